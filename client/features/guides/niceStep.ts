/** The smallest of 1, 2, 5 times a power of ten that is not below `least`, which is more than 0. */
export function niceStep(least: number): number {
  const power = 10 ** Math.floor(Math.log10(least));
  return ([1, 2, 5].find((times) => times * power >= least) ?? 10) * power;
}
