import { readFileSync } from "node:fs";
import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { DomainError } from "#shared/domain/DomainError";
import { nearestORings, oRingSource } from "#shared/domain/oRings";
import { oRingTable } from "#shared/domain/oRingTable";
import cases from "../../reference/oRings.json";

const published = readFileSync(new URL("../../reference/as568.csv", import.meta.url), "utf8")
  .trim()
  .split("\n")
  .slice(1)
  .map((line) => line.split(","));
const ringOf = (dash: string) => oRingTable.find((size) => size.dash === dash);

describe("the table of standard O-rings (SAE AS568)", () => {
  it("holds just the published numbers, in order, and their sizes to the last digit", () => {
    expect(published).toHaveLength(369);
    const ours = oRingTable.map(({ dash, insideDiameterMm, insideDiameterTolMm, sectionMm, sectionTolMm }) => [
      dash,
      ...[insideDiameterMm, insideDiameterTolMm, sectionMm, sectionTolMm].map((mm) => mm.toFixed(4)),
    ]);
    expect(ours).toEqual(published.map(([dash, , id, idTol, , cs, csTol]) => [dash, id, idTol, cs, csTol]));
    for (const [, inches, , , csInches] of published) {
      const exact = [Number(inches) * 25.4, Number(csInches) * 25.4];
      expect(oRingTable.some((size) => Math.abs(size.insideDiameterMm - exact[0]!) < 1e-9)).toBe(true);
      expect(oRingTable.some((size) => Math.abs(size.sectionMm - exact[1]!) < 1e-9)).toBe(true);
    }
  });

  const sizes = cases.filter((c) => c.inputs.dash && c.expected.id_mm);
  it("has the twelve reference sizes", () => expect(sizes).toHaveLength(12));
  it.each(sizes.map((c) => [c.id, c] as const))("%s", (_id, { inputs, expected, tolerance }) => {
    const ring = ringOf(inputs.dash!)!;
    const near = tolerance!.abs;
    expect(Math.abs(ring.insideDiameterMm - expected.id_mm!)).toBeLessThan(near);
    expect(Math.abs(ring.insideDiameterTolMm - expected.id_tol_mm!)).toBeLessThan(near);
    expect(Math.abs(ring.sectionMm - expected.cs_mm!)).toBeLessThan(near);
    expect(Math.abs(ring.sectionTolMm - expected.cs_tol_mm!)).toBeLessThan(near);
    expect(Math.abs(ring.insideDiameterMm + 2 * ring.sectionMm - expected.od_mm!)).toBeLessThan(near);
    expect(Math.abs(ring.insideDiameterMm / 25.4 - expected.id_in!)).toBeLessThan(near);
  });

  it("as568-14: has nothing in the gaps between the series", () => {
    for (const dash of ["000", "051", "101", "179", "285", "308", "396", "424", "476", "900", "915", "931"]) {
      expect(ringOf(dash), dash).toBeUndefined();
    }
  });
  it("as568-15: has so many of each series", () => {
    const { rows, by_series } = cases.find((c) => c.id === "as568-15-count")!.expected;
    expect(oRingTable).toHaveLength(rows!);
    for (const [series, count] of Object.entries(by_series!)) {
      expect(oRingTable.filter(({ dash }) => dash.startsWith(series))).toHaveLength(count);
    }
  });
});

