import { emptyView, type PartView } from "../layout/PartView";
import type { MaterialLook, Point } from "../Scene";
import type { PartSizes } from "./PartSizes";
import { addAxis, addCross, addDiameter, addLine, addRing } from "./shapes";

/** A grooved grommet, bush or isolator: full section with its axis upright, and for a large drawing its face too. */
export function motorMountViews(sizes: PartSizes, large: boolean, material: MaterialLook): PartView[] {
  const outer = sizes.or("outsideDiameter", 15);
  const inner = Math.min(sizes.or("insideDiameter", outer * 0.4), outer * 0.95);
  const groove = Math.min(Math.max(sizes.or("grooveDiameter", (outer + inner) / 2), inner), outer);
  const height = sizes.or("height", outer * 0.6);
  const slot = Math.min(sizes.or("grooveWidth", height * 0.3), height);

  const section = emptyView();
  for (const side of [-1, 1]) addWall(section, sizes, material, side, { outer, inner, groove, height, slot });
  const across = sizes.role("height");
  for (const end of [-1, 1]) addLine(section, across, -inner / 2, (end * height) / 2, inner / 2, (end * height) / 2);
  addAxis(section, "y", -height / 2, height / 2);

  const rim = [-outer / 2, outer / 2] as const;
  const upright = [-height / 2, height / 2] as const;
  section.marks.push({
    mark: "linear",
    name: "outsideDiameter",
    side: "bottom",
    middle: 0,
    span: upright,
    sign: "diameter",
  });
  if (!large) {
    section.marks.push({ mark: "linear", name: "height", side: "right", middle: 0, span: rim });
    return [section];
  }
  section.marks.push({
    mark: "linear",
    name: "insideDiameter",
    side: "top",
    middle: 0,
    span: upright,
    sign: "diameter",
  });
  section.marks.push({ mark: "linear", name: "grooveWidth", side: "left", middle: 0, span: rim });
  section.marks.push({ mark: "linear", name: "height", side: "left", middle: 0, span: rim });
  section.marks.push({ mark: "groove", name: "grooveDiameter", sign: "diameter" });

  const face = emptyView();
  addRing(face, material, outer / 2, inner / 2);
  addDiameter(face, sizes, "insideDiameter", inner);
  addDiameter(face, sizes, "outsideDiameter", outer);
  addCross(face, outer / 2);
  return [section, face];
}

type Mount = { outer: number; inner: number; groove: number; height: number; slot: number };

function addWall(view: PartView, sizes: PartSizes, material: MaterialLook, side: number, mount: Mount): void {
  const { outer, inner, groove, height, slot } = mount;
  const [o, i, g] = [(side * outer) / 2, (side * inner) / 2, (side * groove) / 2];
  const [h, s] = [height / 2, slot / 2];
  const corner = (x: number, y: number): Point => ({ x, y });
  const points = [
    corner(i, -h),
    corner(o, -h),
    corner(o, -s),
    corner(g, -s),
    corner(g, s),
    corner(o, s),
    corner(o, h),
    corner(i, h),
  ];
  const thinnest = Math.min((outer - inner) / 2, Math.max((groove - inner) / 2, (outer - inner) / 8));
  view.areas.push({ material, cut: true, outlines: [{ shape: "polygon", points }], thinnest });

  for (const end of [-1, 1]) {
    addLine(view, sizes.role("height"), i, end * h, o, end * h);
    addLine(view, sizes.role("outsideDiameter"), o, end * s, o, end * h);
    addLine(view, sizes.role("grooveWidth"), g, end * s, o, end * s);
  }
  addLine(view, sizes.role("grooveDiameter"), g, -s, g, s);
  addLine(view, sizes.role("insideDiameter"), i, -h, i, h);
}
