import { roundStep } from "../../../lib/axisMarks";
import { boxOfTrain, platterMargin, type Train, type Wheel } from "./layoutTrain";
import { type Box, type Obstacle, type PlacedLabel, type Point, placeLabels } from "./placeLabels";
import type { TrainLabel } from "./trainLabels";

/** From mm of the train to px of the sheet. */
export type View = { pxPerMm: number; x: number; y: number };
export const toPx = ({ pxPerMm, x, y }: View, at: Point): Point => ({ x: x + at.x * pxPerMm, y: y + at.y * pxPerMm });

/** A round window on one small wheel, `times` as large as in the plan. */
export type Detail = {
  letter: string;
  wheel: Wheel;
  times: number;
  view: View;
  centre: Point;
  radius: number;
  mark: Point & { r: number };
  label: TrainLabel;
  words: Point & { anchor: "start" | "middle" };
};
export type Sheet = {
  width: number;
  height: number;
  plan: View;
  placed: { label: TrainLabel; at: PlacedLabel }[];
  details: Detail[];
};

/** A wheel smaller than this in the plan, px of radius, is shown again in a detail. */
const leastRadius = 15;
const wanted = { radius: 32 } as const;

/** Round enough to be read: 2, 5, 10, 20 .. times, never more than asked. */
function roundTimes(most: number): number {
  const above = roundStep(most);
  return above <= most ? above : roundStep(above / 2.6);
}

const detailWheels = ({ wheels }: Train) => [
  wheels.find(({ field }) => field === "stepDiameter" || field === "pulleyDiameter" || field === "stages/0/driver"),
  wheels.find(({ field }) => field === "capstanDiameter"),
];

function viewOf(train: Train, room: Box, margin: Point): View {
  const { left, top, right, bottom } = boxOfTrain(train);
  const pxPerMm = Math.min((room.width - 2 * margin.x) / (right - left), (room.height - 2 * margin.y) / (bottom - top));
  return {
    pxPerMm,
    x: room.left + room.width / 2 - ((left + right) / 2) * pxPerMm,
    y: room.top + room.height / 2 - ((top + bottom) / 2) * pxPerMm,
  };
}

function obstaclesOf(train: Train, plan: View): Obstacle[] {
  return train.wheels.flatMap((wheel) => {
    const at = { ...toPx(plan, wheel), r: wheel.r * plan.pxPerMm };
    if (wheel.look !== "rim") return [{ ...at, isFilled: wheel.look !== "presumed" }];
    return [at, { ...at, r: at.r * platterMargin }].map((ring) => ({ ...ring, isFilled: false }));
  });
}

/** Boxes along what runs straight, which words should not cover either. */
function straightBoxes({ belts, tape }: Train, plan: View): Box[] {
  const beads = belts.flatMap(({ from, to }) =>
    [1, -1].flatMap((side) =>
      Array.from({ length: 9 }, (_, i) => {
        const part = (i + 1) / 10;
        const [one, other] = [toPx(plan, from), toPx(plan, to)];
        const r = (from.r + (to.r - from.r) * part) * plan.pxPerMm;
        const [dx, dy] = [other.x - one.x, other.y - one.y];
        const d = Math.hypot(dx, dy) || 1;
        const at = { x: one.x + dx * part - (side * dy * r) / d, y: one.y + dy * part + (side * dx * r) / d };
        return { left: at.x - 2, top: at.y - 2, width: 4, height: 4 };
      }),
    ),
  );
  if (!tape) return beads;
  const [from, to] = [toPx(plan, { x: tape.left, y: tape.y }), toPx(plan, { x: tape.right, y: tape.y })];
  return [...beads, { left: from.x, top: from.y - 3, width: to.x - from.x, height: 6 }];
}

