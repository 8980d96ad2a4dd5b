import request from "supertest";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { startTestSite, type TestSite } from "#tests/support/testSite";
import { ask, type CallName, goodBodies, goodQueries, read } from "./calls";

let site: TestSite;
beforeAll(async () => {
  site = await startTestSite();
});
afterAll(() => site.close());

async function answerOf<T>(name: CallName, body: object = goodBodies[name][0]!): Promise<T> {
  const res = await ask(site, name, body);
  expect(res.status, JSON.stringify(res.body)).toBe(200);
  return res.body;
}

const estimate = { valueMm: expect.any(Number), standardUncertaintyMm: expect.any(Number) };
const words = expect.arrayContaining([expect.any(String)]);

describe("every call answers what the interface promises, and no field more", () => {
  it("length", async () => {
    expect(await answerOf("length")).toEqual({
      mm: 44.053125,
      resolutionMm: 0.396875,
      unit: "in",
      echo: "1-47/64 in = 44.05 mm",
    });
  });

  it("belt-route", async () => {
    const route = await answerOf<{ insideCircumferenceMm: { min: number; mid: number; max: number } }>("belt-route");
    expect(route).toEqual({
      pitchLengthMm: expect.closeTo(646.721035998, 6),
      spansMm: [expect.any(Number), expect.any(Number), expect.any(Number)],
      wrapsDeg: [expect.any(Number), expect.any(Number), expect.any(Number)],
      insideCircumferenceMm: {
        min: expect.closeTo(646.721035998 / 1.08 - Math.PI * 1.2, 6),
        mid: expect.closeTo(646.721035998 / 1.06 - Math.PI * 1.2, 6),
        max: expect.closeTo(646.721035998 / 1.04 - Math.PI * 1.2, 6),
      },
      turns: ["same", "opposite", "same"],
      warnings: [expect.stringContaining("Pulley 2")],
    });
  });

  it("belt-sample", async () => {
    const circumference = { insideCircumferenceMm: expect.any(Number), standardUncertaintyMm: expect.any(Number) };
    const sample = await answerOf<{ asFound: { insideCircumferenceMm: number } }>("belt-sample");
    expect(sample).toEqual({ asFound: circumference, asNew: circumference, basis: words });
    expect(sample.asFound.insideCircumferenceMm).toBeCloseTo(2 * (215 - 2 * 1.2), 9);
  });

  it("as-new", async () => {
    expect(await answerOf("as-new")).toEqual({
      asFound: { ...estimate, valueMm: expect.closeTo(44.1, 9) },
      asNew: { ...estimate, valueMm: expect.closeTo(44.2, 9) },
      flatSpot: false,
      basis: words,
    });
  });

  it("speed, of a rim drive with a target", async () => {
    expect(await answerOf("speed")).toEqual({
      motorRpm: 1440,
      outputRpm: expect.closeTo(32.6769230769, 9),
      target: "33 1/3",
      errorPercent: expect.closeTo(-1.9692307692, 9),
      errorCents: expect.closeTo(1200 * Math.log2(32.6769230769 / (100 / 3)), 6),
      sets: ["stepDiameter", "rimDiameter"],
      cancels: ["idlerDiameter"],
      otherMains: { mainsHz: 60, stepDiameterMm: expect.closeTo((5.9 * 5) / 6, 9) },
    });
  });

  it("speed, of the other drives without one", async () => {
    const [, stepped, belt] = goodBodies.speed;
    expect(await answerOf("speed", stepped)).toEqual({
      motorRpm: 1440,
      outputRpm: expect.closeTo(28.8, 9),
      sets: ["stepDiameter", "idlerLargeDiameter", "idlerSmallDiameter", "rimDiameter"],
      cancels: [],
      otherMains: expect.anything(),
    });
    expect(await answerOf("speed", belt)).toMatchObject({
      motorRpm: 300,
      outputRpm: expect.closeTo((300 * 15) / 162.8, 9),
      otherMains: { mainsHz: 50, stepDiameterMm: expect.closeTo(15 * 1.2 - 0.8, 9) },
    });
  });

  it("speed, of a capstan", async () => {
    const outputRpm = (1425 * 12.6) / 80.6;
    expect(await answerOf("speed", goodBodies.speed[3])).toMatchObject({
      outputRpm: expect.closeTo(outputRpm, 9),
      tapeSpeedMmPerS: expect.closeTo((Math.PI * 8 * outputRpm) / 60, 9),
      target: "3 3/4",
      errorPercent: expect.closeTo(((Math.PI * 8 * outputRpm) / 60 / 95.25 - 1) * 100, 9),
    });
  });

  it("strobe", async () => {
    expect(await answerOf("strobe")).toEqual({
      bars: 133,
      shownRpm: expect.closeTo(45.1127819549, 9),
      errorPercent: expect.closeTo(0.250626566416, 9),
    });
  });

  it("rubber-tolerance", async () => {
    const res = await read(site, "rubber-tolerance", goodQueries["rubber-tolerance"]).expect(200);
    expect(res.body).toEqual({ plusMinusMm: 0.5, class: "M2", range: [63, 100], source: "ISO 3302-1:2014 Table 1" });
    const last = await read(site, "rubber-tolerance", { class: "M3", nominalMm: "219.9", dimension: "fixed" });
    expect(last.body).toMatchObject({ plusMinusMm: expect.closeTo(1.7592, 9), range: [160, 10_000] });
  });

  it("o-rings", async () => {
    const res = await read(site, "o-rings", goodQueries["o-rings"]).expect(200);
    expect(res.body.sizes).toHaveLength(5);
    expect(res.body.sizes[0]).toEqual({
      dash: "214",
      insideDiameterMm: expect.closeTo(24.9936, 4),
      insideDiameterTolMm: expect.closeTo(0.254, 4),
      sectionMm: expect.closeTo(3.5306, 4),
      sectionTolMm: expect.closeTo(0.1016, 4),
      differenceMm: expect.closeTo(0.0936, 4),
      stretchPercent: expect.closeTo(-0.3745, 3),
    });
    expect(res.body.source).toContain("AS568");
    await read(site, "o-rings", { insideDiameterMm: "24.9" }).expect(200);
  });

  it("conformance, with two limits and with one", async () => {
    expect(await answerOf("conformance")).toEqual({ probability: expect.closeTo(0.908788732061, 9) });
    const one = { estimateMm: -5.47, standardUncertaintyMm: 0.05, upperMm: -5.4 };
    expect(await answerOf("conformance", one)).toEqual({ probability: expect.closeTo(0.919243340766, 9) });
  });

  it("check-in, with an instrument and with an uncertainty", async () => {
    const [withInstrument, withUncertainty] = goodBodies["check-in"];
    const kept = { meanMm: expect.closeTo(44.035, 9), standardUncertaintyMm: expect.any(Number) };
    expect(await answerOf("check-in", withInstrument)).toEqual({
      verdict: "conforms",
      ...kept,
      guardBandMm: expect.any(Number),
    });
    expect(await answerOf("check-in", withUncertainty)).toEqual({
      verdict: "conforms",
      meanMm: 44.02,
      standardUncertaintyMm: 0.02,
      guardBandMm: expect.closeTo(0.033, 12),
    });
    const answers = await Promise.all(
      [44.18, 44.23, 44.24].map((reading) => answerOf("check-in", { ...withUncertainty, readingsMm: [reading] })),
    );
    expect(answers.map((answer) => (answer as { verdict: string }).verdict)).toEqual([
      "cannot-tell",
      "cannot-tell",
      "does-not-conform",
    ]);
  });

  it("consensus", async () => {
    const consensus = await answerOf<{ robustMeanMm: number }>("consensus");
    expect(consensus).toEqual({
      robustMeanMm: expect.any(Number),
      robustSdMm: expect.any(Number),
      standardUncertaintyMm: expect.any(Number),
      n: 5,
      iterations: expect.any(Number),
    });
    expect(consensus.robustMeanMm).toBeGreaterThan(44.1);
    expect(consensus.robustMeanMm).toBeLessThan(44.2);
  });

  it("fit", async () => {
    const fit = await answerOf<{ dimensions: object[] }>("fit");
    expect(fit).toEqual({
      chance: expect.any(Number),
      verdict: "likely",
      coverage: 0.5,
      dimensions: [expect.anything(), expect.anything()],
    });
    expect(fit.dimensions[0]).toEqual({
      dimension: "outsideDiameter",
      chance: expect.any(Number),
      deviationMm: expect.closeTo(0.1, 9),
      combinedUncertaintyMm: expect.closeTo(Math.hypot(0.1, 0.1 / Math.sqrt(3)), 12),
      lowerMm: expect.closeTo(43.7, 9),
      upperMm: expect.closeTo(44.7, 9),
      reason: expect.stringContaining("outside diameter"),
    });
  });

  it("basket-plan, worked out in its own thread", async () => {
    const plan = {
      lines: [{ offerId: "one", quantity: 1 }],
      partsMinor: 1200,
      shippingMinor: 550,
      totalMinor: 1750,
      parcels: 1,
      lowestChance: 0.9,
      readyInDays: 3,
    };
    expect(await answerOf("basket-plan")).toEqual({
      plans: { cheapest: plan, fewestParcels: plan, surest: plan, soonest: plan },
      optimal: true,
    });
    const wanted = { ...goodBodies["basket-plan"][0], needs: [{ id: "idler", quantity: 5 }] };
    expect(await answerOf("basket-plan", wanted)).toEqual({
      plans: { cheapest: null, fewestParcels: null, surest: null, soonest: null },
      optimal: true,
      infeasible: ["idler"],
    });
  });
});

