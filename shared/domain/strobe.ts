import { DomainError } from "./DomainError";

/** What `strobe` and its like accept: mains in Hz, speeds in revolutions per minute. */
export const strobeLimits = {
  mainsHz: { min: 10, max: 400 },
  rpm: { min: 1, max: 1000 },
  bars: { min: 2, max: 48_000 },
};

export type StrobeRing = {
  /** Bars around the ring. */
  bars: number;
  /** How many of them pass from one flash to the next at the speed shown. */
  barsPerFlash: number;
  /** The speed at which the bars stand still, rpm. */
  shownRpm: number;
  errorPercent: number;
  /** Bars per minute, forward positive, that pass at exactly the speed wanted. */
  creepPerMinute: number;
};

type Wanted = { mainsHz: number; rpm: number };

function check(field: string, isRight: boolean, words: string) {
  if (!isRight) throw new DomainError(field, words);
}

const isWithin = (value: number, { min, max }: { min: number; max: number }) => value >= min && value <= max;

/** Flashes a minute of a lamp on the mains: one in each half cycle. */
function flashesPerMinute(mainsHz: number): number {
  check("mainsHz", isWithin(mainsHz, strobeLimits.mainsHz), "Mains run at 10 to 400 Hz.");
  return 120 * mainsHz;
}

function checkRpm(rpm: number) {
  check("rpm", isWithin(rpm, strobeLimits.rpm), "A speed is 1 to 1,000 turns a minute.");
}

function ringOf(flashes: number, rpm: number, bars: number, barsPerFlash: number): StrobeRing {
  const passing = flashes * barsPerFlash;
  const shownRpm = passing / bars;
  return {
    bars,
    barsPerFlash,
    shownRpm,
    errorPercent: (shownRpm / rpm - 1) * 100,
    creepPerMinute: bars * rpm - passing,
  };
}

/**
 * The ring of bars that best shows a speed under a lamp on the mains, and the speed that it really shows.
 *
 * Shape:  bars = the whole number nearest to 120 f / rpm (a half goes up); shownRpm = 120 f / bars;
 *         errorPercent = (shownRpm - rpm) / rpm x 100.
 * Errors: DomainError on "mainsHz" or "rpm" outside `strobeLimits`, and on "rpm" where a ring would have one bar only.
 * Source: stroboscope arithmetic; IEC 60050-806 for the sign of the error.
 */
export function strobe({ mainsHz, rpm }: Wanted): StrobeRing {
  const flashes = flashesPerMinute(mainsHz);
  checkRpm(rpm);
  const bars = Math.round(flashes / rpm);
  check("rpm", bars >= strobeLimits.bars.min, "Too fast for this lamp: a ring needs two bars or more.");
  return ringOf(flashes, rpm, bars, 1);
}

/** More bars per flash than this, and no lamp's flash is short enough to show them: common practice, no source. */
const mostBarsPerFlash = 4;

/**
 * The rings for a speed: the nearest one and, where that has an error and a ring exists whose bars pass two to four
 * at a flash and stand still at the true speed, that one as well (50 Hz and 45 rpm: 133 bars, and 400 bars by threes).
 *
 * Errors: as `strobe`. "Exact" means to one part in 10^9.
 */
export function strobeRings(wanted: Wanted): StrobeRing[] {
  const nearest = strobe(wanted);
  const rings = [nearest];
  const flashes = flashesPerMinute(wanted.mainsHz);
  for (let m = 1; m <= mostBarsPerFlash && !rings.some(isExact); m++) {
    const ring = ringOf(flashes, wanted.rpm, Math.round((flashes * m) / wanted.rpm), m);
    if (m > 1 && isExact(ring)) rings.push(ring);
  }
  return rings;
}

/** Whether a ring stands still at the very speed that was wanted. */
export const isExact = ({ errorPercent }: StrobeRing): boolean => Math.abs(errorPercent) < 1e-7;

/**
 * The true speed from bars that creep: rpm = (120 f x bars per flash + bars a minute) / bars; forward, with the
 * turning, is positive and means fast.
 *
 * Errors: DomainError on "mainsHz", "rpm", "bars", "barsPerFlash" or "barsPerMinute". More than half of the flashes
 *         is refused: at such a drift bars seem to run the other way.
 * Source: reference case strobe-11, derived.
 */
export function strobeDrift(input: Wanted & { bars: number; barsPerFlash?: number; barsPerMinute: number }): {
  rpm: number;
  errorPercent: number;
} {
  const { mainsHz, rpm, bars, barsPerFlash = 1, barsPerMinute } = input;
  const flashes = flashesPerMinute(mainsHz);
  checkRpm(rpm);
  check("bars", Number.isInteger(bars) && isWithin(bars, strobeLimits.bars), "A ring has 2 to 48,000 whole bars.");
  const isCount = Number.isInteger(barsPerFlash) && isWithin(barsPerFlash, { min: 1, max: mostBarsPerFlash });
  check("barsPerFlash", isCount, "One to four bars pass at a flash.");
  check("barsPerMinute", Math.abs(barsPerMinute) <= flashes / 2, "Bars that pass so fast cannot be counted.");
  const trueRpm = (flashes * barsPerFlash + barsPerMinute) / bars;
  return { rpm: trueRpm, errorPercent: (trueRpm / rpm - 1) * 100 };
}

/** Bars a minute that pass on any ring when the speed is off by so many percent of what it shows: 0.3 % at 60 Hz is 21.6. */
export function barsPerMinuteFor(mainsHz: number, percent: number, barsPerFlash = 1): number {
  return (flashesPerMinute(mainsHz) * barsPerFlash * percent) / 100;
}
