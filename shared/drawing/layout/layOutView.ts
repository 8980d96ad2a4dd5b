import type { DimensionName } from "#shared/domain/partKinds";
import type { PartSizes } from "../parts/PartSizes";
import type { Box, Point, SceneItem } from "../Scene";
import { around, boxOfItem } from "./boxOfItem";
import type { LayoutContext } from "./LayoutContext";
import { label, setLabel } from "./labels";
import { mapOutline } from "./moveItem";
import type { DimensionMark, PartView } from "./PartView";
import { placeMarks } from "./placeMarks";

export type LaidView = { items: SceneItem[]; box: Box };

/** A section wall thinner than this on the screen is filled, not hatched (thin sections, ISO 128-3:2020; from memory), px. */
const thinnestHatched = 5;
/** Measured edges run past the feature by this much, px. */
const measuredOverhang = 6;

/** Draws a view at its scale, with its dimensions around it, in px from the view's own origin. */
export function layOutView(view: PartView, pxPerMm: number, context: LayoutContext): LaidView {
  const scale = pxPerMm * view.magnification;
  const px = (p: Point): Point => ({ x: p.x * scale, y: p.y * scale });
  const body: SceneItem[] = [];
  for (const { material, cut, outlines, thinnest } of view.areas) {
    const hatched = cut && thinnest * scale >= thinnestHatched;
    body.push({ type: "area", material, hatched, outlines: outlines.map((o) => mapOutline(o, px, scale)) });
  }
  for (const { role, outline, dimension } of view.contours) {
    body.push({ type: "contour", role, outline: mapOutline(outline, px, scale), ...(dimension ? { dimension } : {}) });
  }
  for (const { role, from, to, overhang = 0 } of view.lines) {
    const [a, b] = lengthen(px(from), px(to), overhang);
    body.push({ type: "line", role, from: a, to: b });
  }
  for (const mark of view.marks) body.push(...measuredEdges(view, mark, scale, context.sizes));

  const part = around(body.map(boxOfItem))!;
  const marks = placeMarks(view.marks, scale, part, context);
  const items = [...body, ...marks];
  const box = around([part, ...marks.map(boxOfItem)])!;
  if (!view.caption) return { items, box };

  const { words } = context.style;
  const caption = label([{ content: view.caption, role: "note", size: words, weight: 500 }]);
  const at = { x: part.x + part.width / 2 - caption.width / 2, y: box.y + box.height + context.style.clear };
  items.push(...setLabel(caption, at));
  return { items, box: around(items.map(boxOfItem))! };
}

/** The user's own size of a linear dimension: its two edges, dashed, across the feature at their true distance. */
function measuredEdges(view: PartView, mark: DimensionMark, scale: number, sizes: PartSizes): SceneItem[] {
  if (mark.mark !== "linear" && mark.mark !== "groove") return [];
  const found = sizes.found(mark.name);
  if (!found || view.contours.some((c) => c.role === "measured" && c.dimension === mark.name)) return [];
  if (mark.mark === "groove") {
    return [-1, 1].map((end) => measuredLine("x", (end * found * scale) / 2, [-2, 2], mark.name));
  }
  const axis = mark.side === "left" || mark.side === "right" ? "y" : "x";
  const span = [mark.span[0] * scale, mark.span[1] * scale] as const;
  return [-1, 1].map((end) => measuredLine(axis, (mark.middle + (end * found) / 2) * scale, span, mark.name));
}

function measuredLine(
  axis: "x" | "y",
  edge: number,
  [low, high]: readonly [number, number],
  dimension: DimensionName,
): SceneItem {
  const point = (along: number): Point => (axis === "x" ? { x: edge, y: along } : { x: along, y: edge });
  const [from, to] = [point(low - measuredOverhang), point(high + measuredOverhang)];
  return { type: "line", role: "measured", from, to, dimension };
}

function lengthen(from: Point, to: Point, by: number): [Point, Point] {
  const length = Math.hypot(to.x - from.x, to.y - from.y);
  if (by === 0 || length === 0) return [from, to];
  const [ux, uy] = [((to.x - from.x) / length) * by, ((to.y - from.y) / length) * by];
  return [
    { x: from.x - ux, y: from.y - uy },
    { x: to.x + ux, y: to.y + uy },
  ];
}
