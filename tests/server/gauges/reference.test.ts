import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { startTestSite, type TestSite } from "#tests/support/testSite";
import conformity from "../../reference/conformity.json";
import iso3302 from "../../reference/iso3302.json";
import oRingStretch from "../../reference/oRingStretch.json";
import oRings from "../../reference/oRings.json";
import units from "../../reference/units.json";
import { read } from "./calls";
import { answered, casesOf, expectNear, type Figures } from "./referenceCases";

/*
 * The reference cases once more, through the interface. tests/shared/domain holds all of them to the functions; here are
 * those that a call can express (belts and speeds in the two files beside this one). Sources and status (verified, derived,
 * from memory) stand beside each case in its file.
 *
 * Through functions only, since no call asks or answers them:
 *   open-08                      solves for the centre distance (here: its answer is asked, its length comes back)
 *   size-08, sg-01..04           expanded uncertainties, advice
 *   motor-06, motor-07, rim-03, rim-05, rim-06, bdrive-05, capstan-04      solve for slip or for a size
 *   err-03, err-04, err-05, err-07, err-08, nom-01..03, lim-01..07         errors against speeds that are no target; limits
 *   strobe-09, strobe-11, strobe-12, strobe-10 (400 bars)                  a ring of another count, creeping bars
 *   iso-13..15                   classes for extruded and cut parts, which the product does not have
 *   as568-14, as568-15, ostr-02..05, o3601-01..05                          the table itself, loss of section, ISO 3601-1
 *   conf-08, all of uncertainty, instrument_mpe, hardness, set_and_relaxation, currency_minor_units, allocation
 *   unit-09..12                  tape speeds, wire gauges, nearest fractions
 * webhook_signature: tests/server/payments/signatureReference.test.ts. gtin: the product has no such numbers.
 */

let site: TestSite;
beforeAll(async () => {
  site = await startTestSite();
});
afterAll(() => site.close());

describe("tolerances, rings and lengths", () => {
  const moulded = casesOf(iso3302, "iso-").filter(([, { inputs }]) => String(inputs.tolerance_class).startsWith("M"));
  it("has the twelve cases of moulded sizes", () => expect(moulded).toHaveLength(12));
  it.each(moulded)("%s", async (_id, { inputs, expected, tolerance }) => {
    const { body } = await read(site, "rubber-tolerance", {
      class: String(inputs.tolerance_class),
      nominalMm: String(inputs.nominal_mm),
      dimension: inputs.dimension_kind === "F" ? "fixed" : "closure",
    }).expect(200);
    expectNear(body.plusMinusMm, expected.plus_minus_mm, tolerance);
  });

  const listed = casesOf(oRings, "as568-").filter(([, { expected }]) => expected.id_mm !== undefined);
  it("has the twelve rings by their sizes", () => expect(listed).toHaveLength(12));
  it.each(listed)("%s", async (_id, { inputs, expected, tolerance }) => {
    const query = { insideDiameterMm: String(expected.id_mm), sectionMm: String(expected.cs_mm), limit: "1" };
    const { body } = await read(site, "o-rings", query).expect(200);
    expect(body.sizes).toHaveLength(1);
    const [ring] = body.sizes;
    expect(ring.dash).toBe(inputs.dash);
    expectNear(ring.insideDiameterMm, expected.id_mm, tolerance);
    expectNear(ring.insideDiameterTolMm, expected.id_tol_mm, tolerance);
    expectNear(ring.sectionMm, expected.cs_mm, tolerance);
    expectNear(ring.sectionTolMm, expected.cs_tol_mm, tolerance);
    expectNear(ring.stretchPercent, 0, { abs: 1e-3 });
  });

  it.each(casesOf(oRings, "as568-13"))("%s", async (_id, { inputs, expected }) => {
    const query = { insideDiameterMm: String(inputs.measured_id_mm), sectionMm: String(inputs.measured_cs_mm) };
    const [ring] = (await read(site, "o-rings", query).expect(200)).body.sizes;
    expect(ring.dash).toBe(expected.dash);
    expect(Math.abs(ring.differenceMm) <= ring.insideDiameterTolMm).toBe(expected.id_within_tolerance);
    expect(Math.abs(ring.sectionMm - Number(inputs.measured_cs_mm)) <= ring.sectionTolMm).toBe(
      expected.cs_within_tolerance,
    );
  });

  it.each(casesOf(oRingStretch, "ostr-01"))("%s", async (_id, { inputs, expected, tolerance }) => {
    const query = { insideDiameterMm: String(inputs.seat_diameter), sectionMm: "3.5306", limit: "3" };
    const { sizes } = (await read(site, "o-rings", query).expect(200)).body;
    const ring = sizes.find((one: Figures) => Math.abs(Number(one.insideDiameterMm) - Number(inputs.oring_id)) < 1e-9);
    expectNear(ring?.stretchPercent, expected.stretch_pct, tolerance);
  });

  const lengths = casesOf(units, ...Array.from({ length: 8 }, (_, i) => `unit-0${i + 1}`));
  it("has the eight lengths", () => expect(lengths).toHaveLength(8));
  it.each(lengths)("%s", async (_id, { inputs, expected, tolerance }) => {
    const { mm } = await answered<{ mm: number }>(site, "length", { text: inputs.text, defaultUnit: "mm" });
    expectNear(mm, expected.mm, tolerance);
  });
});

