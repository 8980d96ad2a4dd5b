import { type Contact, noGapMm } from "./beltTangents";

type Point = { x: number; y: number };
type Line = { from: Point; to: Point };

/** The straight part from contact i to the next. */
export const spanOf = (contacts: readonly Contact[], i: number): Line => ({
  from: contacts[i]!.leave,
  to: contacts[(i + 1) % contacts.length]!.arrive,
});

/** How far left of a line a point lies, mm; not a number for a line without length, which crosses nothing. */
export const leftOf = ({ from, to }: Line, { x, y }: Point) =>
  ((to.x - from.x) * (y - from.y) - (to.y - from.y) * (x - from.x)) / Math.hypot(to.x - from.x, to.y - from.y);

/** Whether the ends of one lie on different sides of the other, by more than rounding. */
const parts = (line: Line, { from, to }: Line) => {
  const [a, b] = [leftOf(line, from), leftOf(line, to)];
  return Math.min(a, b) < -noGapMm && Math.max(a, b) > noGapMm;
};

/** Pairs of straight parts (numbered by the contact that they leave) that cross each other. */
export function beltCrossings(contacts: readonly Contact[]): [number, number][] {
  const lines = contacts.map((_, i) => spanOf(contacts, i));
  return lines.flatMap((one, i) =>
    lines.flatMap((other, j): [number, number][] => (j > i && parts(one, other) && parts(other, one) ? [[i, j]] : [])),
  );
}
