import { describe, expect, it } from "vitest";
import { axisMarks, roundStep } from "../../../client/lib/axisMarks";

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
