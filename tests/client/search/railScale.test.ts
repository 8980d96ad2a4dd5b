import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { axisMarks, intoLanes, roundStep, zoomed } from "../../../client/features/search/railScale";

describe("roundStep", () => {
  it.each([
    [0.07, 0.1],
    [0.1, 0.1],
    [0.11, 0.2],
    [3, 5],
    [7, 10],
  ])("of at least %f is %f", (atLeast, step) => {
    expect(roundStep(atLeast)).toBeCloseTo(step, 9);
  });
});

describe("axisMarks", () => {
  it("labels round sizes, at least 64 px apart", () => {
    const labels = axisMarks({ fromMm: 42, toMm: 46.5 }, 1200, "mm").filter(({ label }) => label);
    expect(labels.map(({ label }) => label)).toContain("44.0");
    const apart = ((labels[1]!.mm - labels[0]!.mm) / 4.5) * 1200;
    expect(apart).toBeGreaterThanOrEqual(64);
  });
  it("counts in inches where these are read", () => {
    const labelled = axisMarks({ fromMm: 42, toMm: 46.5 }, 1200, "in").find(({ label }) => label === "1.70");
    expect(labelled?.mm).toBeCloseTo(43.18, 6);
  });
  it("has none for a rail without room", () => {
    expect(axisMarks({ fromMm: 42, toMm: 46 }, 0, "mm")).toEqual([]);
  });
});

describe("intoLanes", () => {
  it("never lets two things of one lane come nearer than the gap", () => {
    const thing = fc.tuple(fc.integer({ min: 0, max: 500 }), fc.integer({ min: 1, max: 60 })).map(([from, length]) => ({
      fromPx: from,
      toPx: from + length,
    }));
    fc.assert(
      fc.property(fc.array(thing, { maxLength: 40 }), (things) => {
        const lanes = intoLanes(things, 3, 4);
        for (const [i, a] of things.entries()) {
          for (const [j, b] of things.entries()) {
            if (i >= j || lanes[i] === null || lanes[i] !== lanes[j]) continue;
            expect(a.toPx + 4 <= b.fromPx || b.toPx + 4 <= a.fromPx).toBe(true);
          }
        }
      }),
      { seed: 7 },
    );
  });
  it("gives null where every lane is taken", () => {
    const same = { fromPx: 0, toPx: 10 };
    expect(intoLanes([same, same, same], 2)).toEqual([0, 1, null]);
  });
});

describe("zoomed", () => {
  it("stays inside and keeps its width at an end", () => {
    expect(zoomed({ fromMm: 40, toMm: 50 }, 49.9, 4)).toEqual({ fromMm: 46, toMm: 50 });
    expect(zoomed({ fromMm: 40, toMm: 50 }, 45, 40)).toEqual({ fromMm: 40, toMm: 50 });
  });
});
