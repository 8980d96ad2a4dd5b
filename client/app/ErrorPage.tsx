import { Link } from "react-router-dom";
import { ApiProblem } from "../lib/ApiProblem";
import { useTitle } from "../lib/useTitle";
import { Button } from "../ui/Button";
import { NotFoundPage } from "./NotFoundPage";

/** Shown in place of a page that broke. */
export function ErrorPage({ error }: { error: unknown }) {
  useTitle("Something went wrong");
  if (error instanceof ApiProblem && error.status === 404) return <NotFoundPage />;
  return (
    <div role="alert" className="page grid justify-items-start gap-4 py-16">
      <h1>This page could not be shown</h1>
      <p className="max-w-prose">
        {error instanceof ApiProblem
          ? error.message
          : "Idlewright may have been renewed while you had it open, or the connection broke. Loading the page again helps in both cases; what stands in the address is kept."}
      </p>
      <Button look="primary" onClick={() => window.location.reload()}>
        Load again
      </Button>
      <Link to="/">To the beginning</Link>
    </div>
  );
}
