import { describe, expect, it } from "vitest";
import type { DimensionName } from "#shared/domain/partKinds";
import { drawPart, type PartDrawingRequest } from "#shared/drawing/drawPart";
import type { ContourItem, LineItem, Outline, Scene } from "#shared/drawing/Scene";
import { sharedScale } from "#shared/drawing/sharedScale";
import { extremeParts } from "./extremeParts";
import { polyline } from "./findCollisions";

const wheel: PartDrawingRequest = {
  kind: "idler-wheel",
  view: "large",
  dims: {
    outsideDiameter: { nominalMm: 44.1, plusMinusMm: 0.1 },
    bore: { nominalMm: 4 },
    treadWidth: { nominalMm: 6 },
    overallHeight: { nominalMm: 12.5 },
  },
  asFound: { outsideDiameter: 43.3, treadWidth: 5.6 },
};

/** The dimension line that carries a name: from arrow tip to arrow tip. */
function measuredBetweenArrows(scene: Scene, name: DimensionName): number {
  const line = scene.items.find(
    (item): item is LineItem => item.type === "line" && item.role === "dimension" && item.dimension === name,
  )!;
  const at = scene.items.indexOf(line);
  const tips = scene.items
    .slice(at)
    .filter((item) => item.type === "arrow")
    .slice(0, 2);
  return Math.hypot(tips[0]!.tip.x - tips[1]!.tip.x, tips[0]!.tip.y - tips[1]!.tip.y);
}

function circles(scene: Scene, role: ContourItem["role"], name: DimensionName): number[] {
  return scene.items
    .filter((item): item is ContourItem => item.type === "contour" && item.role === role && item.dimension === name)
    .map((item) => (item.outline.shape === "circle" ? item.outline.radius * 2 : Number.NaN));
}

function measuredEdges(scene: Scene, name: DimensionName): LineItem[] {
  return scene.items.filter(
    (item): item is LineItem => item.type === "line" && item.role === "measured" && item.dimension === name,
  );
}

function lengthOf(outline: Outline): number {
  if (outline.shape === "stadium") return 2 * Math.PI * outline.radius + 2 * outline.straight;
  const points = polyline(outline);
  return points.reduce(
    (sum, p, i) => sum + Math.hypot(points[(i + 1) % points.length]!.x - p.x, points[(i + 1) % points.length]!.y - p.y),
    0,
  );
}

describe("a drawn part is true to scale", () => {
  it("has an outside diameter of 44.1 mm times the scale, in section and in face", () => {
    const scene = drawPart(wheel);
    expect(measuredBetweenArrows(scene, "outsideDiameter")).toBeCloseTo(44.1 * scene.pxPerMm, 6);
    expect(circles(scene, "outline", "outsideDiameter")).toEqual([expect.closeTo(44.1 * scene.pxPerMm, 6)]);
    const tread = scene.items.flatMap((item) =>
      item.type === "area" && item.material === "rubber" && item.hatched ? item.outlines : [],
    );
    const heights = tread.flatMap((outline) => polyline(outline).map((p) => p.y));
    expect(Math.max(...heights) - Math.min(...heights)).toBeCloseTo(44.1 * scene.pxPerMm, 6);
  });

  it.each(["bore", "treadWidth", "overallHeight"] as const)("keeps %s to the same scale", (name) => {
    const scene = drawPart(wheel);
    expect(measuredBetweenArrows(scene, name)).toBeCloseTo(wheel.dims[name]!.nominalMm * scene.pxPerMm, 6);
  });

  it("lays the measured part over it at its own size, on the same axis", () => {
    const scene = drawPart(wheel);
    expect(circles(scene, "measured", "outsideDiameter")).toEqual([expect.closeTo(43.3 * scene.pxPerMm, 6)]);
    const [upper, lower] = measuredEdges(scene, "outsideDiameter");
    expect(Math.abs(lower!.from.y - upper!.from.y)).toBeCloseTo(43.3 * scene.pxPerMm, 6);
    const [left, right] = measuredEdges(scene, "treadWidth");
    expect(Math.abs(right!.from.x - left!.from.x)).toBeCloseTo(5.6 * scene.pxPerMm, 6);
    const axis = scene.items.find((item): item is LineItem => item.type === "line" && item.role === "centre")!;
    expect((upper!.from.y + lower!.from.y) / 2).toBeCloseTo(axis.from.y, 6);
  });

  it("draws a belt's inside edge as long as the belt, and its section at the scale it states", () => {
    const scene = drawPart({
      kind: "flat-belt",
      view: "large",
      dims: { insideCircumference: { nominalMm: 524 }, width: { nominalMm: 5 }, thickness: { nominalMm: 0.6 } },
      asFound: { insideCircumference: 541 },
    });
    const loops = scene.items.filter(
      (item): item is ContourItem => item.type === "contour" && item.dimension === "insideCircumference",
    );
    const [stated, found] = ["outline", "measured"].map((role) => loops.find((item) => item.role === role)!);
    expect(lengthOf(stated!.outline)).toBeCloseTo(524 * scene.pxPerMm, 6);
    expect(lengthOf(found!.outline)).toBeCloseTo(541 * scene.pxPerMm, 6);
    expect(measuredBetweenArrows(scene, "width")).toBeCloseTo(5 * scene.sectionPxPerMm!, 6);
    const times = Math.round(scene.sectionPxPerMm! / scene.pxPerMm);
    expect(
      scene.items.some((item) => item.type === "text" && item.content === `section, drawn ${times} × the loop`),
    ).toBe(true);
  });

  it("marks what is not stated as presumed and gives it no dimension", () => {
    const scene = drawPart({ kind: "idler-wheel", view: "large", dims: { outsideDiameter: { nominalMm: 44 } } });
    const named = scene.items
      .filter((item): item is LineItem => item.type === "line" && item.role === "dimension")
      .map((item) => item.dimension);
    expect(named).toEqual(["outsideDiameter"]);
    expect(circles(scene, "presumed", "bore")).toHaveLength(1);
    expect(circles(scene, "outline", "bore")).toHaveLength(0);
  });

  it("has a scale bar as long as it says", () => {
    const scene = drawPart(wheel);
    const [bar] = scene.items.filter((item): item is LineItem => item.type === "line" && item.role === "scale");
    expect(bar!.to.x - bar!.from.x).toBeCloseTo(10 * scene.pxPerMm, 6);
    expect(scene.items.some((item) => item.type === "text" && item.content === "10 mm")).toBe(true);
  });
});

