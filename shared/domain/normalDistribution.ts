import erfcinv from "@stdlib/math-base-special-erfcinv";
import cdf from "@stdlib/stats-base-dists-normal-cdf";

/** Standard normal distribution function: the probability of a value up to z. Good to about 1e-15 absolutely. */
export const normalCdf = (z: number): number => cdf(z, 0, 1);

/**
 * The z that a standard normal value stays below with probability p; infinite for 0 and 1.
 * By the inverse of the complementary error function, which keeps its digits for small p.
 */
export const normalQuantile = (p: number): number => -Math.SQRT2 * erfcinv(2 * p);
