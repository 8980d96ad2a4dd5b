import { DomainError } from "./DomainError";

/** Refuses, on `field`, a number outside [least, most] (0 left out where `least` is 0) or not a number at all. */
export function requireWithin(field: string, value: number, least: number, most: number, unit = "mm"): void {
  if (value >= least && value <= most && value !== 0) return;
  const from = least === 0 ? "More than 0" : `From ${least}`;
  throw new DomainError(field, `${from} up to ${most} ${unit}.`);
}
