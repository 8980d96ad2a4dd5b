import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { beltOutline } from "#shared/domain/beltOutline";
import { type BeltRoute, type BeltRouteInput, type Pulley, solveBeltRoute } from "#shared/domain/beltRoute";
import { DomainError } from "#shared/domain/DomainError";
import { layouts, pulley, route } from "./layouts";

const chance = { seed: 20_261_201, numRuns: 100 };
const layout = fc.constantFrom(...Object.values(layouts));
const thickness = fc.double({ min: 0, max: 3, noNaN: true });
const number = (min: number, max: number) => fc.double({ min, max, noNaN: true });

/** The numbers of a route, in one list. */
const numbersOf = ({ pitchLengthMm, spansMm, wrapsDeg, insideCircumferenceMm: { min, mid, max } }: BeltRoute) => [
  pitchLengthMm,
  ...spansMm,
  ...wrapsDeg,
  min,
  mid,
  max,
];
function expectSame(got: readonly number[], wanted: readonly number[]) {
  expect(got).toHaveLength(wanted.length);
  for (const [i, value] of got.entries()) expect(Math.abs(value - wanted[i]!)).toBeLessThan(1e-8 * (1 + wanted[i]!));
}
const solve = (pulleys: readonly Pulley[], t: number) => solveBeltRoute(route(pulleys, t, 3, 6));

