import { roundStep } from "../../../lib/axisMarks";
import type { Train, Wheel } from "./layoutTrain";
import type { Point } from "./placeLabels";
import type { TrainLabel } from "./trainLabels";
import { toPx, type View } from "./trainView";

/** A round window on one small wheel, `times` as large as in the plan. */
export type Detail = {
  letter: string;
  wheel: Wheel;
  times: number;
  view: View;
  centre: Point;
  radius: number;
  /** Where the plan is marked with the letter. */
  mark: Point & { r: number };
  label: TrainLabel;
  words: Point & { anchor: "start" | "middle" };
};

/** The middle of the letter beside a mark, above and right of it. */
export const letterOf = ({ x, y, r }: Detail["mark"]): Point => ({ x: x + r + 6, y: y - r - 2 });

/** A wheel smaller than this in the plan, px of radius, is shown again in a detail, about as large as wanted. */
const leastRadius = 15;
const wantedRadius = 32;

/** Round enough to be read: 2, 5, 10, 20 .. times, near to what is asked. */
const roundTimes = (asked: number) => Math.max(2, roundStep(asked * 0.62));

/** The motor's step or pulley, and the capstan, where the plan shows them too small. */
export function smallWheels({ wheels }: Train, plan: View): Wheel[] {
  const asked = [/^(?:stepDiameter|pulleyDiameter|stages\/0\/driver)$/, /^capstanDiameter$/];
  return asked.flatMap((name) => {
    const wheel = wheels.find(({ field }) => field !== undefined && name.test(field));
    return wheel && wheel.r * plan.pxPerMm < leastRadius ? [wheel] : [];
  });
}

type Room = { width: number; planHeight: number; side: number; isWide: boolean };

/** Room that each detail needs with its words, px. */
const windowRadius = (isWide: boolean) => (isWide ? 76 : 64);
const eachHeight = (isWide: boolean) => windowRadius(isWide) * 2 + 88;

/** How high the sheet must be: details stand beside the plan where there is width, else below it. */
export function sheetHeight(count: number, { planHeight, isWide }: Room): number {
  if (count === 0) return planHeight;
  if (isWide) return Math.max(planHeight, count * eachHeight(isWide) + 12);
  return planHeight + windowRadius(isWide) * 2 + (count === 1 ? 28 : 100);
}

export function placeDetails(
  wheels: readonly Wheel[],
  labels: readonly TrainLabel[],
  plan: View,
  room: Room,
): Detail[] {
  const { width, planHeight, side, isWide } = room;
  const radius = windowRadius(isWide);
  const isLone = wheels.length === 1;
  return wheels.flatMap((wheel, i) => {
    const label = labels.find(({ field }) => field === wheel.field);
    const letter = ["A", "B"][i];
    if (!label || !letter) return [];
    const times = roundTimes(wantedRadius / (wheel.r * plan.pxPerMm));
    const pxPerMm = plan.pxPerMm * times;
    const middle = planHeight / 2 + (i - (wheels.length - 1) / 2) * eachHeight(isWide) - 34;
    const below = { x: isLone ? radius + 16 : (width * (1 + 2 * i)) / 4, y: planHeight + radius + 12 };
    const centre = isWide ? { x: width - side / 2, y: middle } : below;
    const beside = { x: radius * 2 + 34, y: centre.y - 30, anchor: "start" as const };
    const under = { x: centre.x, y: centre.y + radius + 18, anchor: "middle" as const };
    return {
      letter,
      wheel,
      times,
      view: { pxPerMm, x: centre.x - wheel.x * pxPerMm, y: centre.y - wheel.y * pxPerMm },
      centre,
      radius,
      mark: { ...toPx(plan, wheel), r: Math.max(wheel.r * plan.pxPerMm + 6, 12) },
      label,
      words: !isWide && isLone ? beside : under,
    };
  });
}
