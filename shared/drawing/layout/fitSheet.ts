import { around, boxOfOutline, boxOfPoints } from "./boxOfItem";
import { type Arrangement, type Composition, compose } from "./compose";
import type { LayoutContext } from "./LayoutContext";
import { layOutView } from "./layOutView";
import type { PartView } from "./PartView";

export type Sheet = {
  /** The part's views for a scale: what is magnified, and by how much, depends on it. */
  viewsAt: (pxPerMm: number) => PartView[];
  /** Views stand above each other on one centre line, whatever the room. */
  projected: boolean;
  context: LayoutContext;
  gap: number;
  width: number;
  height: number;
};
export type Fitted = { composition: Composition; pxPerMm: number; views: PartView[] };

type Arrange = (views: number) => Arrangement;

const beside: Arrange = (views) => [indices(views)];
const stacked: Arrange = (views) => indices(views).map((i) => [i]);
const detailBelow: Arrange = (views) => [indices(views).slice(0, 2), ...(views > 2 ? [indices(views).slice(2)] : [])];

const step = 0.98;
const least = 1e-4;
/** Stacking views has to gain this much over setting them side by side. */
const gain = 1.08;

/** Lays the sheet out at the largest scale at which everything, words included, fits its box; at most `atMost`. */
export function fitSheet(sheet: Sheet, atMost = Number.POSITIVE_INFINITY): Fitted {
  const top = Math.min(atMost, largestConceivable(sheet));
  const [first, ...others] = sheet.projected ? [stacked] : [beside, detailBelow, stacked];
  let best = descend(sheet, first!, top, 0)!;
  for (const arrange of others) {
    best = descend(sheet, arrange, top, best.pxPerMm * gain) ?? best;
  }
  return best;
}

/** The largest scale not above `top` that fits, found from above; undefined once it is not more than `worthwhile`. */
function descend(sheet: Sheet, arrange: Arrange, top: number, worthwhile: number): Fitted | undefined {
  let pxPerMm = top;
  while (pxPerMm > worthwhile) {
    const views = sheet.viewsAt(pxPerMm);
    const laid = views.map((view) => layOutView(view, pxPerMm, sheet.context));
    const composition = compose(laid, arrange(laid.length), sheet.gap, sheet.projected);
    const excess = Math.min(sheet.width / composition.width, sheet.height / composition.height);
    if (excess >= 1 || pxPerMm < least) return { composition, pxPerMm, views };
    // Words keep their size, so shrinking everything by the excess is never too much.
    pxPerMm *= Math.min(step, excess);
  }
  return undefined;
}

function indices(count: number): number[] {
  return [...Array(count).keys()];
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