describe("nearestORings", () => {
  it("as568-13: finds 214 for a ring measured as 24.9 x 3.5, within its tolerances", () => {
    const { inputs, expected } = cases.find((c) => c.id === "as568-13-nearest")!;
    const need = { insideDiameterMm: inputs.measured_id_mm!, sectionMm: inputs.measured_cs_mm! };
    const [first] = nearestORings(need).sizes;
    expect(first?.dash).toBe(expected.dash);
    expect(Math.abs(first!.differenceMm)).toBeLessThanOrEqual(first!.insideDiameterTolMm);
    expect(Math.abs(first!.sectionMm - need.sectionMm)).toBeLessThanOrEqual(first!.sectionTolMm);
  });

  it("with a section looks at the section first, then at the inside diameter", () => {
    const { sizes, source } = nearestORings({ insideDiameterMm: 25.5, sectionMm: 2.7, limit: 3 });
    expect(source).toBe(oRingSource);
    expect(sizes.map(({ dash }) => dash)).toEqual(["120", "121", "119"]);
    expect(sizes[0]).toEqual({
      dash: "120",
      insideDiameterMm: 25.0698,
      insideDiameterTolMm: 0.254,
      sectionMm: 2.6162,
      sectionTolMm: 0.0762,
      differenceMm: expect.closeTo(-0.4302, 9),
      stretchPercent: expect.closeTo((0.4302 / 25.0698) * 100, 9),
    });
  });
  it("goes on to the next section when one has no more sizes", () => {
    // One size only has a section of 0.050 in; those of 0.056 in are the next.
    const dashes = nearestORings({ insideDiameterMm: 30, sectionMm: 1.3, limit: 2 }).sizes.map(({ dash }) => dash);
    expect(dashes).toEqual(["002", "901"]);
  });
  it("without one looks at the inside diameter first, the thinner ring first where two are alike", () => {
    const { sizes } = nearestORings({ insideDiameterMm: 7.6454, limit: 4 });
    expect(sizes.map(({ dash }) => dash)).toEqual(["903", "011", "109", "203"]);
    expect(sizes.slice(0, 2).map(({ differenceMm }) => differenceMm)).toEqual([0, 0]);
  });
  it("counts a loose ring's stretch below zero", () => {
    const [first] = nearestORings({ insideDiameterMm: 24.9, sectionMm: 3.5 }).sizes;
    expect(first?.stretchPercent).toBeCloseTo((24.9 / 24.9936 - 1) * 100, 9);
  });
  it("gives ten sizes unless told, and up to fifty", () => {
    expect(nearestORings({ insideDiameterMm: 20 }).sizes).toHaveLength(10);
    expect(nearestORings({ insideDiameterMm: 20, limit: 50 }).sizes).toHaveLength(50);
  });

  it.each([
    ["insideDiameterMm", { insideDiameterMm: 0 }],
    ["insideDiameterMm", { insideDiameterMm: -3 }],
    ["insideDiameterMm", { insideDiameterMm: Number.NaN }],
    ["insideDiameterMm", { insideDiameterMm: 2000.01 }],
    ["insideDiameterMm", { insideDiameterMm: Infinity }],
    ["sectionMm", { insideDiameterMm: 20, sectionMm: 0 }],
    ["sectionMm", { insideDiameterMm: 20, sectionMm: Number.NaN }],
    ["sectionMm", { insideDiameterMm: 20, sectionMm: 50.1 }],
    ["limit", { insideDiameterMm: 20, limit: 0 }],
    ["limit", { insideDiameterMm: 20, limit: 51 }],
    ["limit", { insideDiameterMm: 20, limit: 2.5 }],
    ["limit", { insideDiameterMm: 20, limit: Number.NaN }],
  ])("refuses a wrong %s: %o", (field, need) => {
    expect(() => nearestORings(need)).toThrow(DomainError);
    expect(() => nearestORings(need)).toThrow(expect.objectContaining({ field }));
  });

  it("orders by the rule whatever is asked, in finite numbers", () => {
    const asked = fc.double({ min: 5e-324, max: 2000, noNaN: true });
    const section = fc.option(fc.double({ min: 5e-324, max: 50, noNaN: true }), { nil: undefined });
    fc.assert(
      fc.property(asked, section, (insideDiameterMm, sectionMm) => {
        const { sizes } = nearestORings({ insideDiameterMm, sectionMm, limit: 50 });
        const keys = sizes.map((size) => [
          sectionMm === undefined ? 0 : Math.abs(size.sectionMm - sectionMm),
          Math.abs(size.differenceMm),
        ]);
        for (const [i, [section, difference]] of keys.entries()) {
          expect(Number.isFinite(sizes[i]!.stretchPercent)).toBe(true);
          if (i === 0) continue;
          const [sectionBefore, differenceBefore] = keys[i - 1]!;
          const inOrder = sectionBefore! < section! || (sectionBefore === section && differenceBefore! <= difference!);
          expect(inOrder).toBe(true);
        }
      }),
    );
  });
});
