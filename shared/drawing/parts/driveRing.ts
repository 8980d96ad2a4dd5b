import type { DimensionName } from "#shared/domain/partKinds";
import { emptyView, type PartView } from "../layout/PartView";
import type { MaterialLook } from "../Scene";
import type { BeltScale } from "./belt";
import type { PartSizes } from "./PartSizes";
import { addAxis, addBlock, addCross, addDiameter, addLine, addRing, circle } from "./shapes";

/**
 * A drive ring in full section and from its face. The cross-section is round (an O-ring) unless a width or a
 * height is given: then it is a rectangle, width along the axis and height outwards from it. A cross-section too
 * small to dimension is repeated magnified.
 */
export function driveRingViews(
  sizes: PartSizes,
  large: boolean,
  material: MaterialLook,
  magnified: BeltScale | undefined,
): PartView[] {
  const inner = sizes.or("insideDiameter", 40);
  const round = isRoundRing(sizes);
  const side = sizes.or("section", inner * 0.06);
  const wide = round ? side : sizes.or("width", sizes.or("height", side));
  const tall = round ? side : sizes.or("height", sizes.or("width", side));
  const ring = { sizes, material, inner, round, wide, tall };

  const section = ringSection(ring, !magnified, large);
  if (!large) return [section];

  const face = emptyView();
  addRing(face, material, inner / 2 + tall, inner / 2);
  const edge = sizes.role(round ? "section" : "height");
  face.contours.push({ role: edge, outline: circle(inner / 2 + tall) });
  addDiameter(face, sizes, "insideDiameter", inner);
  addCross(face, inner / 2 + tall);
  return magnified ? [section, face, detail(ring, magnified)] : [section, face];
}

/** Whether the sizes describe a ring of round cross-section. */
export function isRoundRing(sizes: PartSizes): boolean {
  return sizes.known("section") !== undefined || (!sizes.known("width") && !sizes.known("height"));
}

type Ring = { sizes: PartSizes; material: MaterialLook; inner: number; round: boolean; wide: number; tall: number };

function ringSection(
  { sizes, material, inner, round, wide, tall }: Ring,
  dimensioned: boolean,
  large: boolean,
): PartView {
  const view = emptyView();
  const middle = inner / 2 + tall / 2;
  const beyond = sizes.role(round ? "section" : "width");
  // The half of the ring behind the cut shows its two sides.
  for (const end of [-1, 1]) addLine(view, beyond, (end * wide) / 2, -middle, (end * wide) / 2, middle);
  for (const up of [-1, 1]) addCut(view, { sizes, material, inner, round, wide, tall }, up * middle);
  addAxis(view, "x", -wide / 2, wide / 2);
  const span = [-wide / 2, wide / 2] as const;
  const start = round ? { start: 0 } : {};
  view.marks.push({
    mark: "linear",
    name: "insideDiameter",
    side: "right",
    middle: 0,
    span,
    ...start,
    sign: "diameter",
  });
  if (dimensioned) addCutMarks(view, { sizes, material, inner, round, wide, tall }, -middle, large);
  return view;
}

function addCut(view: PartView, { sizes, material, round, wide, tall }: Ring, y: number): void {
  if (round) {
    const centre = { x: 0, y };
    view.areas.push({ material, cut: true, outlines: [circle(tall / 2, centre)], thinnest: tall });
    view.contours.push({ role: sizes.role("section"), outline: circle(tall / 2, centre), dimension: "section" });
    const found = sizes.found("section");
    if (found) view.contours.push({ role: "measured", outline: circle(found / 2, centre), dimension: "section" });
    return;
  }
  const [side, flat] = [sizes.role("width"), sizes.role("height")];
  addBlock(view, material, true, [-wide / 2, y - tall / 2, wide / 2, y + tall / 2], {
    left: side,
    right: side,
    top: flat,
    bottom: sizes.role("insideDiameter"),
  });
}

function addCutMarks(view: PartView, { round, wide, tall }: Ring, y: number, large: boolean): void {
  const across: DimensionName = round ? "section" : "width";
  const span = round ? ([y, y] as const) : ([y - tall / 2, y + tall / 2] as const);
  view.marks.push({ mark: "linear", name: across, side: "top", middle: 0, span, sign: round ? "diameter" : undefined });
  if (round || !large) return;
  view.marks.push({ mark: "linear", name: "height", side: "left", middle: y, span: [-wide / 2, wide / 2] });
}

function detail(ring: Ring, { magnification, caption }: BeltScale): PartView {
  const view = emptyView(magnification);
  view.caption = caption;
  addCut(view, ring, 0);
  addCutMarks(view, ring, 0, true);
  if (ring.round) addCross(view, ring.tall / 2);
  return view;
}
