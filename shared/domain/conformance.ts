import { DomainError } from "./DomainError";
import { normalCdf } from "./normalDistribution";

/** A band that a size has to lie in, ends included, in mm. An end left out is no limit on that side. */
export type Band = { lowerMm?: number; upperMm?: number };

/**
 * The probability that a quantity lies in a band, from its estimate and standard uncertainty: Phi((TU - y)/u) - Phi((TL - y)/u).
 *
 * Shape:  one or both ends of the band; with an uncertainty of 0, 1 inside (ends included) and 0 outside.
 * Errors: DomainError on "lowerMm" (no end at all, or above the upper), "standardUncertaintyMm" (negative), "estimateMm".
 * Source: JCGM 106:2012 7.3 and 7.4 (one- and two-sided tolerance interval, normal distribution).
 */
export function conformanceProbability(estimateMm: number, standardUncertaintyMm: number, band: Band): number {
  const { lowerMm = -Infinity, upperMm = Infinity } = band;
  if (!Number.isFinite(estimateMm)) throw new DomainError("estimateMm", "The estimate is not a number.");
  if (!(standardUncertaintyMm >= 0) || standardUncertaintyMm === Infinity) {
    throw new DomainError("standardUncertaintyMm", "An uncertainty is zero or more.");
  }
  if (lowerMm === -Infinity && upperMm === Infinity) throw new DomainError("lowerMm", "Give at least one limit.");
  if (!(lowerMm <= upperMm)) throw new DomainError("lowerMm", "The lower limit lies above the upper one.");

  if (standardUncertaintyMm === 0) return lowerMm <= estimateMm && estimateMm <= upperMm ? 1 : 0;
  const below = (lowerMm - estimateMm) / standardUncertaintyMm;
  const above = (upperMm - estimateMm) / standardUncertaintyMm;
  // In the upper tail both values are nearly 1; their mirror images keep the digits of the difference.
  const probability = below > 0 ? normalCdf(-below) - normalCdf(-above) : normalCdf(above) - normalCdf(below);
  return Math.min(Math.max(probability, 0), 1);
}
