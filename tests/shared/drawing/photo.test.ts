import sharp from "sharp";
import { describe, expect, it } from "vitest";
import { partKinds } from "#shared/domain/partKinds";
import { drawDemoPhoto } from "#shared/drawing/photo";
import { fallenLoop } from "#shared/drawing/photo/paintLoop";
import { seededChance } from "#shared/drawing/photo/seededChance";
import { extremeParts } from "./extremeParts";

const dims = { outsideDiameter: { nominalMm: 44.2 } };

describe("drawDemoPhoto", () => {
  it.each(partKinds)("makes a picture of 960 by 720 px of a %s", async (kind) => {
    const picture = await sharp(Buffer.from(drawDemoPhoto({ kind, dims: {}, seed: 5, angle: 9 }))).stats();
    const { width, height } = await sharp(Buffer.from(drawDemoPhoto({ kind, dims: {}, seed: 5 }))).metadata();
    expect([width, height]).toEqual([960, 720]);
    expect(picture.channels[0]!.stdev).toBeGreaterThan(15);
  });

  it("repeats itself for a seed and has four looks", () => {
    const draw = (seed: number) => drawDemoPhoto({ kind: "idler-wheel", dims, seed });
    expect(draw(7)).toBe(draw(7));
    const grounds = [0, 1, 2, 3, 4].map((seed) => draw(seed).match(/stop-color="(#[0-9a-f]{6})"/)![1]);
    expect(new Set(grounds).size).toBe(4);
  });

  it.each(extremeParts)("has finite geometry: $name", ({ kind, dims: sizes }) => {
    expect(drawDemoPhoto({ kind, dims: sizes, seed: 3 })).not.toMatch(/NaN|Infinity|undefined/);
  });

  it("shows the material", () => {
    const draw = (material: string) => drawDemoPhoto({ kind: "round-belt", dims: {}, seed: 1, material });
    expect(draw("silicone")).not.toBe(draw("NBR"));
  });
});

describe("fallenLoop", () => {
  it.each([40, 524, 900])("is exactly %s mm long", (length) => {
    const loop = fallenLoop(length, seededChance(1));
    const around = loop.reduce((sum, p, i) => {
      const q = loop[(i + 1) % loop.length]!;
      return sum + Math.hypot(q.x - p.x, q.y - p.y);
    }, 0);
    expect(around).toBeCloseTo(length, 6);
  });
});