describe("check-in and conformance", () => {
  const verdictOf = async (readingMm: number, plusMinusMm: number, u: number, guardFactor = 1, nominalMm = 10) => {
    const body = { readingsMm: [readingMm], standardUncertaintyMm: u, nominalMm, plusMinusMm, guardFactor };
    return (await answered<{ verdict: string }>(site, "check-in", body)).verdict;
  };
  const verdicts: Record<string, string> = {
    "conf-01-pass": "conforms",
    "conf-02-grey-in": "cannot-tell",
    "conf-03-grey-out": "cannot-tell",
    "conf-04-fail": "does-not-conform",
  };
  it.each(casesOf(conformity, ...Object.keys(verdicts)))("%s", async (id, { inputs }) => {
    for (const side of [1, -1]) {
      const reading = 10 + side * Number(inputs.deviation);
      expect(await verdictOf(reading, Number(inputs.mpe), Number(inputs.U))).toBe(verdicts[id]);
    }
  });

  it.each(casesOf(conformity, "conf-05"))("%s", async (_id, { inputs, expected }) => {
    const U = Number(inputs.U);
    expect(await verdictOf(Number(inputs.y), 0.05, U)).toBe("cannot-tell");
    for (const end of expected.acceptance_zone as number[]) expect(await verdictOf(end, 0.05, U)).toBe("conforms");
    for (const out of [9.9899, 10.0101]) expect(await verdictOf(out, 0.05, U)).toBe("cannot-tell");
  });

  it.each(casesOf(conformity, "conf-06"))("%s", async (_id, { inputs }) => {
    for (const reading of [9.96, 10, 10.04])
      expect(await verdictOf(reading, 0.05, Number(inputs.U))).toBe("cannot-tell");
  });

  it.each(casesOf(conformity, "conf-07", "conf-09"))("%s", async (_id, { inputs, expected, tolerance }) => {
    const { probability } = await answered<{ probability: number }>(site, "conformance", {
      estimateMm: inputs.y,
      standardUncertaintyMm: inputs.u,
      lowerMm: inputs.LSL,
      upperMm: inputs.USL ?? inputs.upper_limit,
    });
    expectNear(probability, expected.conformance_probability, tolerance);
  });

  it.each(casesOf(conformity, "conf-10"))("%s", async (_id, { inputs, expected }) => {
    const [limit, factor] = [Number(expected.acceptance_limit), Number(expected.guard_band_factor)];
    expect(await verdictOf(limit - 1e-6, 0.05, Number(inputs.u), factor)).toBe("conforms");
    expect(await verdictOf(limit + 1e-6, 0.05, Number(inputs.u), factor)).toBe("cannot-tell");
  });
});
