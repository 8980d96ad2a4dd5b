import { describe, expect, it } from "vitest";
import { meanOf, ofMean, ofStep, rectangular, rootSumSquare, standardDeviation } from "#shared/domain/uncertainty";
import cases from "../../reference/uncertainty.json";

function caseOf(id: string) {
  const found = cases.find((c) => c.id === id);
  if (!found) throw new Error(`no case ${id}`);
  return found;
}
const digits = (value: number, expected: number) => expect(Math.abs(value / expected - 1)).toBeLessThan(1e-9);

describe("uncertainty terms against the reference", () => {
  it("rectangular: EURACHEM/CITAC guide Appendix E.1, 1.5 / sqrt 3 = 0.87", () => {
    digits(rectangular(caseOf("unc-01-eurachem").inputs.half_width!), 0.866025403784);
  });
  it("rectangular: JCGM 100:2008 4.3.7, copper, u = 0.15e-6 (from memory)", () => {
    digits(rectangular(caseOf("unc-02-gum-copper").inputs.half_width!), 1.50111069989e-7);
  });
  it("permissible error as a rectangular half-width (from memory)", () => {
    digits(rectangular(caseOf("unc-03-mpe").inputs.mpe_mm!), 0.0173205080757);
  });
  it("step: JCGM 100:2008 F.2.2.1, 0.29 q (from memory)", () => {
    digits(ofStep(caseOf("unc-04-resolution").inputs.resolution_mm!), 0.00288675134595);
  });
  it("repeat readings: JCGM 100:2008 4.2 (from memory)", () => {
    const { inputs, expected } = caseOf("unc-05-repeat");
    expect(meanOf(inputs.readings!)).toBeCloseTo(expected.mean!, 12);
    expect(standardDeviation(inputs.readings!)).toBeCloseTo(expected.s!, 9);
    expect(ofMean(inputs.readings!)).toBeCloseTo(expected.u_mean!, 9);
  });
  it("combined: JCGM 100:2008 5.1.2 (from memory)", () => {
    const { mpe_half_width_mm, resolution_mm, readings_mm } = caseOf("unc-06-combined").inputs.components!;
    const u = rootSumSquare([rectangular(mpe_half_width_mm), ofStep(resolution_mm), ofMean(readings_mm)]);
    expect(u).toBeCloseTo(0.0191485421551, 9);
  });
  it("combined: string example of NPL Good Practice Guide 11 (from memory), 6.4 mm printed", () => {
    const { inputs, expected } = caseOf("unc-07-npl-string");
    expect(rootSumSquare(inputs.standard_uncertainties_mm!)).toBeCloseTo(expected.u_c_mm!, 9);
  });
});

describe("readings", () => {
  it("gives equal readings their own value as mean and no scatter", () => {
    expect(meanOf([44.1, 44.1, 44.1])).toBe(44.1);
    expect(ofMean([44.1, 44.1, 44.1])).toBe(0);
  });
  it("has no scatter for one reading", () => expect(ofMean([44.1])).toBe(0));
});