describe("the gauge desk", () => {
  it("asks for no session and gives none", async () => {
    const res = await ask(site, "strobe", goodBodies.strobe[0]!);
    expect(res.headers["set-cookie"]).toBeUndefined();
  });

  it("does not answer while a large basket is planned any later than else", async () => {
    const { offers, ...rest } = goodBodies["basket-plan"][0]!;
    const many = { ...rest, offers: Array.from({ length: 300 }, (_, i) => ({ ...offers[0], id: `offer ${i}` })) };
    const planned = ask(site, "basket-plan", many).then((res) => res.status);
    await ask(site, "strobe", goodBodies.strobe[0]!).expect(200);
    expect(await planned).toBe(200);
  });

  it("is described with its limits", async () => {
    const { body } = await request(site.url).get("/api/v1/openapi.json").expect(200);
    const route = body.paths["/api/v1/gauges/belt-route"].post.requestBody.content["application/json"].schema;
    expect(route.properties.thickness).toMatchObject({ type: "number", minimum: 0, maximum: 50 });
    expect(route.properties.pulleys).toMatchObject({ minItems: 2, maxItems: 24 });
    const rings = body.paths["/api/v1/gauges/o-rings"].get.parameters;
    expect(rings).toContainEqual(
      expect.objectContaining({
        name: "insideDiameterMm",
        in: "query",
        schema: expect.objectContaining({ type: "number" }),
      }),
    );
  });
});
