import type { Board } from "./boardView";

type Point = { x: number; y: number };
export type Box = Point & { width: number; height: number };
export type Line = { from: Point; to: Point };
export type Disc = Point & { r: number };
export const letter = 7.1;
const lineHeight = 17;

/** Room between a box and a disc; less than 0 where they meet. */
export const between = ({ x, y, width, height }: Box, disc: Disc) =>
  Math.hypot(Math.max(Math.abs(disc.x - x) - width / 2, 0), Math.max(Math.abs(disc.y - y) - height / 2, 0)) - disc.r;

const meetsBox = (a: Box, b: Box) =>
  Math.abs(a.x - b.x) < (a.width + b.width) / 2 + 3 && Math.abs(a.y - b.y) < (a.height + b.height) / 2 + 1;

/** Whether a line comes into the box (Liang and Barsky's clipping). */
function meetsLine({ x, y, width, height }: Box, { from, to }: Line): boolean {
  const [dx, dy] = [to.x - from.x, to.y - from.y];
  let [least, most] = [0, 1];
  for (const [step, room] of [
    [-dx, from.x - (x - width / 2)],
    [dx, x + width / 2 - from.x],
    [-dy, from.y - (y - height / 2)],
    [dy, y + height / 2 - from.y],
  ] as const) {
    if (step === 0) {
      if (room < 0) return false;
    } else if (step < 0) least = Math.max(least, room / step);
    else most = Math.min(most, room / step);
  }
  return least <= most;
}

export type Scene = { board: Board; discs: readonly Disc[]; lines: readonly Line[]; halfBelt: number; taken: Box[] };

/** How much a box covers of what is drawn already; 0 is free. */
function cost(box: Box, { board, discs, lines, halfBelt, taken }: Scene): number {
  const grown = { ...box, width: box.width + 2 * halfBelt, height: box.height + 2 * halfBelt };
  const isOut =
    box.x - box.width / 2 < 2 ||
    box.x + box.width / 2 > board.width - 2 ||
    box.y - box.height / 2 < 2 ||
    box.y + box.height / 2 > board.height - 2;
  return (
    (isOut ? 400 : 0) +
    taken.filter((other) => meetsBox(box, other)).length * 400 +
    lines.filter((line) => meetsLine(grown, line)).length * 60 +
    discs.filter((disc) => between(box, disc) < 0).length * 60
  );
}

type Found = { box: Box; way: number; cost: number };

/** The cheapest of the boxes. Words that stand well stay there, which also spares looking at the others in each frame. */
export function best(
  boxes: readonly Box[],
  scene: Scene,
  keptWay: number | undefined,
  price: (way: number) => number,
): Found {
  const costOf = (way: number) => cost(boxes[way]!, scene) + price(way);
  const kept = keptWay === undefined || !boxes[keptWay] ? undefined : costOf(keptWay);
  let found: Found = { box: boxes[0]!, way: 0, cost: Number.POSITIVE_INFINITY };
  if (keptWay !== undefined && kept !== undefined) {
    found = { box: boxes[keptWay]!, way: keptWay, cost: kept - 12 };
    if (kept <= 6) return found;
  }
  for (const [way, box] of boxes.entries()) {
    const whole = way === keptWay ? found.cost : costOf(way);
    if (whole < found.cost) found = { box, way, cost: whole };
  }
  return found;
}

export const directions = 16;
const distances = [7, 24, 46];

/** Boxes around a disc, turning from the right upwards, nearer ones first. */
export const around = ({ x, y, r }: Disc, width: number): Box[] =>
  distances.flatMap((distance) =>
    Array.from({ length: directions }, (_, i) => {
      const angle = (2 * Math.PI * i) / directions;
      const [c, s] = [Math.cos(angle), -Math.sin(angle)];
      return {
        x: x + c * (r + distance) + (c * width) / 2,
        y: y + s * (r + distance) + (s * lineHeight) / 2,
        width,
        height: lineHeight,
      };
    }),
  );

const shares = [0.5, 0.4, 0.6, 0.3, 0.7, 0.2, 0.8];

/** Boxes beside a straight part, on either side of it. */
export const beside = ({ from, to }: Line, width: number, halfBelt: number): Box[] => {
  const length = Math.hypot(to.x - from.x, to.y - from.y) || 1;
  const [nx, ny] = [(to.y - from.y) / length, (from.x - to.x) / length];
  const off = halfBelt + 4 + (Math.abs(nx) * width + Math.abs(ny) * lineHeight) / 2;
  return shares.flatMap((share) =>
    [1, -1].map((side) => ({
      x: from.x + share * (to.x - from.x) + side * nx * off,
      y: from.y + share * (to.y - from.y) + side * ny * off,
      width,
      height: lineHeight,
    })),
  );
};
