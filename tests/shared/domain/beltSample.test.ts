import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { estimateAsNew } from "#shared/domain/asNew";
import { type BeltSampleInput, beltSampleMethods, estimateBeltSample } from "#shared/domain/beltSample";
import { conditionFacts, conditionsFor } from "#shared/domain/conditions";
import { DomainError } from "#shared/domain/DomainError";
import { instruments } from "#shared/domain/instruments";
import cases from "../../reference/beltSize.json";

const sample: BeltSampleInput = {
  method: "lay-flat-inside",
  readingsMm: [215],
  thicknessMm: 1,
  instrument: "steel-rule",
  condition: "sound",
};
const estimate = (changes: Partial<BeltSampleInput> = {}) => estimateBeltSample({ ...sample, ...changes });
const caseOf = (id: string) => cases.find((c) => c.id === id)!;
const sumOfSquares = (terms: readonly { standardUncertaintyMm: number }[]) =>
  Math.sqrt(terms.reduce((sum, term) => sum + term.standardUncertaintyMm ** 2, 0));

function refusal(changes: Partial<BeltSampleInput>): DomainError {
  try {
    estimate(changes);
  } catch (error) {
    if (error instanceof DomainError) return error;
    throw error;
  }
  throw new Error("was not refused");
}

describe("estimateBeltSample against the reference cases (derived with 40 digits, see their source)", () => {
  it("laid flat, inside: C = 2 F", () => {
    const { inputs, expected } = caseOf("size-04-layflat");
    const { asFound } = estimate({ readingsMm: [inputs.lay_flat_mm!] });
    expect(asFound.insideCircumferenceMm).toBeCloseTo(expected.inside_circumference_mm!, 9);
    expect(asFound.insideCircumferenceMm / Math.PI).toBeCloseTo(expected.inside_diameter_mm!, 9);
  });
  it("inside diameter: C = pi d", () => {
    const { inputs, expected } = caseOf("size-05-id");
    const { asFound } = estimate({ method: "inside-diameter", readingsMm: [inputs.inside_diameter_mm!] });
    expect(asFound.insideCircumferenceMm).toBeCloseTo(expected.inside_circumference_mm!, 9);
    expect(asFound.insideCircumferenceMm / 2).toBeCloseTo(expected.lay_flat_mm!, 9);
  });
  it("around the outside: C = L - 2 pi t", () => {
    const { inputs, expected } = caseOf("size-06-pitch");
    const readingsMm = [expected.outside_circumference_mm!];
    const thicknessMm = inputs.thickness_mm!;
    const { asFound } = estimate({ method: "outside-circumference", readingsMm, thicknessMm });
    expect(asFound.insideCircumferenceMm).toBeCloseTo(expected.inside_circumference_mm!, 6);
  });
  it("laid flat over the outside: C = 2 (F - 2 t)", () => {
    const { inputs, expected } = caseOf("size-07-thick-fold");
    const readingsMm = [inputs.lay_flat_outside_to_outside_mm!];
    const { asFound } = estimate({ method: "lay-flat-outside", readingsMm, thicknessMm: inputs.thickness_mm! });
    expect(asFound.insideCircumferenceMm).toBeCloseTo(expected.inside_circumference_mm!, 9);
  });
  it("the uncertainty of a flat length counts twice, that of the diameter is a pi-th of it", () => {
    const { inputs, expected } = caseOf("size-08-layflat-uncert");
    const flat = estimateAsNew({ ...sample, kind: "flat-belt", dimension: "insideCircumference" }).asFound;
    const { asFound } = estimate({ readingsMm: [inputs.lay_flat_mm!] });
    const factor = asFound.standardUncertaintyMm / flat.standardUncertaintyMm;
    const expanded = inputs.lay_flat_expanded_uncertainty_mm! * factor;
    expect(expanded).toBeCloseTo(expected.circumference_expanded_uncertainty_mm!, 9);
    expect(expanded / Math.PI).toBeCloseTo(expected.diameter_expanded_uncertainty_mm!, 9);
  });
});

