import request from "supertest";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { FitReport } from "#server/models/FitReport";
import { Part } from "#server/models/Part";
import { SearchAnswer } from "#shared/schemas/search";
import { buildPart, buildUser, buildWorkshop } from "#tests/support/factories";
import { startTestSite, type TestSite } from "#tests/support/testSite";
import { buildKit } from "./builders";

let site: TestSite;
beforeAll(async () => {
  site = await startTestSite();
});
afterAll(() => site.close());

const ask = (query: Record<string, string | number>) => request(site.url).get("/api/v1/search").query(query);
async function search(query: Record<string, string | number>): Promise<SearchAnswer> {
  const res = await ask(query).expect(200);
  return SearchAnswer.parse(res.body);
}
const ids = (answer: SearchAnswer) => answer.items.map(({ part }) => part.id);

// Each group of tests has sizes of its own, so that they share a database without meeting.
describe("a search by size", () => {
  it("answers parts with their chance, its reason, the workshop, the landed price and what was understood", async () => {
    const workshop = await buildWorkshop({ name: "Spindle Yard", dispatchDays: 2 });
    const part = await buildPart({
      workshopId: workshop.id,
      sizes: { outsideDiameter: [44.05, 0.05], bore: [4.01, 0.01] },
    });
    const answer = await search({
      kind: "idler-wheel",
      outsideDiameter: '1-47/64"',
      bore: "4 mm",
      condition: "glazed",
      shipTo: "NO",
    });
    expect(answer.need).toMatchObject({ kind: "idler-wheel", instrument: "digital-caliper", condition: "glazed" });
    expect(answer.need.dimensions.map(({ dimension, text }) => [dimension, text])).toEqual([
      ["outsideDiameter", '1-47/64"'],
      ["bore", "4 mm"],
    ]);
    expect(answer.need.dimensions[0]).toMatchObject({ echo: "1-47/64 in = 44.05 mm", bandFrom: "common-practice" });
    // Glazing took something: as new it was larger.
    expect(answer.need.dimensions[0]!.asNewMm).toBeGreaterThan(44.1);
    expect(answer.total).toBe(1);
    const item = answer.items[0]!;
    expect(item).toMatchObject({
      part: { id: part.id, available: 10, dispatchDays: 2 },
      workshop: { name: "Spindle Yard", countryName: "Germany" },
      kitLineId: null,
      shippingMinor: 600,
      landedMinor: 2600,
      currency: "EUR",
      evidence: { fitted: 0, sentence: "no fit reports yet" },
    });
    expect(item.fit).toMatchObject({ verdict: "sure", checked: 2, matters: 4, coverage: 0.5 });
    expect(item.fit!.reason).toContain("Not measured: tread width and overall height.");
  });

  it("leaves out drafts, hidden and retired parts, and workshops that are not admitted", async () => {
    const sizes = { outsideDiameter: 51, bore: 4 };
    const shown = await buildPart({ sizes });
    for (const state of ["draft", "hidden", "retired"] as const) await buildPart({ sizes, state });
    await buildPart({ sizes, workshopId: (await buildWorkshop({ state: "suspended" })).id });
    const answer = await search({ kind: "idler-wheel", outsideDiameter: "51" });
    expect(ids(answer)).toEqual([shown.id]);
    expect(answer.rail?.ticks).toHaveLength(1);
    expect(answer.nearMisses).toEqual([]);
  });

  it("finds by any dimension, without a kind too", async () => {
    const [wheel, mount] = [
      await buildPart({ sizes: { outsideDiameter: 20.5, bore: 7.77 } }),
      await buildPart({ kind: "pinch-roller", sizes: { outsideDiameter: 30, bore: 7.77 } }),
    ];
    const answer = await search({ bore: "7.77" });
    expect(new Set(ids(answer))).toEqual(new Set([wheel.id, mount.id]));
    expect(answer.need.kind).toBeNull();
    expect(answer.rail).toBeNull();
    expect(ids(await search({ kind: "pinch-roller", bore: "7.77" }))).toEqual([mount.id]);
  });

  it("keeps a part that does not state a size asked for, with less coverage, after one that does", async () => {
    const silent = await buildPart({ priceMinor: 100, sizes: { outsideDiameter: [57, 0.05] } });
    const stating = await buildPart({
      priceMinor: 9000,
      sizes: { outsideDiameter: [57, 0.05], treadWidth: [6, 0.05] },
    });
    const answer = await search({ kind: "idler-wheel", outsideDiameter: "57.0", treadWidth: "6.0" });
    expect(ids(answer)).toEqual([stating.id, silent.id]);
    expect(answer.items.map(({ fit }) => fit?.coverage)).toEqual([0.5, 0.25]);
    expect(answer.items[1]!.fit!.reason).toContain("Not stated by the workshop: tread width.");
  });

  it("filters by chance, offer and material", async () => {
    const sure = await buildPart({ material: "NBR", sizes: { outsideDiameter: [63, 0.05] } });
    const chancy = await buildPart({ offerType: "made-to-order", sizes: { outsideDiameter: [63.5, 0.1] } });
    const query = { kind: "idler-wheel", outsideDiameter: "63.00" };
    expect(ids(await search(query))).toEqual([sure.id, chancy.id]);
    expect(ids(await search({ ...query, minChance: 0.9 }))).toEqual([sure.id]);
    expect(ids(await search({ ...query, offer: "made-to-order" }))).toEqual([chancy.id]);
    expect(ids(await search({ ...query, material: "NBR" }))).toEqual([sure.id]);
    expect((await search({ ...query, material: "felt" })).total).toBe(0);
  });

  it("moves the estimate by hand, and the band with it", async () => {
    const larger = await buildPart({ sizes: { outsideDiameter: [70, 0.05] } });
    const query = { kind: "idler-wheel", outsideDiameter: "69.00" };
    expect((await search(query)).total).toBe(0);
    const moved = await search({ ...query, estimateMm: 70 });
    expect(ids(moved)).toEqual([larger.id]);
    expect(moved.need.dimensions[0]).toMatchObject({ asFoundMm: 69, asNewMm: 70, lowerMm: 69.5, upperMm: 70.5 });
    expect(moved.need.dimensions[0]!.basis.at(-1)).toContain("Moved along the rail to 70.00 mm");
    // Without a reading the mark on the rail is the size itself.
    const placed = await search({ kind: "idler-wheel", estimateMm: 70 });
    expect(ids(placed)).toEqual([larger.id]);
    expect(placed.need.dimensions[0]).toMatchObject({ text: null, asFoundMm: null, asNewMm: 70 });
  });

  it("takes the mean of several readings, with their scatter and the flat spot that they show", async () => {
    const part = await buildPart({ sizes: { outsideDiameter: [24, 0.05] } });
    const answer = await search({ kind: "idler-wheel", outsideDiameter: "24.00; 23.70 mm; 24.00", condition: "sound" });
    expect(ids(answer)).toEqual([part.id]);
    const size = answer.need.dimensions[0]!;
    expect(size).toMatchObject({ text: "24.00; 23.70 mm; 24.00", echo: "3 readings, mean 23.90 mm" });
    expect(size.asFoundMm).toBeCloseTo(23.9, 12);
    // A flat only takes away: as new it was as large as at its highest.
    expect(size.asNewMm).toBeCloseTo(24, 12);
    expect(size.basis[0]).toContain("Mean of 3 readings with a digital calliper");
    expect(size.basis.join(" ")).toContain("The 3 readings scatter");
    expect(size.basis.join(" ")).toContain("The readings differ by 0.30 mm; measuring alone explains");
  });

  it("searches a size that was worked out where no part is left, and corrects it for nothing", async () => {
    const [near, far] = [
      await buildPart({ kind: "flat-belt", sizes: { insideCircumference: [905, 1] } }),
      await buildPart({ kind: "flat-belt", sizes: { insideCircumference: [990, 1] } }),
    ];
    const query = { kind: "flat-belt", insideCircumference: "900 ± 8 mm" };
    for (const condition of ["missing", "melted", "slack"]) {
      const answer = await search({ ...query, condition });
      expect(ids(answer)).toEqual([near.id]);
      const size = answer.need.dimensions[0]!;
      expect(size).toMatchObject({
        text: "900 ± 8 mm",
        echo: "worked out as 900 ± 8 mm",
        asFoundMm: null,
        asNewMm: 900,
      });
      // JCGM 100:2008 4.3.7: 8 / sqrt 3.
      expect(size.standardUncertaintyMm).toBeCloseTo(4.618802, 6);
      expect(size.basis[0]).toBe("Worked out as 900 ± 8 mm, not measured: no correction.");
    }
    expect(ids(await search({ ...query, insideCircumference: "985 +/- 8", condition: "missing" }))).toEqual([far.id]);
  });

  it("corrects what was measured beside a size that was worked out", async () => {
    const answer = await search({
      kind: "idler-wheel",
      outsideDiameter: "1.14 ± 0.02 in",
      secondTreadDiameter: "18.00",
      condition: "glazed",
    });
    const [workedOut, measured] = answer.need.dimensions;
    expect(workedOut).toMatchObject({ asFoundMm: null, echo: "worked out as 1.14 ± 0.02 in = 28.96 ± 0.51 mm" });
    expect(workedOut!.asNewMm).toBeCloseTo(28.956, 12);
    expect(measured!.asFoundMm).toBe(18);
    expect(measured!.asNewMm).toBeGreaterThan(18);
  });

  it("tells what restorers reported", async () => {
    const part = await buildPart({ sizes: { outsideDiameter: 75 } });
    const users = [await buildUser(), await buildUser(), await buildUser()];
    const outcomes = ["fitted", "fitted-after-work", "did-not-fit"] as const;
    for (const [i, outcome] of outcomes.entries()) {
      await FitReport.create({ partId: part.id, servicePointId: null, userId: users[i]!.id, outcome });
    }
    const answer = await search({ kind: "idler-wheel", outsideDiameter: "75" });
    expect(answer.items[0]!.evidence).toEqual({
      fitted: 1,
      fittedAfterWork: 1,
      didNotFit: 1,
      sentence: "2 restorers fitted this, 1 after some work; 1 restorer found that it did not fit",
    });
  });
});

