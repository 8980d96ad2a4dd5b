import type { Band } from "./conformance";
import { DomainError } from "./DomainError";
import { normalQuantile } from "./normalDistribution";

export type FitWindow = { lowerMm: number; upperMm: number; reachPerPlusMinus: number };

/** Rounding of the chance may lift it over the threshold from this far outside, as a share of what is compared. */
const slack = 1e-9;

/**
 * Where the nominal of a part must lie for its chance in this dimension to reach `minChance`: a part of nominal x and
 * tolerance +/-t that reaches it always has x - reachPerPlusMinus * t <= upperMm and x + reachPerPlusMinus * t >= lowerMm.
 * For an index: it may let through parts that turn out not to reach it, and never drops one that does.
 *
 * Why:    beyond the band's end by d the chance is at most Phi(-d / u), so d <= z u with z = -quantile(minChance), and
 *         u = sqrt(u_need^2 + t^2 / 3) <= u_need + t / sqrt 3. From 0.5 up z is 0: the nominal must lie in the band.
 * Limits: a minChance of 0 or less bounds nothing: the ends are infinite and the reach 0.
 * Errors: DomainError on "minChance" (over 1 or not a number), "uNeedMm" (negative), "band/lowerMm" (above the upper end).
 */
export function fitWindow(band: Band, uNeedMm: number, minChance: number): FitWindow {
  const { lowerMm = -Infinity, upperMm = Infinity } = band;
  if (!(minChance <= 1)) throw new DomainError("minChance", "A chance is at most 1.");
  if (!(uNeedMm >= 0) || uNeedMm === Infinity) throw new DomainError("uNeedMm", "An uncertainty is zero or more.");
  if (!(lowerMm <= upperMm)) throw new DomainError("band/lowerMm", "The lower limit lies above the upper one.");
  if (minChance <= 0) return { lowerMm: -Infinity, upperMm: Infinity, reachPerPlusMinus: 0 };

  const z = minChance >= 0.5 ? 0 : -normalQuantile(minChance) * (1 + slack);
  const marginAt = (endMm: number) => z * uNeedMm + (Number.isFinite(endMm) ? slack * Math.max(1, Math.abs(endMm)) : 0);
  return {
    lowerMm: lowerMm - marginAt(lowerMm),
    upperMm: upperMm + marginAt(upperMm),
    reachPerPlusMinus: z / Math.sqrt(3),
  };
}
