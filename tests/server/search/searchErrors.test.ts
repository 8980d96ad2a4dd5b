import pg from "pg";
import request from "supertest";
import { afterAll, beforeAll, describe, expect, it, vi } from "vitest";
import { writeCursor } from "#server/search/searchCursor";
import { SearchAnswer } from "#shared/schemas/search";
import { buildPart } from "#tests/support/factories";
import { startTestSite, type TestSite } from "#tests/support/testSite";
import { buildFamily } from "./builders";

let site: TestSite;
beforeAll(async () => {
  site = await startTestSite();
  await buildPart({ title: "Platter idler, ground" });
  await buildFamily({
    slug: "plain",
    name: "Plain",
    points: [
      { name: "idler", sizes: { outsideDiameter: [44, 43.5, 44.5], bore: [4, 3.96, 4.06] } },
      { name: "belt", kind: "flat-belt", sizes: {} },
    ],
  });
});
afterAll(() => site.close());

const ask = (query: string) => request(site.url).get(`/api/v1/search?${query}`);
const wheel = "kind=idler-wheel&outsideDiameter=44.0";
const place = (sort: "fit" | "price", key: (string | number)[]) => writeCursor(sort, key);
const someId = "3f0c1a52-0c55-4b7e-9f0e-3c2f5a1d9b10";

describe("what a search refuses", () => {
  it.each([
    ["nothing to go by", "", "#/q", "Give at least one dimension"],
    ["a kind alone", "kind=flat-belt", "#/insideCircumference", "Give at least one dimension"],
    [
      "a length that is none",
      "kind=idler-wheel&outsideDiameter=wide",
      "#/outsideDiameter",
      "does not begin with a number",
    ],
    ["a negative length", "kind=idler-wheel&bore=-4", "#/bore", "cannot be negative"],
    ["two readings of one number", "kind=idler-wheel&bore=1%2C234 mm", "#/bore", "can be"],
    ["a dimension that the kind has not", "kind=flat-belt&bore=4", "#/bore", "The flat belt has no bore"],
    ["dimensions that no kind has", "bore=4&section=3", "#/bore", "No kind of part is measured by bore and section"],
    ["a condition that the kind cannot be in", `${wheel}&condition=slack`, "#/condition", "do not become slack"],
    ["a reading of what is gone", `${wheel}&condition=melted`, "#/condition", "no size left to measure"],
    ["an estimate of no kind", "q=idler&estimateMm=44", "#/estimateMm", "Choose the kind"],
    ["an estimate of nothing", `${wheel}&estimateMm=0`, "#/estimateMm", ""],
    ["a kind that the family has no sizes for", "family=plain&kind=flat-belt", "#/kind", "The register has no size"],
    ["a limit of nothing", `${wheel}&limit=0`, "#/limit", ""],
    ["a limit too large", `${wheel}&limit=51`, "#/limit", ""],
    ["a chance over one", `${wheel}&minChance=1.1`, "#/minChance", ""],
    ["an unknown kind", "kind=needle&bore=4", "#/kind", ""],
    ["an unknown instrument", `${wheel}&instrument=eye`, "#/instrument", ""],
    ["an unknown sort", `${wheel}&sort=best`, "#/sort", ""],
    ["a country that is none", `${wheel}&shipTo=germany`, "#/shipTo", "Choose a country"],
    ["words without end", `q=${"a".repeat(121)}`, "#/q", "at most 120"],
    ["a length without end", `kind=idler-wheel&bore=${"4".repeat(41)}`, "#/bore", "too long for one length"],
    ["a size without end", `kind=idler-wheel&bore=${"4;".repeat(81)}`, "#/bore", "at most 160"],
    ["too many readings", `kind=idler-wheel&bore=${"4;".repeat(13)}`, "#/bore", "at most 12 readings"],
    ["a reading that is none", "kind=idler-wheel&bore=4;wide", "#/bore", "Reading 2: “wide”"],
    ["readings of two things", "kind=idler-wheel&bore=4;44", "#/bore", "too far apart for one size"],
    ["a size with nothing after its ±", "kind=flat-belt&insideCircumference=532 ±", "#/insideCircumference", "After ±"],
    ["less than nothing", "kind=flat-belt&insideCircumference=8 ± 532", "#/insideCircumference", "must be smaller"],
    [
      "a reading of what is gone beside a size that was worked out",
      "kind=flat-belt&insideCircumference=532 ± 8 mm&width=5&condition=missing",
      "#/condition",
      "Write what was worked out, like 532 ± 8 mm",
    ],
    [
      "a worked-out size of a kind that cannot be so",
      "kind=clutch-felt&thickness=3 ± 1&condition=melted",
      "#/condition",
      "do not become melted",
    ],
    ["a dimension given twice", "kind=idler-wheel&bore=4&bore=5", "#/bore", ""],
    ["a kind given twice", "kind=idler-wheel&kind=flat-belt&bore=4", "#/kind", ""],
    ["words given twice", "q=a&q=b", "#/q", ""],
    ["a cursor of noise", `${wheel}&cursor=abc`, "#/cursor", "Begin again from the first page"],
    ["a cursor of another order", `${wheel}&cursor=${place("price", [1, someId])}`, "#/cursor", "Begin again"],
    ["a cursor with a false key", `${wheel}&cursor=${place("fit", [1, 2, "x", someId])}`, "#/cursor", "Begin again"],
    ["a cursor without end", `${wheel}&cursor=${"a".repeat(301)}`, "#/cursor", ""],
  ])("%s", async (_name, query, pointer, words) => {
    const res = await ask(query).expect(422);
    expect(res.headers["content-type"]).toContain("application/problem+json");
    expect(res.body.type).toBe("/problems/invalid-request");
    const error = res.body.errors.find((one: { pointer: string }) => one.pointer === pointer);
    expect(error?.detail).toContain(words);
    expect(error?.detail.length).toBeGreaterThan(3);
  });

  it("a family that is not there, in words", async () => {
    const res = await ask("family=no-such-family").expect(404);
    expect(res.body).toMatchObject({
      type: "/problems/not-found",
      detail: "No mechanism family is called “no-such-family” here",
    });
  });

  it("names every field that is wrong, not only the first", async () => {
    const res = await ask("kind=idler-wheel&outsideDiameter=wide&bore=narrow").expect(422);
    expect(res.body.errors.map(({ pointer }: { pointer: string }) => pointer)).toEqual(["#/outsideDiameter", "#/bore"]);
  });
});

