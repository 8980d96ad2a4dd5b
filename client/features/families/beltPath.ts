import type { DriveMap } from "#shared/schemas/catalogue";

type Wheel = DriveMap["wheels"][number];
type Point = { x: number; y: number };

const centre = (wheels: readonly Wheel[]): Point => ({
  x: wheels.reduce((sum, { xMm }) => sum + xMm, 0) / wheels.length,
  y: wheels.reduce((sum, { yMm }) => sum + yMm, 0) / wheels.length,
});

/** Outer tangent from one wheel to the next, both inside a belt that runs clockwise on the page. */
function tangent(a: Wheel, b: Wheel): [Point, Point] | null {
  const [dx, dy] = [b.xMm - a.xMm, b.yMm - a.yMm];
  const apart = Math.hypot(dx, dy);
  const [ra, rb] = [a.diameterMm / 2, b.diameterMm / 2];
  if (apart <= Math.abs(ra - rb)) return null;
  const along = Math.atan2(dy, dx);
  const turn = Math.acos((ra - rb) / apart);
  const angle = along - turn;
  const at = (wheel: Wheel, radius: number) => ({
    x: wheel.xMm + radius * Math.cos(angle),
    y: wheel.yMm + radius * Math.sin(angle),
  });
  return [at(a, ra), at(b, rb)];
}

/**
 * The outline of a belt around its wheels, as an SVG path in mm; empty where one wheel lies within another.
 * A sketch for the eye: every wheel is taken as inside the belt, so belts that bend backwards are not shown as they run.
 */
export function beltPath(wheels: readonly Wheel[]): string {
  if (wheels.length < 2) return "";
  const middle = centre(wheels);
  const ordered = [...wheels].sort(
    (a, b) => Math.atan2(a.yMm - middle.y, a.xMm - middle.x) - Math.atan2(b.yMm - middle.y, b.xMm - middle.x),
  );
  const spans = ordered.map((wheel, i) => tangent(wheel, ordered[(i + 1) % ordered.length]!));
  if (spans.some((span) => span === null)) return "";
  const pieces = (spans as [Point, Point][]).map(([from, to], i) => {
    const next = ordered[(i + 1) % ordered.length]!;
    const leave = (spans as [Point, Point][])[(i + 1) % spans.length]![0];
    const [start, end] = [
      Math.atan2(to.y - next.yMm, to.x - next.xMm),
      Math.atan2(leave.y - next.yMm, leave.x - next.xMm),
    ];
    const sweep = (end - start + 4 * Math.PI) % (2 * Math.PI);
    const radius = next.diameterMm / 2;
    const move = i === 0 ? `M${from.x} ${from.y}` : "";
    return `${move}L${to.x} ${to.y}A${radius} ${radius} 0 ${sweep > Math.PI ? 1 : 0} 1 ${leave.x} ${leave.y}`;
  });
  return `${pieces.join("")}Z`;
}
