import type { DimensionName, PartKind } from "#shared/domain/partKinds";
import { emptyView, type PartView } from "../layout/PartView";
import type { MaterialLook, Outline } from "../Scene";
import type { PartSizes } from "./PartSizes";
import { addBlock, addCross, circle, origin } from "./shapes";

export type BeltKind = Extract<PartKind, "flat-belt" | "square-belt" | "round-belt">;

/** Straight part of the loop, as a multiple of the radius of its ends; a choice of the drawing, not of the belt. */
const straightPerRadius = 1.6;

/** Radius of a drawn loop's ends so that its inside measures exactly this circumference (mm in, mm out). */
function loopRadius(insideCircumference: number): number {
  return insideCircumference / (2 * Math.PI + 2 * straightPerRadius);
}

function loop(insideCircumference: number, grow = 0): Extract<Outline, { shape: "stadium" }> {
  const radius = loopRadius(insideCircumference);
  return { shape: "stadium", centre: origin, radius: radius + grow, straight: radius * straightPerRadius };
}

export type BeltScale = {
  magnification: number;
  caption: string | undefined;
  /** The loop is thinner than a drawn line: only its inside edge is drawn. */
  hairline?: boolean;
};

/**
 * A belt: its loop at the scale of the drawing, lying open, and its cross-section magnified.
 * The loop's inside edge is drawn to length; its depth is the belt's thickness.
 */
export function beltViews(
  kind: BeltKind,
  sizes: PartSizes,
  large: boolean,
  material: MaterialLook,
  scale: BeltScale,
): PartView[] {
  const circumference = sizes.or("insideCircumference", 300);
  const thick = kind === "flat-belt" ? sizes.or("thickness", 0.8) : sizes.or("section", 2);
  const wide = kind === "flat-belt" ? sizes.or("width", Math.max(5, thick * 3)) : thick;

  const view = emptyView();
  const inner = loop(circumference);
  const outer = loop(circumference, thick);
  const role = sizes.role("insideCircumference");
  if (!scale.hairline) {
    view.areas.push({ material, cut: false, outlines: [outer, inner], thinnest: thick });
    view.contours.push({ role, outline: outer });
  }
  view.contours.push({ role, outline: inner, dimension: "insideCircumference" });
  const found = sizes.found("insideCircumference");
  if (found) view.contours.push({ role: "measured", outline: loop(found), dimension: "insideCircumference" });
  const { radius, straight } = inner;
  view.marks.push({ mark: "loop", name: "insideCircumference", radius, straight, outer: radius + thick });

  return [view, crossSection(kind, sizes, large, material, scale, wide, thick)];
}

function crossSection(
  kind: BeltKind,
  sizes: PartSizes,
  large: boolean,
  material: MaterialLook,
  { magnification, caption }: BeltScale,
  wide: number,
  thick: number,
): PartView {
  const view = emptyView(magnification);
  view.caption = caption;
  const depth: DimensionName = kind === "flat-belt" ? "thickness" : "section";
  if (kind === "round-belt") {
    view.areas.push({ material, cut: true, outlines: [circle(thick / 2)], thinnest: thick });
    view.contours.push({ role: sizes.role("section"), outline: circle(thick / 2), dimension: "section" });
    const found = sizes.found("section");
    if (found) view.contours.push({ role: "measured", outline: circle(found / 2), dimension: "section" });
    if (large) addCross(view, thick / 2);
  } else {
    const side = sizes.role(kind === "flat-belt" ? "width" : "section");
    const flat = sizes.role(depth);
    const corners = [-wide / 2, -thick / 2, wide / 2, thick / 2] as const;
    addBlock(view, material, true, corners, { left: side, right: side, top: flat, bottom: flat });
  }
  if (!large) {
    const names = kind === "flat-belt" ? (["width", "thickness"] as const) : (["section"] as const);
    view.marks.push({ mark: "beside", names, sign: signOf(kind) });
    return view;
  }
  if (kind === "flat-belt") {
    view.marks.push({ mark: "linear", name: "width", side: "top", middle: 0, span: [-thick / 2, thick / 2] });
  }
  const span = kind === "round-belt" ? ([0, 0] as const) : ([-wide / 2, wide / 2] as const);
  view.marks.push({ mark: "linear", name: depth, side: "right", middle: 0, span, sign: signOf(kind) });
  return view;
}

function signOf(kind: BeltKind): "diameter" | "square" | undefined {
  if (kind === "round-belt") return "diameter";
  return kind === "square-belt" ? "square" : undefined;
}
