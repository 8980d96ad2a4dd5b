import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { type AsNewInput, estimateAsNew } from "#shared/domain/asNew";
import { conditionFacts, conditionsFor } from "#shared/domain/conditions";
import { DomainError } from "#shared/domain/DomainError";
import { traitsOf } from "#shared/domain/dimensionTraits";
import { rangeFactor } from "#shared/domain/flatSpot";
import { instruments } from "#shared/domain/instruments";
import { normalCdf } from "#shared/domain/normalDistribution";
import { dimensionsOf, partKinds } from "#shared/domain/partKinds";

const wheel: AsNewInput = {
  kind: "idler-wheel",
  dimension: "outsideDiameter",
  readingsMm: [44.05],
  instrument: "digital-caliper",
  condition: "glazed",
};
const estimate = (changes: Partial<AsNewInput> = {}) => estimateAsNew({ ...wheel, ...changes });

function refusal(changes: Partial<AsNewInput>): DomainError {
  try {
    estimate(changes);
  } catch (error) {
    if (error instanceof DomainError) return error;
    throw error;
  }
  throw new Error("was not refused");
}

describe("estimateAsNew", () => {
  it("puts back what glazing took from a wheel: 44.05 as found, 44.15 +/- 0.17 as new", () => {
    const { asFound, asNew, flatSpot, basis } = estimate();
    expect(asFound.valueMm).toBe(44.05);
    // JCGM 100:2008 5.1.2: MPE 0.02 (DIN 862) / sqrt 3, step 0.01 / (2 sqrt 3), 0.03 for soft rubber.
    expect(asFound.standardUncertaintyMm).toBeCloseTo(Math.sqrt(0.02 ** 2 / 3 + 0.01 ** 2 / 12 + 0.03 ** 2), 12);
    expect(asNew.valueMm).toBeCloseTo(44.15, 12);
    expect((2 * asNew.standardUncertaintyMm).toFixed(2)).toBe("0.17");
    expect(flatSpot).toBe(false);
    expect(basis.filter((line) => line.includes("common practice, no source"))).toHaveLength(2);
    expect(basis.at(-1)).toBe("As new 44.15 ± 0.17 mm (k = 2).");
  });

  it("leaves a bore as it was found: metal does not age with the rubber", () => {
    for (const condition of ["sound", "glazed", "hardened", "swollen"] as const) {
      const { asFound, asNew, basis } = estimate({ dimension: "bore", readingsMm: [4], condition });
      expect(asNew).toEqual(asFound);
      // Inside jaws: DIN 862, 20 um more. Metal has no softness term.
      expect(asFound.standardUncertaintyMm).toBeCloseTo(Math.sqrt(0.04 ** 2 / 3 + 0.01 ** 2 / 12), 12);
      expect(basis.join(" ")).toContain("does not change with the rubber");
    }
  });

  it("takes a sound part at the size it has", () => {
    const { asFound, asNew } = estimate({ condition: "sound" });
    expect(asNew).toEqual(asFound);
  });

  it.each([
    ["hardened wheel", { condition: "hardened" }, 1],
    ["swollen wheel", { condition: "swollen" }, -1],
    ["slack belt", { kind: "flat-belt", dimension: "insideCircumference", readingsMm: [620], condition: "slack" }, -1],
    ["slack belt's thickness", { kind: "flat-belt", dimension: "thickness", readingsMm: [1], condition: "slack" }, 1],
    ["slack ring", { kind: "drive-ring", dimension: "insideDiameter", readingsMm: [30], condition: "slack" }, -1],
    ["worn pad", { kind: "brake-pad", dimension: "thickness", readingsMm: [3], condition: "glazed" }, 1],
    ["hard mount", { kind: "motor-mount", dimension: "height", readingsMm: [12], condition: "hardened" }, 1],
  ] as const)("corrects a %s the right way", (_name, changes, sign) => {
    const { asFound, asNew } = estimate(changes);
    expect(Math.sign(asNew.valueMm - asFound.valueMm)).toBe(sign);
    expect(asNew.standardUncertaintyMm).toBeGreaterThan(asFound.standardUncertaintyMm);
  });

  it("counts the scatter of repeat readings (JCGM 100:2008 4.2.3)", () => {
    const readingsMm = [44.03, 44.05, 44.07];
    const { asFound, budget } = estimate({ readingsMm });
    expect(asFound.valueMm).toBeCloseTo(44.05, 12);
    const scatter = budget.find(({ name }) => name === "repeatability")?.standardUncertaintyMm;
    expect(scatter).toBeCloseTo(0.02 / Math.sqrt(3), 12);
  });

  it("takes the writing's resolution where it is coarser than the instrument's step", () => {
    const step = (resolutionMm?: number) =>
      estimate({ resolutionMm }).budget.find(({ name }) => name === "resolution")?.standardUncertaintyMm;
    expect(step(0.396875)).toBeCloseTo(0.396875 / Math.sqrt(12), 12);
    expect(step(0.001)).toBe(step());
  });

  it("gives a soft wheel more uncertainty than metal of the same size, and a rule more than a calliper", () => {
    const rubber = estimate({ condition: "sound" }).asFound.standardUncertaintyMm;
    const metal = estimate({ dimension: "overallHeight", condition: "sound" }).asFound.standardUncertaintyMm;
    const byRule = estimate({ instrument: "steel-rule", condition: "sound" }).asFound.standardUncertaintyMm;
    expect(metal).toBeLessThan(rubber);
    expect(rubber).toBeLessThan(byRule);
  });

  it("keeps every estimate positive, finite and no surer than the measurement, whatever the part", () => {
    const combinations = partKinds.flatMap((kind) =>
      dimensionsOf(kind).flatMap((dimension) =>
        conditionsFor(kind)
          .filter((condition) => conditionFacts[condition].hasReadings)
          .map((condition) => ({ kind, dimension, condition })),
      ),
    );
    fc.assert(
      fc.property(
        fc.constantFrom(...combinations),
        fc.constantFrom(...instruments),
        fc.array(fc.double({ min: 0.01, max: 3000, noNaN: true }), { minLength: 1, maxLength: 8 }),
        (combination, instrument, readingsMm) => {
          const { asFound, asNew, flatSpot, basis, budget } = estimateAsNew({ ...combination, instrument, readingsMm });
          expect(asFound.valueMm).toBeGreaterThan(0);
          expect(asNew.valueMm).toBeGreaterThan(0);
          expect(asNew.standardUncertaintyMm).toBeGreaterThanOrEqual(asFound.standardUncertaintyMm);
          expect(Number.isFinite(asNew.standardUncertaintyMm)).toBe(true);
          const sum = budget.reduce((square, term) => square + term.standardUncertaintyMm ** 2, 0);
          expect(Math.abs(Math.sqrt(sum) / asNew.standardUncertaintyMm - 1)).toBeLessThan(1e-9);
          expect(basis.length).toBeGreaterThan(2);
          const role = traitsOf(combination.kind, combination.dimension).role;
          expect(flatSpot && role !== "tread").toBe(false);
        },
      ),
      { seed: 3 },
    );
  });
});

