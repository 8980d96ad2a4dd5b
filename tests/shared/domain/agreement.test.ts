import { describe, expect, it } from "vitest";
import { agreement } from "#shared/domain/agreement";
import { DomainError } from "#shared/domain/DomainError";

const of = (valueMm: number, standardUncertaintyMm: number) => ({ valueMm, standardUncertaintyMm });

describe("agreement (ISO 13528:2015 9.6 and 9.7, formulas from memory)", () => {
  it.each([
    // The uncertainties are 3-4-5 triangles, so that the scores can be reckoned in the head.
    [of(44.5, 0.3), of(44, 0.4), 1, 0.5, true],
    [of(44, 0.3), of(44.5, 0.4), -1, -0.5, true],
    [of(45, 0.3), of(44, 0.4), 2, 1, true],
    [of(45.25, 0.3), of(44, 0.4), 2.5, 1.25, false],
    [of(44, 0.3), of(44, 0), 0, 0, true],
    [of(44.75, 0.25), of(44, 0), 3, 1.5, false],
  ])("%j against %j: zeta %d, En %d, agrees %s", (one, other, zeta, en, agrees) => {
    const found = agreement(one, other);
    expect(found.zeta).toBeCloseTo(zeta, 9);
    expect(found.en).toBeCloseTo(en, 9);
    if (zeta !== 2) expect(found.agrees).toBe(agrees);
  });
  it("counts a score of exactly 2 as agreeing", () => {
    expect(agreement(of(46, 1), of(44, 0))).toEqual({ zeta: 2, en: 1, agrees: true });
  });
  it.each([
    ["one/valueMm", of(Number.NaN, 1), of(44, 1)],
    ["other/valueMm", of(44, 1), of(1e308, 1)],
    ["one/standardUncertaintyMm", of(44, -1), of(44, 1)],
    ["other/standardUncertaintyMm", of(44, 1), of(44, Infinity)],
    ["other/standardUncertaintyMm", of(44, 0), of(44, 0)],
    ["other/standardUncertaintyMm", of(44, 5e-324), of(45, 5e-324)],
  ])("refuses by %s", (field, one, other) => {
    expect(() => agreement(one, other)).toThrow(expect.objectContaining({ field }));
    expect(() => agreement(one, other)).toThrow(DomainError);
  });
});
