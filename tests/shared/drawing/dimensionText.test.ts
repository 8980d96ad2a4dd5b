import { expect, it } from "vitest";
import { dimensionText } from "#shared/drawing/dimensionText";

it.each([
  // A class of ISO 3302-1 is a share of the size above 160 mm: 0.8 % of 591 mm.
  [{ nominalMm: 591, plusMinusMm: 4.728 }, "591.0", "±4.7"],
  [{ nominalMm: 44.2, plusMinusMm: 0.15 }, "44.20", "±0.15"],
  [{ nominalMm: 4, plusMinusMm: 0.125 }, "4.00", "±0.13"],
  [{ nominalMm: 4.01, plusMinusMm: 0.005 }, "4.010", "±0.005"],
])("writes %o with as many decimals as its tolerance is worth", (size, nominal, tolerance) => {
  expect(dimensionText(size, "mm")).toEqual({ nominal, tolerance });
});
