import { Link } from "react-router-dom";
import { useTitle } from "../lib/useTitle";

export function NotFoundPage() {
  useTitle("Nothing here");
  return (
    <div className="page grid gap-4 py-16">
      <h1>There is nothing at this address</h1>
      <p className="max-w-prose">It may have been mistyped, or what stood here is no longer offered.</p>
      <p className="flex flex-wrap gap-6">
        <Link to="/">Find a part by its size</Link>
        <Link to="/families">Look through the mechanism families</Link>
      </p>
    </div>
  );
}
