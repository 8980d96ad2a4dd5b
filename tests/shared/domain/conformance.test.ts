import { describe, expect, it } from "vitest";
import { conformanceProbability } from "#shared/domain/conformance";
import { DomainError } from "#shared/domain/DomainError";
import { normalCdf, normalQuantile } from "#shared/domain/normalDistribution";
import cases from "../../reference/conformity.json";

describe("the normal distribution", () => {
  // Reckoned with 40 digits by an independent arbitrary-precision library.
  it.each([
    [-8, 6.220960574271784e-16],
    [-5, 2.866515718791939e-7],
    [-3, 0.0013498980316300946],
    [-1.96, 0.024997895148220435],
    [-1, 0.15865525393145705],
    [-0.1, 0.460172162722971],
    [0, 0.5],
    [0.5, 0.6914624612740131],
    [2, 0.9772498680518208],
    [3.5, 0.9997673709209645],
    [6, 0.9999999990134123],
  ])("Phi(%d)", (z, p) => expect(Math.abs(normalCdf(z) - p)).toBeLessThan(4e-16));
  it.each([
    [0.001, -3.0902323061678136],
    [0.01, -2.326347874040841],
    [0.2, -0.8416212335729142],
    [0.5, 0],
    [0.6, 0.2533471031357998],
    [0.9, 1.2815515655446004],
    [0.95, 1.6448536269514726],
    [0.000001, -4.753424308822899],
    [1e-20, -9.262340089798407],
    [1e-300, -37.0470962993612],
  ])("quantile(%d)", (p, z) => expect(Math.abs(normalQuantile(p) - z)).toBeLessThan(1e-11));
});

describe("conformanceProbability", () => {
  const caseOf = (id: string) => cases.find((c) => c.id === id)!;

  it("Zener diode, one upper limit: JCGM 106:2012 7.3 example (from memory), 0.92 printed", () => {
    const { inputs, expected } = caseOf("conf-07-probability");
    const p = conformanceProbability(inputs.y!, inputs.u!, { upperMm: inputs.upper_limit! });
    expect(p).toBeCloseTo(expected.conformance_probability!, 6);
  });
  it("two limits: JCGM 106:2012 7.4 formula (from memory)", () => {
    const { inputs, expected } = caseOf("conf-09-two-sided-probability");
    const p = conformanceProbability(inputs.y!, inputs.u!, { lowerMm: inputs.LSL!, upperMm: inputs.USL! });
    expect(p).toBeCloseTo(expected.conformance_probability!, 9);
  });
  it("speed limit: JCGM 106:2012 example (from memory), rejected from 107 km/h", () => {
    const { inputs, expected } = caseOf("conf-08-police");
    const speed = expected.rejection_limit!;
    const p = conformanceProbability(speed, inputs.relative_u! * speed, { upperMm: inputs.limit! });
    expect(p).toBeCloseTo(inputs.probability_of_being_below_limit!, 6);
  });
  it("mirrors: one lower limit", () => {
    expect(conformanceProbability(5.47, 0.05, { lowerMm: 5.4 })).toBeCloseTo(0.919243340766, 9);
  });
  it("keeps its digits far above the band as far below it", () => {
    const below = conformanceProbability(-8, 1, { lowerMm: 0, upperMm: 1 });
    const above = conformanceProbability(8, 1, { lowerMm: -1, upperMm: 0 });
    expect(above).toBe(below);
    expect(above).toBeGreaterThan(6e-16);
  });
  it("without uncertainty is in or out, ends included", () => {
    const band = { lowerMm: 3.97, upperMm: 4.05 };
    expect([3.96, 3.97, 4, 4.05, 4.06].map((size) => conformanceProbability(size, 0, band))).toEqual([0, 1, 1, 1, 0]);
  });
  it.each([
    ["standardUncertaintyMm", 4, -1, { lowerMm: 3 }],
    ["standardUncertaintyMm", 4, Number.NaN, { lowerMm: 3 }],
    ["lowerMm", 4, 0.1, {}],
    ["lowerMm", 4, 0.1, { lowerMm: 5, upperMm: 3 }],
    ["estimateMm", Number.NaN, 0.1, { lowerMm: 3 }],
  ] as const)("refuses a wrong %s", (field, estimate, u, band) => {
    expect(() => conformanceProbability(estimate, u, band)).toThrow(expect.objectContaining({ field }));
    expect(() => conformanceProbability(estimate, u, band)).toThrow(DomainError);
  });
});
