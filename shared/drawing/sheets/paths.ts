import type { PathItem, Step } from "./Sheet";

/** How a line is drawn; see Sheet. */
export type Pen = Pick<PathItem, "strokeMm" | "isDashed"> & Partial<Pick<PathItem, "shade">>;

export const path = (steps: readonly Step[], pen: Pen = {}): PathItem => ({
  type: "path",
  shade: "ink",
  ...pen,
  steps,
});

export const line = (x1: number, y1: number, x2: number, y2: number, pen: Pen): PathItem =>
  path(
    [
      ["M", x1, y1],
      ["L", x2, y2],
    ],
    pen,
  );

export const rectangle = (x: number, y: number, width: number, height: number): Step[] => [
  ["M", x, y],
  ["L", x + width, y],
  ["L", x + width, y + height],
  ["L", x, y + height],
  ["Z"],
];

const radians = (deg: number) => (deg * Math.PI) / 180;

/** The point at an angle on a circle: 0 to the right, clockwise as seen on the page. */
export const onCircle = (cx: number, cy: number, radius: number, deg: number): [x: number, y: number] => [
  cx + radius * Math.cos(radians(deg)),
  cy + radius * Math.sin(radians(deg)),
];

/** No curve spans more: its distance from the true circle is then under 4e-7 of the radius. */
const widestCurveDeg = 30;

/** Curves along a circle from where the pen stands, at `fromDeg`, to `toDeg`, either way round. */
export function arcSteps(cx: number, cy: number, radius: number, fromDeg: number, toDeg: number): Step[] {
  const count = Math.max(1, Math.ceil(Math.abs(toDeg - fromDeg) / widestCurveDeg - 1e-9));
  const each = (toDeg - fromDeg) / count;
  const handle = (4 / 3) * Math.tan(radians(each) / 4) * radius;
  return Array.from({ length: count }, (_, i): Step => {
    const [a, b] = [radians(fromDeg + i * each), radians(fromDeg + (i + 1) * each)];
    const [x1, y1] = onCircle(cx, cy, radius, fromDeg + i * each);
    const [x2, y2] = onCircle(cx, cy, radius, fromDeg + (i + 1) * each);
    return [
      "C",
      x1 - handle * Math.sin(a),
      y1 + handle * Math.cos(a),
      x2 + handle * Math.sin(b),
      y2 - handle * Math.cos(b),
      x2,
      y2,
    ];
  });
}

/** An open arc. */
export const arc = (cx: number, cy: number, radius: number, fromDeg: number, toDeg: number, pen: Pen): PathItem =>
  path([["M", ...onCircle(cx, cy, radius, fromDeg)], ...arcSteps(cx, cy, radius, fromDeg, toDeg)], pen);

export const circle = (cx: number, cy: number, radius: number, pen: Pen): PathItem =>
  path([["M", cx + radius, cy], ...arcSteps(cx, cy, radius, 0, 360), ["Z"]], pen);

/** A piece of a ring between two radii and two angles. */
export const sector = (
  cx: number,
  cy: number,
  [inner, outer]: readonly [inner: number, outer: number],
  fromDeg: number,
  toDeg: number,
): Step[] => [
  ["M", ...onCircle(cx, cy, inner, fromDeg)],
  ["L", ...onCircle(cx, cy, outer, fromDeg)],
  ...arcSteps(cx, cy, outer, fromDeg, toDeg),
  ["L", ...onCircle(cx, cy, inner, toDeg)],
  ...arcSteps(cx, cy, inner, toDeg, fromDeg),
  ["Z"],
];
