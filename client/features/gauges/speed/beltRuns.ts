import type { TrainBelt } from "./layoutTrain";
import type { Point } from "./placeLabels";

/** The two straight runs of an open belt along its middle, each from the driver to the driven wheel, mm of the train. */
export function beltRuns({ from, to, thickness }: TrainBelt): readonly [upper: [Point, Point], lower: [Point, Point]] {
  const [r1, r2] = [from.r + thickness / 2, to.r + thickness / 2];
  const along = Math.atan2(to.y - from.y, to.x - from.x);
  const lean = Math.acos((r1 - r2) / Math.hypot(to.x - from.x, to.y - from.y));
  const at = ({ x, y }: Point, r: number, angle: number) => ({
    x: x + r * Math.cos(angle),
    y: y + r * Math.sin(angle),
  });
  const run = (angle: number): [Point, Point] => [at(from, r1, angle), at(to, r2, angle)];
  return [run(along - lean), run(along + lean)];
}
