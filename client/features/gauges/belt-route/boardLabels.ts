import type { BeltRoute } from "#shared/domain/beltRoute";
import type { Contact } from "#shared/domain/beltTangents";
import { type NamedPulley, pulleyName } from "./beltState";
import { type Board, toPx, type View } from "./boardView";
import { around, type Box, beside, best, between, directions, letter, type Scene } from "./labelBoxes";

/** Words with their middle; `way` remembers where they stand, so that they stay there while there is room. */
export type Label = { id: number; x: number; y: number; way: number };
export type BoardLabels = { names: (Label & { isShort: boolean })[]; spans: Label[] };

export const noLabels: BoardLabels = { names: [], spans: [] };

/** Direction of a pulley's free side, opposite the middle of its wrap, in whole degrees (y up). */
export const freeSideOf = ({ x, y, arrive, wrap, turn }: Contact): number =>
  Math.round(((Math.atan2(arrive.y - y, arrive.x - x) + (turn * wrap) / 2 + Math.PI) * 180) / Math.PI);

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
 * Where names and lengths stand, px: clear of pulleys, belt, each other and the edges as far as there is room. Where there
 * is none, a name is cut down to its number (`isShort`), and a length is left out; the table has it all.
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
  const contacts = route?.contacts ?? [];
  const discs = pulleys.map((pulley) => ({
    ...toPx(view, pulley),
    r: (pulley.diameter / 2) * view.scale + 2 * halfBelt,
  }));
  // Arrows of small pulleys stand outside, on their free sides.
  const arrows = contacts.flatMap((contact, i) => {
    const { x, y, r } = discs[i]!;
    if (hasInnerArrow(r - 2 * halfBelt)) return [];
    const angle = (freeSideOf(contact) * Math.PI) / 180;
    return [{ x: x + (r + 6) * Math.cos(angle), y: y - (r + 6) * Math.sin(angle), width: 18, height: 18 }];
  });
  const lines = contacts.map(({ leave }, i) => ({
    from: toPx(view, leave),
    to: toPx(view, contacts[(i + 1) % contacts.length]!.arrive),
  }));
  // The upper right corner has the length of the belt.
  const corner = { x: board.width - 80, y: 14, width: 160, height: 28 };
  const scene: Scene = { board, discs, lines, halfBelt, taken: [corner, ...arrows, ...taken] };
  // The smallest first: its name must stand near it, that of a large one has room all round.
  const order = pulleys.map((_, i) => i).sort((a, b) => pulleys[a]!.diameter - pulleys[b]!.diameter);
  const wayOf = (labels: readonly Label[], id: number) => labels.find((label) => label.id === id)?.way;
  const names = order.flatMap((i) => {
    const pulley = pulleys[i]!;
    const { name, wrap } = nameWords(pulley, i, route?.wrapsDeg[i], view, board);
    const place = (width: number) => {
      const boxes = around(discs[i]!, width);
      // Beside another pulley a name would be taken for that one's.
      const price = (one: number) => {
        const own = between(boxes[one]!, discs[i]!);
        const isAstray = discs.some((disc, other) => other !== i && between(boxes[one]!, disc) < own + 3);
        return Math.floor(one / directions) * 14 + (isAstray ? 45 : 0);
      };
      return best(boxes, scene, wayOf(before.names, pulley.id), price);
    };
    const whole = place((name.length + wrap.length + 1) * letter + 6);
    const isShort = whole.cost >= 100;
    if (isShort && hasOwnNumber(pulley, view)) return [];
    const { box, way } = isShort ? place(2 * letter + 4) : whole;
    scene.taken.push(box);
    return [{ id: pulley.id, x: box.x, y: box.y, way, isShort }];
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
