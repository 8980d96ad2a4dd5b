import type { DimensionName } from "#shared/domain/partKinds";
import type { PartView } from "../layout/PartView";
import type { LineRole, MaterialLook, Outline, Point } from "../Scene";
import type { PartSizes } from "./PartSizes";

export const origin: Point = { x: 0, y: 0 };
/** How far an axis runs past the part, px. */
const axisOverhang = 9;

export function circle(radius: number, centre: Point = origin): Outline {
  return { shape: "circle", centre, radius };
}

function rectangle(x0: number, y0: number, x1: number, y1: number): Outline {
  const [left, right, top, bottom] = [Math.min(x0, x1), Math.max(x0, x1), Math.min(y0, y1), Math.max(y0, y1)];
  return {
    shape: "polygon",
    points: [
      { x: left, y: top },
      { x: right, y: top },
      { x: right, y: bottom },
      { x: left, y: bottom },
    ],
  };
}

type Edges = { left?: LineRole; right?: LineRole; top?: LineRole; bottom?: LineRole };

/** A rectangle of material whose four edges are drawn each in its own role; an edge without a role is not drawn. */
export function addBlock(
  view: PartView,
  material: MaterialLook,
  cut: boolean,
  [x0, y0, x1, y1]: readonly [number, number, number, number],
  edges: Edges,
): void {
  const [left, right, top, bottom] = [Math.min(x0, x1), Math.max(x0, x1), Math.min(y0, y1), Math.max(y0, y1)];
  const thinnest = Math.min(right - left, bottom - top);
  view.areas.push({ material, cut, outlines: [rectangle(left, top, right, bottom)], thinnest });
  if (edges.top) addLine(view, edges.top, left, top, right, top);
  if (edges.bottom) addLine(view, edges.bottom, left, bottom, right, bottom);
  if (edges.left) addLine(view, edges.left, left, top, left, bottom);
  if (edges.right) addLine(view, edges.right, right, top, right, bottom);
}

export function addLine(view: PartView, role: LineRole, x0: number, y0: number, x1: number, y1: number): void {
  view.lines.push({ role, from: { x: x0, y: y0 }, to: { x: x1, y: y1 } });
}

/** A ring of material seen along its axis. */
export function addRing(view: PartView, material: MaterialLook, outer: number, inner: number): void {
  view.areas.push({ material, cut: false, outlines: [circle(outer), circle(inner)], thinnest: outer - inner });
}

/** A circle of a face view, with the measured one over it. */
export function addDiameter(view: PartView, sizes: PartSizes, name: DimensionName, diameter: number): void {
  view.contours.push({ role: sizes.role(name), outline: circle(diameter / 2), dimension: name });
  const found = sizes.found(name);
  if (found) view.contours.push({ role: "measured", outline: circle(found / 2), dimension: name });
}

export function addAxis(view: PartView, along: "x" | "y", from: number, to: number): void {
  const at = (v: number) => (along === "x" ? { x: v, y: 0 } : { x: 0, y: v });
  view.lines.push({ role: "centre", from: at(from), to: at(to), overhang: axisOverhang });
}

export function addCross(view: PartView, radius: number): void {
  addAxis(view, "x", -radius, radius);
  addAxis(view, "y", -radius, radius);
}
