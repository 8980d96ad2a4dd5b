import type { PartKind } from "#shared/domain/partKinds";
import { drawPart } from "#shared/drawing/drawPart";
import { isBelt } from "#shared/drawing/kitCell";
import { sharedScale } from "#shared/drawing/sharedScale";
import type { StatedDimensions } from "#shared/schemas/part";

export type Drawable = { kind: PartKind; dims: StatedDimensions };
export type ComparedScale = { pxPerMm: number; sectionPxPerMm?: number };

/** The box of one drawing in a list of bought parts, px. */
export const comparedBox = { width: 120, height: 108 };

/**
 * The one scale of a list of parts of all kinds, px to the mm: the largest at which every part fits its box. Loops of belts
 * do not count where there is anything else: they would dwarf it, and are drawn at a stated fraction instead.
 * With nothing to draw the scale is 0.
 */
export function comparedScale(parts: readonly Drawable[]): ComparedScale {
  const others = parts.filter(({ kind }) => !isBelt(kind));
  const belts = parts.filter(({ kind }) => isBelt(kind));
  const { pxPerMm = 0 } = sharedScale(others.length > 0 ? others : belts, comparedBox);
  const { sectionPxPerMm } = sharedScale(belts, comparedBox);
  return { pxPerMm, ...(sectionPxPerMm === undefined ? {} : { sectionPxPerMm }) };
}

const reductions = [1, 2, 4, 5, 10, 20, 50, 100] as const;

/** By how much this part must be drawn smaller than the list's scale to fit its box: 1 for all but long belts. */
export function reductionOf({ kind, dims }: Drawable, scale: ComparedScale): number {
  const fits = (by: number) => {
    const wanted = scale.pxPerMm / by;
    return drawPart({ kind, dims, view: "row", ...comparedBox, ...scale, pxPerMm: wanted }).pxPerMm >= wanted * 0.999;
  };
  return reductions.find(fits) ?? reductions[reductions.length - 1] ?? 1;
}
