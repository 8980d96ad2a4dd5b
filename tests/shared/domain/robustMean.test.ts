import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { DomainError } from "#shared/domain/DomainError";
import { robustMean } from "#shared/domain/robustMean";

/** Algorithm A written down again as the standard tells it, for a fixed number of rounds. */
function byTheBook(values: readonly number[], rounds: number): { mean: number; sd: number } {
  const x = [...values].sort((a, b) => a - b);
  const p = x.length;
  const middle = (sorted: number[]) => (sorted[Math.floor((p - 1) / 2)]! + sorted[Math.ceil((p - 1) / 2)]!) / 2;
  const deviation = (list: number[], from: number) =>
    Math.sqrt(list.reduce((sum, value) => sum + (value - from) ** 2, 0) / (p - 1));
  const average = (list: number[]) => list.reduce((a, b) => a + b, 0) / p;
  let mean = middle(x);
  let sd = 1.483 * middle(x.map((value) => Math.abs(value - mean)).sort((a, b) => a - b));
  if (sd === 0) sd = deviation(x, average(x));
  for (let round = 0; round < rounds; round++) {
    const delta = 1.5 * sd;
    const star = x.map((value) => Math.min(Math.max(value, mean - delta), mean + delta));
    mean = average(star);
    sd = 1.134 * deviation(star, mean);
  }
  return { mean, sd };
}

// Analytical Methods Committee, "Robust statistics - how not to reject outliers", Analyst 114 (1989) 1693-1702: copper in
// wholemeal flour. The data and the printed answer of its method with k = 1.5 (3.21 and 0.67) are from memory.
const flour = [
  2.2, 2.2, 2.4, 2.4, 2.5, 2.7, 2.8, 2.9, 3.03, 3.03, 3.1, 3.37, 3.4, 3.4, 3.4, 3.5, 3.6, 3.7, 3.7, 3.7, 3.7, 3.77,
  5.28, 28.95,
];
const bits = fc.oneof(fc.integer({ min: 1, max: 6 }), fc.double({ min: 1, max: 100, noNaN: true }));
const lists = fc.array(bits, { minLength: 2, maxLength: 24 });

describe("robustMean", () => {
  it("gives the published answer for the copper in flour (from memory)", () => {
    const { robustMeanMm, robustSdMm, n } = robustMean(flour);
    expect(robustMeanMm.toFixed(2)).toBe("3.21");
    expect(robustSdMm.toFixed(2)).toBe("0.67");
    expect(n).toBe(24);
  });
  it("agrees with the standard's stop at the third figure (ISO 13528:2015 C.3.1)", () => {
    const stopped = byTheBook(flour, 8);
    const { robustMeanMm, robustSdMm } = robustMean(flour);
    expect(robustMeanMm.toPrecision(3)).toBe(stopped.mean.toPrecision(3));
    expect(robustSdMm.toPrecision(3)).toBe(stopped.sd.toPrecision(3));
  });
  it("ends where three thousand rounds of the standard's own steps end", () => {
    fc.assert(
      fc.property(lists, (values) => {
        const { mean, sd } = byTheBook(values, 3000);
        const { robustMeanMm, robustSdMm } = robustMean(values);
        expect(Math.abs(robustMeanMm - mean)).toBeLessThan(1e-8);
        expect(Math.abs(robustSdMm - sd)).toBeLessThan(1e-8);
      }),
      { seed: 11, numRuns: 100 },
    );
  });
  it("is the mean where nothing is drawn in, with 1.25 s* / sqrt(p)", () => {
    const { robustMeanMm, robustSdMm, standardUncertaintyMm, iterations } = robustMean([43.9, 44, 44.1]);
    expect(robustMeanMm).toBeCloseTo(44, 12);
    expect(robustSdMm).toBeCloseTo(1.134 * 0.1, 12);
    expect(standardUncertaintyMm).toBeCloseTo((1.25 * 0.1134) / Math.sqrt(3), 12);
    expect(iterations).toBe(2);
  });

  it("hardly moves for one wild value, however wild", () => {
    const around = [44.05, 44.1, 44.12, 44.08, 44.11, 44.07, 44.09];
    const wild = robustMean([...around, 9000]);
    expect(wild).toEqual({ ...robustMean([...around, 50]), iterations: wild.iterations });
    expect(Math.abs(wild.robustMeanMm - 44.09)).toBeLessThan(0.03);
  });
  it("takes the sample's own spread where more than half are equal, and ends at their value", () => {
    expect(robustMean([44, 44, 44, 44, 44, 44, 44, 45])).toMatchObject({ robustMeanMm: 44, robustSdMm: 0 });
    expect(robustMean([44, 44])).toMatchObject({ robustMeanMm: 44, robustSdMm: 0, iterations: 0 });
    const { robustMeanMm, robustSdMm } = robustMean([1, 1, 1, 1, 2, 2, 2]);
    expect(robustMeanMm).toBeCloseTo(10 / 7, 12);
    expect(robustSdMm).toBeGreaterThan(0.6);
  });

  it("does not care for the order, and follows a shift and a scale", () => {
    fc.assert(
      fc.property(lists, fc.integer({ min: 1, max: 1000 }), (values, shift) => {
        const { robustMeanMm, robustSdMm } = robustMean(values);
        expect(robustMean(values.toReversed())).toEqual(robustMean(values));
        const shifted = robustMean(values.map((value) => value + shift));
        expect(Math.abs(shifted.robustMeanMm - shift - robustMeanMm)).toBeLessThan(1e-8);
        expect(Math.abs(shifted.robustSdMm - robustSdMm)).toBeLessThan(1e-8);
        const doubled = robustMean(values.map((value) => value * 8));
        expect(doubled.robustMeanMm).toBe(8 * robustMeanMm);
        expect(doubled.robustSdMm).toBe(8 * robustSdMm);
      }),
      { seed: 12, numRuns: 300 },
    );
  });
  it("ends for any lengths, also two camps that pull at each other and the smallest doubles", () => {
    const camps = [...Array.from({ length: 14 }, (_, i) => 10 + i / 100), ...Array.from({ length: 6 }, () => 20)];
    for (const values of [
      camps,
      [5e-324, 5e-324, 1e-323],
      [5e-324, 10_000],
      Array.from({ length: 10_000 }, (_, i) => i + 1),
    ]) {
      const { robustMeanMm, robustSdMm, iterations } = robustMean(values);
      expect(robustMeanMm > 0 && robustMeanMm <= 10_000 && robustSdMm >= 0 && Number.isFinite(robustSdMm)).toBe(true);
      expect(iterations).toBeLessThan(500 + 200_000 / values.length + 1);
    }
  });

  it.each([
    [[], "valuesMm"],
    [[44], "valuesMm"],
    [new Array(10_001).fill(44), "valuesMm"],
    [[44, 0], "valuesMm/1"],
    [[44, -1], "valuesMm/1"],
    [[Number.NaN, 44], "valuesMm/0"],
    [[44, Infinity], "valuesMm/1"],
    [[44, 1e308], "valuesMm/1"],
  ])("refuses case %#", (values, field) => {
    expect(() => robustMean(values)).toThrow(expect.objectContaining({ field }));
    expect(() => robustMean(values)).toThrow(DomainError);
  });
});
