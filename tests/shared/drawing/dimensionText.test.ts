import { describe, expect, it } from "vitest";
import { dimensionText } from "#shared/drawing/dimensionText";
import { textWidth } from "#shared/drawing/textWidth";

describe("dimensionText", () => {
  it.each([
    [44.2, 0.1, "mm", "44.2", "±0.1"],
    [44.2, 0.15, "mm", "44.20", "±0.15"],
    [4, 0.02, "mm", "4.00", "±0.02"],
    [6, undefined, "mm", "6.0", undefined],
    [524, undefined, "mm", "524", undefined],
    [524, 2.5, "mm", "524.0", "±2.5"],
    [0.1 + 0.2, undefined, "mm", "0.3", undefined],
    [44.2, 0.1, "in", "1.740", "±0.004"],
    [4, 0.02, "in", "0.1575", "±0.0008"],
    [25.4, undefined, "in", "1.000", undefined],
  ] as const)("writes %s mm ± %s in %s as %s %s", (nominalMm, plusMinusMm, unit, nominal, tolerance) => {
    expect(dimensionText({ nominalMm, plusMinusMm }, unit)).toEqual(tolerance ? { nominal, tolerance } : { nominal });
  });
});

describe("textWidth", () => {
  it("gives every digit the same room, 0.604 em", () => {
    for (const digit of "0123456789") expect(textWidth(digit, 100, 600)).toBeCloseTo(60.4, 6);
  });

  it("reserves more for a letter that it does not know than for one that it does", () => {
    expect(textWidth("測", 10, 500)).toBeGreaterThan(textWidth("W", 10, 500));
  });

  it("reserves room for a drawn sign", () => {
    expect(textWidth("44", 10, 600, "diameter")).toBeCloseTo(textWidth("44", 10, 600) + 9.8, 6);
  });
});
