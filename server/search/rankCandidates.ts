import { verdictThresholds } from "#shared/domain/verdict";
import type { SearchQuery } from "#shared/schemas/search";
import { type Assessed, assessRow, compareFits } from "./assessRow";
import type { CandidateRow } from "./loadRows";
import type { Target } from "./Target";

/** A candidate and how it fits; `assessed` is null where words alone found it. */
export type Ranked = { row: CandidateRow; assessed: Assessed | null };
type Filters = Pick<SearchQuery, "minChance" | "offer" | "material" | "sort">;

/** Where a candidate stands under a sort: compared item by item, the smaller first; ends with the part's id. */
export type SortKey = readonly (number | string)[];

// Where there is no postage to the country the landed price comes after every other.
const notShipped = Number.MAX_SAFE_INTEGER;
const hundredths = (chance: number) => Math.round(chance * 100);

/** The key of a candidate under a sort. Chances that are the same to two digits count as equal. */
export function sortKey({ row, assessed }: Ranked, sort: SearchQuery["sort"]): SortKey {
  const landed = row.landedMinor ?? notShipped;
  if (sort === "price") return [landed, row.partId];
  if (sort === "dispatch") return [row.dispatchDays, landed, row.partId];
  const fit = assessed?.fit;
  return [fit ? -hundredths(fit.chance) : 0, fit ? -fit.coverage : 0, landed, row.partId];
}

export function compareKeys(a: SortKey, b: SortKey): number {
  for (const [i, one] of a.entries()) {
    const other = b[i]!;
    if (one !== other) return one < other ? -1 : 1;
  }
  return 0;
}

/** Each part once: a kit by the line that fits best. */
function onePerPart(candidates: readonly Ranked[]): Ranked[] {
  const best = new Map<string, Ranked>();
  for (const candidate of candidates) {
    const known = best.get(candidate.row.partId);
    const better =
      !known || (known.assessed && candidate.assessed && compareFits(candidate.assessed.fit, known.assessed.fit) < 0);
    if (better) best.set(candidate.row.partId, candidate);
  }
  return [...best.values()];
}

/** The least chance that is shown; without a wish, that of the verdict `chancy`. */
export const leastChance = ({ minChance }: Pick<SearchQuery, "minChance">) => minChance ?? verdictThresholds.chancy;

/**
 * Candidates assessed, filtered and in order; and those that miss, in no order.
 *
 * Shape: each part once, in `fitting` or else in `missing`. Without targets nothing is assessed and all fit.
 */
export function rankCandidates(
  rows: readonly CandidateRow[],
  targets: readonly Target[],
  { offer, material, sort, minChance }: Filters,
): { fitting: Ranked[]; missing: Ranked[] } {
  const candidates: Ranked[] = [];
  for (const row of rows) {
    if ((offer && row.offerType !== offer) || (material && row.material !== material)) continue;
    const assessed = targets.length > 0 ? assessRow(row, targets) : null;
    if (assessed || targets.length === 0) candidates.push({ row, assessed });
  }

  const least = leastChance({ minChance });
  const reaches = ({ assessed }: Ranked) => !assessed || assessed.fit.chance >= least;
  const parts = onePerPart(candidates);
  const keyed = parts.filter(reaches).map((ranked) => ({ ranked, key: sortKey(ranked, sort) }));
  keyed.sort((a, b) => compareKeys(a.key, b.key));
  return { fitting: keyed.map(({ ranked }) => ranked), missing: parts.filter((part) => !reaches(part)) };
}
