import type { Mark } from "./Sketch";
import { lines, rectangle } from "./shapes";

const top = 6;
const beam = { top: 9, bottom: 21 };
const slider = 34;

function ticks(from: number, to: number, step: number, y: number, length: number): string {
  let d = "";
  for (let x = from + step; x < to; x += step) d += `M${x} ${y}v${(x - from) % (step * 5) === 0 ? length + 3 : length}`;
  return d;
}

/** A calliper from above, its outside jaws on the faces `from` and `to`, reaching down to `reach`. */
export function outsideJaws(from: number, to: number, reach: number): Mark[] {
  const tip = Math.max(reach - 26, 27);
  return [
    rectangle("tool", from, beam.top, 197, beam.bottom),
    lines("thin", ticks(from, to, 5, beam.bottom, -4)),
    lines("tool", `M${from} ${top}V${reach}h-5L${from - 15} ${tip}V${top}Z`),
    lines("tool", `M${to} ${top - 2}V${reach}h5L${to + 15} ${tip}V25H${to + slider}V${top - 2}Z`),
  ];
}

/** The same with its inside jaws opened until they touch the faces `from` and `to`. */
export function insideJaws(from: number, to: number, reach: number): Mark[] {
  const middle = (from + to) / 2;
  const width = Math.min(9, middle - from - 1.5);
  return [
    rectangle("tool", from - 10, beam.top, 197, beam.bottom),
    lines(
      "tool",
      `M${from - 10} ${top}H${Math.min(from + 10, middle)}V26L${from + width} 38L${from + width / 2} ${reach}H${from}V26H${from - 10}Z`,
    ),
    lines(
      "tool",
      `M${to + slider - 4} ${top - 2}H${Math.max(to - 10, middle)}V26L${to - width} 38L${to - width / 2} ${reach}H${to}V26H${to + slider - 4}Z`,
    ),
  ];
}

/** A rule, its edge at `y` and its zero line at `zero`. */
export const rule = (zero: number, y: number): Mark[] => [
  rectangle("tool", zero - 8, y, 194, y + 26),
  lines("thin", `M${zero} ${y}v10${ticks(zero, 194, 6, y, 5)}`),
];
