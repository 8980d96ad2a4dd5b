import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { type CheckInInput, checkIn } from "#shared/domain/checkIn";
import { DomainError } from "#shared/domain/DomainError";
import { instruments } from "#shared/domain/instruments";
import { normalQuantile } from "#shared/domain/normalDistribution";
import cases from "../../reference/conformity.json";

const delivered: CheckInInput = { readingsMm: [44.1], standardUncertaintyMm: 0.1, nominalMm: 44, plusMinusMm: 0.5 };
const verdict = (changes: Partial<CheckInInput>) => checkIn({ ...delivered, ...changes }).verdict;
const caseOf = (id: string) => cases.find((c) => c.id === id)!;

/** The cases state expanded uncertainties U: as a guard band that is a factor of 1 with u = U. */
const guardedBy = (U: number) => ({ standardUncertaintyMm: U, guardFactor: 1 });

describe("checkIn against the reference cases (ILAC-G8:09/2019 4.2.1-4.2.3 and a published example of it)", () => {
  it.each([
    ["conf-01-pass", "conforms"],
    ["conf-02-grey-in", "cannot-tell"],
    ["conf-03-grey-out", "cannot-tell"],
    ["conf-04-fail", "does-not-conform"],
  ] as const)("%s %s", (id, expected) => {
    const { mpe, deviation, U } = caseOf(id).inputs;
    for (const side of [1, -1]) {
      const readingsMm = [10 + side * deviation!];
      expect(verdict({ readingsMm, nominalMm: 10, plusMinusMm: mpe!, ...guardedBy(U!) })).toBe(expected);
    }
  });
  it("proves conformity from end to end of the acceptance zone and no further", () => {
    const { inputs, expected } = caseOf("conf-05-two-sided");
    const { LSL, USL, y, U } = inputs;
    const limits = { nominalMm: (LSL! + USL!) / 2, plusMinusMm: (USL! - LSL!) / 2, ...guardedBy(U!) };
    const [from, to] = expected.acceptance_zone!;
    expect(verdict({ ...limits, readingsMm: [y!] })).toBe("cannot-tell");
    for (const inside of [from!, to!]) expect(verdict({ ...limits, readingsMm: [inside] })).toBe("conforms");
    for (const outside of [from! - 1e-6, to! + 1e-6]) {
      expect(verdict({ ...limits, readingsMm: [outside] })).toBe("cannot-tell");
    }
  });
  it("can never prove conformity where the guard band is wider than the tolerance", () => {
    const { LSL, USL, U } = caseOf("conf-06-no-zone").inputs;
    for (let y = LSL! - 0.1; y < USL! + 0.1; y += 0.001) {
      expect(verdict({ readingsMm: [y], nominalMm: 10, plusMinusMm: 0.05, ...guardedBy(U!) })).not.toBe("conforms");
    }
  });
  it("accepts up to 1.645 u before the limit where that is asked for (from memory)", () => {
    const { inputs, expected } = caseOf("conf-10-guard-1p65");
    const guardFactor = normalQuantile(0.95);
    expect(guardFactor).toBeCloseTo(expected.guard_band_factor!, 9);
    const at = (reading: number) =>
      verdict({
        readingsMm: [reading],
        nominalMm: 10,
        plusMinusMm: 0.05,
        standardUncertaintyMm: inputs.u!,
        guardFactor,
      });
    expect(at(expected.acceptance_limit! - 1e-6)).toBe("conforms");
    expect(at(expected.acceptance_limit! + 1e-6)).toBe("cannot-tell");
  });
});

