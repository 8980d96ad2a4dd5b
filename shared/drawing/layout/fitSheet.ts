import { around, boxOfOutline, boxOfPoints } from "./boxOfItem";
import { type Arrangement, type Composition, compose } from "./compose";
import { type LayoutContext, layOutView } from "./layOutView";
import type { PartView } from "./PartView";

export type Sheet = {
  /** The part's views for a scale: what is magnified, and by how much, depends on it. */
  viewsAt: (pxPerMm: number) => PartView[];
  projected: boolean;
  context: LayoutContext;
  gap: number;
  width: number;
  height: number;
};
export type Fitted = { composition: Composition; pxPerMm: number; views: PartView[] };

const step = 0.99;
const least = 1e-4;

/** Lays the sheet out at the largest scale at which everything, words included, fits its box; at most `atMost`. */
export function fitSheet(sheet: Sheet, atMost = Number.POSITIVE_INFINITY): Fitted {
  const top = Math.min(atMost, largestConceivable(sheet));
  let best: Fitted | undefined;
  for (const arrangement of arrangements(sheet.viewsAt(top).length, sheet.projected)) {
    const fitted = descend(sheet, arrangement, top);
    // Side by side is kept unless stacking really gains something.
    if (!best || fitted.pxPerMm > best.pxPerMm * 1.08) best = fitted;
  }
  return best!;
}

function descend(sheet: Sheet, arrangement: Arrangement, top: number): Fitted {
  let pxPerMm = top;
  for (;;) {
    const views = sheet.viewsAt(pxPerMm);
    const laid = views.map((view) => layOutView(view, pxPerMm, sheet.context));
    const rows = arrangement.map((row) => row.filter((i) => i < laid.length)).filter((row) => row.length > 0);
    for (let i = rows.flat().length; i < laid.length; i++) rows.push([i]);
    const composition = compose(laid, rows, sheet.gap, sheet.projected);
    const fits = composition.width <= sheet.width && composition.height <= sheet.height;
    if (fits || pxPerMm < least) return { composition, pxPerMm, views };
    // Words keep their size, so shrinking everything by the excess is never too much.
    const excess = Math.min(sheet.width / composition.width, sheet.height / composition.height);
    pxPerMm *= Math.min(step, excess);
  }
}

function arrangements(views: number, projected: boolean): Arrangement[] {
  if (projected) return [[...Array(views).keys()].map((i) => [i])];
  if (views === 1) return [[[0]]];
  if (views === 2) return [[[0, 1]], [[0], [1]]];
  return [[[0, 1, 2]], [[0, 1], [2]], [[0], [1], [2]]];
}

/** The scale at which the largest view alone would fill the box. */
function largestConceivable({ viewsAt, width, height }: Sheet): number {
  const scales = viewsAt(1)
    .filter((view) => view.magnification === 1)
    .map((view) => {
      const outlines = [...view.areas.flatMap((a) => a.outlines), ...view.contours.map((c) => c.outline)];
      const box = around([...outlines.map(boxOfOutline), ...view.lines.map((l) => boxOfPoints([l.from, l.to]))])!;
      return Math.min(width / Math.max(box.width, 1e-6), height / Math.max(box.height, 1e-6));
    });
  return Math.min(...scales);
}
