import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { conformanceProbability } from "#shared/domain/conformance";
import { DomainError } from "#shared/domain/DomainError";
import { fitWindow } from "#shared/domain/fitWindow";
import { rectangular, rootSumSquare } from "#shared/domain/uncertainty";

const band = { lowerMm: 43.65, upperMm: 44.65 };

describe("fitWindow", () => {
  it("is the band itself from a chance of 0.5 up", () => {
    for (const minChance of [0.5, 0.6, 0.9, 1]) {
      const { lowerMm, upperMm, reachPerPlusMinus } = fitWindow(band, 0.1, minChance);
      expect(lowerMm).toBeCloseTo(43.65, 6);
      expect(upperMm).toBeCloseTo(44.65, 6);
      expect(reachPerPlusMinus).toBeCloseTo(0, 12);
    }
  });
  it("reaches z u beyond the band below that: z = 0.8416 for 0.2", () => {
    const { lowerMm, upperMm, reachPerPlusMinus } = fitWindow(band, 0.1, 0.2);
    expect(lowerMm).toBeCloseTo(43.65 - 0.08416212, 6);
    expect(upperMm).toBeCloseTo(44.65 + 0.08416212, 6);
    expect(reachPerPlusMinus).toBeCloseTo(0.8416212336 / Math.sqrt(3), 8);
  });
  it("bounds nothing for a chance of 0, and stays open where the band is", () => {
    expect(fitWindow(band, 0.1, 0)).toEqual({ lowerMm: -Infinity, upperMm: Infinity, reachPerPlusMinus: 0 });
    expect(fitWindow({ upperMm: 4 }, 0.1, 0.2).lowerMm).toBe(-Infinity);
  });

  const size = fc.double({ min: 0.5, max: 2000, noNaN: true });
  const spread = fc.oneof(fc.constant(0), fc.double({ min: 1e-6, max: 5, noNaN: true }));
  // Evenly over the range: doubles by their bits would nearly all lie at 0.
  const offset = fc.integer({ min: -3_000_000, max: 3_000_000 }).map((millionths) => millionths / 1e6);
  it("never drops a part that reaches the chance, however near the window's edge", () => {
    fc.assert(
      fc.property(
        size,
        spread,
        spread,
        spread,
        offset,
        fc.boolean(),
        (lowerMm, width, uNeed, plusMinus, steps, top) => {
          const upperMm = lowerMm + width;
          const u = rootSumSquare([uNeed, rectangular(plusMinus)]);
          const nominal = (top ? upperMm : lowerMm) + steps * u;
          const chance = conformanceProbability(nominal, u, { lowerMm, upperMm });
          // The hardest question is about the very chance that this part has.
          for (const minChance of [chance, chance * 0.999, 0.2, 0.5, 0.6, 0.9]) {
            if (chance < minChance) continue;
            const window = fitWindow({ lowerMm, upperMm }, uNeed, minChance);
            const reach = window.reachPerPlusMinus * plusMinus;
            expect(nominal - reach).toBeLessThanOrEqual(window.upperMm);
            expect(nominal + reach).toBeGreaterThanOrEqual(window.lowerMm);
          }
        },
      ),
      { numRuns: 3000, seed: 8 },
    );
  });
  it("allows for rounding: a hair outside the band the chance can still come out as 0.5", () => {
    const nominal = 1 + Number.EPSILON;
    expect(conformanceProbability(nominal, 1000, { upperMm: 1 })).toBe(0.5);
    expect(nominal).toBeLessThanOrEqual(fitWindow({ upperMm: 1 }, 1000, 0.5).upperMm);
  });
  it("is tight: a part without tolerance just outside it misses the chance", () => {
    fc.assert(
      fc.property(fc.double({ min: 0.05, max: 0.49, noNaN: true }), (minChance) => {
        const wide = { lowerMm: 10, upperMm: 100 };
        const { upperMm } = fitWindow(wide, 0.1, minChance);
        expect(conformanceProbability(upperMm + 1e-5, 0.1, wide)).toBeLessThan(minChance);
      }),
      { seed: 9 },
    );
  });
  it.each([
    ["minChance", band, 0.1, 1.1],
    ["minChance", band, 0.1, Number.NaN],
    ["uNeedMm", band, -0.1, 0.5],
    ["uNeedMm", band, Infinity, 0.9],
    ["band/lowerMm", { lowerMm: 5, upperMm: 4 }, 0.1, 0.5],
  ] as const)("refuses a wrong %s", (field, wrongBand, u, minChance) => {
    expect(() => fitWindow(wrongBand, u, minChance)).toThrow(expect.objectContaining({ field }));
    expect(() => fitWindow(wrongBand, u, minChance)).toThrow(DomainError);
  });
});
