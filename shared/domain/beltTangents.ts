/** One pulley as the belt's middle line sees it, in mm. */
export type Circle = {
  x: number;
  y: number;
  radius: number;
  /** 1 where the belt runs round it from x towards y (counter-clockwise with y up), -1 the other way. */
  turn: 1 | -1;
};
type Point = { x: number; y: number };

/** Where the belt lies on one pulley, and its straight part to the next. */
export type Contact = Circle & {
  arrive: Point;
  leave: Point;
  /** Radians, in [0, 2 pi). */
  wrap: number;
  /** Length of the straight part from `leave` to the next pulley's `arrive`. */
  spanMm: number;
};

const fullTurn = 2 * Math.PI;
/** Rounding moves a belt that just touches by far less than this (radians), and nothing that was measured by as little. */
const noise = 1e-9;
/** Less than this, mm, is rounding and no gap. */
export const noGapMm = 1e-9;

function wrapOf(radians: number): number {
  const wrap = ((radians % fullTurn) + fullTurn) % fullTurn;
  return wrap < noise || wrap > fullTurn - noise ? 0 : wrap;
}

const pointOn = ({ x, y, radius, turn }: Circle, heading: number): Point => ({
  x: x + turn * radius * Math.sin(heading),
  y: y - turn * radius * Math.cos(heading),
});

/**
 * The closed line that runs round circles in the order given, each in its own sense: exact common tangents and arcs.
 *
 * Shape:  one contact for each circle; null where two that follow each other have no such tangent (one lies within the
 *         other, or they overlap and turn opposite ways).
 * Units:  mm, radians. An arc is taken the way that its circle turns, whatever that adds up to: see `closeBelt`.
 * Source: with left normal n, centre = point + turn x radius x n, so the heading of a span is that of the centres plus
 *         asin((turn1 radius1 - turn2 radius2) / distance); derived here, held against second ways in the tests.
 */
export function beltTangents(circles: readonly Circle[]): Contact[] | null {
  const spans = circles.map((one, i) => {
    const next = circles[(i + 1) % circles.length]!;
    const [dx, dy] = [next.x - one.x, next.y - one.y];
    const apart = Math.hypot(dx, dy);
    const offset = one.turn * one.radius - next.turn * next.radius;
    const spanMm = Math.sqrt(Math.max(0, (apart - offset) * (apart + offset)));
    const exists = apart > 0 && apart >= Math.abs(offset) - noGapMm;
    return { exists, spanMm, heading: Math.atan2(dy, dx) + Math.atan2(offset, spanMm) };
  });
  if (!spans.every(({ exists }) => exists)) return null;
  return circles.map((circle, i) => {
    const { heading, spanMm } = spans[i]!;
    const before = spans.at(i - 1)!.heading;
    return {
      ...circle,
      spanMm,
      arrive: pointOn(circle, before),
      leave: pointOn(circle, heading),
      wrap: wrapOf(circle.turn * (heading - before)),
    };
  });
}
