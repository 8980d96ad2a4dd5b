import { kindFacts } from "#shared/domain/partKinds";
import type { SearchAnswer, SearchQuery } from "#shared/schemas/search";
import type { CandidateQuery, SearchEngine, Sought } from "../adapters/SearchEngine";
import { presentParts } from "../presenters/presentParts";
import { presentSearchItem } from "../presenters/presentSearchItem";
import { evidenceOf } from "./evidenceOf";
import { type CandidateRow, loadItems, loadParts } from "./loadRows";
import { nearMissesOf } from "./nearMisses";
import { neighboursOf } from "./neighbours";
import { leastChance, type Ranked, rankCandidates, sortKey } from "./rankCandidates";
import { refused } from "./readLengths";
import { type ReadNeed, readNeed } from "./readNeed";
import { countUpTo, readCursor, writeCursor } from "./searchCursor";
import { railSizeOf, searchRail } from "./searchRail";
import { loadSellers } from "./sellers";
import { soughtBy } from "./sizeWindows";
import { dimensionsIn } from "./Target";

/** More than any search that narrows anything down; keeps one request from taking the server's memory. */
const mostCandidates = 20_000;

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
  read: ReadNeed,
  query: SearchQuery,
  sought: CandidateQuery["sought"],
): Promise<CandidateRow[]> {
  const words = read.need.q;
  const along = railSizeOf(read.need);
  const shown = sought[0];
  const [refs, neighbours] = await Promise.all([
    engine.candidates({ sought, words, limit: mostCandidates }),
    along && shown && shown.windows.length > 0
      ? neighboursOf(shown, along.dimension, { offer: query.offer, material: query.material, words })
      : [],
  ]);
  const itemIds = new Set([...refs.flatMap(({ itemId }) => itemId ?? []), ...neighbours]);
  const [items, parts] = await Promise.all([
    loadItems("item", [...itemIds], dimensionsIn(read.targets)),
    loadParts(refs.flatMap(({ itemId, partId }) => (itemId ? [] : partId))),
  ]);
  return [...items, ...parts];
}

/**
 * Measured search: what was asked, the page of parts that fit in the order wished, the rail, and near misses.
 *
 * Errors: `invalid-request` for what is not clear, with a pointer; `not-found` for a family that is not there.
 */
export async function searchParts(engine: SearchEngine, query: SearchQuery): Promise<SearchAnswer> {
  const after = query.cursor === undefined ? null : readCursor(query.cursor, query.sort);
  const read = await readNeed(query, query.q || null);
  const { need, targets, familyId } = read;
  const least = leastChance(query);
  const rows = await loadCandidates(engine, read, query, soughtOf(read, least));
  const sellers = await loadSellers(
    rows.map(({ workshopId }) => workshopId),
    query.shipTo,
  );
  const { fitting, missing } = rankCandidates(rows, { targets, sellers, filters: query });

  const keys = after ? fitting.map((ranked) => sortKey(ranked, query.sort)) : [];
  const start = after ? countUpTo(keys, after) : 0;
  const page = fitting.slice(start, start + query.limit);
  const last = start + page.length < fitting.length ? page.at(-1) : undefined;
  const misses = nearMissesOf(missing, least);

  const partIds = [...page, ...misses.map(({ ranked }) => ranked)].map(({ row }) => row.partId);
  const [parts, evidence] = await Promise.all([presentParts(partIds), evidenceOf(partIds, familyId)]);
  const severalPoints = new Set(targets.map(({ point }) => point?.id)).size > 1;
  const present = (ranked: Ranked) => {
    const part = parts.get(ranked.row.partId);
    const reports = evidence.get(ranked.row.partId);
    // A part that was taken away between two of the queries is left out.
    return part && reports ? [presentSearchItem(ranked, { part, evidence: reports, severalPoints })] : [];
  };
  return {
    need,
    items: page.flatMap(present),
    rail: searchRail(need, fitting, missing),
    nearMisses: misses.flatMap(({ ranked, failing: { dimension, reason } }) =>
      present(ranked).map((item) => ({ ...item, failing: { dimension, reason } })),
    ),
    total: fitting.length,
    nextCursor: last ? writeCursor(query.sort, sortKey(last, query.sort)) : null,
  };
}
