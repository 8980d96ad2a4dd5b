import { describe, expect, it } from "vitest";
import { hardnessScale, hardnessWindow, shoreASpring } from "#shared/domain/hardness";
import cases from "../../reference/hardness.json";

const caseOf = (id: string) => cases.find((c) => c.id === id)!;

describe("hardness", () => {
  it("hard-01: a nominal of 70 is 65 to 75 (ASTM D2000)", () => {
    const { inputs, expected } = caseOf("hard-01");
    expect(hardnessWindow(inputs.nominal_shore_a!)).toEqual({ lower: expected.lower, upper: expected.upper });
  });
  it("hard-02: 66 is outside the window of 60", () => {
    const { inputs, expected } = caseOf("hard-02");
    const { lower, upper } = hardnessWindow(inputs.nominal_shore_a!);
    expect(inputs.measured! >= lower && inputs.measured! <= upper).toBe(expected.within);
  });
  it("keeps the window on the scale", () => {
    expect(hardnessWindow(3)).toEqual({ lower: 0, upper: 8 });
    expect(hardnessWindow(98)).toEqual({ lower: 93, upper: 100 });
  });
  it("hard-03: over 90 A is read on D (ISO 48-4:2018)", () => {
    const { inputs, expected } = caseOf("hard-03-scale");
    expect(hardnessScale({ scale: "A", reading: inputs.reading_type_A! })).toBe(expected.use_scale);
  });
  it.each([
    ["A", 90, 6, "A"],
    ["A", 20, 6, "A"],
    ["A", 19.9, 6, "AO"],
    ["A", 55, 5.9, "AM"],
    ["D", 19.9, 8, "A"],
    ["D", 20, 8, "D"],
  ] as const)("%s at %d in %d mm is read on %s's proper scale", (scale, reading, thicknessMm, best) => {
    expect(hardnessScale({ scale, reading, thicknessMm })).toBe(best);
  });
  it("hard-04: the spring of type A (from memory)", () => {
    const { inputs, expected } = caseOf("hard-04-spring");
    const { forceN, depthMm } = shoreASpring(inputs.shore_a!);
    expect(forceN).toBeCloseTo(expected.spring_force_N!, 9);
    expect(depthMm).toBeCloseTo(expected.indentation_mm!, 9);
  });
  it.each([-1, 100.1, Number.NaN, Infinity])("refuses a hardness of %d", (value) => {
    expect(() => hardnessWindow(value)).toThrow(expect.objectContaining({ field: "nominal" }));
    expect(() => hardnessScale({ scale: "A", reading: value })).toThrow(expect.objectContaining({ field: "reading" }));
    expect(() => shoreASpring(value)).toThrow(expect.objectContaining({ field: "reading" }));
  });
  it("refuses a thickness of nothing", () => {
    const thin = { scale: "A", reading: 50, thicknessMm: 0 } as const;
    expect(() => hardnessScale(thin)).toThrow(expect.objectContaining({ field: "thicknessMm" }));
  });
});
