import type { WearRole } from "./dimensionTraits";
import { type Measurement, mostReadings } from "./measure";
import { rootSumSquare } from "./uncertainty";

/**
 * The range that n readings of one true size exceed only one time in twenty, in standard deviations of a reading: the
 * 95 % point of the range of n normal values. For more than 20 readings the value for 20 grows with sqrt(ln n).
 * Source: studentised range with infinite degrees of freedom, recomputed: the tests integrate its distribution.
 */
const rangeFactors = [
  2.772, 3.314, 3.633, 3.858, 4.03, 4.17, 4.286, 4.387, 4.474, 4.552, 4.622, 4.685, 4.743, 4.796, 4.845, 4.891, 4.934,
  4.974, 5.012,
];
export function rangeFactor(count: number): number {
  const last = rangeFactors.at(-1)!;
  if (count <= 20) return rangeFactors[count - 2] ?? last;
  return last * Math.sqrt(Math.log(Math.min(count, mostReadings)) / Math.log(20));
}

/**
 * Whether three or more readings around a rolling part differ by more than measuring alone explains, with the range found
 * and the range explained, in mm. Sizes that do not run round (widths, bores, belts) have no flat spot.
 */
export function findFlatSpot(
  role: WearRole,
  readingsMm: readonly number[],
  { budget }: Measurement,
): { found: boolean; rangeMm: number; explainedMm: number } {
  const rangeMm = Math.max(...readingsMm) - Math.min(...readingsMm);
  const perReading = budget.filter((term) => term.name !== "repeatability").map((term) => term.standardUncertaintyMm);
  const explainedMm = rangeFactor(readingsMm.length) * rootSumSquare(perReading);
  return { found: role === "tread" && readingsMm.length >= 3 && rangeMm > explainedMm, rangeMm, explainedMm };
}
