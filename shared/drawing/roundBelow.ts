/** The largest 1, 2 or 5 times a power of ten that is not above `limit`. */
export function roundBelow(limit: number): number {
  const power = 10 ** Math.floor(Math.log10(limit));
  const lead = limit / power;
  const digit = lead >= 5 ? 5 : lead >= 2 ? 2 : 1;
  return Number((digit * power).toPrecision(1));
}
