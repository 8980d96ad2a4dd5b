import type { PartKind } from "#shared/domain/partKinds";
import { describePart } from "./describePart";
import type { LengthUnit } from "./dimensionText";
import { styleFor } from "./layout/DrawingStyle";
import { fitSheet } from "./layout/fitSheet";
import { footer } from "./layout/footer";
import { moveItem } from "./layout/moveItem";
import type { PartView } from "./layout/PartView";
import { materialLook } from "./materialLook";
import { type MeasuredDimensions, PartSizes, type StatedDimensions } from "./parts/PartSizes";
import { partViews } from "./partViews";
import type { LineRole, Scene } from "./Scene";

export type PartDrawingRequest = {
  kind: PartKind;
  /** What the workshop states; leave out what it does not. */
  dims: StatedDimensions;
  /** "row": one small view with a size or two. "large": all views, all sizes, tolerances, scale bar. */
  view: "row" | "large";
  /** What the user measured on the old part, mm: laid over the part, dashed. */
  asFound?: MeasuredDimensions | undefined;
  unit?: LengthUnit | undefined;
  /** As a listing states it, such as "NBR" or "felt". */
  material?: string | undefined;
  /** Box to draw in, px. A row fills it; a large drawing is cut to the height that it needs. */
  width?: number | undefined;
  height?: number | undefined;
  /** Draw at this scale, so that several drawings can be compared; a smaller one is taken where it does not fit. */
  pxPerMm?: number | undefined;
  /** The same for the cross-sections of belts in a row. */
  sectionPxPerMm?: number | undefined;
};

const defaultBox = { row: { width: 150, height: 130 }, large: { width: 760, height: 560 } } as const;

/** Draws a part from its numbers. */
export function drawPart(request: PartDrawingRequest): Scene {
  const { kind, view, unit = "mm", pxPerMm: atMost } = request;
  const large = view === "large";
  const { width = defaultBox[view].width } = request;
  const height = request.height ?? (large ? Math.max(defaultBox.large.height, width * 0.6) : defaultBox.row.height);
  const sizes = new PartSizes(request.dims, request.asFound ?? {});
  const style = styleFor(view, width);
  const pad = large ? Math.min(24, width * 0.04) : 3;
  const inner = width - pad * 2;

  const sectionRoom = large ? Math.min(150, width * 0.36) : 36;
  const material = materialLook(kind, request.material);
  const viewRequest = { kind, sizes, large, material, sectionRoom, sectionPxPerMm: request.sectionPxPerMm };
  const viewsAt = (scale: number) => partViews(viewRequest, scale);
  const foot = large ? footer(rolesOf(viewsAt(1), sizes), inner, unit, style) : undefined;
  const footRoom = foot ? foot.height + style.clear * 1.5 : 0;

  const sheet = {
    viewsAt,
    projected: kind === "brake-pad",
    context: { sizes, unit, style },
    gap: large ? Math.min(40, Math.max(24, width * 0.05)) : 8,
    width: inner,
    height: height - pad * 2 - footRoom,
  };
  const { composition, pxPerMm, views } = fitSheet(sheet, atMost);
  const tall = large ? Math.min(height, composition.height + pad * 2 + footRoom) : height;
  const left = (width - composition.width) / 2;
  const top = large ? pad : (height - composition.height) / 2;
  const items = composition.items().map((item) => moveItem(item, left, top));
  if (foot) items.push(...foot.draw(pxPerMm, tall - pad - foot.height).map((item) => moveItem(item, pad, 0)));

  const magnified = views.find((v) => v.magnification !== 1);
  return {
    width,
    height: tall,
    pxPerMm,
    ...(magnified ? { sectionPxPerMm: pxPerMm * magnified.magnification } : {}),
    fine: style.fine,
    items,
    ...describePart(kind, sizes, unit),
  };
}

function rolesOf(views: readonly PartView[], sizes: PartSizes): Set<LineRole> {
  const roles = new Set(views.flatMap((v) => [...v.contours, ...v.lines].map((drawn) => drawn.role)));
  const measured = views.some((v) => v.marks.some((m) => m.mark !== "beside" && sizes.found(m.name) !== undefined));
  if (measured) roles.add("measured");
  return roles;
}
