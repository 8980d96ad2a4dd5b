import { type BeltRoute, beltRouteLimits } from "#shared/domain/beltRoute";
import type { NamedPulley } from "./beltState";

type Pulleys = readonly NamedPulley[];
const clamp = (value: number, [least, most]: readonly [number, number]) => Math.min(Math.max(value, least), most);
/** A thousandth of a millimetre is the last digit that is kept: what a drag adds must not grow tails. */
const tidy = (mm: number) => Math.round(mm * 1000) / 1000 + 0;

/** One pulley with other numbers, kept within the limits of a route; the others stay the same objects. */
export const withPulley = (pulleys: Pulleys, id: number, change: Partial<NamedPulley>): Pulleys =>
  pulleys.map((pulley) => {
    if (pulley.id !== id) return pulley;
    const { place, diameter } = beltRouteLimits;
    const next = { ...pulley, ...change };
    return {
      ...next,
      x: tidy(clamp(next.x, place)),
      y: tidy(clamp(next.y, place)),
      diameter: tidy(clamp(next.diameter, diameter)),
    };
  });

/** One place earlier (-1) or later (1) in the order in which the belt comes by. */
export function withMoved(pulleys: Pulleys, id: number, by: 1 | -1): Pulleys {
  const from = pulleys.findIndex((pulley) => pulley.id === id);
  const to = from + by;
  const [one, other] = [pulleys[from], pulleys[to]];
  if (!one || !other) return pulleys;
  return pulleys.map((pulley, i) => (i === from ? other : i === to ? one : pulley));
}

export const withInserted = (pulleys: Pulleys, pulley: NamedPulley, index: number): Pulleys => [
  ...pulleys.slice(0, index),
  pulley,
  ...pulleys.slice(index),
];

/**
 * A new inside pulley that the belt touches at once: in the middle of the longest straight part, its centre on the belt.
 * Without a route it stands beside the last pulley.
 */
export function newPulley(pulleys: Pulleys, route: BeltRoute | null): { pulley: NamedPulley; index: number } {
  const made = { id: Math.max(-1, ...pulleys.map(({ id }) => id)) + 1, name: "", wrap: "inside" as const };
  if (!route) {
    const last = pulleys.at(-1);
    const [x, y] = last ? [last.x + last.diameter / 2 + 30, last.y] : [0, 0];
    return { pulley: { ...made, x, y, diameter: 20 }, index: pulleys.length };
  }
  const { contacts, spansMm } = route;
  const longest = spansMm.indexOf(Math.max(...spansMm));
  const [from, to] = [contacts[longest]!.leave, contacts[(longest + 1) % contacts.length]!.arrive];
  const diameter = tidy(clamp(Math.round(spansMm[longest]! / 6), [2, 20]));
  return {
    pulley: { ...made, x: tidy((from.x + to.x) / 2), y: tidy((from.y + to.y) / 2), diameter },
    index: longest + 1,
  };
}
