import type { Pulley } from "#shared/domain/beltRoute";
import { roundStep } from "../../../lib/axisMarks";

type Point = { x: number; y: number };
/** The window on the machine: mm at the left and at the top edge (y points up), and px for each mm. */
export type View = { left: number; top: number; scale: number };
export type Board = { width: number; height: number };

export const toPx = ({ left, top, scale }: View, { x, y }: Point): Point => ({
  x: (x - left) * scale,
  y: (top - y) * scale,
});

/** Corners of the box that holds every pulley with the belt around it, mm. */
function extent(pulleys: readonly Pulley[], thickness: number) {
  const reach = (of: (pulley: Pulley) => number, sign: 1 | -1) =>
    Math.max(...pulleys.map((pulley) => sign * of(pulley) + pulley.diameter / 2 + thickness));
  const [left, right] = [-reach(({ x }) => x, -1), reach(({ x }) => x, 1)];
  const [bottom, top] = [-reach(({ y }) => y, -1), reach(({ y }) => y, 1)];
  return { left, right, bottom, top };
}

const marginOf = ({ width }: Board) => (width < 560 ? 36 : 62);

/** All pulleys in the middle, with room around them for their names. */
export function fitView(pulleys: readonly Pulley[], thickness: number, board: Board): View {
  const { left, right, bottom, top } = extent(pulleys, thickness);
  const margin = marginOf(board);
  const room = (px: number) => Math.max(px - 2 * margin, 40);
  const scale = Math.min(room(board.width) / (right - left), room(board.height) / (top - bottom), 40);
  return zoomedView({ left: 0, top: 0, scale }, 1, board, { x: (left + right) / 2, y: (bottom + top) / 2 });
}

/** Closer (above 1) or wider around a point, which comes to lie in the middle. */
export function zoomedView({ scale }: View, times: number, { width, height }: Board, middle: Point): View {
  const next = Math.min(Math.max(scale * times, 0.005), 80);
  return { scale: next, left: middle.x - width / 2 / next, top: middle.y + height / 2 / next };
}

/** What lies in the middle of the board. */
export const middleOf = ({ left, top, scale }: View, { width, height }: Board): Point => ({
  x: left + width / 2 / scale,
  y: top - height / 2 / scale,
});

/** Whether every pulley is seen whole, but for the belt. */
export function showsAll({ left, top, scale }: View, pulleys: readonly Pulley[], { width, height }: Board): boolean {
  const seen = extent(pulleys, 0);
  const slack = 2 / scale;
  return (
    seen.left >= left - slack &&
    seen.right <= left + width / scale + slack &&
    seen.top <= top + slack &&
    seen.bottom >= top - height / scale - slack
  );
}

/** Lines of the grid, px; every fifth or tenth is a main one with its number. */
export function gridOf({ left, top, scale }: View, { width, height }: Board) {
  const main = roundStep(64 / scale);
  const lead = Math.round(main / 10 ** Math.floor(Math.log10(main) + 1e-9));
  const small = main / (lead === 2 ? 4 : 5);
  const along = (from: number, to: number, at: (mm: number) => number) => {
    const lines: { px: number; label: string | null }[] = [];
    for (let i = Math.ceil(from / small); i * small <= to; i++) {
      const isMain = Math.abs(i % Math.round(main / small)) === 0;
      lines.push({ px: at(i * small), label: isMain ? String(Number((i * small).toPrecision(6)) + 0) : null });
    }
    return lines;
  };
  return {
    stepMm: main,
    upright: along(left, left + width / scale, (mm) => (mm - left) * scale),
    level: along(top - height / scale, top, (mm) => (top - mm) * scale),
  };
}
