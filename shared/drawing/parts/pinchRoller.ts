import { emptyView, type PartView } from "../layout/PartView";
import type { PartSizes } from "./PartSizes";
import { addAxis, addBlock, addCross, addDiameter, addLine, addRing, circle } from "./shapes";

/** A pinch roller: rubber sleeve bonded to a metal bush, in full section, and for a large drawing its face too. */
export function pinchRollerViews(sizes: PartSizes, large: boolean): PartView[] {
  const outer = sizes.or("outsideDiameter", 12);
  const bore = Math.min(sizes.or("bore", outer * 0.2), outer * 0.9);
  const tread = sizes.or("treadWidth", outer * 0.8);
  const height = sizes.or("overallHeight", tread * 1.12);
  const core = bore / 2 + (outer - bore) * 0.2;

  const section = emptyView();
  const treadEdge = sizes.role("treadWidth");
  const bushEdge = sizes.role("overallHeight");
  for (const up of [-1, 1]) {
    const [outside, inside] = up < 0 ? (["top", "bottom"] as const) : (["bottom", "top"] as const);
    addBlock(section, "rubber", true, [-tread / 2, (up * outer) / 2, tread / 2, up * core], {
      left: treadEdge,
      right: treadEdge,
      [outside]: sizes.role("outsideDiameter"),
    });
    addBlock(section, "metal", true, [-height / 2, up * core, height / 2, (up * bore) / 2], {
      left: bushEdge,
      right: bushEdge,
      [outside]: "thin",
      [inside]: sizes.role("bore"),
    });
  }
  const half = Math.max(tread, height) / 2;
  if (large)
    for (const end of [-1, 1]) addLine(section, "thin", (end * height) / 2, -bore / 2, (end * height) / 2, bore / 2);
  addAxis(section, "x", -half, half);
  const across = [-tread / 2, tread / 2] as const;
  section.marks.push({
    mark: "linear",
    name: "outsideDiameter",
    side: "right",
    middle: 0,
    span: across,
    sign: "diameter",
  });
  section.marks.push({ mark: "linear", name: "treadWidth", side: "top", middle: 0, span: [-outer / 2, -core] });
  if (!large) return [section];

  const bush = [-height / 2, height / 2] as const;
  section.marks.push({ mark: "linear", name: "bore", side: "left", middle: 0, span: bush, sign: "diameter" });
  section.marks.push({ mark: "linear", name: "overallHeight", side: "bottom", middle: 0, span: [-core, core] });

  const face = emptyView();
  addRing(face, "rubber", outer / 2, core);
  addRing(face, "metal", core, bore / 2);
  face.contours.push({ role: "thin", outline: circle(core) });
  addDiameter(face, sizes, "bore", bore);
  addDiameter(face, sizes, "outsideDiameter", outer);
  addCross(face, outer / 2);
  return [section, face];
}
