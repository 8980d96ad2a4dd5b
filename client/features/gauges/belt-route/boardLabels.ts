import type { BeltRoute } from "#shared/domain/beltRoute";
import { type NamedPulley, pulleyName } from "./beltState";
import { type Board, toPx, type View } from "./boardView";

type Point = { x: number; y: number };
export type Box = Point & { width: number; height: number };
type Line = { from: Point; to: Point };
type Disc = Point & { r: number };
/** Words with their middle; `way` remembers where they stand, so that they stay there while there is room. */
export type Label = { id: number; x: number; y: number; way: number };
export type BoardLabels = { names: Label[]; spans: Label[] };

const letter = 7.1;
const lineHeight = 17;
export const noLabels: BoardLabels = { names: [], spans: [] };

/** Room between a box and a disc; less than 0 where they meet. */
const between = ({ x, y, width, height }: Box, disc: Disc) =>
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

type Scene = { board: Board; discs: readonly Disc[]; lines: readonly Line[]; halfBelt: number; taken: Box[] };

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
    taken.filter((other) => meetsBox(box, other)).length * 100 +
    lines.filter((line) => meetsLine(grown, line)).length * 60 +
    discs.filter((disc) => between(box, disc) < 0).length * 60
  );
}

type Found = { box: Box; way: number; cost: number };

/** The cheapest of the boxes. Words that stand well stay there, which also spares looking at the others in each frame. */
function best(boxes: readonly Box[], scene: Scene, keptWay: number | undefined, price: (way: number) => number): Found {
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

const directions = 16;
const distances = [7, 24, 46];

/** Boxes around a disc, turning from the right upwards, nearer ones first. */
const around = ({ x, y, r }: Disc, width: number): Box[] =>
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
const beside = ({ from, to }: Line, width: number, halfBelt: number): Box[] => {
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

/** In a pulley of this radius, px, the arrow that shows how it turns has room; else it stands outside. */
export const hasInnerArrow = (radius: number): boolean => radius >= 26;

/** Of a pulley that is large enough, the number stands on itself. */
export const hasOwnNumber = (pulley: NamedPulley, { scale }: View): boolean => (pulley.diameter / 2) * scale >= 13;

/**
 * What stands beside pulley i: its number where it has none on itself, or where names come to stand closely; its name; and
 * its wrap while there is a route.
 */
export const nameWords = (
  pulley: NamedPulley,
  index: number,
  wrapDeg: number | undefined,
  view: View,
  { width }: Board,
) => ({
  name: `${pulley.name.trim() && (width < 560 || !hasOwnNumber(pulley, view)) ? `${index + 1} ` : ""}${pulleyName(pulley, index)}`,
  wrap: wrapDeg === undefined ? "" : `${wrapDeg.toFixed(wrapDeg < 10 ? 1 : 0)}°`,
});

/**
 * Where names and lengths stand, px: clear of pulleys, belt, each other and the edges as far as there is room. A length
 * that would lie upon something is left out; the table has it.
 */
export function boardLabels(
  pulleys: readonly NamedPulley[],
  route: BeltRoute | null,
  thickness: number,
  spanWords: readonly string[],
  view: View,
  board: Board,
  before: BoardLabels,
  taken: readonly Box[],
): BoardLabels {
  const halfBelt = Math.max((thickness * view.scale) / 2, 1.2);
  const discs = pulleys.map((pulley) => ({
    ...toPx(view, pulley),
    r: (pulley.diameter / 2) * view.scale + 2 * halfBelt,
  }));
  const contacts = route?.contacts ?? [];
  const lines = contacts.map(({ leave }, i) => ({
    from: toPx(view, leave),
    to: toPx(view, contacts[(i + 1) % contacts.length]!.arrive),
  }));
  // The upper right corner has the length of the belt.
  const corner = { x: board.width - 80, y: 14, width: 160, height: 28 };
  const scene: Scene = { board, discs, lines, halfBelt, taken: [corner, ...taken] };
  // The smallest first: its name must stand near it, that of a large one has room all round.
  const order = pulleys.map((_, i) => i).sort((a, b) => pulleys[a]!.diameter - pulleys[b]!.diameter);
  const wayOf = (labels: readonly Label[], id: number) => labels.find((label) => label.id === id)?.way;
  const names = order.map((i) => {
    const { id } = pulleys[i]!;
    const { name, wrap } = nameWords(pulleys[i]!, i, route?.wrapsDeg[i], view, board);
    const boxes = around(discs[i]!, (name.length + wrap.length + 1) * letter + 6);
    // Beside another pulley a name would be taken for that one's.
    const price = (one: number) => {
      const own = between(boxes[one]!, discs[i]!);
      const isAstray = discs.some((disc, other) => other !== i && between(boxes[one]!, disc) < own + 3);
      return Math.floor(one / directions) * 14 + (isAstray ? 45 : 0);
    };
    const { box, way } = best(boxes, scene, wayOf(before.names, id), price);
    scene.taken.push(box);
    return { id, x: box.x, y: box.y, way };
  });
  const spans = lines.flatMap((line, i) => {
    const { id } = pulleys[i]!;
    const boxes = beside(line, spanWords[i]!.length * letter + 4, halfBelt);
    const { box, way, cost: whole } = best(boxes, scene, wayOf(before.spans, id), (one) => Math.floor(one / 2) * 3);
    if (whole >= 50) return [];
    scene.taken.push(box);
    return [{ id, x: box.x, y: box.y, way }];
  });
  return { names, spans };
}
