import { DomainError } from "./DomainError";
import type { Instrument } from "./instruments";
import { longestLengthMm } from "./length";
import { checkReadings, measure } from "./measure";
import { meanOf } from "./uncertainty";

export const checkInVerdicts = ["conforms", "does-not-conform", "cannot-tell"] as const;
export type CheckInVerdict = (typeof checkInVerdicts)[number];
/** The widest guard band that can be asked for, in standard uncertainties. */
export const largestGuardFactor = 5;

export type CheckInInput = {
  readingsMm: readonly number[];
  /** Exactly one of these two says how well it was measured. */
  instrument?: Instrument | undefined;
  standardUncertaintyMm?: number | undefined;
  nominalMm: number;
  plusMinusMm: number;
  guardFactor?: number | undefined;
};
export type CheckIn = {
  verdict: CheckInVerdict;
  meanMm: number;
  standardUncertaintyMm: number;
  guardBandMm: number;
};

/** A size on the very limit is within it; the noise of binary fractions does not decide. */
const slackMm = 1e-9;

function measured({ readingsMm, instrument, standardUncertaintyMm }: CheckInInput) {
  if (instrument !== undefined) {
    if (standardUncertaintyMm !== undefined) {
      throw new DomainError("standardUncertaintyMm", "Give the instrument or its uncertainty, not both.");
    }
    const traits = { role: "body", material: "rubber", inside: false } as const;
    return measure({ readingsMm, instrument, traits, condition: "sound" });
  }
  if (standardUncertaintyMm === undefined) {
    throw new DomainError("instrument", "Say what it was measured with, or how uncertain that is.");
  }
  if (!(standardUncertaintyMm >= 0 && standardUncertaintyMm <= longestLengthMm)) {
    throw new DomainError("standardUncertaintyMm", "An uncertainty is from 0 to 10 m.");
  }
  checkReadings(readingsMm);
  return { valueMm: meanOf(readingsMm), standardUncertaintyMm };
}

/**
 * Whether what was delivered is within what was stated, or whether that cannot be told with this instrument; in mm.
 *
 * Shape:  with g = guardFactor u, "conforms" where the mean lies within the tolerance less g at both ends, "does-not-conform"
 *         where it lies beyond the tolerance by more than g, else "cannot-tell". Limits belong to the zone that they end.
 *         A guard band wider than the tolerance leaves nothing that can be shown to conform.
 *         From an instrument u is that of `measure` for soft rubber, whose give makes it larger than the instrument alone; a
 *         given u is taken for the mean of the readings as it stands.
 * Limits: nominal above 0 and at most 10 m, tolerance 0 to 10 m, guardFactor 0 to 5. Its default of 1.65 is ours: 95 % of a
 *         normal distribution lie on one side of 1.645 u, as ISO 14253-1:2017 asks by default (from memory).
 * Errors: DomainError on "instrument", "standardUncertaintyMm", "nominalMm", "plusMinusMm", "guardFactor", "readingsMm" or
 *         "readingsMm/<index>".
 * Source: ISO 14253-1 (conformity and non-conformity have each to be shown against the uncertainty); ILAC-G8:09/2019 4.2.
 */
export function checkIn(input: CheckInInput): CheckIn {
  const { nominalMm, plusMinusMm, guardFactor = 1.65 } = input;
  if (!(nominalMm > 0 && nominalMm <= longestLengthMm)) {
    throw new DomainError("nominalMm", "A size is more than zero and at most 10 m.");
  }
  if (!(plusMinusMm >= 0 && plusMinusMm <= longestLengthMm)) {
    throw new DomainError("plusMinusMm", "A tolerance is from 0 to 10 m.");
  }
  if (!(guardFactor >= 0 && guardFactor <= largestGuardFactor)) {
    throw new DomainError("guardFactor", `A guard factor is from 0 to ${largestGuardFactor}.`);
  }
  const { valueMm: meanMm, standardUncertaintyMm } = measured(input);
  const guardBandMm = guardFactor * standardUncertaintyMm;
  const deviationMm = Math.abs(meanMm - nominalMm);
  let verdict: CheckInVerdict = "cannot-tell";
  if (deviationMm <= plusMinusMm - guardBandMm + slackMm) verdict = "conforms";
  else if (deviationMm > plusMinusMm + guardBandMm + slackMm) verdict = "does-not-conform";
  return { verdict, meanMm, standardUncertaintyMm, guardBandMm };
}