describe("what a search makes of strange words", () => {
  it.each([
    "'; DROP TABLE parts; --",
    "idler' | 'x",
    "a & b | !c <-> (d):*",
    "\\",
    "%_%",
    '"quoted" -minus',
    "<script>alert(1)</script>",
    "$1 $p0 :p0 ?",
    "\u202e\u0000idler".replace("\u0000", ""),
    "🎛️ ¿qué?",
    "___proto___ constructor",
    "the of and",
    "....,,,,",
    '9,5 mm 1-47/64"',
  ])("%s finds nothing or something, and breaks nothing", async (words) => {
    const res = await request(site.url).get("/api/v1/search").query({ q: words }).expect(200);
    expect(SearchAnswer.parse(res.body).need.q).toBe(words.trim());
  });

  it("a null character is refused or read as nothing, never a failure of ours", async () => {
    const res = await ask("q=idler%00wheel");
    expect(res.status).toBeLessThan(500);
    const family = await ask("family=a%00b");
    expect(family.status).toBe(422);
  });

  it("keeps what is not of the search out of it", async () => {
    await ask(`${wheel}&__proto__[x]=1&constructor=2&unknown=3`).expect(200);
  });
});

describe("what a search costs", () => {
  it("at most twelve queries, however much it finds", async () => {
    for (let n = 0; n < 30; n++) await buildPart({ title: "Platter idler", sizes: { outsideDiameter: 44, bore: 4 } });
    const queries = vi.spyOn(pg.Client.prototype, "query");
    const res = await ask(`${wheel}&bore=4.0&family=plain&q=plattre+idler&limit=50`).expect(200);
    const sent = queries.mock.calls.length;
    queries.mockRestore();
    expect(res.body.total).toBeGreaterThan(20);
    expect(sent).toBeGreaterThan(3);
    expect(sent).toBeLessThanOrEqual(12);
  });
});
