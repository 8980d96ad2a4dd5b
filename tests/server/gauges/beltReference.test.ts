import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { startTestSite, type TestSite } from "#tests/support/testSite";
import beltRelaxed from "../../reference/beltRelaxed.json";
import beltRoutes from "../../reference/beltRoute.json";
import beltSizes from "../../reference/beltSize.json";
import { ask, goodBodies, pointersOf } from "./calls";
import { answered, casesOf, expectNear } from "./referenceCases";

let site: TestSite;
beforeAll(async () => {
  site = await startTestSite();
});
afterAll(() => site.close());

type Route = {
  pitchLengthMm: number;
  spansMm: number[];
  wrapsDeg: number[];
  insideCircumferenceMm: { min: number; mid: number; max: number };
};
const routed = (pulleys: object[], thickness = 0, stretch = 0) =>
  ask(site, "belt-route", { pulleys, thickness, stretchPercent: { min: stretch, max: stretch } });
const pair = (one: unknown, other: unknown, apart: unknown, wrap = "inside") =>
  routed([
    { x: -Number(apart) / 2, y: 0, diameter: one, wrap: "inside" },
    { x: Number(apart) / 2, y: 0, diameter: other, wrap },
  ]);
/** Printed to twelve digits. */
const angles = { abs: 1e-8 };

describe("belt routes", () => {
  it.each(casesOf(beltRoutes, "open"))("%s", async (_id, { inputs, expected, tolerance }) => {
    const apart = inputs.centre_distance ?? expected.centre_distance;
    const res = await pair(inputs.d_large, inputs.d_small, apart);
    if (expected.error) {
      expect([res.status, pointersOf(res.body)[0]]).toEqual([422, "#/pulleys/1"]);
      return;
    }
    expect(res.status).toBe(200);
    const route: Route = res.body;
    expectNear(route.pitchLengthMm, expected.length ?? inputs.length, tolerance, "length");
    if (expected.span === undefined) return;
    for (const span of route.spansMm) expectNear(span, expected.span, tolerance, "span");
    expectNear(route.wrapsDeg[1], expected.wrap_small_deg, angles, "wrap");
    expectNear((route.wrapsDeg[0] ?? 0) * (Math.PI / 180), expected.wrap_large_rad, angles, "wrap");
  });

  it.each(casesOf(beltRoutes, "crossed"))("%s", async (_id, { inputs, expected, tolerance }) => {
    const res = await pair(inputs.d1, inputs.d2, inputs.centre_distance, "back");
    if (expected.error) {
      expect([res.status, pointersOf(res.body)[0]]).toEqual([422, "#/pulleys/1"]);
      return;
    }
    expectNear(res.body.pitchLengthMm, expected.length, tolerance, "length");
    for (const wrap of (res.body as Route).wrapsDeg) expectNear(wrap, expected.wrap_each_deg, angles, "wrap");
  });

  it.each(casesOf(beltRoutes, "multi"))("%s", async (_id, { inputs, expected, tolerance }) => {
    const pulleys = (inputs.pulleys as { side: string }[]).map(({ side, ...rest }) => ({
      ...rest,
      wrap: side === "outside" ? "back" : "inside",
    }));
    const res = await routed(pulleys);
    if (expected.error) {
      const idler = pulleys.findIndex(({ wrap }) => wrap === "back");
      expect([res.status, pointersOf(res.body)]).toEqual([422, [`#/pulleys/${idler}`]]);
      return;
    }
    const route: Route = res.body;
    expectNear(route.pitchLengthMm, expected.contact_path_length, tolerance, "length");
    for (const [i, span] of (expected.spans as number[]).entries())
      expectNear(route.spansMm[i], span, tolerance, "span");
    for (const [i, wrap] of (expected.wraps_deg as number[]).entries()) {
      expectNear(route.wrapsDeg[i], wrap, tolerance, "wrap");
    }
    if (inputs.belt_thickness === undefined) return;
    const thick: Route = (await routed(pulleys, Number(inputs.belt_thickness))).body;
    expectNear(thick.pitchLengthMm, expected.pitch_line_length, tolerance, "pitch length");
    expectNear(thick.insideCircumferenceMm.mid, expected.belt_inner_surface_length, tolerance, "inside");
  });
});

describe("belt sizes", () => {
  /** A path of just this length round two equal pulleys. */
  const path = (length: number, thickness = 0, stretch = 0) => {
    const apart = (length - 50 * Math.PI) / 2;
    const pulley = { y: 0, diameter: 50, wrap: "inside" };
    return routed(
      [
        { ...pulley, x: 0 },
        { ...pulley, x: apart },
      ],
      thickness,
      stretch,
    );
  };

  it.each(casesOf(beltRelaxed, "size-01", "size-02", "size-09"))("%s", async (_id, { inputs, expected, tolerance }) => {
    const length = Number(inputs.path_length_mm ?? inputs.contact_path_mm);
    const thickness = Number(inputs.thickness_mm ?? 0);
    const { body } = await path(length, thickness, Number(inputs.installed_stretch_pct));
    const wanted = expected.relaxed_circumference_mm ?? expected.relaxed_inside_mm;
    for (const got of Object.values((body as Route).insideCircumferenceMm)) expectNear(got, wanted, tolerance);
  });

  it.each(casesOf(beltRelaxed, "size-03"))("%s, the other way round", async (_id, { inputs, expected, tolerance }) => {
    const { body } = await path(Number(inputs.path_length_mm), 0, Number(expected.installed_stretch_pct));
    expectNear((body as Route).insideCircumferenceMm.mid, inputs.relaxed_circumference_mm, tolerance);
  });

  it.each(casesOf(beltSizes, "size-06"))("%s", async (_id, { inputs, expected, tolerance }) => {
    const thickness = Number(inputs.thickness_mm);
    const { body } = await path(Number(inputs.pitch_circumference_mm) - Math.PI * thickness, thickness);
    expectNear(body.pitchLengthMm, inputs.pitch_circumference_mm, tolerance);
    expectNear(body.insideCircumferenceMm.mid, expected.inside_circumference_mm, tolerance);
  });

  it.each(casesOf(beltSizes, "size-04", "size-05", "size-07"))("%s", async (_id, { inputs, expected, tolerance }) => {
    const [method, reading] =
      inputs.lay_flat_mm !== undefined
        ? ["lay-flat-inside", inputs.lay_flat_mm]
        : inputs.inside_diameter_mm !== undefined
          ? ["inside-diameter", inputs.inside_diameter_mm]
          : ["lay-flat-outside", inputs.lay_flat_outside_to_outside_mm];
    const asked = { ...goodBodies["belt-sample"][0], method, readingsMm: [reading] };
    const { asFound } = await answered<{ asFound: { insideCircumferenceMm: number } }>(site, "belt-sample", {
      ...asked,
      thicknessMm: inputs.thickness_mm ?? 1,
    });
    expectNear(asFound.insideCircumferenceMm, expected.inside_circumference_mm, tolerance);
  });
});
