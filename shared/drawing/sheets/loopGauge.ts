import { framedPage, roomOf } from "./pageFrame";
import type { Paper } from "./papers";
import { arc, line, path, rectangle } from "./paths";
import type { SheetItem, SheetPage } from "./Sheet";
import { column, words } from "./words";

/** Circumferences of the circles drawn, mm. */
const loopSizes = { from: 60, upTo: 560, step: 20 } as const;

const label = { sizeMm: 2.4, anchor: "middle" } as const;
/** Where the number of a circle stands, left of the middle, and half the room that it takes, mm. */
const [labelAtMm, labelHalfMm] = [7.4, 2.9];

/** A circle, parted left of its top for its number. */
function labelledCircle(cx: number, cy: number, radius: number, text: string, isBold: boolean): SheetItem[] {
  const degAt = (left: number) => -90 - (Math.asin(Math.min(1, left / radius)) * 180) / Math.PI;
  const [from, to] = [degAt(labelAtMm - labelHalfMm), degAt(labelAtMm + labelHalfMm)];
  const y = cy + radius * Math.sin((degAt(labelAtMm) * Math.PI) / 180);
  return [
    arc(cx, cy, radius, from, to + 360, { strokeMm: isBold ? 0.25 : 0.12, shade: isBold ? "ink" : "grey" }),
    words(cx - labelAtMm, y + label.sizeMm * 0.34, text, { ...label, weight: isBold ? 600 : 500 }),
  ];
}

/** Circles that all touch one line, each marked with its circumference, and a scale of circumferences up the middle. */
function loopItems(cx: number, stop: number): SheetItem[] {
  const { from, upTo, step } = loopSizes;
  const heightOf = (circumference: number) => circumference / Math.PI;
  const circles = Array.from({ length: (upTo - from) / step + 1 }, (_, i) => from + i * step).flatMap((size) => {
    const height = heightOf(size);
    const isHundred = size % 100 === 0;
    return [...labelledCircle(cx, stop - height / 2, height / 2, String(size), isHundred)];
  });
  const marks = Array.from({ length: (upTo - from) / 5 + 1 }, (_, i) => from + i * 5).map((size) => {
    const half = size % 20 === 0 ? 3.6 : size % 10 === 0 ? 2.4 : 1.4;
    const y = stop - heightOf(size);
    return line(cx - half, y, cx + half, y, { strokeMm: 0.12 });
  });
  return [
    path(rectangle(cx - 40, stop, 80, 1.5)),
    line(cx, stop, cx, stop - heightOf(upTo), { strokeMm: 0.1 }),
    ...circles,
    ...marks,
  ];
}

/** A page for loops that keep a round shape: the inside circumference is read off the circle that they follow. */
export function loopGaugePage(paper: Paper): SheetPage {
  const room = roomOf(paper);
  const left = room.besideLeft;
  const width = (room.right - left - 6) / 2;
  const draw = (top: number) => [
    column(
      left,
      top,
      width,
      [
        {
          heading: "Use it",
          text: "Lay the loop down round and loose, its inside touching the thick line. The circle that its inside follows, or the mark that it reaches at the top, is its inside circumference in millimetres.",
        },
      ],
      2.5,
    ),
    column(
      left + width + 6,
      top,
      width,
      [
        {
          heading: "Which gauge",
          text: "A round belt or a ring that springs open is read here; a flat or a limp one is better laid flat on the ruler. A millimetre of height is three of circumference, so read to a third of a millimetre.",
        },
      ],
      2.5,
    ),
  ];
  const height = Math.max(...draw(0).map(({ bottom }) => bottom));
  const stop = room.top + loopSizes.upTo / Math.PI + 3;
  const range = `${loopSizes.from} to ${loopSizes.upTo} mm`;
  return framedPage(paper, "Loop gauge", [{ label: "Around the inside", value: range }], () => [
    ...loopItems((room.left + room.right) / 2, stop),
    ...draw(room.bottom - height).flatMap(({ items }) => items),
  ]);
}
