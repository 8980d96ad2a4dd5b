import { useState } from "react";
import type { Rail } from "#shared/schemas/search";
import type { Range } from "../../lib/axisMarks";
import { zoomed } from "./railScale";

type Kept = { needKey: string; known: Range; view: Range };
const smallestSpan = 0.2;

const joined = (a: Range, b: Range): Range => ({
  fromMm: Math.min(a.fromMm, b.fromMm),
  toMm: Math.max(a.toMm, b.toMm),
});

/** What the rail shows first: all of it on a wide screen; on a narrow one the half around the estimate. */
const first = (rail: Range, estimateMm: number, narrow: boolean): Range =>
  zoomed(rail, estimateMm, (rail.toMm - rail.fromMm) * (narrow ? 0.5 : 1));

/**
 * The stretch of the rail that is shown. It stays put while the estimate is moved, so that the ruler does not slide under
 * the finger; another need begins anew.
 */
export function useRailView(rail: Rail, estimateMm: number, needKey: string, narrow: boolean) {
  const [kept, setKept] = useState<Kept | null>(null);
  const fresh = !kept || kept.needKey !== needKey;
  const known = fresh ? rail : joined(kept.known, rail);
  const view = fresh ? first(rail, estimateMm, narrow) : kept.view;
  const show = (next: Range) => setKept({ needKey, known, view: next });
  if (fresh) show(view);

  const span = view.toMm - view.fromMm;
  const fullSpan = known.toMm - known.fromMm;
  return {
    view,
    canGoCloser: span > smallestSpan * 1.01,
    canGoWider: span < fullSpan * 0.999,
    closer: () => show(zoomed(known, estimateMm, Math.max(smallestSpan, span / 2))),
    wider: () => show(zoomed(known, estimateMm, span * 2)),
    fit: () => show(zoomed(joined(known, rail), estimateMm, fullSpan)),
    /** Slides the view along when the estimate is moved out of it. */
    follow: (mm: number) => {
      if (mm < view.fromMm || mm > view.toMm) {
        const by = mm < view.fromMm ? mm - view.fromMm - span / 4 : mm - view.toMm + span / 4;
        setKept({
          needKey,
          known: joined(known, { fromMm: mm - span / 2, toMm: mm + span / 2 }),
          view: { fromMm: view.fromMm + by, toMm: view.toMm + by },
        });
      }
    },
  };
}
