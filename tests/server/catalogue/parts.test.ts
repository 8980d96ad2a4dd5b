import { randomUUID } from "node:crypto";
import request from "supertest";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { FitClaim } from "#server/models/FitClaim";
import { FitReport } from "#server/models/FitReport";
import { Photo } from "#server/models/Photo";
import { Workshop } from "#server/models/Workshop";
import { buildFamily, buildKit } from "#tests/server/search/builders";
import { buildPart, buildUser, buildWorkshop } from "#tests/support/factories";
import { startTestSite, type TestSite } from "#tests/support/testSite";

let site: TestSite;
let points: Awaited<ReturnType<typeof buildFamily>>["points"];
beforeAll(async () => {
  site = await startTestSite();
  ({ points } = await buildFamily({
    slug: "lone",
    name: "Lone",
    points: [{ name: "platter idler", sizes: { outsideDiameter: [44, 43.5, 44.5], bore: [4, 3.96, 4.06] } }],
  }));
});
afterAll(() => site.close());

const part = (id: string, query: Record<string, string> = {}) =>
  request(site.url).get(`/api/v1/parts/${id}`).query(query);

describe("the page of a part", () => {
  it("shows the part, who sells it, its photos, claims and evidence, and how it fits what was measured", async () => {
    const workshop = await buildWorkshop({ name: "Page Works" });
    const made = await buildPart({
      workshopId: workshop.id,
      description: "Ground to size.",
      sizes: { outsideDiameter: [44, 0.05], bore: [4, 0.01] },
    });
    await FitClaim.create({ partId: made.id, servicePointId: points[0]!.id, evidence: "from-drawing" });
    await FitReport.create({
      partId: made.id,
      servicePointId: points[0]!.id,
      userId: (await buildUser()).id,
      outcome: "fitted",
    });
    for (const position of [2, 1]) {
      await Photo.create({
        partId: made.id,
        position,
        file: `p${position}`,
        alt: `Side ${position}`,
        width: 1200,
        height: 900,
      });
    }
    const { body } = await part(made.id, { outsideDiameter: "44.0", bore: "4.00", shipTo: "NO" }).expect(200);
    expect(body).toMatchObject({
      part: { id: made.id, available: 10, photo: { alt: "Side 1", width: 320, height: 240 } },
      description: "Ground to size.",
      workshop: { name: "Page Works", countryName: "Germany" },
      trader: { legalName: expect.stringContaining("Ltd"), email: expect.stringContaining("@") },
      fitClaims: [
        { familySlug: "lone", familyName: "Lone", servicePointName: "platter idler", evidence: "from-drawing" },
      ],
      evidence: { fitted: 1, sentence: "1 restorer fitted this" },
      need: { kind: "idler-wheel", shipTo: "NO" },
      fit: { verdict: "sure", checked: 2, matters: 4 },
      shippingMinor: 600,
      landedMinor: 2600,
      currency: "EUR",
      madeToSize: false,
    });
    expect(body.photos.map(({ alt, width, height }: Record<string, unknown>) => [alt, width, height])).toEqual([
      ["Side 1", 960, 720],
      ["Side 2", 960, 720],
    ]);
  });

  it("has no fit where nothing was measured, and one against the register where a family is named", async () => {
    const made = await buildPart({ sizes: { outsideDiameter: [45.5, 0.05], bore: [4, 0.01] } });
    expect((await part(made.id).expect(200)).body).toMatchObject({ fit: null, need: { dimensions: [] } });
    const { body } = await part(made.id, { family: "lone" }).expect(200);
    expect(body.fit).toMatchObject({ verdict: "unfit", checked: 2 });
    expect(body.fit.reason).toContain("Outside diameter is 1.50 mm too large");
  });

  it("shows how the best line of a kit fits", async () => {
    const { part: kit } = await buildKit({ lines: [{ outsideDiameter: 20 }, { outsideDiameter: 44 }] });
    const { body } = await part(kit.id, { kind: "idler-wheel", outsideDiameter: "44.0", bore: "4.00" }).expect(200);
    expect(body.fit.verdict).toBe("sure");
    expect(body.part.kitLines).toHaveLength(3);
    expect(body.part.dimensions).toEqual({});
  });

  it("has no landed price where the workshop does not ship", async () => {
    const made = await buildPart();
    const { body } = await part(made.id, { shipTo: "JP" }).expect(200);
    expect(body).toMatchObject({ landedMinor: null, shippingMinor: null });
  });

  it("stays for what is sold out or retired, with nothing left to buy", async () => {
    const sold = await buildPart({ stockOnHand: 0 });
    const retired = await buildPart({ state: "retired", stockOnHand: 4 });
    const custom = await buildPart({ state: "retired", offerType: "made-to-order" });
    for (const made of [sold, retired, custom]) {
      expect((await part(made.id).expect(200)).body.part.available).toBe(0);
    }
    const open = await buildPart({ offerType: "made-to-order" });
    expect((await part(open.id).expect(200)).body.part.available).toBeNull();
  });

  it("is not there for drafts, hidden parts, workshops not admitted, and ids of nothing", async () => {
    const hidden = [await buildPart({ state: "draft" }), await buildPart({ state: "hidden" })];
    const suspended = await buildPart();
    await Workshop.update({ state: "suspended" }, { where: { id: suspended.workshopId } });
    for (const id of [...hidden.map((made) => made.id), suspended.id, randomUUID(), "not-an-id"]) {
      const res = await part(id).expect(404);
      expect(res.body.type).toBe("/problems/not-found");
    }
  });

  it("refuses an unclear need as the search does", async () => {
    const made = await buildPart();
    const res = await part(made.id, { bore: "wide" }).expect(422);
    expect(res.body.errors[0].pointer).toBe("#/bore");
    await part(made.id, { kind: "flat-belt", bore: "4" }).expect(422);
    await part(made.id, { family: "no-such" }).expect(404);
  });
});
