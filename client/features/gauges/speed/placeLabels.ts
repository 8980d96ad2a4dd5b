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
const directions = Array.from({ length: 24 }, (_, i) => (i / 24) * 2 * Math.PI);
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

/** On which side of the line from p to q a point lies. */
const side = (p: Point, q: Point, r: Point) => Math.sign((q.x - p.x) * (r.y - p.y) - (q.y - p.y) * (r.x - p.x));

function cross([a, b]: readonly [Point, Point], [c, d]: readonly [Point, Point]): boolean {
  return side(a, b, c) !== side(a, b, d) && side(c, d, a) !== side(c, d, b);
}

function crossesBox(line: readonly [Point, Point], { left, top, width, height }: Box): boolean {
  const [right, bottom] = [left + width, top + height];
  // Most lines are nowhere near, and this is asked a hundred thousand times.
  const [from, to] = line;
  if (Math.max(from.x, to.x) < left || Math.min(from.x, to.x) > right) return false;
  if (Math.max(from.y, to.y) < top || Math.min(from.y, to.y) > bottom) return false;
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

const pointBox = ({ x, y }: Point): Box => ({ left: x, top: y, width: 0, height: 0 });

type Candidate = { placed: PlacedLabel; cost: number };

/** A label at the end of a leader that leaves its circle at an angle; inwards where `sense` is -1. */
function candidate(
  { key, at, width, height }: LabelRequest,
  angle: number,
  length: number,
  sense: number,
  side: number,
): Candidate {
  const [ux, uy] = [Math.cos(angle), Math.sin(angle)];
  const tip = { x: at.x + ux * at.r, y: at.y + uy * at.r };
  const knee = { x: tip.x + sense * ux * length, y: tip.y + sense * uy * length };
  const end = { x: knee.x + side * shoulder, y: knee.y };
  const left = side > 0 ? end.x + gap : end.x - gap - width;
  const box = { left, top: knee.y - 9, width, height };
  // Leaders that run nearly level or upright read as edges of the drawing; one that turns back at its knee is no beauty.
  const isOblique = Math.abs(ux) > 0.2 && Math.abs(uy) > 0.2;
  const turnsBack = side * sense * ux < -0.01;
  const cost = length * 0.3 + (isOblique ? 0 : 6) + (turnsBack ? 15 : 0);
  return { placed: { key, box, leader: [tip, knee, end] }, cost };
}

function candidates(request: LabelRequest): Candidate[] {
  // Inwards only where there is room for words inside.
  const senses = request.at.r > request.width * 0.7 ? [1, -1] : [1];
  return senses.flatMap((sense) =>
    directions.flatMap((angle) => {
      const lean = sense * Math.cos(angle);
      const sides = Math.abs(lean) < 0.75 ? [1, -1] : [Math.sign(lean)];
      return lengths.flatMap((length) => sides.map((side) => candidate(request, angle, length, sense, side)));
    }),
  );
}

/** Orders in which few labels are tried, since the first ones take the best places; for many, one must do. */
function ordersOf(count: number): number[][] {
  const order = Array.from({ length: count }, (_, i) => i);
  if (count > 6) return [order];
  const turned = order.map((by) => order.map((i) => (i + by) % count));
  return [...turned, ...turned.map((one) => [...one].reverse())];
}

/**
 * Words beside what they name, each at the end of a leader, where they cover least: neither each other nor edges.
 * Each takes its best place in turn, and is then looked at again with the others in place; of several turns the one that
 * costs least as a whole is taken.
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

  const covers = (box: Box) => {
    const room = inflated(box);
    const edges = obstacles.reduce((sum, circle) => {
      const [nearest, farthest] = reachOf(box, circle);
      if (nearest - 3 >= circle.r) return sum;
      return sum + (farthest + 3 > circle.r ? 220 : 0) + circle.cost;
    }, 0);
    return lines.reduce((sum, { line, cost }) => sum + (crossesBox(line, room) ? cost : 0), edges);
  };

  const clashes = ({ box, leader }: PlacedLabel, others: readonly PlacedLabel[]) => {
    const line = [leader[0], leader[1]] as const;
    return others.reduce((sum, other) => {
      const otherLine = [other.leader[0], other.leader[1]] as const;
      const words = overlap(box, other.box, 6) ? 3000 : 0;
      const through = (crossesBox(line, other.box) ? 200 : 0) + (crossesBox(otherLine, box) ? 200 : 0);
      return sum + words + through + (cross(line, otherLine) ? 120 : 0);
    }, 0);
  };

  const ways = requests.map((request) =>
    candidates(request).map(({ placed, cost }) => {
      const [, knee, end] = placed.leader;
      const out = [placed.box, pointBox(knee), pointBox(end)].reduce((sum, part) => sum + outside(part), 0);
      return { placed, cost: cost + covers(placed.box) + (out > 0 ? 2000 + out * 10 : 0) };
    }),
  );
  const best = (index: number, others: readonly PlacedLabel[]) => {
    let least: Candidate = { placed: ways[index]![0]!.placed, cost: Infinity };
    for (const { placed, cost } of ways[index]!) {
      if (cost >= least.cost) continue;
      const whole = cost + clashes(placed, others);
      if (whole < least.cost) least = { placed, cost: whole };
    }
    return least;
  };
  const inTurn = (order: readonly number[]) => {
    const places = new Map<number, Candidate>();
    const othersOf = (index: number) => [...places].flatMap(([other, { placed }]) => (other === index ? [] : [placed]));
    for (const index of order) places.set(index, best(index, othersOf(index)));
    for (let round = 0; round < 2; round++) {
      for (const index of order) places.set(index, best(index, othersOf(index)));
    }
    const cost = [...places.values()].reduce((sum, place) => sum + place.cost, 0);
    return { placed: requests.map((_, index) => places.get(index)!.placed), cost };
  };
  const tries = ordersOf(requests.length).map(inTurn);
  return tries.reduce((least, one) => (one.cost < least.cost ? one : least)).placed;
}
