import { emptyView, type PartView } from "../layout/PartView";
import type { PartSizes } from "./PartSizes";
import { addAxis, addBlock, addCross, addDiameter, addLine, addRing, circle } from "./shapes";

/**
 * An idler wheel: rubber tread on a metal disc with a hub, in full section, and for a large drawing its face too.
 * A stepped wheel carries its smaller tread beside the larger one. Tread depth, disc and hub diameter are no
 * dimensions of the kind; they follow usual proportions and are drawn with thin lines.
 */
export function idlerWheelViews(sizes: PartSizes, large: boolean): PartView[] {
  const outer = sizes.or("outsideDiameter", 44);
  const bore = Math.min(sizes.or("bore", outer * 0.09), outer * 0.9);
  const tread = sizes.or("treadWidth", outer * 0.13);
  const height = sizes.or("overallHeight", Math.max(tread * 1.5, outer * 0.26));
  const second = sizes.known("secondTreadDiameter");
  const rim = (outer - 2 * treadDepth(outer, bore)) / 2;
  const hub = Math.min(bore * 2.2, (bore + rim * 2) / 2) / 2;

  const wheel = { sizes, outer, bore, tread, height, second, rim, hub };
  return large ? [section(wheel, true), face(wheel)] : [section(wheel, false)];
}

type Wheel = {
  sizes: PartSizes;
  outer: number;
  bore: number;
  tread: number;
  height: number;
  second: number | undefined;
  rim: number;
  hub: number;
};

function treadDepth(outer: number, bore: number): number {
  return Math.min(outer * 0.075, ((outer - bore) / 2) * 0.35);
}

function section({ sizes, outer, bore, tread, height, second, rim, hub }: Wheel, large: boolean): PartView {
  const view = emptyView();
  const disc = Math.min(tread * 0.26, outer * 0.035) / 2;
  const step = second === undefined ? 0 : tread * 0.8;
  const hubLeft = (step - height) / 2;
  const hubRight = hubLeft + height;
  const treadEdge = sizes.role("treadWidth");
  const hubEdge = sizes.role("overallHeight");

  for (const up of [-1, 1]) {
    addBlock(view, "metal", true, [-disc, up * rim, disc, up * hub], { left: "thin", right: "thin" });
    if (second !== undefined) {
      const depth = treadDepth(second, bore);
      const boss = Math.max(second / 2 - depth, hub);
      const edge = sizes.role("secondTreadDiameter");
      const [outside, inside] = up < 0 ? (["top", "bottom"] as const) : (["bottom", "top"] as const);
      addBlock(view, "metal", true, [disc, up * boss, tread / 2 + step, up * hub], {
        right: "thin",
        [outside]: "thin",
      });
      addBlock(view, "rubber", true, [tread / 2, (up * second) / 2, tread / 2 + step, up * boss], {
        left: "thin",
        right: "thin",
        [outside]: edge,
        [inside]: "thin",
      });
    }
    const [outside, inside] = up < 0 ? (["top", "bottom"] as const) : (["bottom", "top"] as const);
    addBlock(view, "rubber", true, [-tread / 2, (up * outer) / 2, tread / 2, up * rim], {
      left: treadEdge,
      right: treadEdge,
      [outside]: sizes.role("outsideDiameter"),
      [inside]: "thin",
    });
    addBlock(view, "metal", true, [hubLeft, up * hub, hubRight, (up * bore) / 2], {
      left: hubEdge,
      right: hubEdge,
      [outside]: "thin",
      [inside]: sizes.role("bore"),
    });
  }
  if (large) {
    // Edges behind the cut: the ends of the bore, and the rim where nothing stands before it.
    for (const end of [hubLeft, hubRight]) addLine(view, "thin", end, -bore / 2, end, bore / 2);
    for (const up of [-1, 1]) {
      addLine(view, "thin", -tread / 2, up * rim, -tread / 2, up * hub);
      if (second === undefined) addLine(view, "thin", tread / 2, up * rim, tread / 2, up * hub);
    }
  }
  addAxis(view, "x", Math.min(hubLeft, -tread / 2), Math.max(hubRight, tread / 2 + step));

  const across = [-tread / 2, tread / 2] as const;
  view.marks.push({
    mark: "linear",
    name: "outsideDiameter",
    side: "right",
    middle: 0,
    span: across,
    sign: "diameter",
  });
  view.marks.push({ mark: "linear", name: "treadWidth", side: "top", middle: 0, span: [-outer / 2, -rim] });
  if (second !== undefined) {
    const span = [tread / 2, tread / 2 + step] as const;
    view.marks.push({ mark: "linear", name: "secondTreadDiameter", side: "right", middle: 0, span, sign: "diameter" });
  }
  if (large) {
    const hubSpan = [hubLeft, hubRight] as const;
    view.marks.push({ mark: "linear", name: "bore", side: "left", middle: 0, span: hubSpan, sign: "diameter" });
    const middle = (hubLeft + hubRight) / 2;
    view.marks.push({ mark: "linear", name: "overallHeight", side: "bottom", middle, span: [-hub, hub] });
  }
  return view;
}

function face({ sizes, outer, bore, second, rim, hub }: Wheel): PartView {
  const view = emptyView();
  addRing(view, "rubber", outer / 2, rim);
  addRing(view, "metal", rim, bore / 2);
  view.contours.push({ role: "thin", outline: circle(rim) }, { role: "thin", outline: circle(hub) });
  if (second !== undefined) {
    const boss = Math.max(second / 2 - treadDepth(second, bore), hub);
    // Where the second tread is the larger one, its boss shows around the first.
    if (boss > outer / 2) addRing(view, "metal", boss, outer / 2);
    addRing(view, "rubber", second / 2, boss);
    view.contours.push({ role: "thin", outline: circle(boss) });
    addDiameter(view, sizes, "secondTreadDiameter", second);
  }
  addDiameter(view, sizes, "bore", bore);
  addDiameter(view, sizes, "outsideDiameter", outer);
  addCross(view, outer / 2);
  return view;
}
