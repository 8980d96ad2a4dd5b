import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { startTestSite, type TestSite } from "#tests/support/testSite";
import { ask, type Body, callNames, faultOf, goodBodies, goodQueries, pointersOf, read } from "./calls";

let site: TestSite;
beforeAll(async () => {
  site = await startTestSite();
});
afterAll(() => site.close());

type Place = readonly (string | number)[];

/** Every place in a value where something stands that is of a type, and the value itself. */
function placesOf(value: unknown, fits: (value: unknown) => boolean, at: Place = []): Place[] {
  const inner = typeof value === "object" && value !== null ? Object.entries(value) : [];
  const below = inner.flatMap(([name, part]) => placesOf(part, fits, [...at, Array.isArray(value) ? +name : name]));
  return fits(value) ? [at, ...below] : below;
}

/** The value with another at one place; undefined takes it out. */
function changed(value: unknown, [step, ...rest]: Place, to: unknown): unknown {
  if (step === undefined) return to;
  if (Array.isArray(value)) return value.map((part, i) => (i === step ? changed(part, rest, to) : part));
  const fields = value as Record<string, unknown>;
  return { ...fields, [step]: changed(fields[step], rest, to) };
}

/** JSON can write numbers that no double holds; `JSON.stringify` cannot. */
const written = (body: unknown) =>
  JSON.stringify(body).replaceAll('"@1e999"', "1e999").replaceAll('"@-1e999"', "-1e999").replaceAll('"@-0"', "-0.0");

const never: [what: string, value: unknown][] = [
  ["1e999", "@1e999"],
  ["-1e999", "@-1e999"],
  ["1e308", 1e308],
  ["-1e308", -1e308],
  ["null", null],
  ["a text", "44.1"],
  ["a text with a unit", "44 mm"],
  ["NaN in words", "NaN"],
  ["a list", [44.1]],
  ["an object", { valueMm: 44.1 }],
  ["a truth", true],
];
const perhaps: [what: string, value: unknown][] = [
  ["zero", 0],
  ["minus zero", "@-0"],
  ["minus one", -1],
  ["5e-324", 5e-324],
  ["a tenth", 0.1],
  ["a billion", 1e9],
  ["2^53 + 2", 2 ** 53 + 2],
];

describe.each(callNames)("%s", (name) => {
  const bodies: readonly Body[] = goodBodies[name];

  it("refuses at its field every number that is none, or too large, and answers or refuses every other", async () => {
    for (const body of bodies) {
      await expectSound(body);
      const places = placesOf(body, (value) => typeof value === "number");
      for (const place of places) {
        const pointer = `#/${place.join("/")}`;
        for (const [what, value] of never) {
          const res = await ask(site, name, written(changed(body, place, value)));
          expect([res.status, faultOf(res)], `${pointer}: ${what}`).toEqual([422, undefined]);
          expect(
            pointersOf(res.body).some((found) => found.startsWith(pointer)),
            `${pointer}: ${what}`,
          ).toBe(true);
        }
        for (const [what, value] of perhaps) {
          const res = await ask(site, name, written(changed(body, place, value)));
          expect(faultOf(res), `${pointer}: ${what}`).toBeUndefined();
        }
      }
    }
  }, 240_000);

  it("says of every field that is missing, or a list that is none, where it is", async () => {
    for (const body of bodies) {
      for (const field of Object.keys(body)) {
        const res = await ask(site, name, written(changed(body, [field], undefined)));
        expect(faultOf(res), field).toBeUndefined();
      }
      const lists = placesOf(body, (value) => typeof value === "object" && value !== null);
      for (const place of lists.filter(({ length }) => length > 0)) {
        for (const value of [[], {}, "x", null, 7, [[[[]]]], [null], { __proto__: null, constructor: 1 }]) {
          const res = await ask(site, name, written(changed(body, place, value)));
          expect(faultOf(res), `${place.join("/")}: ${JSON.stringify(value)}`).toBeUndefined();
        }
      }
      for (const place of placesOf(body, (value) => typeof value === "string")) {
        for (const value of ["", " ", "x".repeat(5000), null, 1, ["mm"], {}, "constructor", "__proto__", "\u0000"]) {
          const res = await ask(site, name, written(changed(body, place, value)));
          expect(faultOf(res), `${place.join("/")}: ${JSON.stringify(value)}`).toBeUndefined();
        }
      }
    }
  }, 240_000);

  it("takes no flood: long lists, deep nesting, large bodies", async () => {
    const body = bodies[0]!;
    for (const place of placesOf(body, Array.isArray)) {
      const list = place.reduce<unknown>((value, step) => (value as Record<string, unknown>)[step], body) as unknown[];
      const long = Array.from({ length: Math.floor(90_000 / (JSON.stringify(list[0]).length + 1)) }, () => list[0]);
      const res = await ask(site, name, written(changed(body, place, long)));
      expect(faultOf(res), place.join("/")).toBeUndefined();
    }
    for (const deep of ["[".repeat(40_000) + "]".repeat(40_000), `${'{"a":'.repeat(15_000)}1${"}".repeat(15_000)}`]) {
      for (const field of Object.keys(body)) {
        const text = JSON.stringify({ ...body, [field]: "@deep" }).replace('"@deep"', deep);
        expect((await ask(site, name, text)).status, field).toBe(422);
      }
    }
    expect((await ask(site, name, JSON.stringify({ ...body, more: "x".repeat(1_000_000) }))).status).toBe(413);
  });

  it.each([
    ["nothing", "application/json", "", 422],
    ["an empty object", "application/json", "{}", 422],
    ["an empty list", "application/json", "[]", 422],
    ["a bare number", "application/json", "1", 400],
    ["JSON that breaks off", "application/json", '{"text": ', 400],
    ["NaN, which JSON has not", "application/json", '{"rpm": NaN}', 400],
    ["a form", "application/x-www-form-urlencoded", "mainsHz=50&rpm=45", 422],
    ["text", "text/plain", '{"mainsHz":50,"rpm":45}', 422],
    ["an unknown character set", "application/json; charset=rot13", "{}", 415],
  ])("answers a body of %s as a problem", async (_what, type, body, status) => {
    const res = await ask(site, name, body).type(type);
    expect([res.status, res.type]).toEqual([status, "application/problem+json"]);
  });

  it("ignores fields that it does not know", async () => {
    const res = await ask(site, name, { ...bodies[0], role: "administrator", priceMinor: { $gt: 0 } });
    expect(res.status).toBe(200);
  });

  async function expectSound(body: Body) {
    const res = await ask(site, name, body);
    expect([res.status, faultOf(res)], JSON.stringify(res.body)).toEqual([200, undefined]);
  }
});

