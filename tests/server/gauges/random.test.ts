import fc from "fast-check";
import { afterAll, beforeAll, expect, it } from "vitest";
import { startTestSite, type TestSite } from "#tests/support/testSite";
import { ask, callNames, faultOf, goodBodies, read } from "./calls";

let site: TestSite;
beforeAll(async () => {
  site = await startTestSite();
});
afterAll(() => site.close());

/** Numbers as people and attackers choose them: sizes, edges of limits, and any double. */
const anyNumber = fc.oneof(
  { weight: 6, arbitrary: fc.double({ min: 0.01, max: 500, noNaN: true }) },
  { weight: 2, arbitrary: fc.constantFrom(0, -0, 1, 2, 24, 50, 100, 9999, 10_000, 10_000.001, -10_000, 0.1, 5000) },
  { weight: 1, arbitrary: fc.double({ noNaN: true, noDefaultInfinity: true }) },
);
const anyValue = fc.oneof({ weight: 3, arbitrary: anyNumber }, { weight: 1, arbitrary: fc.jsonValue({ maxDepth: 2 }) });

/** A body with its own shape, in which numbers are others now and then, and more rarely a part is anything at all. */
function like(value: unknown): fc.Arbitrary<unknown> {
  const usual = (): fc.Arbitrary<unknown> => {
    if (typeof value === "number")
      return fc.oneof({ weight: 6, arbitrary: fc.constant(value) }, { weight: 2, arbitrary: anyNumber });
    if (Array.isArray(value)) {
      return fc.oneof(
        { weight: 4, arbitrary: fc.tuple(...value.map(like)) },
        { weight: 1, arbitrary: fc.array(like(value[0]), { maxLength: 6 }) },
      );
    }
    if (typeof value !== "object" || value === null) return fc.constant(value);
    const fields = Object.fromEntries(Object.entries(value).map(([name, inner]) => [name, like(inner)]));
    return fc.record(fields);
  };
  return fc.oneof({ weight: 40, arbitrary: usual() }, { weight: 1, arbitrary: anyValue });
}

it.each(callNames)("%s answers any body with finite numbers or a 422 that points", async (name) => {
  let answered = 0;
  const bodies = goodBodies[name].map(like);
  await fc.assert(
    fc.asyncProperty(fc.oneof(...bodies), async (body) => {
      if (typeof body !== "object" || body === null) return;
      const res = await ask(site, name, JSON.stringify(body));
      expect(faultOf(res)).toBeUndefined();
      if (res.status === 200) answered += 1;
    }),
    { numRuns: 150, seed: 1789 },
  );
  expect(answered).toBeGreaterThan(0);
});

it("answers a route of any pulleys far apart, closed or refused by its pulley", async () => {
  const place = fc.integer({ min: -3, max: 3 }).map((step) => 400 * step);
  const pulley = fc.record({
    x: place,
    y: place,
    diameter: fc.double({ min: 0.1, max: 250, noNaN: true }),
    wrap: fc.constantFrom("inside", "back"),
  });
  const route = fc.record({
    pulleys: fc.uniqueArray(pulley, { minLength: 2, maxLength: 8, selector: ({ x, y }) => `${x} ${y}` }),
    thickness: fc.double({ min: 0, max: 3, noNaN: true }),
    stretchPercent: fc.constant({ min: 3, max: 8 }),
  });
  let closed = 0;
  await fc.assert(
    fc.asyncProperty(route, async (body) => {
      const res = await ask(site, "belt-route", body);
      expect(faultOf(res)).toBeUndefined();
      if (res.status !== 200) return;
      closed += 1;
      const { wrapsDeg, turns } = res.body as { wrapsDeg: number[]; turns: string[] };
      for (const wrap of wrapsDeg) expect(wrap >= 0 && wrap < 360).toBe(true);
      const total = wrapsDeg.reduce((sum, wrap, i) => sum + (turns[i] === "opposite" ? -wrap : wrap), 0);
      expect(
        [0, 360].some((whole) => Math.abs(Math.abs(total) - whole) < 1e-6),
        `${total}`,
      ).toBe(true);
    }),
    { numRuns: 300, seed: 1848 },
  );
  expect(closed).toBeGreaterThan(20);
});

it("reads any query", async () => {
  const text = fc.oneof(fc.string({ maxLength: 30 }), anyNumber.map(String), fc.constantFrom("M1", "M3", "fixed", ""));
  await fc.assert(
    fc.asyncProperty(fc.constantFrom("o-rings", "rubber-tolerance"), text, text, text, async (name, a, b, c) => {
      const query: Record<string, string> =
        name === "o-rings"
          ? { insideDiameterMm: a, ...(b && { sectionMm: b }), ...(c && { limit: c }) }
          : { class: "M2", nominalMm: a, dimension: b === "" ? "closure" : b };
      const encoded = new URLSearchParams(query).toString();
      expect(faultOf(await read(site, name, encoded))).toBeUndefined();
    }),
    { numRuns: 300, seed: 1905 },
  );
});
