import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  beltAfterSet,
  compressionSetPercent,
  polyurethaneBelts,
  polyurethaneTension,
  tensionSetPercent,
} from "#shared/domain/rubberSet";
import beltCases from "../../reference/beltStretch.json";
import cases from "../../reference/rubberSet.json";

const caseOf = (id: string) => cases.find((c) => c.id === id)!;
const newtonPerPound = 4.4482216152605;

describe("set of rubber", () => {
  it("set-01: compression set (ISO 815-1)", () => {
    const { inputs, expected } = caseOf("set-01-compression");
    const sizes = { originalMm: inputs.h0!, strainedMm: inputs.hs!, afterMm: inputs.h1! };
    expect(compressionSetPercent(sizes)).toBeCloseTo(expected.compression_set_pct!, 9);
  });
  it("set-02: tension set (ISO 2285, from memory)", () => {
    const { inputs, expected } = caseOf("set-02-tension");
    const sizes = { originalMm: inputs.l0!, strainedMm: inputs.ls!, afterMm: inputs.l1! };
    expect(tensionSetPercent(sizes)).toBeCloseTo(expected.tension_set_pct!, 9);
  });
  it("set-03: a belt after its set", () => {
    const { inputs, expected } = caseOf("set-03-belt");
    const belt = beltAfterSet({
      relaxedMm: inputs.relaxed_mm!,
      stretchPercent: inputs.installed_stretch_pct!,
      setPercent: inputs.tension_set_pct!,
    });
    expect(belt.relaxedMm).toBeCloseTo(expected.relaxed_after_mm!, 9);
    expect(belt.remainingStretchPercent).toBeCloseTo(expected.remaining_stretch_pct!, 9);
  });
  it("set-04 and sg-03: polyurethane round belts", () => {
    const { inputs, expected } = caseOf("set-04-pu-tension");
    const { initialN, settledN } = polyurethaneTension(inputs.diameter_in! * 25.4);
    expect(initialN / newtonPerPound).toBeCloseTo(expected.initial_tension_lbf!, 6);
    expect(settledN / newtonPerPound).toBeCloseTo(expected.tension_after_24_48h_lbf!, 6);

    const advice = beltCases.find((c) => c.id === "sg-03-pu")!.expected;
    expect(polyurethaneBelts.stretchPercent["83A"]).toBe(advice.recommended_stretch_pct_83A);
    expect(polyurethaneBelts.stretchPercent["92A"]).toBe(advice.recommended_stretch_pct_92A);
    expect(polyurethaneBelts.tensionLeft).toBe(advice.tension_after_24_48h_fraction);
  });

  it("is 0 for rubber that springs back and 100 for rubber that does not", () => {
    expect(compressionSetPercent({ originalMm: 10, strainedMm: 7.5, afterMm: 10 })).toBe(0);
    expect(tensionSetPercent({ originalMm: 100, strainedMm: 110, afterMm: 110 })).toBe(100);
    expect(beltAfterSet({ relaxedMm: 400, stretchPercent: 6, setPercent: 100 }).remainingStretchPercent).toBeCloseTo(0);
  });
  it.each([
    ["strainedMm", { originalMm: 10, strainedMm: 10, afterMm: 10 }],
    ["strainedMm", { originalMm: 10, strainedMm: 11, afterMm: 10 }],
    ["afterMm", { originalMm: 10, strainedMm: 8, afterMm: 7.9 }],
    ["afterMm", { originalMm: 10, strainedMm: 8, afterMm: 10.1 }],
    ["originalMm", { originalMm: Number.NaN, strainedMm: 8, afterMm: 9 }],
    ["strainedMm", { originalMm: 10, strainedMm: 0, afterMm: 9 }],
  ])("refuses a wrong %s in compression: %o", (field, sizes) => {
    expect(() => compressionSetPercent(sizes)).toThrow(expect.objectContaining({ field }));
  });
  it("refuses tension that shortens, a stretch over 100 %, and no belt at all", () => {
    const short = { originalMm: 10, strainedMm: 9, afterMm: 9.5 };
    expect(() => tensionSetPercent(short)).toThrow(expect.objectContaining({ field: "strainedMm" }));
    const belt = { relaxedMm: 400, stretchPercent: 6, setPercent: 20 };
    for (const [field, value] of [
      ["relaxedMm", 0],
      ["stretchPercent", 101],
      ["setPercent", Number.NaN],
    ] as const) {
      expect(() => beltAfterSet({ ...belt, [field]: value })).toThrow(expect.objectContaining({ field }));
    }
    expect(() => polyurethaneTension(0)).toThrow(expect.objectContaining({ field: "sectionMm" }));
  });
  it("lies between 0 and 100 whatever the sizes", () => {
    const size = fc.double({ min: 5e-324, max: 10_000, noNaN: true });
    fc.assert(
      fc.property(size, size, size, (a, b, c) => {
        const [least, middle, most] = [a, b, c].sort((x, y) => x - y) as [number, number, number];
        fc.pre(least < most);
        for (const set of [
          compressionSetPercent({ originalMm: most, strainedMm: least, afterMm: middle }),
          tensionSetPercent({ originalMm: least, strainedMm: most, afterMm: middle }),
        ]) {
          expect(set).toBeGreaterThanOrEqual(0);
          expect(set).toBeLessThanOrEqual(100);
        }
      }),
    );
  });
});
