import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { DomainError } from "#shared/domain/DomainError";
import { wilsonInterval } from "#shared/domain/wilsonInterval";

describe("wilsonInterval", () => {
  // R. G. Newcombe, "Two-sided confidence intervals for the single proportion", Statistics in Medicine 17 (1998) 857-872,
  // Table I, score method without continuity correction (printed values from memory).
  it.each([
    [81, 263, 0.2553, 0.3662],
    [15, 148, 0.0624, 0.1605],
    [0, 20, 0, 0.1611],
    [1, 29, 0.0061, 0.1718],
  ])("%d of %d: %d to %d", (successes, trials, lower, upper) => {
    const found = wilsonInterval(successes, trials);
    expect(found.rate).toBe(successes / trials);
    expect(Math.abs(found.lower - lower)).toBeLessThan(0.00005 + 1e-9);
    expect(Math.abs(found.upper - upper)).toBeLessThan(0.00005 + 1e-9);
  });

  it("ends where the score test just rejects: |rate - p| = z sqrt(p (1 - p) / n), the equation that it solves", () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 100_000 }), fc.double({ min: 0, max: 1, noNaN: true }), (trials, share) => {
        const successes = Math.round(share * trials);
        const { rate, lower, upper } = wilsonInterval(successes, trials, 2);
        expect(lower).toBeLessThanOrEqual(rate);
        expect(rate).toBeLessThanOrEqual(upper);
        for (const end of [lower, upper]) {
          const reach = 2 * Math.sqrt((end * (1 - end)) / trials);
          if (end > 0 && end < 1) expect(Math.abs(Math.abs(rate - end) - reach)).toBeLessThan(1e-9);
        }
      }),
      { seed: 31 },
    );
  });
  it("mirrors, ends at 0 and 1, and narrows with more trials", () => {
    const [few, many] = [wilsonInterval(3, 4), wilsonInterval(300, 400)];
    const mirrored = wilsonInterval(1, 4);
    expect(mirrored.lower).toBeCloseTo(1 - few.upper, 12);
    expect(many.upper - many.lower).toBeLessThan((few.upper - few.lower) / 5);
    expect(wilsonInterval(0, 7).lower).toBe(0);
    expect(wilsonInterval(7, 7).upper).toBe(1);
    expect(wilsonInterval(Number.MAX_SAFE_INTEGER, Number.MAX_SAFE_INTEGER).lower).toBeLessThanOrEqual(1);
    expect(wilsonInterval(3, 4, 0)).toEqual({ rate: 0.75, lower: 0.75, upper: 0.75 });
  });
  it.each([
    ["trials", 0, 0, 2],
    ["trials", 0, 1.5, 2],
    ["trials", 0, Number.NaN, 2],
    ["trials", 0, Infinity, 2],
    ["successes", -1, 4, 2],
    ["successes", 0.5, 4, 2],
    ["successes", 5, 4, 2],
    ["z", 1, 4, -1],
    ["z", 1, 4, Number.NaN],
    ["z", 1, 4, 1e308],
  ])("refuses a wrong %s", (field, successes, trials, z) => {
    expect(() => wilsonInterval(successes, trials, z)).toThrow(expect.objectContaining({ field }));
    expect(() => wilsonInterval(successes, trials, z)).toThrow(DomainError);
  });
});
