import { useQuery } from "@tanstack/react-query";
import { useEffect, useMemo } from "react";
import { Link, useParams, useSearchParams } from "react-router-dom";
import type { PartPage as Answer } from "#shared/schemas/catalogue";
import type { PartSummary } from "#shared/schemas/part";
import { ApiProblem } from "../../lib/ApiProblem";
import { capitalised } from "../../lib/capitalised";
import type { SizeUnit } from "../../lib/formatSize";
import { askable, needOnly, needParams, readNeed } from "../../lib/needParams";
import { useShipTo, useUnit } from "../../lib/preferences";
import { useTitle } from "../../lib/useTitle";
import { FailureNotice } from "../../ui/FailureNotice";
import { Notice } from "../../ui/Notice";
import { materialWords, offerNames, stockWords } from "../../ui/offerWords";
import { partQuery } from "./api";
import { BuyPanel } from "./BuyPanel";
import { DrawingPanel } from "./DrawingPanel";
import { EvidenceSection } from "./EvidenceSection";
import { FitPanel } from "./FitPanel";
import { PartSkeleton } from "./PartSkeleton";
import { Photos } from "./Photos";
import { TraderSection } from "./TraderSection";

/** The need in the address, as the server is asked: without a kind where nothing was measured, so that none is assumed. */
function useNeed() {
  const [params] = useSearchParams();
  const [shipTo, unit] = [useShipTo(), useUnit()];
  return useMemo(() => {
    const need = askable(readNeed(params, { shipTo, unit }));
    const query = needOnly(needParams(need));
    query.delete("q");
    if (Object.keys(need.lengths).length === 0 && !need.family) query.delete("kind");
    const moved = params.get("estimateMm");
    if (moved) query.set("estimateMm", moved);
    return { query: query.toString(), unit: need.unit };
  }, [params, shipTo, unit]);
}

function withKind(params: URLSearchParams, kind: string): URLSearchParams {
  const next = new URLSearchParams(params);
  next.set("kind", kind);
  return next;
}

export function PartPage() {
  const { id = "" } = useParams();
  const { query, unit } = useNeed();
  // Another need keeps the page of the same part until its answer is there.
  const page = useQuery({
    ...partQuery(id, query),
    placeholderData: (previous) => (previous?.part.id === id ? previous : undefined),
  });
  useTitle(page.data?.part.title ?? "Part");
  const [params, setParams] = useSearchParams();
  const kind = page.data && kindOf(page.data.part);
  useEffect(() => {
    if (kind && !params.has("kind")) setParams(withKind(params, kind), { replace: true });
  }, [kind, params, setParams]);

  if (page.isError && !page.data) {
    const isGone = page.error instanceof ApiProblem && page.error.status === 404;
    return (
      <div className="page py-12">
        <h1 className="sr-only">Part</h1>
        {isGone ? (
          <Notice title="This part is not offered any more">
            <p>
              Its workshop took it down, or the address is not complete.{" "}
              <Link to={`/find?${query}`}>Look for others</Link> of the size.
            </p>
          </Notice>
        ) : (
          <FailureNotice error={page.error} what="The part could not be fetched" onRetry={() => void page.refetch()} />
        )}
      </div>
    );
  }
  if (!page.data) return <PartSkeleton />;
  return <Part page={page.data} unit={unit} />;
}

/** "NBR, 45 Shore A. Stocked, 7 left." */
function factsOf(part: PartSummary): string {
  const offer = [offerNames[part.offerType], part.available === null ? null : stockWords(part)]
    .filter(Boolean)
    .join(", ");
  return [materialWords(part), offer]
    .filter(Boolean)
    .map((words) => `${capitalised(words)}.`)
    .join(" ");
}

/** The kind that the strip asks for where the address names none: the part's own, or of a kit the first that is measured. */
const kindOf = (part: PartSummary) =>
  part.kind === "rebuild-kit" ? part.kitLines.find(({ kind }) => kind !== null)?.kind : part.kind;

function Part({ page, unit }: { page: Answer; unit: SizeUnit }) {
  const { part, workshop } = page;
  return (
    <article className="page pb-8">
      <header className="grid gap-1 pt-8 pb-2">
        <h1>{part.title}</h1>
        <p className="text-step1 text-soft">
          <Link to={`/workshops/${workshop.slug}`} className="text-ink">
            {workshop.name}
          </Link>
          , {workshop.town}, {workshop.countryName}. {factsOf(part)}
        </p>
      </header>
      <div className="part-columns">
        <DrawingPanel page={page} unit={unit} />
        <div className="grid grid-cols-[minmax(0,1fr)] content-start gap-2" style={{ gridArea: "decide" }}>
          <FitPanel page={page} unit={unit} />
          <BuyPanel page={page} />
        </div>
        <div className="grid content-start gap-2" style={{ gridArea: "about" }}>
          <Photos photos={page.photos} />
          <EvidenceSection page={page} />
          <TraderSection page={page} />
        </div>
      </div>
    </article>
  );
}
