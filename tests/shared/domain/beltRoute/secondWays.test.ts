import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { type Pulley, solveBeltRoute } from "#shared/domain/beltRoute";
import { DomainError } from "#shared/domain/DomainError";
import { layouts, pulley, route } from "./layouts";
import { circlesOf, hullPerimeter, supportPerimeter, tightString } from "./secondWays";

const chance = { seed: 20_261_201 };
const relative = (got: number, wanted: number) => Math.abs(got - wanted) / wanted;

/** Pulleys in turn round a ring, each at its own distance: some stick out, some hang free within. */
const ring = fc
  .tuple(
    fc.array(
      fc.record({ reach: fc.double({ min: 50, max: 120, noNaN: true }), diameter: fc.integer({ min: 4, max: 50 }) }),
      {
        minLength: 4,
        maxLength: 7,
      },
    ),
    fc.double({ min: 0, max: 6, noNaN: true }),
  )
  .map(([wheels, turned]) =>
    wheels.map(({ reach, diameter }, i) => {
      const angle = turned + (2 * Math.PI * i) / wheels.length;
      return pulley(reach * Math.cos(angle), reach * Math.sin(angle), diameter);
    }),
  );

function solved(pulleys: readonly Pulley[], thickness: number): number | DomainError {
  try {
    return solveBeltRoute(route(pulleys, thickness)).pitchLengthMm;
  } catch (error) {
    if (error instanceof DomainError) return error;
    throw error;
  }
}

describe("a belt round inside pulleys is the shortest loop round them all", () => {
  it("by the integral of the support function; and what is refused is not touched", () => {
    const seen = { closed: 0, refused: 0 };
    fc.assert(
      fc.property(ring, fc.double({ min: 0, max: 3, noNaN: true }), (pulleys, thickness) => {
        const got = solved(pulleys, thickness);
        const around = supportPerimeter(circlesOf(pulleys, thickness), 4000);
        if (typeof got === "number") {
          seen.closed++;
          expect(relative(got, around)).toBeLessThan(4e-6);
        } else if (!got.words.includes("overlap")) {
          seen.refused++;
          const free = Number(got.field.replace("pulleys/", ""));
          const others = pulleys.filter((_, i) => i !== free);
          const without = supportPerimeter(circlesOf(others, thickness), 4000);
          expect(relative(without, around)).toBeLessThan(1e-9);
        }
      }),
      { ...chance, numRuns: 200 },
    );
    expect(seen.closed).toBeGreaterThan(20);
    expect(seen.refused).toBeGreaterThan(20);
  });

  it("by the convex hull of points on the circles", () => {
    const pulleys = layouts["four inside"]!;
    for (const thickness of [0, 1.2, 5]) {
      const { pitchLengthMm } = solveBeltRoute(route(pulleys, thickness));
      expect(relative(pitchLengthMm, hullPerimeter(circlesOf(pulleys, thickness)))).toBeLessThan(1e-6);
      expect(relative(pitchLengthMm, supportPerimeter(circlesOf(pulleys, thickness)))).toBeLessThan(1e-8);
    }
  });
});

/** Round the motor, over the idler, round the flywheel and the take-up. */
const bent = [[140, 250], [80], [250, 0, 50], [50, 140]];

describe("a belt with pulleys on its back is a string pulled tight", () => {
  // Where the belt lies on each pulley, in degrees from x towards y, read from a drawing of the layout.
  it.each([
    ["one on the back", bent],
    ["two and an idler", [[90, 180, 270], [90], [270, 0, 90]]],
    ["five inside, three on the back", [[180, 270], [90], [270], [270, 0, 90], [180], [270, 0, 90], [270], [90, 180]]],
  ] as const)("%s", (name, sides) => {
    const pulleys = layouts[name]!;
    for (const thickness of [0, 2]) {
      const { pitchLengthMm } = solveBeltRoute(route(pulleys, thickness));
      const { lengthMm, touched } = tightString(pulleys, thickness, sides);
      expect(touched).toEqual(pulleys.map(() => true));
      expect(relative(pitchLengthMm, lengthMm)).toBeLessThan(2e-4);
    }
  });

  it("an idler that the tight string does not touch is the one that is refused", () => {
    const pulleys = layouts["one on the back"]!.map((one, i) => (i === 1 ? { ...one, y: -40 } : one));
    // The string begins on the idler and comes off it.
    const { touched } = tightString(pulleys, 1.2, bent);
    expect(touched).toEqual([true, false, true, true]);
    expect(solved(pulleys, 1.2)).toMatchObject({ field: "pulleys/1" });
  });
});
