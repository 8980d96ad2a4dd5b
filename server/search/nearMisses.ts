import type { SizeChance } from "#shared/domain/fit";
import type { Ranked } from "./rankCandidates";

const mostNearMisses = 6;

/** A candidate that one dimension alone keeps out. */
export type Miss = { ranked: Ranked; failing: SizeChance };

/** How far a size lies outside its band, in widths of the band. */
function farOut({ deviationMm, lowerMm, upperMm }: SizeChance, neededMm: number): number {
  const nominalMm = neededMm + deviationMm;
  return Math.max(lowerMm - nominalMm, nominalMm - upperMm, 0) / Math.max(upperMm - lowerMm, 0.001);
}

/**
 * The parts that miss on exactly one dimension, that whose own chance is below what is wanted, while the others together
 * reach it; the nearest first by how far out that dimension lies, at most six.
 */
export function nearMissesOf(missing: readonly Ranked[], leastChance: number): Miss[] {
  const misses = missing.flatMap((ranked) => {
    if (!ranked.assessed) return [];
    const { fit, target } = ranked.assessed;
    const failing = fit.dimensions.filter(({ chance }) => chance < leastChance);
    const [only] = failing;
    if (!only || failing.length > 1) return [];
    const others = fit.dimensions.reduce((product, size) => (size === only ? product : product * size.chance), 1);
    if (others < leastChance) return [];
    return [{ ranked, failing: only, off: farOut(only, target.need[only.dimension]?.valueMm ?? 0) }];
  });
  misses.sort(
    (a, b) =>
      a.off - b.off || b.failing.chance - a.failing.chance || (a.ranked.row.partId < b.ranked.row.partId ? -1 : 1),
  );
  return misses.slice(0, mostNearMisses);
}
