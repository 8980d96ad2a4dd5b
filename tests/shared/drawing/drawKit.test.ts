import { describe, expect, it } from "vitest";
import { drawKit } from "#shared/drawing/drawKit";
import type { KitLine } from "#shared/drawing/KitLine";
import type { LineItem, Scene } from "#shared/drawing/Scene";
import { extremeParts } from "./extremeParts";
import { findCollisions } from "./findCollisions";

const size = (nominalMm: number) => ({ nominalMm });
const kit: KitLine[] = [
  { label: "platter idler", kind: "idler-wheel", dims: { outsideDiameter: size(44.2), treadWidth: size(6) } },
  { label: "pinch roller", kind: "pinch-roller", dims: { outsideDiameter: size(13), treadWidth: size(10.5) } },
  {
    label: "capstan belt",
    kind: "flat-belt",
    dims: { insideCircumference: size(900), width: size(5), thickness: size(0.6) },
  },
  {
    label: "motor mount, the rubber one under the motor board",
    quantity: 3,
    kind: "motor-mount",
    dims: { outsideDiameter: size(15) },
  },
  { label: "grease, 5 g" },
  { label: "circlip", quantity: 4 },
];

const words = (scene: Scene) => scene.items.flatMap((item) => (item.type === "text" ? [item.content] : []));
const spans = (scene: Scene, name: string) =>
  scene.items
    .filter((item): item is LineItem => item.type === "line" && item.role === "dimension" && item.dimension === name)
    .map(({ from, to }) => Math.hypot(to.x - from.x, to.y - from.y));

describe("drawKit", () => {
  it("draws all its parts at one scale", () => {
    const scene = drawKit(kit);
    expect(spans(scene, "outsideDiameter")[0]).toBeCloseTo(44.2 * scene.pxPerMm, 6);
    const roller = scene.items.flatMap((item) => (item.type === "arrow" ? [item.tip] : []));
    const apart = roller.flatMap((a) => roller.map((b) => Math.abs(a.y - b.y)));
    expect(apart.some((px) => Math.abs(px - 13 * scene.pxPerMm) < 1e-6)).toBe(true);
  });

  it("says by how much a long belt's loop is drawn smaller", () => {
    const scene = drawKit(kit);
    const [, by] = words(scene)
      .join(" ")
      .match(/loop at 1\/(\d+) scale/)!;
    const loop = scene.items.find((item) => item.type === "contour" && item.outline.shape === "stadium");
    const outline = loop?.type === "contour" && loop.outline.shape === "stadium" ? loop.outline : undefined;
    expect(2 * Math.PI * outline!.radius + 2 * outline!.straight).toBeCloseTo((900 * scene.pxPerMm) / Number(by), 6);
  });

  it("names every line, with how many, and lists what is not drawn", () => {
    const scene = drawKit(kit);
    expect(words(scene).join(" ")).toContain("3 × motor mount, the rubber one under the motor board");
    expect(words(scene)).toContain("Not drawn: grease, 5 g; 4 × circlip");
    expect(scene.title).toBe("Kit of 6 lines");
    expect(scene.description).toContain("platter idler: Idler wheel drawn to scale. Stated: outside diameter 44.2 mm");
    expect(scene.description).toContain("4 × circlip: not drawn.");
  });

  it.each([760, 360, 288])("keeps its words apart on a sheet %s px wide", (width) => {
    expect(findCollisions(drawKit(kit, { width }))).toEqual([]);
    const lines = extremeParts.map(({ kind, dims, asFound, name }) => ({ label: name, kind, dims, asFound }));
    expect(findCollisions(drawKit(lines, { width }))).toEqual([]);
  });

  it("can be empty", () => {
    expect(drawKit([]).items).toEqual([]);
    expect(drawKit([{ label: "grease" }]).title).toBe("Kit of 1 line");
  });
});
