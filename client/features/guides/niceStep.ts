/** The largest of 1, 2, 5 times a power of ten that is not above `most`, which is more than 0. */
export function niceStep(most: number): number {
  const power = 10 ** Math.floor(Math.log10(most));
  return ([5, 2].find((times) => times * power <= most) ?? 1) * power;
}
