import { emptyView, type PartView } from "../layout/PartView";
import type { MaterialLook } from "../Scene";
import type { PartSizes } from "./PartSizes";
import { addAxis, addBlock, addCross, addDiameter, addRing } from "./shapes";

/** A brake pad: its face, and for a large drawing the section under it, on the same centre line. */
export function brakePadViews(sizes: PartSizes, large: boolean, material: MaterialLook): PartView[] {
  const length = sizes.or("length", 20);
  const width = sizes.or("width", length * 0.4);
  const thickness = sizes.or("thickness", Math.min(width, length) * 0.3);
  const [end, side, flat] = [sizes.role("length"), sizes.role("width"), sizes.role("thickness")];

  const face = emptyView();
  addBlock(face, material, false, [-length / 2, -width / 2, length / 2, width / 2], {
    left: end,
    right: end,
    top: side,
    bottom: side,
  });
  face.marks.push({ mark: "linear", name: "length", side: "top", middle: 0, span: [-width / 2, width / 2] });
  face.marks.push({ mark: "linear", name: "width", side: "right", middle: 0, span: [-length / 2, length / 2] });
  if (!large) return [face];

  const section = emptyView();
  addBlock(section, material, true, [-length / 2, -thickness / 2, length / 2, thickness / 2], {
    left: end,
    right: end,
    top: flat,
    bottom: flat,
  });
  section.marks.push({ mark: "linear", name: "thickness", side: "right", middle: 0, span: [-length / 2, length / 2] });
  return [face, section];
}

/** A clutch felt: a flat ring in full section, and for a large drawing its face too. */
export function clutchFeltViews(sizes: PartSizes, large: boolean, material: MaterialLook): PartView[] {
  const outer = sizes.or("outsideDiameter", 25);
  const inner = Math.min(sizes.or("insideDiameter", outer * 0.4), outer * 0.97);
  const thickness = sizes.or("thickness", outer * 0.08);

  const section = emptyView();
  const flat = sizes.role("thickness");
  for (const up of [-1, 1]) {
    const [outside, inside] = up < 0 ? (["top", "bottom"] as const) : (["bottom", "top"] as const);
    addBlock(section, material, true, [-thickness / 2, (up * outer) / 2, thickness / 2, (up * inner) / 2], {
      left: flat,
      right: flat,
      [outside]: sizes.role("outsideDiameter"),
      [inside]: sizes.role("insideDiameter"),
    });
  }
  for (const end of [-1, 1]) {
    const x = (end * thickness) / 2;
    section.lines.push({ role: flat, from: { x, y: -inner / 2 }, to: { x, y: inner / 2 } });
  }
  addAxis(section, "x", -thickness / 2, thickness / 2);
  const across = [-thickness / 2, thickness / 2] as const;
  section.marks.push({
    mark: "linear",
    name: "outsideDiameter",
    side: "right",
    middle: 0,
    span: across,
    sign: "diameter",
  });
  section.marks.push({ mark: "linear", name: "thickness", side: "top", middle: 0, span: [-outer / 2, -inner / 2] });
  if (!large) return [section];

  section.marks.push({
    mark: "linear",
    name: "insideDiameter",
    side: "left",
    middle: 0,
    span: across,
    sign: "diameter",
  });
  const face = emptyView();
  addRing(face, material, outer / 2, inner / 2);
  addDiameter(face, sizes, "insideDiameter", inner);
  addDiameter(face, sizes, "outsideDiameter", outer);
  addCross(face, outer / 2);
  return [section, face];
}
