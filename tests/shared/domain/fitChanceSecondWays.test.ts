import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { conformanceProbability } from "#shared/domain/conformance";
import { assessFit } from "#shared/domain/fit";

/** Uniform on (0, 1), the same on every run: mulberry32, a public-domain generator of 32 bits (from memory). */
function seeded(seed: number): () => number {
  let state = seed;
  return () => {
    state = (state + 0x6d2b79f5) | 0;
    let mixed = Math.imul(state ^ (state >>> 15), 1 | state);
    mixed = (mixed + Math.imul(mixed ^ (mixed >>> 7), 61 | mixed)) ^ mixed;
    return (((mixed ^ (mixed >>> 14)) >>> 0) + 0.5) / 2 ** 32;
  };
}
/** A standard normal value (Box and Muller). */
const normalFrom = (random: () => number) => () =>
  Math.sqrt(-2 * Math.log(random())) * Math.cos(2 * Math.PI * random());
/** Four standard deviations of a share that was counted in so many draws: wrong once in 16,000 of such checks. */
const scatter = (share: number, draws: number) => 4 * Math.sqrt((share * (1 - share)) / draws) + 4 / draws;

describe("the fit chance, by throwing dice", () => {
  const draws = 40_000;

  it.each([
    [44.1, 0.1, { lowerMm: 44, upperMm: 44.3 }],
    [44.1, 0.5, { lowerMm: 44, upperMm: 44.3 }],
    [5.47, 0.05, { lowerMm: 5.4 }],
    [4.06, 0.02, { upperMm: 4.05 }],
    [523, 6, { lowerMm: 530, upperMm: 540 }],
  ])("share of sizes round %d mm, u = %d mm, that lie in %j", (estimate, u, band) => {
    const normal = normalFrom(seeded(1));
    const { lowerMm = -Infinity, upperMm = Infinity } = band as { lowerMm?: number; upperMm?: number };
    let inside = 0;
    for (let draw = 0; draw < draws; draw++) {
      const size = estimate + u * normal();
      if (lowerMm <= size && size <= upperMm) inside++;
    }
    const expected = conformanceProbability(estimate, u, band);
    expect(Math.abs(inside / draws - expected)).toBeLessThan(scatter(expected, draws));
  });

  it("share of wheels whose three sizes all fit, need and part each drawn with its own scatter", () => {
    const normal = normalFrom(seeded(2));
    const need = {
      outsideDiameter: { valueMm: 44.1, standardUncertaintyMm: 0.085 },
      bore: { valueMm: 4, standardUncertaintyMm: 0.02 },
      treadWidth: { valueMm: 6, standardUncertaintyMm: 0.1 },
    };
    const part = {
      outsideDiameter: { nominalMm: 44.25, plusMinusMm: 0.15 },
      bore: { nominalMm: 4.03, plusMinusMm: 0.02 },
      treadWidth: { nominalMm: 6.1, plusMinusMm: 0.3 },
    };
    const bands = {
      outsideDiameter: { lowerMm: 43.9, upperMm: 44.4 },
      bore: { lowerMm: 3.98, upperMm: 4.06 },
      treadWidth: { lowerMm: 5.6, upperMm: 6.4 },
    };
    const names = ["outsideDiameter", "bore", "treadWidth"] as const;
    let fitting = 0;
    for (let draw = 0; draw < draws; draw++) {
      const fits = names.every((name) => {
        const needOff = need[name].standardUncertaintyMm * normal();
        const partOff = (part[name].plusMinusMm / Math.sqrt(3)) * normal();
        // What matters is the part against what is needed: a need that is larger than thought shifts its band along.
        const against = part[name].nominalMm + partOff - needOff;
        return bands[name].lowerMm <= against && against <= bands[name].upperMm;
      });
      if (fits) fitting++;
    }
    const chance = assessFit({ kind: "idler-wheel", need, part, bands })!.chance;
    expect(chance).toBeGreaterThan(0.2);
    expect(chance).toBeLessThan(0.8);
    expect(Math.abs(fitting / draws - chance)).toBeLessThan(scatter(chance, draws));
  });
});

describe("the fit chance, by integrating the density", () => {
  it("is the area over the band, one end or two", () => {
    const size = fc.double({ min: -4, max: 4, noNaN: true });
    fc.assert(
      fc.property(size, size, fc.constantFrom("both", "lower", "upper"), (one, other, ends) => {
        const [lower, upper] = [Math.min(one, other), Math.max(one, other)];
        const from = ends === "upper" ? -10 : lower;
        const to = ends === "lower" ? 10 : upper;
        const steps = 4000;
        const width = (to - from) / steps;
        let area = 0;
        for (let i = 0; i < steps; i++) area += Math.exp(-((from + (i + 0.5) * width) ** 2) / 2) * width;
        const band = {
          ...(ends === "upper" ? {} : { lowerMm: 10 + 0.3 * lower }),
          ...(ends === "lower" ? {} : { upperMm: 10 + 0.3 * upper }),
        };
        const found = conformanceProbability(10, 0.3, band);
        expect(Math.abs(found - area / Math.sqrt(2 * Math.PI))).toBeLessThan(1e-5);
      }),
      { seed: 51, numRuns: 60 },
    );
  });
});

describe("the best chance over every nominal that could be offered", () => {
  it("never rises with a wider tolerance", () => {
    const best = (standardUncertaintyMm: number, plusMinusMm: number, lowerMm: number, upperMm: number) => {
      let most = 0;
      const step = (upperMm - lowerMm) / 100;
      for (let nominalMm = lowerMm - 50 * step; nominalMm <= upperMm + 50 * step; nominalMm += step) {
        const fit = assessFit({
          kind: "idler-wheel",
          need: { outsideDiameter: { valueMm: 44, standardUncertaintyMm } },
          part: { outsideDiameter: { nominalMm, plusMinusMm } },
          bands: { outsideDiameter: { lowerMm, upperMm } },
        });
        most = Math.max(most, fit!.chance);
      }
      return most;
    };
    const length = (max: number) => fc.double({ min: 0.001, max, noNaN: true });
    fc.assert(
      fc.property(length(1), length(1), length(1), length(2), (u, plusMinus, wider, half) => {
        const [narrow, wide] = [plusMinus, plusMinus + wider].map((t) => best(u, t, 44 - half, 44 + half)) as [
          number,
          number,
        ];
        expect(wide).toBeLessThanOrEqual(narrow + 1e-12);
      }),
      { seed: 52, numRuns: 60 },
    );
  });
});