describe("flat spots", () => {
  it("shows where three readings differ by more than measuring explains, and reckons from the highest", () => {
    const { asFound, asNew, flatSpot, basis } = estimate({ readingsMm: [44.1, 44.1, 43.6], condition: "sound" });
    expect(flatSpot).toBe(true);
    expect(asFound.valueMm).toBeCloseTo(43.9333333333, 9);
    expect(asNew.valueMm).toBeCloseTo(44.1, 9);
    expect(basis.join(" ")).toContain("That is a flat spot.");
  });
  it.each([
    ["readings agree", { readingsMm: [44.1, 44.12, 44.09] }],
    ["there are only two readings", { readingsMm: [44.1, 43.6] }],
    ["a steel rule cannot tell", { readingsMm: [44.5, 44, 44.5], instrument: "steel-rule" }],
    ["the size does not run round", { dimension: "treadWidth", readingsMm: [6, 6.6, 6.1] }],
  ] as const)("shows none where %s", (_why, changes) => expect(estimate(changes).flatSpot).toBe(false));
  it("believes the restorer who saw one, and puts back less than it doubts", () => {
    const { flatSpot, asNew, asFound } = estimate({ condition: "flat-spotted" });
    expect(flatSpot).toBe(true);
    expect(asNew.valueMm - asFound.valueMm).toBeCloseTo(0.15, 12);
    expect(2 * asNew.standardUncertaintyMm).toBeGreaterThan(0.15);
  });

  // P(range < r) of n standard normal values = n * integral of pdf(x) (Phi(x + r) - Phi(x))^(n - 1) dx.
  it.each([2, 3, 5, 10, 20])("exceeds the factor for %d readings one time in twenty", (count) => {
    const r = rangeFactor(count);
    let probability = 0;
    const step = 0.005;
    for (let x = -9; x < 9; x += step) {
      const density = Math.exp((-x * x) / 2) / Math.sqrt(2 * Math.PI);
      probability += count * density * (normalCdf(x + r) - normalCdf(x)) ** (count - 1) * step;
    }
    expect(probability).toBeCloseTo(0.95, 3);
  });
});

describe("refusals name the field and say why", () => {
  it.each([
    [{ condition: "slack" }, "condition", "do not become slack"],
    [{ condition: "melted" }, "condition", "no size left to measure"],
    [{ condition: "missing", readingsMm: [] }, "condition", "no size left to measure"],
    [{ dimension: "insideCircumference" }, "dimension", "has no inside circumference"],
    [{ readingsMm: [] }, "readingsMm", "at least one"],
    [{ readingsMm: new Array(101).fill(44) }, "readingsMm", "at most 100"],
    [{ readingsMm: [44, 0] }, "readingsMm/1", "more than zero"],
    [{ readingsMm: [Number.NaN] }, "readingsMm/0", "more than zero"],
    [{ readingsMm: [10_001] }, "readingsMm/0", "10 m"],
    [{ resolutionMm: -1 }, "resolutionMm", "not negative"],
  ] as const)("%j", (changes, field, words) => {
    const { field: refused, words: said } = refusal(changes as Partial<AsNewInput>);
    expect(refused).toBe(field);
    expect(said).toContain(words);
  });
});
