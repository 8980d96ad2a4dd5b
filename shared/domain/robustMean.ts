import { DomainError } from "./DomainError";
import { longestLengthMm } from "./length";
import { meanOf, standardDeviation } from "./uncertainty";

/** How many values a consensus takes. */
export const robustMeanLimits = { least: 2, most: 10_000 } as const;
/** The rounds end at the latest after this many looks at a value, and 500 rounds more. */
const mostLooks = 200_000;
/** Values further out than this many s* are drawn in; a standard deviation of drawn-in normal values is too small by this. */
const [reach, grows] = [1.5, 1.134];

export type RobustMean = {
  robustMeanMm: number;
  robustSdMm: number;
  standardUncertaintyMm: number;
  n: number;
  /** Rounds of drawing in until nothing changed any more. */
  iterations: number;
};

function checkValues(valuesMm: readonly number[]): void {
  const { least, most } = robustMeanLimits;
  if (valuesMm.length < least) throw new DomainError("valuesMm", `Give at least ${least} values.`);
  if (valuesMm.length > most) throw new DomainError("valuesMm", `Give at most ${most} values.`);
  for (const [i, value] of valuesMm.entries()) {
    if (!(value > 0 && value <= longestLengthMm)) {
      throw new DomainError(`valuesMm/${i}`, "A value is a length of more than zero and at most 10 m.");
    }
  }
}

const median = (sorted: readonly number[]) => {
  const half = sorted.length >> 1;
  return sorted.length % 2 ? sorted[half]! : (sorted[half - 1]! + sorted[half]!) / 2;
};
/**
 * Where the rounds end as long as the same counts of values are drawn in from below and above: the two equations of a round
 * solved for mean and sd. Undefined where other values would then be drawn in, or the rounds lead away from it.
 */
function fixedPoint(sorted: readonly number[], below: number, above: number) {
  const inner = sorted.slice(below, sorted.length - above);
  const centre = meanOf(inner);
  const perSd = (reach * (above - below)) / inner.length;
  const squares = inner.reduce((sum, value) => sum + (value - centre) ** 2, 0);
  const rest = (sorted.length - 1) / grows ** 2 - reach ** 2 * (below + above) - perSd ** 2 * inner.length;
  if (!(rest > 0)) return undefined;
  const sd = Math.sqrt(squares / rest);
  const mean = centre + perSd * sd;
  const isDrawnIn = (value: number) => Math.abs(value - mean) > reach * sd;
  const holds =
    !inner.some(isDrawnIn) && [...sorted.slice(0, below), ...sorted.slice(sorted.length - above)].every(isDrawnIn);
  return holds ? { mean, sd } : undefined;
}

const ascending = (values: readonly number[]) => [...values].sort((a, b) => a - b);

/**
 * Mean and standard deviation of independent measurements of one size, in mm, that a few wild ones hardly move.
 *
 * Shape:  Algorithm A. Start from the median and 1.483 times the median absolute deviation; draw what lies beyond 1.5 s* in
 *         to there; take the mean, and 1.134 times the standard deviation; again. The standard stops when the third figure
 *         stands still; here the rounds go on until nothing changes, and where they creep their end is solved for. The
 *         uncertainty is 1.25 s* / sqrt(p).
 * Ties:   where more than half of the values are equal the start is the sample standard deviation (from memory). The
 *         spread may still end at 0, with their value as the mean.
 * Limits: 2 to 10,000 values, each above 0 and at most 10 m; ends after 500 + 200,000 / p rounds at the latest (only where
 *         two camps are held apart by a hair's breadth is that reached). The order of the values does not matter.
 * Errors: DomainError on "valuesMm" or "valuesMm/<index>".
 * Source: ISO 13528:2015 Annex C.3.1 (Algorithm A), 7.7.3 for the uncertainty (clause numbers from memory).
 */
export function robustMean(valuesMm: readonly number[]): RobustMean {
  checkValues(valuesMm);
  const sorted = ascending(valuesMm);
  const n = sorted.length;
  let mean = median(sorted);
  let sd = 1.483 * median(ascending(sorted.map((value) => Math.abs(value - mean)))) || standardDeviation(sorted);
  const start = sd;

  let [iterations, alike, counts] = [0, 0, ""];
  for (let change = sd; change > 1e-13 * start && iterations < 500 + mostLooks / n; iterations++) {
    const [low, high] = [mean - reach * sd, mean + reach * sd];
    const below = sorted.filter((value) => value < low).length;
    const above = sorted.filter((value) => value > high).length;
    alike = counts === `${below} ${above}` ? alike + 1 : 0;
    counts = `${below} ${above}`;
    const end = alike >= 5 ? fixedPoint(sorted, below, above) : undefined;
    const drawnIn = sorted.map((value) => Math.min(Math.max(value, low), high));
    const next = end ?? { mean: meanOf(drawnIn), sd: grows * standardDeviation(drawnIn) };
    change = end ? 0 : Math.abs(next.mean - mean) + Math.abs(next.sd - sd);
    ({ mean, sd } = next);
  }
  return { robustMeanMm: mean, robustSdMm: sd, standardUncertaintyMm: (1.25 * sd) / Math.sqrt(n), n, iterations };
}
