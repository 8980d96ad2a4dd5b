import { barsDepthMm, barsLengthMm, calibrationBars } from "./calibrationBars";
import { marginMm, type Paper, papers } from "./papers";
import { circle, line, path, rectangle } from "./paths";
import type { SheetItem, SheetPage } from "./Sheet";
import { paragraph, words } from "./words";

export type TitleCell = { label: string; value: string };
/** Where a page's own drawing goes: whole, and beside the upright bars below `besideTop`. */
export type Room = { left: number; top: number; right: number; bottom: number; besideLeft: number; besideTop: number };

const titleHeight = 11;
const frameStroke = 0.25;
const gap = 2.5;

const warning =
  "Check both black bars with a calliper before you trust this sheet: 100 mm and 4 in, across and up the page. " +
  "If they are off, print again at 100 % (“actual size”), with no fit to page.";

/** The room that the frame leaves on a paper. */
export function roomOf(paper: Paper): Room {
  const { widthMm, heightMm } = papers[paper];
  const bottom = heightMm - marginMm - titleHeight - barsDepthMm - 2 * gap;
  return {
    left: marginMm + gap,
    top: marginMm + gap,
    right: widthMm - marginMm - gap,
    bottom,
    besideLeft: marginMm + barsDepthMm + 2.4 * gap,
    besideTop: heightMm - marginMm - titleHeight - gap - 104,
  };
}

function titleBlock(left: number, top: number, width: number, title: string, cells: readonly TitleCell[]): SheetItem[] {
  const pen = { strokeMm: frameStroke };
  const cellWidth = 27;
  const from = left + width - cells.length * cellWidth;
  const mark = [
    circle(left + 6.6, top + 6, 3.4, { strokeMm: 0.6 }),
    circle(left + 6.6, top + 6, 1.1, { strokeMm: 0.6 }),
    line(left + 6.6, top + 2.6, left + 12, top + 2.6, { strokeMm: 0.6 }),
  ];
  return [
    path(rectangle(left, top, width, titleHeight), pen),
    ...mark,
    words(left + 14, top + 4.4, "Idlewright", { sizeMm: 2.3, shade: "grey" }),
    words(left + 14, top + 8.8, title, { sizeMm: 3.9, weight: 600 }),
    ...cells.flatMap(({ label, value }, i) => {
      const x = from + i * cellWidth;
      return [
        line(x, top, x, top + titleHeight, pen),
        words(x + 2, top + 4, label, { sizeMm: 2.3, shade: "grey" }),
        words(x + 2, top + 8.6, value, { sizeMm: 3.1, weight: 600 }),
      ];
    }),
  ];
}

/**
 * What every sheet has: a frame, a title block, and calibration bars across and up the page with the words to check
 * them. The page's own items come on top.
 */
export function framedPage(
  paper: Paper,
  title: string,
  cells: readonly TitleCell[],
  draw: (room: Room) => SheetItem[],
): SheetPage {
  const { name, widthMm, heightMm } = papers[paper];
  const [left, width, bottom] = [marginMm, widthMm - 2 * marginMm, heightMm - marginMm];
  const titleTop = bottom - titleHeight;
  const barsLeft = left + barsDepthMm + 1.8 * gap;
  const wordsLeft = barsLeft + barsLengthMm + gap * 1.6;
  const frame: SheetItem[] = [
    path(rectangle(left, marginMm, width, heightMm - 2 * marginMm), { strokeMm: frameStroke }),
    ...titleBlock(left, titleTop, width, title, [
      ...cells,
      { label: "Paper", value: name },
      { label: "Print at 100 %", value: "Scale 1:1" },
    ]),
    ...calibrationBars(barsLeft, titleTop - barsDepthMm - gap * 0.7),
    ...calibrationBars(left + gap * 0.7, titleTop - gap, true),
    ...paragraph(wordsLeft, titleTop - barsDepthMm - gap, left + width - gap - wordsLeft, warning, { sizeMm: 2.3 })
      .items,
  ];
  return { title, widthMm, heightMm, items: [...frame, ...draw(roomOf(paper))] };
}
