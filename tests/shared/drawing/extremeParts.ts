import type { DimensionName, PartKind } from "#shared/domain/partKinds";
import type { StatedDimensions } from "#shared/drawing/parts/PartSizes";

type Sizes = Partial<Record<DimensionName, number>>;
export type ExtremePart = { name: string; kind: PartKind; dims: StatedDimensions; asFound?: Sizes };

const part = (kind: PartKind, sizes: Sizes, asFound?: Sizes): ExtremePart => ({
  name: `${kind} ${Object.values(sizes).join(" / ")}${asFound ? `, found ${Object.values(asFound).join(" / ")}` : ""}`,
  kind,
  dims: Object.fromEntries(
    Object.entries(sizes).map(([name, mm]) => [name, { nominalMm: mm, plusMinusMm: mm * 0.013 }]),
  ),
  ...(asFound ? { asFound } : {}),
});
const wheel = (outsideDiameter: number, bore: number, treadWidth: number, overallHeight: number, more: Sizes = {}) => ({
  outsideDiameter,
  bore,
  treadWidth,
  overallHeight,
  ...more,
});
const mount = (
  outsideDiameter: number,
  insideDiameter: number,
  grooveDiameter: number,
  grooveWidth: number,
  height: number,
) => ({
  outsideDiameter,
  insideDiameter,
  grooveDiameter,
  grooveWidth,
  height,
});

/** Sizes far from the usual, in every kind: tiny, huge, thin, thick, long, flat, and with very different old parts. */
export const extremeParts: ExtremePart[] = [
  part("idler-wheel", wheel(44.2, 4, 6, 12.5), { outsideDiameter: 43.4, bore: 4.05 }),
  part("idler-wheel", wheel(6, 1, 1, 2)),
  part("idler-wheel", wheel(120, 2, 1, 60), { overallHeight: 59 }),
  part("idler-wheel", wheel(30, 22, 40, 6), { treadWidth: 38 }),
  part("idler-wheel", wheel(250, 3, 2, 3), { outsideDiameter: 200 }),
  part("idler-wheel", wheel(10, 1.5, 30, 34)),
  part("idler-wheel", wheel(44, 4, 6, 12, { secondTreadDiameter: 43 }), { secondTreadDiameter: 44.5 }),
  part("idler-wheel", wheel(44, 4, 6, 12, { secondTreadDiameter: 7 })),
  part("idler-wheel", wheel(44, 4, 2, 4, { secondTreadDiameter: 60 }), { bore: 6 }),
  part("idler-wheel", { outsideDiameter: 44 }),
  part("idler-wheel", { bore: 4 }, { outsideDiameter: 44, treadWidth: 6 }),
  part("idler-wheel", {}, { bore: 4 }),
  part("pinch-roller", wheel(13, 2, 10.5, 12), { outsideDiameter: 12.7 }),
  part("pinch-roller", wheel(4, 1, 3, 3.5)),
  part("pinch-roller", wheel(6, 1.5, 60, 70), { bore: 1.7, treadWidth: 58 }),
  part("pinch-roller", wheel(60, 50, 3, 4), { outsideDiameter: 62 }),
  part("pinch-roller", wheel(12, 2, 12, 4)),
  part("pinch-roller", { treadWidth: 9 }),
  part("flat-belt", { insideCircumference: 524, width: 5, thickness: 0.6 }, { insideCircumference: 541, width: 4.9 }),
  part("flat-belt", { insideCircumference: 900, width: 25, thickness: 0.4 }, { thickness: 0.2 }),
  part("flat-belt", { insideCircumference: 1800, width: 4, thickness: 0.5 }, { insideCircumference: 2400 }),
  part("flat-belt", { insideCircumference: 40, width: 12, thickness: 4 }, { insideCircumference: 30 }),
  part("flat-belt", { insideCircumference: 60, width: 2, thickness: 6 }, { width: 1, thickness: 7 }),
  part("flat-belt", { width: 5 }, { insideCircumference: 500 }),
  part("square-belt", { insideCircumference: 220, section: 1.2 }, { insideCircumference: 231 }),
  part("square-belt", { insideCircumference: 30, section: 3 }, { section: 2 }),
  part("square-belt", { insideCircumference: 1200, section: 0.8 }),
  part("round-belt", { insideCircumference: 160, section: 3 }, { section: 2.8 }),
  part("round-belt", { insideCircumference: 15, section: 5 }, { insideCircumference: 16, section: 4 }),
  part("round-belt", { section: 3 }),
  part("drive-ring", { insideDiameter: 38, section: 2.62 }, { insideDiameter: 38.9 }),
  part("drive-ring", { insideDiameter: 2, section: 1 }, { section: 0.9 }),
  part("drive-ring", { insideDiameter: 3, section: 12 }, { insideDiameter: 4 }),
  part("drive-ring", { insideDiameter: 400, section: 1 }, { insideDiameter: 410, section: 0.8 }),
  part("drive-ring", { insideDiameter: 60, width: 6, height: 3 }, { width: 5.7 }),
  part("drive-ring", { insideDiameter: 20, width: 60, height: 1 }, { height: 0.7 }),
  part("drive-ring", { insideDiameter: 80, width: 0.8, height: 20 }, { width: 1.4 }),
  part("drive-ring", { insideDiameter: 200, width: 30, height: 0.8 }),
  part("motor-mount", mount(15, 6, 9.5, 2, 9), { grooveDiameter: 9 }),
  part("motor-mount", mount(4, 1, 2.5, 0.5, 2), { insideDiameter: 1.2, grooveWidth: 0.6 }),
  part("motor-mount", mount(40, 8, 30, 0.6, 2), { height: 1.8, grooveDiameter: 33 }),
  part("motor-mount", mount(8, 3, 5, 18, 40), { grooveWidth: 20 }),
  part("motor-mount", mount(20, 18, 19, 1, 30)),
  part("motor-mount", mount(20, 2, 4, 8, 8.4), { outsideDiameter: 26 }),
  part("motor-mount", { outsideDiameter: 15, grooveDiameter: 10 }, { grooveWidth: 2, height: 8 }),
  part("brake-pad", { length: 24, width: 8, thickness: 3 }, { thickness: 2.2 }),
  part("brake-pad", { length: 90, width: 2, thickness: 0.5 }, { width: 1.5, thickness: 0.8 }),
  part("brake-pad", { length: 4, width: 40, thickness: 12 }, { length: 3 }),
  part("brake-pad", { length: 5, width: 5, thickness: 5 }),
  part("clutch-felt", { outsideDiameter: 28, insideDiameter: 10, thickness: 1.5 }, { outsideDiameter: 27.2 }),
  part(
    "clutch-felt",
    { outsideDiameter: 80, insideDiameter: 2, thickness: 0.3 },
    { insideDiameter: 3, thickness: 0.2 },
  ),
  part("clutch-felt", { outsideDiameter: 6, insideDiameter: 5.5, thickness: 9 }, { thickness: 8 }),
];
