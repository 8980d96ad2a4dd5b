import type { Estimate } from "./asNew";
import { DomainError } from "./DomainError";
import { longestLengthMm } from "./length";

/** Less than this together (a thousandth of a nanometre, in mm) is no uncertainty of a measurement. */
const leastUncertaintyMm = 1e-9;

function checkEstimate(name: string, { valueMm, standardUncertaintyMm }: Estimate): void {
  if (!(Math.abs(valueMm) <= longestLengthMm)) throw new DomainError(`${name}/valueMm`, "A size is at most 10 m.");
  if (!(standardUncertaintyMm >= 0 && standardUncertaintyMm <= longestLengthMm)) {
    throw new DomainError(`${name}/standardUncertaintyMm`, "An uncertainty is from 0 to 10 m.");
  }
}

/**
 * Whether two independent estimates of one size agree within their uncertainties, and by how much: both scores are negative
 * where the first is the smaller.
 *
 * Shape:  zeta = (x - y)/sqrt(u² + u²), agreeing where |zeta| <= 2; En is the same with the expanded uncertainties U = 2 u and
 *         so half of zeta, agreeing where |En| <= 1.
 * Limits: sizes to 10 m. Of two values that both have no uncertainty nothing can be said, equal or not: refused.
 * Errors: DomainError on "one/valueMm", "one/standardUncertaintyMm", "other/valueMm", "other/standardUncertaintyMm".
 * Source: ISO 13528:2015 9.6 (zeta scores) and 9.7 (En scores), clause numbers from memory.
 */
export function agreement(one: Estimate, other: Estimate): { zeta: number; en: number; agrees: boolean } {
  checkEstimate("one", one);
  checkEstimate("other", other);
  const uncertaintyMm = Math.hypot(one.standardUncertaintyMm, other.standardUncertaintyMm);
  if (uncertaintyMm < leastUncertaintyMm) {
    throw new DomainError("other/standardUncertaintyMm", "Two values without uncertainty cannot be compared by it.");
  }
  const zeta = (one.valueMm - other.valueMm) / uncertaintyMm;
  return { zeta, en: zeta / 2, agrees: Math.abs(zeta) <= 2 };
}
