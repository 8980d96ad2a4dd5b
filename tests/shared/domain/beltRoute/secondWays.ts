import type { Pulley } from "#shared/domain/beltRoute";

type Point = { x: number; y: number };
type Circle = Point & { radius: number };

export const circlesOf = (pulleys: readonly Pulley[], thickness = 0): Circle[] =>
  pulleys.map(({ x, y, diameter }) => ({ x, y, radius: (diameter + thickness) / 2 }));

/** Length of a taut loop round all circles: the integral of the support function (Cauchy), by the trapezoidal rule. */
export function supportPerimeter(circles: readonly Circle[], steps = 40_000): number {
  let sum = 0;
  for (let i = 0; i < steps; i++) {
    const angle = (2 * Math.PI * i) / steps;
    const [c, s] = [Math.cos(angle), Math.sin(angle)];
    sum += Math.max(...circles.map(({ x, y, radius }) => x * c + y * s + radius));
  }
  return (sum * 2 * Math.PI) / steps;
}

/** The same by the convex hull of points on the circles (monotone chain). */
export function hullPerimeter(circles: readonly Circle[], steps = 4000): number {
  const points = circles.flatMap(({ x, y, radius }) =>
    Array.from({ length: steps }, (_, i) => {
      const angle = (2 * Math.PI * i) / steps;
      return { x: x + radius * Math.cos(angle), y: y + radius * Math.sin(angle) };
    }),
  );
  points.sort((a, b) => a.x - b.x || a.y - b.y);
  const half = (all: readonly Point[]) => {
    const hull: Point[] = [];
    for (const point of all) {
      for (;;) {
        const [a, b] = [hull.at(-2), hull.at(-1)];
        if (!a || !b || (b.x - a.x) * (point.y - a.y) - (b.y - a.y) * (point.x - a.x) > 0) break;
        hull.pop();
      }
      hull.push(point);
    }
    return hull.slice(0, -1);
  };
  return girth([...half(points), ...half(points.reverse())]);
}

const girth = (loop: readonly Point[]) =>
  loop.reduce((sum, { x, y }, i) => {
    const before = loop.at(i - 1)!;
    return sum + Math.hypot(x - before.x, y - before.y);
  }, 0);

/** A loop of beads that is pulled tight round the circles: each bead goes between its neighbours and out of the circles. */
function tighten(loop: Point[], circles: readonly Circle[], rounds: number, pull: number): void {
  for (let round = 0; round < rounds; round++) {
    for (const [i, bead] of loop.entries()) {
      const [before, after] = [loop.at(i - 1)!, loop[(i + 1) % loop.length]!];
      bead.x += pull * ((before.x + after.x) / 2 - bead.x);
      bead.y += pull * ((before.y + after.y) / 2 - bead.y);
      for (const { x, y, radius } of circles) {
        const square = (bead.x - x) ** 2 + (bead.y - y) ** 2;
        if (square >= radius * radius) continue;
        const apart = Math.sqrt(square);
        bead.x = x + ((bead.x - x) * radius) / apart;
        bead.y = y + ((bead.y - y) * radius) / apart;
      }
    }
  }
}

/** The loop with every part cut into `least` pieces or more, none longer than `longest` where that is not 0. */
const divided = (loop: readonly Point[], longest: number, least = 1): Point[] =>
  loop.flatMap((bead, i) => {
    const next = loop[(i + 1) % loop.length]!;
    const apart = Math.hypot(next.x - bead.x, next.y - bead.y);
    const pieces = Math.max(least, longest > 0 ? Math.ceil(apart / longest) : 1);
    return Array.from({ length: pieces }, (_, k) => ({
      x: bead.x + ((next.x - bead.x) * k) / pieces,
      y: bead.y + ((next.y - bead.y) * k) / pieces,
    }));
  });

/**
 * Length of a belt found without tangents or angles: a string is laid over the pulleys as drawn by hand (`sides`: for each
 * pulley directions from its centre, in degrees, in which the belt lies on it), then pulled tight, with ever more beads.
 * `touched` tells which pulleys it then lies on. The chords cut its arcs short, by the square of the beads' spacing.
 */
export function tightString(pulleys: readonly Pulley[], thickness: number, sides: readonly (readonly number[])[]) {
  const circles = circlesOf(pulleys, thickness);
  const corners = circles.flatMap(({ x, y, radius }, i) =>
    sides[i]!.map((side) => {
      const angle = (side * Math.PI) / 180;
      return { x: x + radius * Math.cos(angle), y: y + radius * Math.sin(angle) };
    }),
  );
  // Beads so close together that none slips past a pulley, pulled gently at first, then over-relaxed.
  let loop = divided(corners, 2);
  tighten(loop, circles, 1500, 1);
  const lengths: number[] = [];
  for (let times = 0; times < 2; times++) {
    tighten(loop, circles, 1500, 1.9);
    lengths.push(girth(loop));
    if (times === 0) loop = divided(loop, 0, 2);
  }
  const [coarse, fine] = [lengths.at(-2)!, lengths.at(-1)!];
  const touched = circles.map(({ x, y, radius }) =>
    loop.some((bead) => Math.hypot(bead.x - x, bead.y - y) < radius * (1 + 1e-6)),
  );
  return { lengthMm: fine + (fine - coarse) / 3, touched };
}
