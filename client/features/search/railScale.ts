import type { Range } from "../../lib/axisMarks";

export type Lying = { fromPx: number; toPx: number };

/**
 * The lane of each thing that lies along the rail, so that none overlaps another in its lane; null where every lane is
 * taken. Earlier things choose first, and take the lowest lane that is free for `gap` px around.
 */
export function intoLanes(things: readonly Lying[], lanes: number, gap = 4): (number | null)[] {
  const taken: Lying[][] = Array.from({ length: lanes }, () => []);
  return things.map((thing) => {
    const lane = taken.findIndex((others) =>
      others.every((other) => other.toPx + gap <= thing.fromPx || thing.toPx + gap <= other.fromPx),
    );
    taken[lane]?.push(thing);
    return lane < 0 ? null : lane;
  });
}

/** The part of `within` around a size that is `share` as wide; slid inwards at the ends, never wider than `within`. */
export function zoomed(within: Range, around: number, width: number): Range {
  const span = Math.min(width, within.toMm - within.fromMm);
  const fromMm = Math.min(Math.max(around - span / 2, within.fromMm), within.toMm - span);
  return { fromMm, toMm: fromMm + span };
}