describe("checkIn", () => {
  it("guards with 1.65 u by default, and tells what it reckoned with", () => {
    const found = checkIn({ ...delivered, readingsMm: [44, 44.2] });
    expect(found.verdict).toBe("conforms");
    expect(found.meanMm).toBeCloseTo(44.1, 12);
    expect(found.standardUncertaintyMm).toBe(0.1);
    expect(found.guardBandMm).toBeCloseTo(0.165, 12);
  });
  it.each([
    [44.335, "conforms"],
    [43.665, "conforms"],
    [44.3351, "cannot-tell"],
    [44.5, "cannot-tell"],
    [44.665, "cannot-tell"],
    [43.335, "cannot-tell"],
    [44.6651, "does-not-conform"],
    [43.3349, "does-not-conform"],
  ] as const)("%d mm of 44 ± 0.5 mm with u = 0.1 mm: %s", (reading, expected) => {
    expect(verdict({ readingsMm: [reading] })).toBe(expected);
  });
  it("is not misled by binary fractions at a limit", () => {
    // 0.1 + 0.2 lies above 0.3 in doubles.
    const edge = { readingsMm: [0.1 + 0.2], nominalMm: 0.2, plusMinusMm: 0.1, standardUncertaintyMm: 0 };
    expect(verdict(edge)).toBe("conforms");
    expect(verdict({ readingsMm: [44], nominalMm: 44, plusMinusMm: 0, standardUncertaintyMm: 0 })).toBe("conforms");
  });
  it("counts the give of rubber: a calliper's own error is the least that u can be", () => {
    const { standardUncertaintyMm } = checkIn({
      readingsMm: [44.1],
      instrument: "digital-caliper",
      nominalMm: 44,
      plusMinusMm: 0.5,
    });
    // JCGM 100:2008 5.1.2: MPE 0.02 (DIN 862) / sqrt 3, step 0.01 / (2 sqrt 3), 0.03 for soft rubber.
    expect(standardUncertaintyMm).toBeCloseTo(Math.sqrt(0.02 ** 2 / 3 + 0.01 ** 2 / 12 + 0.03 ** 2), 12);
  });
  it("cannot tell with a rule what a calliper can", () => {
    const by = (instrument: "steel-rule" | "digital-caliper") =>
      checkIn({ readingsMm: [44.1], instrument, nominalMm: 44, plusMinusMm: 0.3 }).verdict;
    expect([by("digital-caliper"), by("steel-rule")]).toEqual(["conforms", "cannot-tell"]);
  });

  it("gives finite numbers or names the field, whatever comes in", () => {
    const hostile = fc.constantFrom(Number.NaN, Infinity, -Infinity, 0, -1, 1e308, 5e-324, 10_000, 44, 0.1, 1);
    fc.assert(
      fc.property(
        fc.array(hostile, { maxLength: 3 }),
        fc.option(fc.constantFrom(...instruments), { nil: undefined }),
        fc.option(hostile, { nil: undefined }),
        fc.tuple(hostile, hostile, hostile),
        (readingsMm, instrument, standardUncertaintyMm, [nominalMm, plusMinusMm, guardFactor]) => {
          try {
            const input = { readingsMm, instrument, standardUncertaintyMm, nominalMm, plusMinusMm, guardFactor };
            const { meanMm, guardBandMm, standardUncertaintyMm: u } = checkIn(input);
            for (const value of [meanMm, guardBandMm, u]) expect(Number.isFinite(value)).toBe(true);
          } catch (error) {
            expect(error).toBeInstanceOf(DomainError);
          }
        },
      ),
      { seed: 41, numRuns: 2000 },
    );
  });
  it.each([
    ["instrument", { standardUncertaintyMm: undefined }],
    ["standardUncertaintyMm", { instrument: "string" }],
    ["standardUncertaintyMm", { standardUncertaintyMm: -0.1 }],
    ["standardUncertaintyMm", { standardUncertaintyMm: Number.NaN }],
    ["nominalMm", { nominalMm: 0 }],
    ["plusMinusMm", { plusMinusMm: -0.1 }],
    ["guardFactor", { guardFactor: 5.1 }],
    ["readingsMm", { readingsMm: [] }],
    ["readingsMm/0", { readingsMm: [0] }],
  ] as const)("refuses by %s: %j", (field, changes) => {
    expect(() => checkIn({ ...delivered, ...changes })).toThrow(expect.objectContaining({ field }));
  });
});
