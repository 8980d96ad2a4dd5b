import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { DomainError } from "#shared/domain/DomainError";
import {
  classBPlusMinusMm,
  empiricalLossPercent,
  oRingOnSeat,
  oRingsForPath,
  stretchAdvice,
  thinRingLossPercent,
} from "#shared/domain/oRingStretch";
import { stretchPercentOf } from "#shared/domain/oRings";
import beltCases from "../../reference/beltStretch.json";
import cases from "../../reference/oRingStretch.json";

const caseOf = (id: string) => cases.find((c) => c.id === id)!;
const beltCase = (id: string) => beltCases.find((c) => c.id === id)!;
const hostile = [0, -1, Number.NaN, Infinity, -Infinity, 5e-324, 1e308];

describe("oRingOnSeat", () => {
  it.each(["ostr-01", "ostr-02"])("%s: stretch on a seat", (id) => {
    const { inputs, expected } = caseOf(id);
    const seat = { insideDiameterMm: inputs.oring_id!, sectionMm: 3.53, seatMm: inputs.seat_diameter! };
    const { stretchPercent } = oRingOnSeat(seat);
    expect(stretchPercent).toBeCloseTo(expected.stretch_pct!, 9);
    expect(stretchPercent <= stretchAdvice.seat.max).toBe(expected.within_5_pct ?? true);
  });
  it("ostr-03: section left by constant volume", () => {
    const { inputs, expected } = caseOf("ostr-03-constant-volume");
    const left = oRingOnSeat({
      insideDiameterMm: inputs.oring_id!,
      sectionMm: inputs.cross_section!,
      seatMm: inputs.seat_diameter!,
    });
    expect(left.sectionMm).toBeCloseTo(expected.stretched_cross_section!, 9);
    expect(left.lossPercent).toBeCloseTo(expected.reduction_pct!, 9);
  });
  it("keeps the section of a ring that is loose on its seat", () => {
    const loose = oRingOnSeat({ insideDiameterMm: 50, sectionMm: 3, seatMm: 48 });
    expect(loose).toEqual({ stretchPercent: -4, sectionMm: 3, lossPercent: 0, empiricalLossPercent: null });
  });
  it("nears the thin ring's loss as the section grows small", () => {
    const thin = oRingOnSeat({ insideDiameterMm: 100, sectionMm: 0.01, seatMm: 105 });
    expect(thin.lossPercent).toBeCloseTo(thinRingLossPercent(5), 3);
  });

  const diameter = fc.double({ min: 0.01, max: 2000, noNaN: true });
  const section = fc.double({ min: 0.01, max: 50, noNaN: true });
  it("keeps the volume, never gains section, and loses more on a larger seat", () => {
    fc.assert(
      fc.property(diameter, section, diameter, (insideDiameterMm, sectionMm, seatMm) => {
        const left = oRingOnSeat({ insideDiameterMm, sectionMm, seatMm });
        expect(left.sectionMm).toBeGreaterThan(0);
        expect(left.sectionMm).toBeLessThanOrEqual(sectionMm);
        const larger = oRingOnSeat({ insideDiameterMm, sectionMm, seatMm: Math.min(seatMm * 1.01, 2000) });
        expect(larger.sectionMm).toBeLessThanOrEqual(left.sectionMm * (1 + 1e-12));
        if (seatMm <= insideDiameterMm) return;
        const volume = left.sectionMm ** 2 * (seatMm + left.sectionMm);
        expect(volume / (sectionMm ** 2 * (insideDiameterMm + sectionMm))).toBeCloseTo(1, 9);
      }),
    );
  });
  it.each(hostile)("refuses %d in any of its sizes", (value) => {
    const ring = { insideDiameterMm: 50, sectionMm: 3, seatMm: 52 };
    for (const field of ["insideDiameterMm", "sectionMm", "seatMm"] as const) {
      expect(() => oRingOnSeat({ ...ring, [field]: value })).toThrow(expect.objectContaining({ field }));
      expect(() => oRingOnSeat({ ...ring, [field]: value })).toThrow(DomainError);
    }
  });
});

describe("loss of section", () => {
  it("ostr-04: along the centreline it is about half the stretch", () => {
    const { inputs, expected } = caseOf("ostr-04-thin-limit");
    expect(thinRingLossPercent(inputs.stretch_pct!)).toBeCloseTo(expected.reduction_pct_constant_volume_centreline!, 9);
    expect(thinRingLossPercent(-3)).toBe(0);
  });
  const curve = cases.filter((c) => c.id.startsWith("ostr-05"));
  it("has five values of the empirical curve", () => expect(curve).toHaveLength(5));
  it.each(curve.map((c) => [c.id, c] as const))("%s (from memory)", (_id, { inputs, expected, tolerance }) => {
    const loss = empiricalLossPercent(inputs.stretch_pct!)!;
    expect(Math.abs(loss - expected.reduction_pct_empirical!)).toBeLessThan((tolerance as { abs: number }).abs);
  });
  it.each([-0.1, 25.1, Number.NaN, Infinity])("knows no empirical value at %d %%", (stretch) => {
    expect(empiricalLossPercent(stretch)).toBeNull();
  });
});

describe("oRingsForPath", () => {
  it("sg-01: rings that run with 8 to 12 % stretch", () => {
    const { inputs, expected } = beltCase("sg-01-oring-belt");
    const { min, ideal, max } = oRingsForPath(inputs.groove_bottom_path_mm!);
    expect([stretchAdvice.belt.min, stretchAdvice.belt.max]).toEqual(expected.recommended_stretch_pct);
    expect(max).toBeCloseTo(expected.oring_id_mm_at_8_pct!, 8);
    expect(ideal).toBeCloseTo(expected.oring_id_mm_at_10_pct!, 8);
    expect(min).toBeCloseTo(expected.oring_id_mm_at_12_pct!, 8);
  });
  it("sg-02: the smallest groove is four sections", () => {
    const { inputs, expected } = beltCase("sg-02-min-pulley");
    const smallest = stretchAdvice.grooveSections * inputs.cross_section_mm!;
    expect(smallest).toBeCloseTo(expected.min_groove_bottom_diameter_mm!, 9);
  });
  it("sg-04: a ring below the advised stretch", () => {
    const { inputs, expected } = beltCase("sg-04-check");
    const stretch = stretchPercentOf(inputs.oring_id_mm!, inputs.groove_bottom_path_mm! / Math.PI);
    expect(stretch).toBeCloseTo(expected.stretch_pct!, 9);
    const { min, max } = stretchAdvice.belt;
    expect(stretch >= min && stretch <= max).toBe(expected.within_8_12);
  });
  it.each(hostile)("refuses a path of %d", (path) => {
    expect(() => oRingsForPath(path)).toThrow(expect.objectContaining({ field: "pathMm" }));
  });
});

describe("classBPlusMinusMm", () => {
  const printed = cases.filter((c) => c.id.startsWith("o3601"));
  it("has five printed values", () => expect(printed).toHaveLength(5));
  it.each(printed.map((c) => [c.id, c] as const))("%s (ISO 3601-1 class B)", (_id, { inputs, expected, printed }) => {
    const plusMinus = classBPlusMinusMm(inputs.inside_diameter_mm!);
    expect(plusMinus).toBeCloseTo(expected.id_tolerance_mm!, 9);
    expect(Math.abs(plusMinus - printed!)).toBeLessThanOrEqual(0.005);
  });
  it.each([0, -1, Number.NaN, Infinity, 2001])("refuses %d", (id) => {
    expect(() => classBPlusMinusMm(id)).toThrow(expect.objectContaining({ field: "insideDiameterMm" }));
  });
});
