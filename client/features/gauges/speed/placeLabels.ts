export type Point = { x: number; y: number };
export type Box = { left: number; top: number; width: number; height: number };
/** A circle that words should not lie across, and how bad it is if they lie upon it. */
export type Obstacle = Point & { r: number; cost: number };
/** A straight that words should not lie across, and how bad it is if they do: 200 for a belt. */
export type LineObstacle = { line: readonly [Point, Point]; cost: number };
export type LabelRequest = {
  key: string;
  /** The circle that the leader points at. */
  at: Point & { r: number };
  width: number;
  height: number;
};
export type PlacedLabel = { key: string; box: Box; leader: readonly [tip: Point, knee: Point, end: Point] };

const lengths = [14, 24, 38, 56, 80, 110, 150];
const directions = Array.from({ length: 32 }, (_, i) => (i / 32) * 2 * Math.PI);
const shoulder = 8;
const gap = 4;

function overlap(one: Box, other: Box, clear: number): boolean {
  return (
    one.left < other.left + other.width + clear &&
    other.left < one.left + one.width + clear &&
    one.top < other.top + other.height + clear &&
    other.top < one.top + one.height + clear
  );
}

/** How near the box comes to a point, and how far it reaches from it. */
function reachOf({ left, top, width, height }: Box, { x, y }: Point): [nearest: number, farthest: number] {
  const [dx, dy] = [Math.max(left - x, 0, x - left - width), Math.max(top - y, 0, y - top - height)];
  const [fx, fy] = [Math.max(x - left, left + width - x), Math.max(y - top, top + height - y)];
  return [Math.hypot(dx, dy), Math.hypot(fx, fy)];
}

function cross([a, b]: readonly [Point, Point], [c, d]: readonly [Point, Point]): boolean {
  const side = (p: Point, q: Point, r: Point) => Math.sign((q.x - p.x) * (r.y - p.y) - (q.y - p.y) * (r.x - p.x));
  return side(a, b, c) !== side(a, b, d) && side(c, d, a) !== side(c, d, b);
}

function crossesBox(line: readonly [Point, Point], { left, top, width, height }: Box): boolean {
  const [right, bottom] = [left + width, top + height];
  const isInside = (p: Point) => p.x > left && p.x < right && p.y > top && p.y < bottom;
  const falling = [
    { x: left, y: top },
    { x: right, y: bottom },
  ] as const;
  const rising = [
    { x: left, y: bottom },
    { x: right, y: top },
  ] as const;
  return line.some(isInside) || cross(line, falling) || cross(line, rising);
}

const inflated = ({ left, top, width, height }: Box): Box => ({
  left: left - 4,
  top: top - 4,
  width: width + 8,
  height: height + 8,
});

function candidates({ key, at, width, height }: LabelRequest): { placed: PlacedLabel; cost: number }[] {
  return directions.flatMap((angle) =>
    lengths.flatMap((length) =>
      // Inwards only where there is room for words inside.
      (at.r > width * 0.7 ? [1, -1] : [1]).map((sense) => {
        const [ux, uy] = [Math.cos(angle), Math.sin(angle)];
        const tip = { x: at.x + ux * at.r, y: at.y + uy * at.r };
        const knee = { x: tip.x + sense * ux * length, y: tip.y + sense * uy * length };
        const toRight = sense * ux >= 0;
        const end = { x: knee.x + (toRight ? shoulder : -shoulder), y: knee.y };
        const left = toRight ? end.x + gap : end.x - gap - width;
        const box = { left, top: knee.y - 9, width, height };
        // Leaders that run nearly level or upright read as edges of the drawing.
        const isOblique = Math.abs(ux) > 0.2 && Math.abs(uy) > 0.2;
        return { placed: { key, box, leader: [tip, knee, end] as const }, cost: length * 0.3 + (isOblique ? 0 : 6) };
      }),
    ),
  );
}

/**
 * Words beside what they name, each at the end of a leader, where they cover least: neither each other nor edges.
 * The first placed have the best places, then each is looked at again with the others in place.
 */
export function placeLabels(
  requests: readonly LabelRequest[],
  obstacles: readonly Obstacle[],
  lines: readonly LineObstacle[],
  region: Box,
): PlacedLabel[] {
  const outside = ({ left, top, width, height }: Box) =>
    Math.max(0, region.left - left) +
    Math.max(0, region.top - top) +
    Math.max(0, left + width - region.left - region.width) +
    Math.max(0, top + height - region.top - region.height);

  const covers = (box: Box) =>
    obstacles.reduce(
      (cost, circle) => {
        const [nearest, farthest] = reachOf(box, circle);
        if (nearest - 3 >= circle.r) return cost;
        return cost + (farthest + 3 > circle.r ? 80 : 0) + circle.cost;
      },
      lines.reduce((sum, { line, cost }) => sum + (crossesBox(line, inflated(box)) ? cost : 0), 0),
    );

  const clashes = ({ box, leader }: PlacedLabel, others: readonly PlacedLabel[]) =>
    others.reduce((cost, other) => {
      const [line, otherLine] = [leader, other.leader].map(([tip, knee]) => [tip, knee] as const);
      return (
        cost +
        (overlap(box, other.box, 6) ? 600 : 0) +
        (crossesBox(line!, other.box) ? 200 : 0) +
        (crossesBox(otherLine!, box) ? 200 : 0) +
        (cross(line!, otherLine!) ? 120 : 0)
      );
    }, 0);

  const ways = requests.map((request) =>
    candidates(request).map(({ placed, cost }) => {
      const out = outside(placed.box);
      return { placed, cost: cost + covers(placed.box) + (out > 0 ? 800 + out * 10 : 0) };
    }),
  );
  const best = (index: number, others: readonly PlacedLabel[]) =>
    ways[index]!.reduce(
      (least, { placed, cost }) => {
        if (cost >= least.cost) return least;
        const whole = cost + clashes(placed, others);
        return whole < least.cost ? { placed, cost: whole } : least;
      },
      { placed: ways[index]![0]!.placed, cost: Infinity },
    ).placed;

  const placed: PlacedLabel[] = [];
  for (const index of requests.keys()) placed.push(best(index, placed));
  for (let round = 0; round < 2; round++) {
    for (const index of requests.keys()) {
      placed[index] = best(
        index,
        placed.filter((_, other) => other !== index),
      );
    }
  }
  return placed;
}
