import { beltRuns } from "./beltRuns";
import { boxOfTrain, type Train } from "./layoutTrain";
import { type PlacedLabel, type Point, placeLabels } from "./placeLabels";
import { type Detail, letterOf, placeDetails, sheetHeight, smallWheels } from "./trainDetails";
import type { TrainLabel } from "./trainLabels";
import { lineObstacles, wheelObstacles } from "./trainObstacles";
import { toPx, type View, viewOf } from "./trainView";

export type Sheet = {
  width: number;
  height: number;
  plan: View;
  /** Where the bar of the plan's scale stands. */
  scaleY: number;
  placed: { label: TrainLabel; at: PlacedLabel }[];
  details: Detail[];
};

/** Where the leader of a label points: the wheel, or the middle of a belt's upper run. */
function anchorOf({ field }: TrainLabel, train: Train, plan: View): Point & { r: number } {
  const wheel = train.wheels.find((one) => one.field === field);
  if (wheel) return { ...toPx(plan, wheel), r: wheel.r * plan.pxPerMm };
  const belt = train.belts.find((one) => one.field === field)!;
  const [[from, to]] = beltRuns(belt);
  const middle = { x: (from.x + to.x) / 2, y: (from.y + to.y) / 2 };
  return { ...toPx(plan, middle), r: Math.max(1, (belt.thickness / 2) * plan.pxPerMm) };
}

/** The plan in what width the details leave it. A platter has room for words inside; other trains need it around them. */
function planWith(train: Train, labels: number, planWidth: number, isWide: boolean) {
  const box = boxOfTrain(train);
  const isOpen = train.wheels.some(({ look, r }) => look === "rim" && box.right - box.left < 2.3 * r);
  const around = isWide ? { x: 90, y: 76 } : { x: 14, y: labels > 3 ? 128 : 92 };
  const margin = isOpen ? { x: isWide ? 28 : 14, y: 40 } : around;
  const wanted = ((planWidth - 2 * margin.x) * (box.bottom - box.top)) / (box.right - box.left);
  const height = Math.max(Math.min(wanted, isWide ? 430 : 400) + 2 * margin.y, isWide ? 400 : 250);
  const room = { left: 0, top: 0, width: planWidth, height };
  return { room, plan: viewOf(train, room, margin) };
}

/** Plan, details and words on a sheet of this width. */
export function trainSheet(train: Train, labels: readonly TrainLabel[], width: number): Sheet {
  const isWide = width >= 560;
  const bare = planWith(train, labels.length, width, isWide);
  const small = smallWheels(train, bare.plan);
  const side = isWide && small.length > 0 ? 210 : 0;
  const { room, plan } = side > 0 ? planWith(train, labels.length, width - side, isWide) : bare;
  const whole = { width, planHeight: room.height, side, isWide };
  const details = placeDetails(small, labels, plan, whole);

  const inPlan = labels.filter((label) => !details.some((detail) => detail.label === label));
  const requests = inPlan
    .map((label) => ({ key: label.field, at: anchorOf(label, train, plan), width: label.width, height: label.height }))
    .sort((one, other) => one.at.r - other.at.r);
  const marks = details.flatMap(({ mark }) => [
    { ...mark, cost: 30 },
    { ...letterOf(mark), r: 8, cost: 300 },
  ]);
  const obstacles = [...wheelObstacles(train, plan), ...marks];
  const region = { left: 10, top: 10, width: room.width - 20, height: room.height - 44 };
  const placed = placeLabels(requests, obstacles, lineObstacles(train, plan), region);
  return {
    width,
    height: sheetHeight(details.length, whole),
    plan,
    scaleY: room.height - 14,
    details,
    placed: placed.map((at) => ({ at, label: inPlan.find(({ field }) => field === at.key)! })),
  };
}