describe.each(Object.entries(goodQueries))("%s", (name, query) => {
  const numbers = Object.entries(query).filter(([, value]) => Number.isFinite(Number(value)));

  it.each(numbers.map(([field]) => field))("takes for %s one plain number only", async (field) => {
    const others = new URLSearchParams(Object.entries(query).filter(([other]) => other !== field)).toString();
    const refused = [
      "",
      "abc",
      "NaN",
      "Infinity",
      "1e400",
      "-1e400",
      "1e308",
      "0x10",
      "44,1",
      "44 mm",
      "-1",
      "0",
      "--1",
    ];
    for (const value of refused) {
      const res = await read(site, name, `${others}&${field}=${encodeURIComponent(value)}`);
      expect([res.status, faultOf(res)], value).toEqual([422, undefined]);
      expect(pointersOf(res.body), value).toEqual([`#/${field}`]);
    }
    for (const odd of [
      `${field}=1&${field}=2`,
      `${field}[]=1`,
      `${field}[$gt]=1`,
      `${field}=1e-5`,
      `${field}=5e-324`,
    ]) {
      expect(faultOf(await read(site, name, `${others}&${odd}`)), odd).toBeUndefined();
    }
    const twice = await read(site, name, `${others}&${field}=1&${field}=2`);
    expect(pointersOf(twice.body)).toEqual([`#/${field}`]);
  });

  it("says what is missing", async () => {
    const res = await read(site, name, "");
    expect([res.status, faultOf(res)]).toEqual([422, undefined]);
  });
});

const [route] = goodBodies["belt-route"];
const [rim, , belt, capstan] = goodBodies.speed;
const [sample] = goodBodies["belt-sample"];
const [asNew] = goodBodies["as-new"];
const [fit] = goodBodies.fit;
const [checked] = goodBodies["check-in"];
const [basket] = goodBodies["basket-plan"];
const pulley = (x: number, y = 0, wrap = "inside") => ({ x, y, diameter: 20, wrap });
const ring = Array.from({ length: 25 }, (_, i) => pulley(2000 * Math.cos(i / 4), 2000 * Math.sin(i / 4)));