describe("a kit", () => {
  it("is found once, by the line that fits best", async () => {
    const { part, lines } = await buildKit({
      lines: [{ outsideDiameter: 81.4 }, { outsideDiameter: 81 }, { outsideDiameter: 20 }],
    });
    const answer = await search({ kind: "idler-wheel", outsideDiameter: "81.00", bore: "4.00" });
    expect(answer.items.map(({ part: { id }, kitLineId }) => [id, kitLineId])).toEqual([[part.id, lines[1]!.id]]);
    expect(answer.total).toBe(1);
    expect(answer.items[0]!.part.kitLines.map(({ title }) => title)).toEqual([
      "Wheel 1",
      "Wheel 2",
      "Wheel 3",
      "Bearing grease",
    ]);
    expect(answer.rail?.ticks.map(({ nominalMm }) => nominalMm)).toEqual([81]);
  });
});

describe("the order of results", () => {
  const query = { kind: "flat-belt", insideCircumference: "300.0", width: "5.00", shipTo: "DE" };
  let cheap: Part;
  let near: Part;
  let far: Part;
  let dear: Part;
  beforeAll(async () => {
    const slow = await buildWorkshop({ dispatchDays: 9 });
    const quick = await buildWorkshop({ dispatchDays: 1 });
    const elsewhere = await buildWorkshop({ countries: ["US"], dispatchDays: 3 });
    const belt = {
      kind: "flat-belt" as const,
      sizes: { insideCircumference: [300, 0.5] as [number, number], width: 5 },
    };
    dear = await buildPart({ ...belt, workshopId: quick.id, priceMinor: 3000 });
    cheap = await buildPart({ ...belt, workshopId: slow.id, priceMinor: 1000 });
    far = await buildPart({ ...belt, workshopId: elsewhere.id, priceMinor: 10 });
    near = await buildPart({
      kind: "flat-belt",
      workshopId: slow.id,
      priceMinor: 500,
      sizes: { insideCircumference: [304.4, 0.5], width: 5 },
    });
  });

  it("is by fit, then by landed price, what is not sent there last", async () => {
    expect(ids(await search(query))).toEqual([cheap.id, dear.id, far.id, near.id]);
  });

  it("is by landed price where asked, what is not sent there last", async () => {
    const answer = await search({ ...query, sort: "price" });
    expect(ids(answer)).toEqual([near.id, cheap.id, dear.id, far.id]);
    expect(answer.items.map(({ landedMinor }) => landedMinor)).toEqual([1100, 1600, 3600, null]);
  });

  it("is by the day of dispatch where asked", async () => {
    expect(ids(await search({ ...query, sort: "dispatch" }))).toEqual([dear.id, far.id, near.id, cheap.id]);
  });

  it("comes in pages that lose nothing and repeat nothing, also when a part goes in between", async () => {
    for (const sort of ["fit", "price", "dispatch"]) {
      const whole = ids(await search({ ...query, sort }));
      const first = await search({ ...query, sort, limit: 2 });
      expect(first.total).toBe(4);
      expect(first.nextCursor).not.toBeNull();
      const second = await search({ ...query, sort, limit: 2, cursor: first.nextCursor! });
      expect([...ids(first), ...ids(second)]).toEqual(whole);
      expect(second.nextCursor).toBeNull();
    }
    const order = ids(await search(query));
    const first = await search({ ...query, limit: 2 });
    await Part.update({ state: "hidden" }, { where: { id: order[1]! } });
    const second = await search({ ...query, limit: 2, cursor: first.nextCursor! });
    expect(ids(second)).toEqual(order.slice(2));
    await Part.update({ state: "published" }, { where: { id: order[1]! } });
  });
});

