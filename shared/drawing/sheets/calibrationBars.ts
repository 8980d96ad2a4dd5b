import { path, rectangle } from "./paths";
import type { SheetItem, Step } from "./Sheet";
import { words } from "./words";

const mmLong = 100;
/** Four inches of 25.4 mm. */
const inLong = 101.6;
const thick = 1.3;
const tick = 1.2;
const textMm = 2.5;

/** Room that a pair of bars takes across its length. */
export const barsDepthMm = 9.5;
export const barsLengthMm = inLong;

type Rectangle = [along: number, across: number, length: number, depth: number];

/** Marks inside the ends of a bar, so that nothing sticks out beyond what is measured. */
function ticks(length: number, step: number, across: number): Rectangle[] {
  const count = Math.round(length / step);
  const width = 0.25;
  return Array.from({ length: count + 1 }, (_, i) => [
    i === count ? length - width : Math.max(0, i * step - (i === 0 ? 0 : width / 2)),
    across,
    width,
    tick,
  ]);
}

/** Two black bars side by side, exactly 100 mm and 4 in long, from the same end, with marks each 10 mm and each inch. */
const bars: { steps: Rectangle[]; label: string; labelAcross: number }[] = [
  {
    steps: [[0, 4.2 - thick, mmLong, thick], ...ticks(mmLong, 10, 4.2 - thick - tick)],
    label: "100 mm",
    labelAcross: 1.4,
  },
  { steps: [[0, 5, inLong, thick], ...ticks(inLong, 25.4, 5 + thick)], label: "4 in", labelAcross: 9.4 },
];

/**
 * The bars by which a print is checked with a calliper, along x from (x, y) or, `upright`, up the page from it.
 *
 * Error: none but that of the printer: each bar is one filled rectangle of its exact length.
 */
export function calibrationBars(x: number, y: number, isUpright = false): SheetItem[] {
  return bars.flatMap(({ steps, label, labelAcross }) => {
    const place = ([along, across, length, depth]: Rectangle): Step[] =>
      isUpright
        ? rectangle(x + across, y - along - length, depth, length)
        : rectangle(x + along, y + across, length, depth);
    const [ax, ay] = isUpright ? [x + labelAcross, y - 50] : [x + 50, y + labelAcross];
    const text = words(ax, ay, `${label} from end to end`, {
      sizeMm: textMm,
      anchor: "middle",
      weight: 600,
      turnDeg: isUpright ? -90 : 0,
    });
    return [...steps.map((rectangleOf) => path(place(rectangleOf))), text];
  });
}
