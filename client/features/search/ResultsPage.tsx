import { useInfiniteQuery } from "@tanstack/react-query";
import { useEffect, useMemo } from "react";
import { useSearchParams } from "react-router-dom";
import { kindFacts } from "#shared/domain/partKinds";
import { ApiProblem } from "../../lib/ApiProblem";
import { announce } from "../../lib/announcements";
import { askable, needOnly, needParams, readNeed } from "../../lib/needParams";
import { useShipTo, useUnit } from "../../lib/preferences";
import { useTitle } from "../../lib/useTitle";
import { FailureNotice } from "../../ui/FailureNotice";
import { Notice } from "../../ui/Notice";
import { searchQuery } from "./api";
import { Results } from "./Results";
import { ResultsSkeleton } from "./ResultsSkeleton";
import { WorkedExamples } from "./WorkedExamples";

/** The address as the server is asked: the need as understood here, with what else stands in the address. */
function useQueryParams() {
  const [params] = useSearchParams();
  const [shipTo, unit] = [useShipTo(), useUnit()];
  return useMemo(() => {
    const need = askable(readNeed(params, { shipTo, unit }));
    const query = needParams(need);
    const needKey = query.toString();
    for (const name of ["estimateMm", "sort", "offer", "material", "minChance"]) {
      const value = params.get(name);
      if (value) query.set(name, value);
    }
    const asks = Object.keys(need.lengths).length > 0 || need.family !== "" || need.q !== "";
    return { need, needKey, query: query.toString(), needQuery: needOnly(query).toString(), asks };
  }, [params, shipTo, unit]);
}

/** The results of a search, wholly from the address. */
export function ResultsPage() {
  const { need, needKey, query, needQuery, asks } = useQueryParams();
  const search = useInfiniteQuery({ ...searchQuery(query), enabled: asks });
  const first = search.data?.pages[0];
  const kindWords = kindFacts[need.kind].plural;
  useTitle(asks ? `Parts for your measurement: ${kindWords}` : "Find a part by its size");

  const found = search.isPlaceholderData ? undefined : first?.total;
  useEffect(() => {
    if (found !== undefined) announce(found === 1 ? "1 part found" : `${found} parts found`);
  }, [found]);

  return (
    <div className="page pb-8">
      <h1 className="sr-only">{asks ? `${kindWords} for your measurement` : "Find a part by its size"}</h1>
      {!asks && (
        <div className="py-8">
          <Notice title="What did you measure?">
            <p>Write at least one size into the sentence above, choose a mechanism, or look by words.</p>
          </Notice>
          <WorkedExamples />
        </div>
      )}
      {asks && search.isPending && <ResultsSkeleton />}
      {asks && search.isError && !first && (
        <div className="py-8">
          <FailureNotice
            error={search.error}
            what="The parts could not be fetched"
            kept="What you measured stands in the sentence above and in the address."
            onRetry={() => void search.refetch()}
          />
          {search.error instanceof ApiProblem && <Faults problem={search.error} />}
        </div>
      )}
      {asks && first && search.data && (
        <Results
          pages={search.data.pages}
          unit={need.unit}
          needQuery={needQuery}
          needKey={needKey}
          isStale={search.isPlaceholderData}
          hasMore={search.hasNextPage}
          isFetchingMore={search.isFetchingNextPage}
          onMore={() => void search.fetchNextPage()}
        />
      )}
    </div>
  );
}

/** What the server refused, field by field, in its words. */
function Faults({ problem }: { problem: ApiProblem }) {
  if (problem.errors.length === 0) return null;
  return (
    <ul className="mt-4 grid gap-1">
      {problem.errors.map(({ pointer, detail }) => (
        <li key={pointer} className="font-semibold text-outband">
          {detail}
        </li>
      ))}
    </ul>
  );
}
