import type { DimensionName } from "#shared/domain/partKinds";
import type { Point, SceneItem } from "../Scene";

/** An extension line stops this far from the edge and runs this far past the dimension line, px. */
const extensionGap = 2;
export const extensionPast = 4;

/** Whether arrowheads fit between two edges `span` px apart; else they stand outside and point inwards. */
export function arrowsFit(span: number, arrow: number): boolean {
  return span >= arrow * 2 + 4;
}

/** Length of the line behind an arrowhead that stands outside. */
export function tailLength(arrow: number): number {
  return arrow + 6;
}

type DimensionLine = {
  axis: "x" | "y";
  name: DimensionName;
  /** The two edges, along the axis, px; `from` below `to`. */
  from: number;
  to: number;
  /** Where the line runs, on the other axis. */
  at: number;
  arrow: number;
  /** Where the line ends, for a text that stands beyond an edge. */
  reach?: { low?: number; high?: number };
};

/** Dimension line with its two arrowheads, inside or outside as they fit. */
export function dimensionLine({ axis, name, from, to, at, arrow, reach = {} }: DimensionLine): SceneItem[] {
  const point = (along: number): Point => (axis === "x" ? { x: along, y: at } : { x: at, y: along });
  const unit = (sign: number): Point => (axis === "x" ? { x: sign, y: 0 } : { x: 0, y: sign });
  const inside = arrowsFit(to - from, arrow);
  const tail = inside ? 0 : tailLength(arrow);
  const low = Math.min(reach.low ?? from, from - tail);
  const high = Math.max(reach.high ?? to, to + tail);
  const outward = inside ? 1 : -1;
  return [
    { type: "line", role: "dimension", from: point(low), to: point(high), dimension: name },
    { type: "arrow", tip: point(from), direction: unit(-outward), length: arrow },
    { type: "arrow", tip: point(to), direction: unit(outward), length: arrow },
  ];
}

/** Extension line from an edge's end to just past the dimension line. */
export function extensionLine(axis: "x" | "y", edge: number, start: number, at: number): SceneItem {
  const away = Math.sign(at - start) || 1;
  const [near, far] = [start + away * extensionGap, at + away * extensionPast];
  const point = (along: number): Point => (axis === "x" ? { x: edge, y: along } : { x: along, y: edge });
  return { type: "line", role: "extension", from: point(near), to: point(far) };
}
