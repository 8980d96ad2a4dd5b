import { erfc, invErfc } from "mathfn/functions/erf.js";

/**
 * Standard normal distribution function: the probability of a value up to z, erfc(-z / sqrt 2) / 2.
 *
 * Error: below 1e-15 absolutely, and below 1e-12 of the value itself in the lower tail down to z = -37.
 */
export const normalCdf = (z: number): number =>
  // Around 0 the package is a bit too low by rounding, where the first term of the series is exact.
  Math.abs(z) < 1e-8 ? 0.5 + z / Math.sqrt(2 * Math.PI) : erfc(-z / Math.SQRT2) / 2;

/**
 * The z that a standard normal value stays below with probability p in [0, 1]; infinite for 0 and 1.
 * By the inverse of the complementary error function, which keeps its digits for small p.
 */
export const normalQuantile = (p: number): number => -Math.SQRT2 * invErfc(2 * p);
