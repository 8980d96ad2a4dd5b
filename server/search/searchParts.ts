import { kindFacts } from "#shared/domain/partKinds";
import type { SearchAnswer, SearchItem, SearchQuery } from "#shared/schemas/search";
import type { CandidateQuery, SearchEngine, Sought } from "../adapters/SearchEngine";
import { presentParts } from "../presenters/presentParts";
import { presentSearchItem } from "../presenters/presentSearchItem";
import { evidenceOf } from "./evidenceOf";
import { type CandidateRow, loadItems, loadParts } from "./loadRows";
import { nearMissesOf } from "./nearMisses";
import { neighboursOf } from "./neighbours";
import { leastChance, type Ranked, rankCandidates, sortKey } from "./rankCandidates";
import { type ReadNeed, readNeed } from "./readNeed";
import { refused } from "./readSizes";
import { countUpTo, readCursor, writeCursor } from "./searchCursor";
import { railSizeOf, searchRail } from "./searchRail";
import { soughtBy } from "./sizeWindows";
import { dimensionsIn } from "./Target";
import { workshopSummaries } from "./workshopSummaries";

/** More than any search that narrows anything down; keeps one request from taking the server's memory. */
const mostCandidates = 100_000;

/** What the engine is asked. Errors: `invalid-request` where nothing narrows the search down. */
function soughtOf({ need, targets, kinds }: ReadNeed, least: number): readonly Sought[] {
  if (targets.length > 0) return targets.map((target) => soughtBy(target, least));
  if (need.q !== null) return kinds.map((kind) => ({ kind, windows: [] }));
  if (need.family) {
    const detail = need.kind
      ? `The register has no size of such a part for the ${need.family.name}. Measure the old part and give a dimension.`
      : `The register has no sizes for the ${need.family.name} yet. Measure the old part and give a dimension.`;
    throw refused([{ pointer: need.kind ? "#/kind" : "#/family", detail }]);
  }
  const detail = "Give at least one dimension, a mechanism family or words to search for.";
  throw refused([{ pointer: `#/${need.kind ? kindFacts[need.kind].primary : "q"}`, detail }]);
}

async function loadCandidates(
  engine: SearchEngine,
  { need, targets }: ReadNeed,
  query: SearchQuery,
  sought: CandidateQuery["sought"],
): Promise<CandidateRow[]> {
  const { shipTo, offer, material } = query;
  const words = need.q;
  const along = railSizeOf(need);
  const shown = sought[0];
  const [candidates, neighbours] = await Promise.all([
    engine.candidates({ sought, words, limit: mostCandidates }),
    along && shown ? neighboursOf(shown, along.dimension, { offer, material, words }) : null,
  ]);
  if (candidates.of === "parts") return loadParts(candidates.select, shipTo);
  const selects = neighbours ? [candidates.select, neighbours] : [candidates.select];
  return loadItems(selects, { dimensions: dimensionsIn(targets), shipTo });
}

/** Rows of results for these candidates, by the id of the part. */
async function presentAll(
  ranked: readonly Ranked[],
  { targets, familyId }: ReadNeed,
): Promise<Map<string, SearchItem>> {
  const partIds = ranked.map(({ row }) => row.partId);
  const [parts, reports, workshops] = await Promise.all([
    presentParts(partIds),
    evidenceOf(partIds, familyId),
    workshopSummaries(ranked.map(({ row }) => row.workshopId)),
  ]);
  const severalPoints = new Set(targets.map(({ point }) => point?.id)).size > 1;
  const items = new Map<string, SearchItem>();
  for (const one of ranked) {
    const part = parts.get(one.row.partId);
    const evidence = reports.get(one.row.partId);
    const workshop = workshops.get(one.row.workshopId);
    // A part that was taken away between two of the queries is left out.
    if (!part || !evidence || !workshop) continue;
    items.set(part.id, presentSearchItem(one, { part, workshop, evidence, severalPoints }));
  }
  return items;
}

/** Everything that a search finds, before a page of it is shown. */
export async function rankedParts(engine: SearchEngine, query: SearchQuery) {
  const read = await readNeed(query, query.q || null);
  const least = leastChance(query);
  const rows = await loadCandidates(engine, read, query, soughtOf(read, least));
  return { read, least, ...rankCandidates(rows, read.targets, query) };
}

/**
 * Measured search: what was asked, the page of parts that fit in the order wished, the rail, and near misses.
 *
 * Errors: `invalid-request` for what is not clear, with a pointer; `not-found` for a family that is not there.
 */
export async function searchParts(engine: SearchEngine, query: SearchQuery): Promise<SearchAnswer> {
  const after = query.cursor === undefined ? null : readCursor(query.cursor, query.sort);
  const { read, least, fitting, missing } = await rankedParts(engine, query);
  const { need } = read;

  const keyOf = (ranked: Ranked) => sortKey(ranked, query.sort);
  const start = after ? countUpTo(fitting.map(keyOf), after) : 0;
  const page = fitting.slice(start, start + query.limit);
  const last = start + page.length < fitting.length ? page.at(-1) : undefined;
  const misses = nearMissesOf(missing, least);
  const presented = await presentAll([...page, ...misses.map(({ ranked }) => ranked)], read);
  const itemOf = ({ row }: Ranked) => presented.get(row.partId) ?? [];
  return {
    need,
    items: page.flatMap(itemOf),
    rail: searchRail(need, fitting, missing),
    nearMisses: misses.flatMap(({ ranked, failing: { dimension } }) =>
      [itemOf(ranked)].flat().map((item) => {
        const reason = item.fit?.dimensions.find((size) => size.dimension === dimension)?.reason ?? "";
        return { ...item, failing: { dimension, reason } };
      }),
    ),
    total: fitting.length,
    nextCursor: last ? writeCursor(query.sort, keyOf(last)) : null,
  };
}
