import request from "supertest";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { WorkshopList, WorkshopPage } from "#shared/schemas/catalogue";
import { buildPart, buildWorkshop } from "#tests/support/factories";
import { startTestSite, type TestSite } from "#tests/support/testSite";

let site: TestSite;
beforeAll(async () => {
  site = await startTestSite();
  const open = await buildWorkshop({
    slug: "open-yard",
    name: "Open Yard",
    countries: ["DE", "NO"],
    tax: { DE: 1900 },
    dispatchDays: 4,
    returnsTerms: "Within 14 days.",
  });
  await buildWorkshop({ slug: "shut", name: "Shut", state: "suspended", countries: ["JP"] });
  await buildPart({ workshopId: open.id, title: "B wheel" });
  await buildPart({ workshopId: open.id, title: "A wheel" });
  await buildPart({ workshopId: open.id, kind: "flat-belt", title: "Belt", sizes: { insideCircumference: 300 } });
  await buildPart({ workshopId: open.id, state: "draft", kind: "brake-pad", sizes: { length: 20 } });
});
afterAll(() => site.close());

const get = (path: string) => request(site.url).get(`/api/v1${path}`);

describe("workshops", () => {
  it("are listed where they are admitted, with what they offer", async () => {
    const { items } = WorkshopList.parse((await get("/workshops").expect(200)).body);
    expect(items).toHaveLength(1);
    expect(items[0]).toMatchObject({
      slug: "open-yard",
      countryName: "Germany",
      partCount: 3,
      kinds: ["idler-wheel", "flat-belt"],
    });
  });

  it("have a page with terms, postage, tax and parts in order", async () => {
    const page = WorkshopPage.parse((await get("/workshops/open-yard").expect(200)).body);
    expect(page).toMatchObject({
      workshop: { name: "Open Yard" },
      dispatchDays: 4,
      returnsTerms: "Within 14 days.",
      trader: { address: [expect.any(String), "00001 Testby", "Germany"] },
      shippingRates: [
        { zone: "everywhere", countries: ["DE", "NO"], baseMinor: 500, perItemMinor: 100, freeOverMinor: null },
      ],
      taxRegistrations: [{ country: "DE", countryName: "Germany", ratePercent: 19 }],
    });
    expect(page.parts.map(({ title }) => title)).toEqual(["Belt", "A wheel", "B wheel"]);
  });

  it("have none where they are not admitted or not there", async () => {
    await get("/workshops/shut").expect(404);
    const res = await get("/workshops/nobody").expect(404);
    expect(res.body.detail).toContain("“nobody”");
  });
});

describe("countries", () => {
  it("are those that an admitted workshop sends to, by name", async () => {
    expect((await get("/countries").expect(200)).body).toEqual({
      items: [
        { code: "DE", name: "Germany" },
        { code: "NO", name: "Norway" },
      ],
    });
  });
});