/** Where the leader of a label points: the wheel, or the middle of a belt's upper run. */
function anchorOf({ field }: TrainLabel, train: Train, plan: View): Point & { r: number } {
  const wheel = train.wheels.find((one) => one.field === field);
  if (wheel) return { ...toPx(plan, wheel), r: wheel.r * plan.pxPerMm };
  const belt = train.belts.find((one) => one.field === field)!;
  const [from, to] = [belt.from, belt.to];
  const d = Math.hypot(to.x - from.x, to.y - from.y) || 1;
  const r = (from.r + to.r + belt.thickness) / 2;
  const at = {
    x: (from.x + to.x) / 2 + ((to.y - from.y) / d) * r,
    y: (from.y + to.y) / 2 - ((to.x - from.x) / d) * r,
  };
  return { ...toPx(plan, at), r: Math.max(1, (belt.thickness / 2) * plan.pxPerMm) };
}

/** Plan, details and words on a sheet of this width. */
export function trainSheet(train: Train, labels: readonly TrainLabel[], width: number): Sheet {
  const isWide = width >= 560;
  const box = boxOfTrain(train);
  const aspect = (box.bottom - box.top) / (box.right - box.left);
  const isRim = train.wheels.some(({ look }) => look === "rim");
  const margin = { x: isWide ? 28 : 14, y: isRim ? 40 : 76 };
  const side = isWide ? 210 : 0;
  const planWith = (sideRoom: number) => {
    const room = { left: 0, top: 0, width: width - sideRoom, height: 0 };
    const drawn = Math.min((room.width - 2 * margin.x) * aspect, isWide ? 430 : 400);
    room.height = Math.max(drawn + 2 * margin.y, isWide ? 400 : 250);
    return { room, plan: viewOf(train, room, margin) };
  };
  const small = (plan: View) =>
    detailWheels(train).flatMap((wheel) => (wheel && wheel.r * plan.pxPerMm < leastRadius ? [wheel] : []));
  const bare = planWith(0);
  const shown = small(bare.plan);
  const { room, plan } = shown.length > 0 ? planWith(side) : bare;
  const radius = isWide ? 76 : 64;
  const details = shown.flatMap((wheel, i): Detail[] => {
    const label = labels.find(({ field }) => field === wheel.field);
    if (!label) return [];
    const times = Math.max(2, roundTimes(wanted.radius / (wheel.r * plan.pxPerMm)));
    const pxPerMm = plan.pxPerMm * times;
    const each = radius * 2 + 88;
    const isLone = shown.length === 1;
    const centre = isWide
      ? { x: width - side / 2, y: room.height / 2 + (i - (shown.length - 1) / 2) * each - 34 }
      : { x: isLone ? radius + 16 : (width * (1 + 2 * i)) / 4, y: room.height + radius + 12 };
    const view = { pxPerMm, x: centre.x - wheel.x * pxPerMm, y: centre.y - wheel.y * pxPerMm };
    const mark = { ...toPx(plan, wheel), r: Math.max(wheel.r * plan.pxPerMm + 6, 12) };
    const words =
      !isWide && isLone
        ? { x: radius * 2 + 34, y: centre.y - 30, anchor: "start" as const }
        : { x: centre.x, y: centre.y + radius + 18, anchor: "middle" as const };
    return [{ letter: "AB"[i]!, wheel, times, view, centre, radius, mark, label, words }];
  });
  const under = isWide || details.length === 0 ? 0 : radius * 2 + (details.length === 1 ? 28 : 100);
  const height = isWide ? Math.max(room.height, details.length * (radius * 2 + 88) + 12) : room.height + under;

  const inPlan = labels.filter((label) => !details.some((detail) => detail.label === label));
  const requests = inPlan
    .map((label) => ({ key: label.field, at: anchorOf(label, train, plan), width: label.width, height: label.height }))
    .sort((one, other) => one.at.r - other.at.r);
  const marks = details.map(({ mark }) => ({ ...mark, isFilled: true }));
  const letters = details.map(({ mark }) => ({
    left: mark.x + mark.r,
    top: mark.y - mark.r - 12,
    width: 14,
    height: 16,
  }));
  const region = { left: 10, top: 10, width: room.width - 20, height: room.height - 44 };
  const boxes = [...straightBoxes(train, plan), ...letters];
  const placed = placeLabels(requests, [...obstaclesOf(train, plan), ...marks], boxes, region);
  return {
    width,
    height,
    plan,
    details,
    placed: placed.map((at) => ({ at, label: inPlan.find(({ field }) => field === at.key)! })),
  };
}
