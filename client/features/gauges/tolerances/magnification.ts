/** CSS pixels to the millimetre at life size: 96 to the inch. */
const lifeSize = 96 / 25.4;
const steps = [1, 2, 5] as const;

/** The largest round magnification (1, 2, 5, 10, .. or a fraction of those) at which so many mm find room. */
export function magnificationFor(mm: number, px: number): { times: number; pxPerMm: number } {
  const most = px / (mm * lifeSize);
  const power = 10 ** Math.floor(Math.log10(most));
  const times = power * (steps.findLast((step) => step * power <= most) ?? 1);
  return { times, pxPerMm: times * lifeSize };
}

/** "20 times life size", "1/5 of life size". */
export const magnificationWords = (times: number): string =>
  times === 1 ? "life size" : times > 1 ? `${times} times life size` : `1/${Math.round(1 / times)} of life size`;
