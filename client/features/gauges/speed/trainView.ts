import { boxOfTrain, type Train, type Wheel } from "./layoutTrain";
import type { Box, Point } from "./placeLabels";

/** From mm of the train to px of the sheet. */
export type View = { pxPerMm: number; x: number; y: number };

export const toPx = ({ pxPerMm, x, y }: View, at: Point): Point => ({ x: x + at.x * pxPerMm, y: y + at.y * pxPerMm });

/** The whole train in the middle of its room, as large as the margins allow. */
export function viewOf(train: Train, room: Box, margin: Point): View {
  const { left, top, right, bottom } = boxOfTrain(train);
  const across = (room.width - 2 * margin.x) / (right - left);
  const down = (room.height - 2 * margin.y) / (bottom - top);
  const pxPerMm = Math.min(across, down);
  return {
    pxPerMm,
    x: room.left + room.width / 2 - ((left + right) / 2) * pxPerMm,
    y: room.top + room.height / 2 - ((top + bottom) / 2) * pxPerMm,
  };
}

/** The cross of centre lines on a wheel, a little longer than it; short on a platter, none where it would blot the wheel. */
export function centreLines(wheel: Wheel, view: View): (readonly [Point, Point])[] {
  const { x, y } = toPx(view, wheel);
  const reach = wheel.look === "rim" ? 26 : wheel.r * view.pxPerMm + 6;
  if (reach < 15) return [];
  const level = [
    { x: x - reach, y },
    { x: x + reach, y },
  ] as const;
  const upright = [
    { x, y: y - reach },
    { x, y: y + reach },
  ] as const;
  return [level, upright];
}
