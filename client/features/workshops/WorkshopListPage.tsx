import { useQuery } from "@tanstack/react-query";
import { Link } from "react-router-dom";
import { useTitle } from "../../lib/useTitle";
import { FailureNotice } from "../../ui/FailureNotice";
import { kindPlural } from "../../ui/kindPlural";
import { Notice } from "../../ui/Notice";
import { Skeleton } from "../../ui/Skeleton";
import { workshopsQuery } from "./api";

export function WorkshopListPage() {
  const workshops = useQuery(workshopsQuery);
  useTitle("Workshops");
  return (
    <div className="page pb-8">
      <header className="grid gap-2 pt-8 pb-6">
        <h1>Workshops</h1>
        <p className="max-w-prose text-step1 text-soft">
          Small makers who mould, grind and cut. Each was looked at before it could sell here, and sells in its own
          name.
        </p>
      </header>
      {workshops.isPending && (
        <div role="status" className="grid gap-4">
          <span className="sr-only">Fetching the workshops</span>
          {["one", "two", "three", "four"].map((row) => (
            <Skeleton key={row} className="h-12 w-full" />
          ))}
        </div>
      )}
      {workshops.isError && !workshops.data && (
        <FailureNotice
          error={workshops.error}
          what="The workshops could not be fetched"
          onRetry={() => void workshops.refetch()}
        />
      )}
      {workshops.data?.items.length === 0 && <Notice title="No workshop has been admitted yet" />}
      <ul className="border-t border-rule">
        {workshops.data?.items.map(({ id, slug, name, town, countryName, partCount, kinds }) => (
          <li
            key={id}
            className="grid gap-x-8 gap-y-0.5 border-b border-rule py-3 sm:grid-cols-[18rem_1fr_auto] sm:items-baseline"
          >
            <h2 className="text-step1">
              <Link to={`/workshops/${slug}`} className="inline-flex min-h-8 items-center no-underline hover:underline">
                {name}
              </Link>
            </h2>
            <p className="text-soft">
              {town}, {countryName}
              <span className="block">{kinds.map(kindPlural).join(", ")}</span>
            </p>
            <p>
              {partCount} {partCount === 1 ? "part" : "parts"}
            </p>
          </li>
        ))}
      </ul>
    </div>
  );
}