describe("estimateBeltSample", () => {
  const belts = conditionsFor("flat-belt").filter((condition) => conditionFacts[condition].hasReadings);

  it.each(belts)("is what a reading of the circumference gives, and what %s takes from it", (condition) => {
    const readingsMm = [523, 524, 523.5];
    const changes = { readingsMm, condition, resolutionMm: 0.8 };
    const { asFound, asNew, budget } = estimate({ ...changes, method: "inside-circumference" });
    const same = estimateAsNew({ ...sample, ...changes, kind: "flat-belt", dimension: "insideCircumference" });
    const { valueMm, standardUncertaintyMm } = same.asFound;
    expect(asFound).toEqual({ insideCircumferenceMm: valueMm, standardUncertaintyMm });
    expect(asNew.insideCircumferenceMm).toBe(same.asNew.valueMm);
    expect(asNew.standardUncertaintyMm).toBe(same.asNew.standardUncertaintyMm);
    expect(budget).toEqual(same.budget);
  });

  it("counts the thickness with an uncertainty of its own: 4 times in a fold, 2 pi times around the outside", () => {
    const changes = { readingsMm: [268], thicknessMm: 3, instrument: "digital-caliper" } as const;
    const term = (method: BeltSampleInput["method"]) =>
      estimate({ ...changes, method }).budget.find(({ name }) => name === "thickness")?.standardUncertaintyMm;
    // JCGM 100:2008 5.1.2: MPE 0.02 (DIN 862) / sqrt 3, step 0.01 / (2 sqrt 3), 0.03 for soft rubber.
    const u = Math.sqrt(0.02 ** 2 / 3 + 0.01 ** 2 / 12 + 0.03 ** 2);
    expect(term("lay-flat-outside")).toBeCloseTo(4 * u, 12);
    expect(term("outside-circumference")).toBeCloseTo(2 * Math.PI * u, 12);
    for (const method of ["inside-circumference", "lay-flat-inside", "inside-diameter"] as const) {
      expect(term(method)).toBeUndefined();
    }
  });

  it("says with what the thickness is reckoned to have been measured", () => {
    const basis = (instrument: BeltSampleInput["instrument"]) =>
      estimate({ method: "lay-flat-outside", instrument }).basis.join(" ");
    expect(basis("micrometer")).toContain("The thickness, taken as measured with a micrometer, counts 4 times");
    expect(basis("string")).toContain("taken as measured with a steel rule, since a string cannot measure it");
  });

  it("tells every step, and ends with the size as new", () => {
    const { basis } = estimate({ condition: "slack", readingsMm: [214.5, 215, 215.5] });
    expect(basis[0]).toMatch(/^Mean of 3 readings with a steel rule: 215\.00 ± /);
    expect(basis).toContain("Inside circumference: C = 2 F, the inside of the fold there and back (geometry).");
    expect(basis.at(-2)).toBe(
      "Being slack added about 12.90 mm to the inside circumference, give or take 12.90 mm (common practice, no source).",
    );
    expect(basis.at(-1)).toMatch(/^As new 417\.10 ± 13\.\d\d mm \(k = 2\)\.$/);
  });

  it("takes readings of a diameter with inside jaws", () => {
    const changes = { readingsMm: [70], instrument: "digital-caliper" } as const;
    const { budget } = estimate({ ...changes, method: "inside-diameter" });
    // DIN 862: 20 um more with inside jaws.
    expect(budget[0]?.standardUncertaintyMm).toBeCloseTo((Math.PI * 0.04) / Math.sqrt(3), 12);
  });

  it("gives the same belt by every way of measuring it", () => {
    const [circumference, thicknessMm] = [430, 2];
    const readings = {
      "inside-circumference": circumference,
      "lay-flat-inside": circumference / 2,
      "lay-flat-outside": circumference / 2 + 2 * thicknessMm,
      "inside-diameter": circumference / Math.PI,
      "outside-circumference": circumference + 2 * Math.PI * thicknessMm,
    };
    for (const method of beltSampleMethods) {
      const { asFound } = estimate({ method, readingsMm: [readings[method]], thicknessMm });
      expect(asFound.insideCircumferenceMm).toBeCloseTo(circumference, 9);
    }
  });

  it("stays finite, positive and the root of its budget, or names the field, for any numbers", () => {
    const number = fc.oneof(
      fc.double({ min: 0.01, max: 3000, noNaN: true }),
      fc.constantFrom(Number.NaN, Infinity, -Infinity, 0, -1, 1e308, 5e-324, 10_000, 50, 1e-9),
    );
    fc.assert(
      fc.property(
        fc.constantFrom(...beltSampleMethods),
        fc.constantFrom(...instruments),
        fc.constantFrom(...belts),
        fc.array(number, { maxLength: 4 }),
        number,
        (method, instrument, condition, readingsMm, thicknessMm) => {
          try {
            const { asFound, asNew, budget } = estimate({ method, instrument, condition, readingsMm, thicknessMm });
            for (const value of [...Object.values(asFound), ...Object.values(asNew)]) {
              expect(Number.isFinite(value) && value > 0).toBe(true);
            }
            expect(Math.abs(sumOfSquares(budget) / asNew.standardUncertaintyMm - 1)).toBeLessThan(1e-9);
            const found = budget.filter(({ name }) => name !== "condition");
            expect(Math.abs(sumOfSquares(found) / asFound.standardUncertaintyMm - 1)).toBeLessThan(1e-9);
          } catch (error) {
            if (!(error instanceof DomainError)) throw error;
            expect(error.field).toMatch(/^(readingsMm(\/\d)?|thicknessMm)$/);
          }
        },
      ),
      { seed: 5, numRuns: 500 },
    );
  });

  it.each([
    [{ condition: "melted", readingsMm: [] }, "condition", "no size left to measure"],
    [{ condition: "missing", readingsMm: [] }, "condition", "no size left to measure"],
    [{ condition: "flat-spotted" }, "condition", "do not become flat-spotted"],
    [{ readingsMm: [] }, "readingsMm", "at least one"],
    [{ readingsMm: [215, -1] }, "readingsMm/1", "more than zero"],
    [{ resolutionMm: Number.NaN }, "resolutionMm", "not negative"],
    [{ thicknessMm: -1 }, "thicknessMm", "0 to 50"],
    [{ thicknessMm: 50.1 }, "thicknessMm", "0 to 50"],
    [{ thicknessMm: Number.NaN }, "thicknessMm", "0 to 50"],
    [{ method: "lay-flat-outside", thicknessMm: 0 }, "thicknessMm", "needs the belt's thickness"],
    [{ method: "lay-flat-outside", readingsMm: [6], thicknessMm: 3 }, "thicknessMm", "cannot measure only 6.00 mm"],
    [{ method: "outside-circumference", readingsMm: [18], thicknessMm: 3 }, "thicknessMm", "cannot measure only"],
  ] as const)("refuses %j", (changes, field, words) => {
    const { field: refused, words: said } = refusal(changes as Partial<BeltSampleInput>);
    expect(refused).toBe(field);
    expect(said).toContain(words);
  });
  it("does without a thickness where none enters", () => {
    expect(estimate({ thicknessMm: 0 }).asFound).toEqual(estimate({ thicknessMm: 50 }).asFound);
  });
});
