import type { Box, SceneItem } from "../Scene";
import { around, boxOfItem } from "./boxOfItem";
import type { LayoutContext } from "./LayoutContext";
import type { DimensionMark, LinearMark, Side } from "./PartView";
import { placeBeside } from "./placeBeside";
import { placeGroove } from "./placeGroove";
import { placeHorizontal } from "./placeHorizontal";
import { placeLoop } from "./placeLoop";
import { placeVertical } from "./placeVertical";

/**
 * Placing follows ISO 129-1:2018: text above its line, read from the bottom or from the right of the sheet, one height
 * for sizes and tolerances.
 *
 * Sets all dimensions of a view around it, in tiers: shorter lengths nearer to the part (ISO 129-1), so that no
 * dimension line is crossed. The tiers at the sides are set first; those above and below clear everything set so far,
 * which is why no two labels can meet at a corner.
 */
export function placeMarks(
  marks: readonly DimensionMark[],
  scale: number,
  part: Box,
  context: LayoutContext,
): SceneItem[] {
  const items: SceneItem[] = [];
  const all = (): Box => around([part, ...items.map(boxOfItem)])!;
  for (const mark of marks) {
    if (mark.mark === "loop") items.push(...placeLoop(mark, scale, context));
    if (mark.mark === "groove") items.push(...placeGroove(mark, scale, part, context));
    if (mark.mark === "beside") items.push(...placeBeside(mark, part, context));
  }
  const linear = marks.filter((mark) => mark.mark === "linear");
  const onSide = (side: Side) =>
    inward(
      linear.filter((mark) => mark.side === side),
      context,
    );
  const grooved = all();
  for (const side of ["left", "right"] as const)
    items.push(...placeVertical(onSide(side), side, scale, grooved, context));
  const sided = all();
  for (const side of ["top", "bottom"] as const)
    items.push(...placeHorizontal(onSide(side), side, scale, sided, context));
  return items;
}

/** Dimensions of which something is known, the shortest first. */
function inward(marks: LinearMark[], { sizes }: LayoutContext): LinearMark[] {
  const known = marks.filter((mark) => sizes.known(mark.name) !== undefined);
  return known.sort((a, b) => sizes.known(a.name)! - sizes.known(b.name)!);
}