describe("near misses and the rail", () => {
  it("show what one dimension alone keeps out, the nearest first, and why", async () => {
    const fits = await buildPart({ sizes: { outsideDiameter: [33, 0.05], bore: [6, 0.01] } });
    const tight = await buildPart({ sizes: { outsideDiameter: [33, 0.05], bore: [5.8, 0.01] } });
    const small = await buildPart({ sizes: { outsideDiameter: [31.5, 0.05], bore: [6, 0.01] } });
    const smaller = await buildPart({ sizes: { outsideDiameter: [31.2, 0.05], bore: [6, 0.01] } });
    const both = await buildPart({ sizes: { outsideDiameter: [31.5, 0.05], bore: [5.8, 0.01] } });
    const answer = await search({ kind: "idler-wheel", outsideDiameter: "33.00", bore: "6.00" });
    expect(ids(answer)).toEqual([fits.id]);
    expect(answer.nearMisses.map(({ part, failing }) => [part.id, failing.dimension, failing.reason])).toEqual([
      [small.id, "outsideDiameter", "outside diameter is 1.50 mm too small"],
      [smaller.id, "outsideDiameter", "outside diameter is 1.80 mm too small"],
      [tight.id, "bore", "bore is 0.20 mm tight for a 6.00 mm spindle"],
    ]);
    expect(answer.nearMisses.every(({ fit }) => fit?.verdict === "unfit")).toBe(true);
    expect(JSON.stringify(answer)).not.toContain(both.id);

    const rail = answer.rail!;
    expect(rail.dimension).toBe("outsideDiameter");
    expect(rail.ticks.map(({ nominalMm, verdict }) => [nominalMm, verdict])).toEqual([
      [31.2, "unfit"],
      [31.5, "unfit"],
      [33, "sure"],
      [33, "unfit"],
    ]);
    expect(rail.fromMm).toBe(31);
    expect(rail.toMm).toBe(33.6);
  });

  it("never has more than six misses or sixty ticks, and shows both sides of a crowd", async () => {
    const workshopId = (await buildWorkshop()).id;
    for (let n = 0; n < 70; n++) {
      await buildPart({ workshopId, kind: "square-belt", sizes: { insideCircumference: [200 + (n % 10) / 10, 0.1] } });
    }
    for (let n = 0; n < 9; n++) {
      await buildPart({ workshopId, kind: "square-belt", sizes: { insideCircumference: [n % 2 ? 192 : 209, 0.1] } });
    }
    const answer = await search({ kind: "square-belt", insideCircumference: "200.5", limit: 5 });
    expect(answer.total).toBe(70);
    expect(answer.nearMisses).toHaveLength(6);
    const { ticks } = answer.rail!;
    expect(ticks).toHaveLength(60);
    expect(ticks[0]!.nominalMm).toBe(192);
    expect(ticks.at(-1)!.nominalMm).toBe(209);
    expect(new Set(ticks.map(({ partId }) => partId)).size).toBe(60);
  });

  it("stands empty where nothing is near, with the band in sight", async () => {
    const answer = await search({ kind: "clutch-felt", outsideDiameter: "17.0" });
    expect(answer).toMatchObject({ total: 0, items: [], nearMisses: [], nextCursor: null });
    expect(answer.rail!.ticks).toEqual([]);
    expect(answer.rail!.fromMm).toBeLessThan(16);
    expect(answer.rail!.toMm).toBeGreaterThanOrEqual(18);
  });
});
