/** One term of an uncertainty budget: its standard uncertainty in mm and where it comes from, in words. */
export type Contribution = {
  name: "instrument" | "resolution" | "repeatability" | "softness" | "thickness" | "flat-spot" | "condition";
  standardUncertaintyMm: number;
  words: string;
  source: string;
};

/** Standard uncertainty of an error known only to lie within +/- `halfWidth`. JCGM 100:2008 4.3.7, rectangular. */
export const rectangular = (halfWidth: number) => halfWidth / Math.sqrt(3);

/** Standard uncertainty of an indication that moves in steps of `step`. JCGM 100:2008 F.2.2.1: step / (2 sqrt 3). */
export const ofStep = (step: number) => rectangular(step / 2);

/** Arithmetic mean of at least one value. JCGM 100:2008 4.2.1. */
export function meanOf(values: readonly number[]): number {
  const rough = values.reduce((sum, value) => sum + value, 0) / values.length;
  // A second pass takes the rounding of the first sum back out, so that equal values give just that value.
  return rough + values.reduce((sum, value) => sum + (value - rough), 0) / values.length;
}

/** Experimental standard deviation, divisor n - 1; 0 for fewer than two values. JCGM 100:2008 4.2.2. */
export function standardDeviation(values: readonly number[]): number {
  if (values.length < 2) return 0;
  const mean = meanOf(values);
  return Math.sqrt(values.reduce((sum, value) => sum + (value - mean) ** 2, 0) / (values.length - 1));
}

/** Type A standard uncertainty of the mean, s / sqrt n. JCGM 100:2008 4.2.3. */
export const ofMean = (values: readonly number[]) => standardDeviation(values) / Math.sqrt(values.length);

/** Combined standard uncertainty of independent terms with unit sensitivity. JCGM 100:2008 5.1.2. */
export const rootSumSquare = (terms: readonly number[]) => Math.hypot(...terms);

/** Combined standard uncertainty of a budget. */
export const combined = (budget: readonly Contribution[]) =>
  rootSumSquare(budget.map((term) => term.standardUncertaintyMm));