describe("what cannot be is refused where it stands", () => {
  it.each([
    ["pulleys that overlap", "belt-route", { ...route, pulleys: [pulley(0), pulley(15)] }, "#/pulleys/1"],
    ["25 pulleys", "belt-route", { ...route, pulleys: ring }, "#/pulleys"],
    ["one pulley", "belt-route", { ...route, pulleys: [pulley(0)] }, "#/pulleys"],
    ["no pulleys", "belt-route", { ...route, pulleys: [] }, "#/pulleys"],
    [
      "a pulley that the belt does not reach",
      "belt-route",
      { ...route, pulleys: [pulley(0), pulley(100, -90, "back"), pulley(200)] },
      "#/pulleys/1",
    ],
    [
      "stretch the wrong way round",
      "belt-route",
      { ...route, stretchPercent: { min: 9, max: 1 } },
      "#/stretchPercent/max",
    ],
    ["a belt thicker than 50 mm", "belt-route", { ...route, thickness: 51 }, "#/thickness"],
    ["a slip of 100 %", "speed", { ...rim, slipPercent: 100 }, "#/slipPercent"],
    ["poles that are odd", "speed", { ...rim, poles: 5 }, "#/poles"],
    ["an unknown drive", "speed", { ...rim, drive: "magnetic" }, "#/drive"],
    ["a tape speed for a record", "speed", { ...belt, target: "15" }, "#/target"],
    ["a capstan without stages", "speed", { ...capstan, stages: [] }, "#/stages"],
    ["a negative stage", "speed", { ...capstan, stages: [{ driver: -1, driven: 2 }] }, "#/stages/0/driver"],
    ["mains of 5 Hz", "strobe", { mainsHz: 5, rpm: 45 }, "#/mainsHz"],
    ["no readings", "as-new", { ...asNew, readingsMm: [] }, "#/readingsMm"],
    ["a negative reading", "as-new", { ...asNew, readingsMm: [44, -44] }, "#/readingsMm/1"],
    ["a size that the kind has not", "as-new", { ...asNew, dimension: "section" }, "#/dimension"],
    ["a condition that the kind has not", "as-new", { ...asNew, condition: "slack" }, "#/condition"],
    ["a melted part", "as-new", { ...asNew, condition: "melted" }, "#/condition"],
    ["a kit", "as-new", { ...asNew, kind: "rebuild-kit" }, "#/kind"],
    ["no readings of a belt", "belt-sample", { ...sample, readingsMm: [] }, "#/readingsMm"],
    ["a belt that is missing", "belt-sample", { ...sample, condition: "missing" }, "#/condition"],
    ["a fold thinner than its belt", "belt-sample", { ...sample, thicknessMm: 50, readingsMm: [40] }, "#/thicknessMm"],
    ["no limits", "conformance", { estimateMm: 1, standardUncertaintyMm: 1 }, "#/lowerMm"],
    [
      "limits the wrong way round",
      "conformance",
      { estimateMm: 1, standardUncertaintyMm: 1, lowerMm: 2, upperMm: 1 },
      "#/lowerMm",
    ],
    ["instrument and uncertainty", "check-in", { ...checked, standardUncertaintyMm: 1 }, "#/standardUncertaintyMm"],
    ["neither of them", "check-in", { ...checked, instrument: undefined }, "#/instrument"],
    ["one value", "consensus", { valuesMm: [44] }, "#/valuesMm"],
    [
      "a need that the kind has not",
      "fit",
      { ...fit, need: { section: { valueMm: 1, standardUncertaintyMm: 1 } } },
      "#/need/section",
    ],
    ["a size that is none", "fit", { ...fit, part: { colour: { nominalMm: 1 } } }, "#/part/colour"],
    ["nothing to check", "fit", { ...fit, part: { treadWidth: { nominalMm: 5 } } }, "#/part"],
    ["a negative size", "fit", { ...fit, part: { bore: { nominalMm: -4 } } }, "#/part/bore/nominalMm"],
    ["no needs", "basket-plan", { ...basket, needs: [] }, "#/needs"],
    ["half a piece", "basket-plan", { ...basket, needs: [{ id: "idler", quantity: 0.5 }] }, "#/needs/0/quantity"],
    ["a chance above 1", "basket-plan", { ...basket, minimumChance: 1.01 }, "#/minimumChance"],
    ["a workshop that is not there", "basket-plan", { ...basket, workshops: [] }, "#/offers/0/workshopId"],
    ["two lengths in one text", "length", { text: "44 mm 3/16 in", defaultUnit: "mm" }, "#/text"],
    ["what may be two lengths", "length", { text: "1,234", defaultUnit: "mm" }, "#/text"],
    ["feet", "length", { text: "3 ft", defaultUnit: "in" }, "#/text"],
  ])("%s: %s", async (_what, name, body, pointer) => {
    const res = await ask(site, name, body);
    expect([res.status, faultOf(res)], JSON.stringify(res.body)).toEqual([422, undefined]);
    expect(pointersOf(res.body)).toEqual([pointer]);
  });

  it("says what is missing, what to choose from and what is no number in plain words", async () => {
    const { body } = await ask(site, "speed", { ...rim, mainsHz: null, stepDiameter: "5.9 mm", target: "33" });
    expect(body.errors).toEqual([
      { pointer: "#/mainsHz", detail: "This is missing. Give a number." },
      { pointer: "#/target", detail: expect.stringMatching(/^Choose one of: .*33 1\/3/) },
      { pointer: "#/stepDiameter", detail: "Give a number alone, without quotes and without a unit." },
    ]);
  });
});