describe("a belt route", () => {
  it("does not change when all of it is moved and turned", () => {
    fc.assert(
      fc.property(
        layout,
        thickness,
        number(-5000, 5000),
        number(-5000, 5000),
        number(0, 7),
        (pulleys, t, x, y, turn) => {
          const [c, s] = [Math.cos(turn), Math.sin(turn)];
          const moved = pulleys.map((one) => ({ ...one, x: x + c * one.x - s * one.y, y: y + s * one.x + c * one.y }));
          expectSame(numbersOf(solve(moved, t)), numbersOf(solve(pulleys, t)));
        },
      ),
      chance,
    );
  });

  it("grows with its pulleys, the wraps staying", () => {
    fc.assert(
      fc.property(layout, thickness, number(0.1, 12), (pulleys, t, times) => {
        const grown = pulleys.map((one) => ({
          ...one,
          x: times * one.x,
          y: times * one.y,
          diameter: times * one.diameter,
        }));
        const [small, large] = [solve(pulleys, t), solve(grown, times * t)];
        expectSame(large.wrapsDeg, small.wrapsDeg);
        expectSame(
          [large.pitchLengthMm, ...large.spansMm, large.insideCircumferenceMm.mid],
          [small.pitchLengthMm, ...small.spansMm, small.insideCircumferenceMm.mid].map((mm) => times * mm),
        );
      }),
      chance,
    );
  });

  it("is the same in the mirror, in which its order runs the other way round", () => {
    fc.assert(
      fc.property(layout, thickness, (pulleys, t) => {
        const mirrored = pulleys.map((one) => ({ ...one, x: -one.x }));
        expectSame(numbersOf(solve(mirrored, t)), numbersOf(solve(pulleys, t)));
      }),
      chance,
    );
  });

  it("is the same run backwards", () => {
    fc.assert(
      fc.property(layout, thickness, (pulleys, t) => {
        const [there, back] = [solve(pulleys, t), solve([...pulleys].reverse(), t)];
        expectSame([back.pitchLengthMm], [there.pitchLengthMm]);
        expectSame([...back.wrapsDeg].reverse(), there.wrapsDeg);
        // The span after the last pulley stays the last.
        expectSame([...back.spansMm.slice(0, -1).reverse(), back.spansMm.at(-1)!], there.spansMm);
      }),
      chance,
    );
  });

  it("may begin at any pulley", () => {
    fc.assert(
      fc.property(layout, thickness, fc.nat(7), (pulleys, t, by) => {
        const from = by % pulleys.length;
        const rotated = <T>(list: readonly T[]) => [...list.slice(from), ...list.slice(0, from)];
        const [first, other] = [solve(pulleys, t), solve(rotated(pulleys), t)];
        expectSame([other.pitchLengthMm], [first.pitchLengthMm]);
        expectSame(other.spansMm, rotated(first.spansMm));
        expectSame(other.wrapsDeg, rotated(first.wrapsDeg));
        expect(other.turns).toEqual(rotated(first.turns));
      }),
      chance,
    );
  });

  it("turns once in all, and its parts sum to its length", () => {
    fc.assert(
      fc.property(layout, thickness, (pulleys, t) => {
        const { wrapsDeg, spansMm, pitchLengthMm } = solve(pulleys, t);
        const signed = wrapsDeg.reduce((sum, wrap, i) => sum + (pulleys[i]!.wrap === "inside" ? wrap : -wrap), 0);
        expect(signed).toBeCloseTo(360, 8);
        const arcs = wrapsDeg.map((wrap, i) => (((pulleys[i]!.diameter + t) / 2) * wrap * Math.PI) / 180);
        expect([...spansMm, ...arcs].reduce((sum, mm) => sum + mm, 0)).toBeCloseTo(pitchLengthMm, 8);
      }),
      chance,
    );
  });

  it("with two pulleys is the textbook formula, open and crossed", () => {
    fc.assert(
      fc.property(number(1, 200), number(1, 200), number(0, 300), number(0, 4), (one, other, more, t) => {
        const apart = (one + other) / 2 + t + 0.001 + more;
        const [large, small] = [Math.max(one, other) + t, Math.min(one, other) + t];
        const pair = [pulley(0, 0, one), pulley(apart, 0, other)];
        // Shigley's Mechanical Engineering Design 8e, Eq. 17-1 and 17-2.
        const lean = 2 * Math.asin((large - small) / (2 * apart));
        const open =
          Math.sqrt(4 * apart ** 2 - (large - small) ** 2) + (large * (Math.PI + lean) + small * (Math.PI - lean)) / 2;
        expectSame([solve(pair, t).pitchLengthMm], [open]);
        // The "belt problem": 2 (r1 + r2) (tan f + pi - f) with cos f = (r1 + r2) / C.
        const sum = (large + small) / 2;
        const f = Math.acos(sum / apart);
        const crossed = solve([pair[0]!, { ...pair[1]!, wrap: "back" }], t);
        expectSame([crossed.pitchLengthMm], [2 * sum * (Math.tan(f) + Math.PI - f)]);
      }),
      chance,
    );
  });

  it("gives numbers or a refusal whatever it is given", () => {
    const odd = fc.oneof(
      fc.constantFrom(Number.NaN, Number.POSITIVE_INFINITY, -1e308, 1e308, 5e-324, -0, 0, -1, 10_000, 0.1, 50),
      number(-300, 300),
    );
    const wheel = fc.record({
      x: odd,
      y: odd,
      diameter: odd,
      wrap: fc.constantFrom("inside" as const, "back" as const),
    });
    const tame = fc.record({
      x: fc.integer({ min: -200, max: 200 }),
      y: fc.integer({ min: -200, max: 200 }),
      diameter: fc.integer({ min: 1, max: 60 }),
      wrap: fc.constantFrom("inside" as const, "back" as const),
    });
    const input: fc.Arbitrary<BeltRouteInput> = fc.record({
      pulleys: fc.oneof(fc.array(wheel, { maxLength: 30 }), {
        weight: 2,
        arbitrary: fc.array(tame, { minLength: 2, maxLength: 4 }),
      }),
      thickness: fc.oneof({ weight: 3, arbitrary: number(0, 5) }, odd),
      stretchPercent: fc.oneof(
        { weight: 3, arbitrary: fc.constant({ min: 3, max: 6 }) },
        fc.record({ min: odd, max: odd }),
      ),
    });
    const seen = { solved: 0, refused: 0 };
    fc.assert(
      fc.property(input, (given) => {
        try {
          const solved = solveBeltRoute(given);
          seen.solved++;
          for (const value of numbersOf(solved)) expect(Number.isFinite(value) && value >= 0).toBe(true);
          for (const wrap of solved.wrapsDeg) expect(wrap).toBeLessThan(360);
          expect(beltOutline(solved.contacts)).not.toMatch(/NaN|Infinity|undefined/);
        } catch (error) {
          if (!(error instanceof DomainError)) throw error;
          seen.refused++;
          expect(error.words).toMatch(/^[A-Z].*\.$/);
          expect(error.words).not.toMatch(/NaN|Infinity|undefined/);
        }
      }),
      { ...chance, numRuns: 3000 },
    );
    expect(seen.solved).toBeGreaterThan(50);
    expect(seen.refused).toBeGreaterThan(500);
  });
});
