import type { BeltRoute } from "#shared/domain/beltRoute";
import { type NamedPulley, pulleyName } from "./beltState";
import { type Board, toPx, type View } from "./boardView";

type Point = { x: number; y: number };
type Box = Point & { width: number; height: number };
type Line = { from: Point; to: Point };
type Disc = Point & { r: number };
/** Words with their middle; `way` remembers where they stand, so that they stay there while there is room. */
export type Label = { id: number; x: number; y: number; way: number };
export type BoardLabels = { names: Label[]; spans: Label[] };

const letter = 7.1;
const lineHeight = 17;
export const noLabels: BoardLabels = { names: [], spans: [] };

const meetsDisc = ({ x, y, width, height }: Box, disc: Disc) => {
  const dx = Math.max(Math.abs(disc.x - x) - width / 2, 0);
  const dy = Math.max(Math.abs(disc.y - y) - height / 2, 0);
  return dx * dx + dy * dy < disc.r * disc.r;
};

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
    discs.filter((disc) => meetsDisc(box, disc)).length * 60
  );
}

function best(
  id: number,
  boxes: readonly Box[],
  scene: Scene,
  before: readonly Label[],
  price: (way: number) => number,
) {
  const keptWay = before.find((label) => label.id === id)?.way;
  let found: { box: Box; way: number; cost: number } | undefined;
  for (const [way, box] of boxes.entries()) {
    const whole = cost(box, scene) + price(way) - (way === keptWay ? 12 : 0);
    if (!found || whole < found.cost) found = { box, way, cost: whole };
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

/** Of a pulley that is large enough, the number stands on itself. */
export const hasOwnNumber = (pulley: NamedPulley, { scale }: View): boolean => (pulley.diameter / 2) * scale >= 13;

/** What stands beside pulley i: its number where it has none on itself, its name, and its wrap while there is a route. */
export const nameWords = (pulley: NamedPulley, index: number, wrapDeg: number | undefined, view: View) => ({
  name: `${hasOwnNumber(pulley, view) || !pulley.name.trim() ? "" : `${index + 1} `}${pulleyName(pulley, index)}`,
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
  const scene: Scene = { board, discs, lines, halfBelt, taken: [] };
  // The smallest first: its name must stand near it, that of a large one has room all round.
  const order = pulleys.map((_, i) => i).sort((a, b) => pulleys[a]!.diameter - pulleys[b]!.diameter);
  const names = order.flatMap((i) => {
    const { name, wrap } = nameWords(pulleys[i]!, i, route?.wrapsDeg[i], view);
    const boxes = around(discs[i]!, (name.length + wrap.length + 1) * letter + 6);
    const found = best(pulleys[i]!.id, boxes, scene, before.names, (way) => Math.floor(way / directions) * 14);
    if (!found) return [];
    scene.taken.push(found.box);
    return [{ id: pulleys[i]!.id, x: found.box.x, y: found.box.y, way: found.way }];
  });
  const spans = lines.flatMap((line, i) => {
    const boxes = beside(line, spanWords[i]!.length * letter + 4, halfBelt);
    const id = pulleys[i]!.id;
    const found = best(id, boxes, scene, before.spans, (way) => Math.floor(way / 2) * 3);
    if (!found || found.cost >= 50) return [];
    scene.taken.push(found.box);
    return [{ id, x: found.box.x, y: found.box.y, way: found.way }];
  });
  return { names, spans };
}
