/** Numbers from 0 to 1 that are the same in every run. Source: mulberry32, a 32-bit mixing generator (public domain). */
export function dice(seed: number) {
  let state = seed;
  const next = () => {
    state = (state + 0x6d2b79f5) | 0;
    let mixed = Math.imul(state ^ (state >>> 15), 1 | state);
    mixed = (mixed + Math.imul(mixed ^ (mixed >>> 7), 61 | mixed)) ^ mixed;
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 2 ** 32;
  };
  return {
    next,
    between: (from: number, to: number) => from + next() * (to - from),
    whole: (from: number, to: number) => from + Math.floor(next() * (to - from + 1)),
    pick: <T>(from: readonly T[]): T => from[Math.floor(next() * from.length)]!,
    uuid: () =>
      `${hex(next)}-${hex(next).slice(4)}-4${hex(next).slice(5)}-8${hex(next).slice(5)}-${hex(next)}${hex(next).slice(4)}`,
  };
}
export type Dice = ReturnType<typeof dice>;

const hex = (next: () => number) =>
  Math.floor(next() * 2 ** 32)
    .toString(16)
    .padStart(8, "0");
