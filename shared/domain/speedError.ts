import type { SpeedLimit } from "./speedLimits";

export type SpeedError = { errorPercent: number; errorCents: number };

/**
 * How far a speed is off: percent of the rated speed, and hundredths of a semitone in pitch; positive is fast.
 *
 * Limits: both speeds above zero, in the same unit. -50 % is -1200 cents, an octave.
 * Source: IEC 60050-806 "deviation from rated speed"; 1200 log2 of the ratio, Howard and Angus, Acoustics and
 *         Psychoacoustics, 5th ed., Appendix 3.
 */
export function speedError(actual: number, rated: number): SpeedError {
  return { errorPercent: ((actual - rated) / rated) * 100, errorCents: 1200 * Math.log2(actual / rated) };
}

/** A billionth of a percent: far below any measurement, far above what doubles lose (1e-15 of the speed). */
const slackPercent = 1e-9;

/**
 * Whether a speed error keeps a limit, ends included: 33 rpm is just -1 % of 33 1/3, where doubles give
 * -1.0000000000000009 and would misjudge without a little slack.
 */
export function isWithinLimit(errorPercent: number, limit: Pick<SpeedLimit, "lowerPercent" | "upperPercent">): boolean {
  return errorPercent >= limit.lowerPercent - slackPercent && errorPercent <= limit.upperPercent + slackPercent;
}
