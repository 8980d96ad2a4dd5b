import { type SpeedLimit, speedLimits } from "#shared/domain/speedLimits";

const ranges = [1, 2, 3, 5, 10, 20, 30, 50, 100, 200, 500, 1000, 2000, 5000, 10_000];

/** Half the width of the scale in percent: all limits and the error lie on it, unless that is beyond any sense. */
export function rangeFor(errorPercent: number, limits: readonly SpeedLimit[]): number {
  const widest = Math.max(...limits.flatMap(({ lowerPercent, upperPercent }) => [-lowerPercent, upperPercent]));
  const least = Math.max(widest * 1.2, Math.abs(errorPercent) * 1.1);
  return ranges.find((range) => range >= least) ?? 10_000;
}

export const limitsOf = (medium: SpeedLimit["medium"]): readonly SpeedLimit[] =>
  speedLimits.filter((limit) => limit.medium === medium);

const centSteps = [1, 2, 5, 10, 20, 50, 100, 200, 300, 600, 1200];
const percentOfCents = (cents: number) => (2 ** (cents / 1200) - 1) * 100;

/** Marks of the scale of cents, which are not evenly apart in percent; `width` px hold the range on either side of zero. */
export function centMarks(range: number, width: number, room = 44): { cents: number; percent: number }[] {
  const least = (room / (width / 2)) * range;
  const step =
    centSteps.find((cents) => percentOfCents(cents) >= least) ?? 1200 * Math.ceil(Math.log2(1 + least / 100));
  const marks = [{ cents: 0, percent: 0 }];
  for (const sign of [1, -1]) {
    let last = 0;
    for (let cents = sign * step; Math.abs(percentOfCents(cents)) <= range; cents += sign * step) {
      const percent = percentOfCents(cents);
      // An octave down is only half as far as one up, and what follows closes up: those without room are left out.
      if (Math.abs(percent - last) < least) break;
      marks.push({ cents, percent });
      last = percent;
    }
  }
  return marks.sort((one, other) => one.cents - other.cents);
}
