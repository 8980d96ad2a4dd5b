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

/** Marks of the scale of cents, which are not evenly apart in percent: about as many as there is room for. */
export function centMarks(range: number, most = 8): { cents: number; percent: number }[] {
  const top = 1200 * Math.log2(1 + range / 100);
  const step = centSteps.find((one) => top / one <= most / 2) ?? 1200 * Math.ceil(top / (most / 2) / 1200);
  const count = Math.floor(top / step);
  return Array.from({ length: 2 * count + 1 }, (_, i) => (i - count) * step)
    .map((cents) => ({ cents, percent: percentOfCents(cents) }))
    .filter(({ percent }) => percent >= -range);
}
