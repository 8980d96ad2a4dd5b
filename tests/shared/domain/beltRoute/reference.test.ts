import { describe, expect, it } from "vitest";
import { type BeltWrap, solveBeltRoute } from "#shared/domain/beltRoute";
import { DomainError } from "#shared/domain/DomainError";
import relaxed from "../../../reference/beltRelaxed.json";
import cases from "../../../reference/beltRoute.json";
import { pulley, route } from "./layouts";

type Tolerance = { abs?: number; rel?: number } | null;
function expectNear(got: number, wanted: number, tolerance: Tolerance) {
  const allowed = tolerance?.abs ?? (tolerance?.rel ?? 0) * Math.abs(wanted);
  expect(allowed).toBeGreaterThan(0);
  expect(Math.abs(got - wanted), `${got} against ${wanted}`).toBeLessThanOrEqual(allowed);
}
/** Angles are printed in degrees and radians with twelve digits. */
const angles = { abs: 1e-8 };
const degrees = (radians: number) => (radians * 180) / Math.PI;
const named = ({ id, status, ...rest }: (typeof cases)[number]) => [`${id} (${status})`, rest] as const;
const of = (topic: string) => cases.filter((c) => c.topic === topic).map(named);
/** Two pulleys this far apart, on both sides of the origin: one case has a distance beyond the longest coordinate. */
const pair = (one: number, other: number, apart: number, wrap: BeltWrap) =>
  solveBeltRoute(route([pulley(-apart / 2, 0, one), pulley(apart / 2, 0, other, wrap)]));

describe("the reference cases of belt routes", () => {
  it("are all here", () => {
    const counted = ["belt_two_pulley_open", "belt_two_pulley_crossed", "belt_multi_pulley"].map((t) => of(t).length);
    expect(counted).toEqual([8, 5, 8]);
    expect(cases).toHaveLength(21);
  });

  it.each(of("belt_two_pulley_open"))("%s, two pulleys, open", (_name, { inputs, expected, tolerance }) => {
    const [large, small] = [inputs.d_large ?? 0, inputs.d_small ?? 0];
    if (expected.error) {
      expect(() => pair(large, small, inputs.centre_distance ?? 0, "inside")).toThrow(DomainError);
      return;
    }
    if (expected.centre_distance) {
      // The other way round: the distance that gives this length, by halving.
      let [low, high] = [(large + small) / 2, inputs.length ?? 0];
      for (let i = 0; i < 60; i++) {
        const middle = (low + high) / 2;
        if (pair(large, small, middle, "inside").pitchLengthMm < (inputs.length ?? 0)) low = middle;
        else high = middle;
      }
      expectNear(low, expected.centre_distance, tolerance);
      return;
    }
    const got = pair(large, small, inputs.centre_distance ?? 0, "inside");
    expectNear(got.pitchLengthMm, expected.length ?? 0, tolerance);
    expectNear(got.spansMm[0]!, expected.span ?? 0, { rel: 1e-9 });
    expectNear(got.spansMm[1]!, expected.span ?? 0, { rel: 1e-9 });
    expectNear(got.wrapsDeg[0]!, degrees(expected.wrap_large_rad ?? 0), angles);
    expectNear(got.wrapsDeg[1]!, expected.wrap_small_deg ?? 0, angles);
  });

  it.each(of("belt_two_pulley_crossed"))("%s, two pulleys, crossed", (_name, { inputs, expected, tolerance }) => {
    const solve = () => pair(inputs.d1 ?? 0, inputs.d2 ?? 0, inputs.centre_distance ?? 0, "back");
    if (expected.error) {
      expect(solve).toThrow(DomainError);
      return;
    }
    const got = solve();
    expectNear(got.pitchLengthMm, expected.length ?? 0, tolerance);
    for (const wrap of got.wrapsDeg) expectNear(wrap, expected.wrap_each_deg ?? 0, angles);
    expect(got.isCrossed).toBe(true);
  });

  it.each(of("belt_multi_pulley"))("%s, several pulleys", (_name, { inputs, expected, tolerance }) => {
    const pulleys = (inputs.pulleys ?? []).map(({ x, y, diameter, side }) =>
      pulley(x, y, diameter, side === "outside" ? "back" : "inside"),
    );
    const refused = pulleys.findIndex(({ wrap }) => wrap === "back");
    if (expected.error) {
      expect(() => solveBeltRoute(route(pulleys))).toThrow(
        expect.objectContaining({
          field: `pulleys/${refused}`,
          words: expect.stringContaining(`pulley ${refused + 1}`),
        }),
      );
      return;
    }
    const bare = solveBeltRoute(route(pulleys));
    expectNear(bare.pitchLengthMm, expected.contact_path_length ?? 0, tolerance);
    expect(bare.spansMm).toHaveLength(pulleys.length);
    for (const [i, span] of bare.spansMm.entries()) expectNear(span, expected.spans?.[i] ?? 0, tolerance);
    for (const [i, wrap] of bare.wrapsDeg.entries()) expectNear(wrap, expected.wraps_deg?.[i] ?? 0, tolerance);
    if (inputs.belt_thickness) {
      const thick = solveBeltRoute(route(pulleys, inputs.belt_thickness));
      expectNear(thick.pitchLengthMm, expected.pitch_line_length ?? 0, tolerance);
      expectNear(thick.insideCircumferenceMm.mid, expected.belt_inner_surface_length ?? 0, tolerance);
    }
  });
});

describe("the reference cases of a belt's relaxed size", () => {
  it.each(relaxed.map(({ id, ...rest }) => [id, rest] as const))("%s", (_id, { inputs, expected, tolerance }) => {
    const thickness = inputs.thickness_mm ?? 0;
    const length = inputs.path_length_mm ?? inputs.contact_path_mm ?? 0;
    const stretch = inputs.installed_stretch_pct ?? expected.installed_stretch_pct ?? 0;
    // Two pulleys of 50 mm, so far apart that a belt lying on them with its inside is just this long.
    const apart = (length - 50 * Math.PI) / 2;
    const got = solveBeltRoute({
      pulleys: [pulley(0, 0, 50), pulley(apart, 0, 50)],
      thickness,
      stretchPercent: { min: stretch, max: stretch },
    });
    const wanted = expected.relaxed_circumference_mm ?? expected.relaxed_inside_mm ?? inputs.relaxed_circumference_mm;
    expectNear(got.insideCircumferenceMm.mid, wanted ?? 0, tolerance);
  });
});
