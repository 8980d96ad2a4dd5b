import { describe, expect, it } from "vitest";
import { DomainError } from "#shared/domain/DomainError";
import { type Instrument, instruments } from "#shared/domain/instruments";
import { permissibleError } from "#shared/domain/permissibleError";
import cases from "../../reference/instrumentMpe.json";

// The reference names instruments as its sources do; class I rules are not among ours.
const asked: Record<string, [Instrument, number, { inside?: boolean; fromEnd?: boolean }?]> = {
  "mpe-01": ["digital-caliper", 80],
  "mpe-02": ["digital-caliper", 150],
  "mpe-03": ["vernier-caliper", 150],
  "mpe-04-inside": ["digital-caliper", 80, { inside: true }],
  "mpe-05": ["micrometer", 25],
  "mpe-06": ["micrometer", 75],
  "mpe-07-rule": ["steel-rule", 300],
  "mpe-09-rule-end": ["steel-rule", 300, { fromEnd: true }],
};

describe("permissibleError", () => {
  const known = cases.filter(({ id }) => id in asked);
  it("finds every case it means to check", () => expect(known.length).toBe(Object.keys(asked).length));
  it.each(known.map((c) => [c.id, c.source, c.expected.mpe_mm] as const))("%s, %s: %d mm", (id, _source, mpe) => {
    expect(permissibleError(...asked[id]!).plusMinusMm).toBeCloseTo(mpe, 9);
  });

  // DIN 862: 20 um to 100 mm, 30 um to 600 mm; with a 0.05 mm vernier 50 um to 300 mm, 60 um at 400 mm.
  // DIN 863-1: 4 um to 50 mm, 5 um to 100 mm, 6 um to 150 mm. UK SI 2016/1153 Sch. 1I class II: 0.3 + 0.2 L.
  it.each([
    ["digital-caliper", 100, 0.02],
    ["digital-caliper", 100.1, 0.03],
    ["digital-caliper", 600, 0.03],
    ["dial-caliper", 44, 0.02],
    ["vernier-caliper", 300, 0.05],
    ["vernier-caliper", 400, 0.06],
    ["micrometer", 50, 0.004],
    ["micrometer", 50.1, 0.005],
    ["micrometer", 150, 0.006],
    ["steel-rule", 1000, 0.5],
    ["tape-measure", 1001, 0.7],
    ["tape-measure", 2500, 0.9],
  ] as const)("%s at %d mm: ± %d mm", (instrument, size, expected) => {
    expect(permissibleError(instrument, size).plusMinusMm).toBe(expected);
  });

  it("adds 20 um for the inside jaws of callipers only", () => {
    expect(permissibleError("digital-caliper", 4, { inside: true }).plusMinusMm).toBe(0.04);
    expect(permissibleError("vernier-caliper", 4, { inside: true }).plusMinusMm).toBe(0.07);
    expect(permissibleError("micrometer", 4, { inside: true }).plusMinusMm).toBe(0.004);
  });

  it("never promises more at a larger size, and always says where its figure comes from", () => {
    for (const instrument of instruments) {
      let last = 0;
      for (let size = 1; size <= 10_000; size += 13) {
        const { plusMinusMm, source } = permissibleError(instrument, size);
        expect(plusMinusMm).toBeGreaterThanOrEqual(last);
        expect(source).not.toBe("");
        last = plusMinusMm;
      }
    }
    expect(permissibleError("string", 620).source).toBe("common practice, no source");
    expect(permissibleError("digital-caliper", 900).source).toContain("carried on");
  });

  it.each([0, -1, Number.NaN, Infinity])("refuses a size of %d", (size) => {
    expect(() => permissibleError("string", size)).toThrow(DomainError);
  });
});
