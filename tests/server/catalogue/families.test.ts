import request from "supertest";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { Family } from "#server/models/Family";
import { FitClaim } from "#server/models/FitClaim";
import { FamilyList, FamilyPage } from "#shared/schemas/catalogue";
import { buildFamily } from "#tests/server/search/builders";
import { buildPart, buildWorkshop } from "#tests/support/factories";
import { startTestSite, type TestSite } from "#tests/support/testSite";

let site: TestSite;
let points: Awaited<ReturnType<typeof buildFamily>>["points"];
beforeAll(async () => {
  site = await startTestSite();
  ({ points } = await buildFamily({
    slug: "ardent-two",
    name: "Ardent Two",
    points: [
      { name: "platter idler", sizes: { outsideDiameter: [44, 43.5, 44.5], bore: [4, 3.96, 4.06] } },
      { name: "counter belt", kind: "flat-belt", sizes: {} },
    ],
  }));
  const { family } = await buildFamily({ slug: "zonal", name: "Zonal", points: [] });
  await Family.update({ kind: "reel-to-reel-deck", models: ["Zonal 9", "Parlour Reel"] }, { where: { id: family.id } });
});
afterAll(() => site.close());

const get = (path: string) => request(site.url).get(`/api/v1${path}`);
const slugs = async (query: string) =>
  FamilyList.parse((await get(`/families${query}`).expect(200)).body).items.map(({ slug }) => slug);

describe("the list of families", () => {
  it("has them by maker and name, with their service points counted", async () => {
    const { items } = FamilyList.parse((await get("/families").expect(200)).body);
    expect(items.map(({ slug, servicePointCount }) => [slug, servicePointCount])).toEqual([
      ["ardent-two", 2],
      ["zonal", 0],
    ]);
  });

  it.each([
    ["?kind=reel-to-reel-deck", ["zonal"]],
    ["?kind=cine-projector", []],
    ["?q=ardent", ["ardent-two"]],
    ["?q=parlour reel", ["zonal"]],
    ["?q=parluor", ["zonal"]],
    ["?q=testwerk", ["ardent-two", "zonal"]],
    ["?q=ard", ["ardent-two"]],
    ["?q=", ["ardent-two", "zonal"]],
    ["?q=' OR 1=1 --", []],
  ])("answers %s", async (query, expected) => {
    expect(await slugs(query)).toEqual(expected);
  });

  it("refuses an unknown kind", async () => {
    await get("/families?kind=gramophone").expect(422);
  });
});

describe("the page of a family", () => {
  it("counts the parts on offer that fit each service point, by size or by a workshop's word", async () => {
    const fits = await buildPart({ sizes: { outsideDiameter: [44.1, 0.05], bore: [4, 0.01] } });
    const claimed = await buildPart({ sizes: { outsideDiameter: [50, 0.05] } });
    await buildPart({ sizes: { outsideDiameter: [50, 0.05] } });
    await buildPart({ state: "hidden", sizes: { outsideDiameter: [44, 0.05] } });
    const suspended = await buildWorkshop({ state: "suspended" });
    const gone = await buildPart({ workshopId: suspended.id, sizes: { outsideDiameter: [44, 0.05] } });
    for (const { id } of [fits, claimed, gone]) {
      await FitClaim.create({ partId: id, servicePointId: points[0]!.id, evidence: "fitted-here" });
    }
    const page = FamilyPage.parse((await get("/families/ardent-two").expect(200)).body);
    expect(page).toMatchObject({ name: "Ardent Two", maker: "Testwerk", servicePointCount: 2 });
    expect(page.servicePoints.map(({ number, name, partCount }) => [number, name, partCount])).toEqual([
      [1, "platter idler", 2],
      [2, "counter belt", 0],
    ]);
    expect(page.servicePoints[0]).toMatchObject({
      partKind: "idler-wheel",
      xMm: 10,
      yMm: 20,
      sizes: { outsideDiameter: { nominalMm: 44, lowerMm: 43.5, upperMm: 44.5 }, bore: { nominalMm: 4 } },
    });
  });

  it("is not there for an unknown one, in words", async () => {
    const res = await get("/families/nothing-here").expect(404);
    expect(res.body.detail).toContain("“nothing-here”");
    await get("/families/NOT%20A%20SLUG").expect(404);
  });
});