describe("every drawing", () => {
  it.each(extremeParts)("has finite geometry inside its sheet: $name", ({ kind, dims, asFound }) => {
    for (const view of ["row", "large"] as const) {
      const scene = drawPart({ kind, dims, asFound, view });
      expect(JSON.stringify(scene)).not.toMatch(/null|NaN/);
      const points = scene.items.flatMap((item) =>
        item.type === "contour" ? polyline(item.outline) : item.type === "line" ? [item.from, item.to] : [],
      );
      const [xs, ys] = [points.map((p) => p.x), points.map((p) => p.y)];
      expect(Math.min(...xs, ...ys)).toBeGreaterThanOrEqual(-0.01);
      expect(Math.max(...xs)).toBeLessThanOrEqual(scene.width + 0.01);
      expect(Math.max(...ys)).toBeLessThanOrEqual(scene.height + 0.01);
    }
  });

  it.each([0, -4, Number.NaN, Number.POSITIVE_INFINITY])("takes a size of %s as not stated", (nominalMm) => {
    const scene = drawPart({
      kind: "idler-wheel",
      view: "row",
      dims: { outsideDiameter: { nominalMm: 44 }, bore: { nominalMm } },
    });
    expect(scene.description).toContain("Not stated: bore");
  });
});

describe("sharedScale", () => {
  const parts = [30, 44, 60].map((nominalMm) => ({
    kind: "idler-wheel" as const,
    dims: { outsideDiameter: { nominalMm } },
  }));

  it("is what the largest part allows, and every part of the list keeps to it", () => {
    const scale = sharedScale(parts);
    expect(scale.pxPerMm).toBeCloseTo(drawPart({ ...parts[2]!, view: "row" }).pxPerMm, 9);
    for (const part of parts) expect(drawPart({ ...part, view: "row", ...scale }).pxPerMm).toBe(scale.pxPerMm);
  });

  it("gives belts one scale for their sections too", () => {
    const belts = [1, 6].map((section) => ({
      kind: "round-belt" as const,
      dims: { insideCircumference: { nominalMm: 200 }, section: { nominalMm: section } },
    }));
    const scale = sharedScale(belts);
    for (const belt of belts)
      expect(drawPart({ ...belt, view: "row", ...scale }).sectionPxPerMm).toBeCloseTo(scale.sectionPxPerMm!, 9);
  });

  it("is nothing for no parts", () => {
    expect(sharedScale([])).toEqual({});
  });
});
