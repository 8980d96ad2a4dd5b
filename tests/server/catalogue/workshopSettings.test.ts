import { afterAll, beforeAll, beforeEach, describe, expect, it } from "vitest";
import { AuditEntry } from "#server/models/AuditEntry";
import { ShippingRate } from "#server/models/ShippingRate";
import type { Workshop } from "#server/models/Workshop";
import { PartPage, WorkshopPage } from "#shared/schemas/catalogue";
import { SearchAnswer } from "#shared/schemas/search";
import { type WorkshopSettings, WorkshopSettingsPage } from "#shared/schemas/workshopSettings";
import { buildPart, buildUser, buildWorkshop, testPassword } from "#tests/support/factories";
import { startTestSite, type TestSite } from "#tests/support/testSite";
import { type Visitor, visitor } from "#tests/support/visitor";

let site: TestSite;
let owner: Visitor;
let workshop: Workshop;
const address = "/workshop/settings";

async function signedIn(given: Parameters<typeof buildUser>[0]) {
  const user = await buildUser(given);
  const person = await visitor(site);
  await person.signIn(user.email, testPassword);
  return { user, person };
}

beforeAll(async () => {
  site = await startTestSite();
});
afterAll(() => site.close());
beforeEach(async () => {
  const { user, person } = await signedIn({ role: "workshop" });
  owner = person;
  workshop = await buildWorkshop({ ownerId: user.id, tax: { DE: 1900 } });
});

const read = async (person = owner) => WorkshopSettingsPage.parse((await person.get(address).expect(200)).body);
const zone = (given: Partial<WorkshopSettings["zones"][number]> = {}) => ({
  zone: "Near",
  countries: ["DE", "AT"],
  baseMinor: 390,
  perItemMinor: 40,
  freeOverMinor: 9000,
  ...given,
});
async function changed(given: Partial<WorkshopSettings> = {}): Promise<WorkshopSettings> {
  const { settings } = await read();
  return { ...settings, ...given };
}

describe("a workshop's settings", () => {
  it("are read as they stand", async () => {
    const page = await read();
    expect(page).toMatchObject({
      workshop: { slug: workshop.slug, state: "admitted" },
      currency: "EUR",
      settings: {
        dispatchDays: 3,
        zones: [{ zone: "everywhere", countries: ["DE", "NO", "US"], baseMinor: 500, freeOverMinor: null }],
        taxRegistrations: [{ country: "DE", ratePercent: 19 }],
      },
    });
  });

  it("are kept whole, with a word in the audit log, and shown on the workshop's page", async () => {
    const body = await changed({
      about: "  Wheels since a while.\nAnd belts. ",
      dispatchDays: 5,
      returnsTerms: "Within 30 days.",
      zones: [zone(), zone({ zone: "Far", countries: ["JP"], baseMinor: 1200, freeOverMinor: null })],
      taxRegistrations: [{ country: "AT", number: "AT-77", ratePercent: 8.25 }],
    });
    const saved = WorkshopSettingsPage.parse((await owner.put(address, body).expect(200)).body);
    expect(saved.settings.about).toBe("Wheels since a while.\nAnd belts.");
    expect(saved.settings.version > body.version).toBe(true);
    expect((await read()).settings).toEqual(saved.settings);
    expect(saved.settings.zones).toEqual([
      { ...zone(), countries: ["AT", "DE"] },
      zone({ zone: "Far", countries: ["JP"], baseMinor: 1200, freeOverMinor: null }),
    ]);
    const page = WorkshopPage.parse((await owner.get(`/workshops/${workshop.slug}`).expect(200)).body);
    expect(page).toMatchObject({ dispatchDays: 5, taxRegistrations: [{ country: "AT", ratePercent: 8.25 }] });

    const entries = await AuditEntry.findAll({ where: { subjectId: workshop.id } });
    expect(entries).toHaveLength(1);
    expect(entries[0]).toMatchObject({
      actorId: workshop.ownerId,
      action: "settings-saved",
      detail: { before: { zones: [{ zone: "everywhere" }] }, after: { dispatchDays: 5 } },
    });
  });

  it("change what parts cost at the door at once, in a search and on the part's page", async () => {
    const part = await buildPart({ workshopId: workshop.id, title: "Landing wheel", sizes: { outsideDiameter: 71.3 } });
    const search = async (shipTo: string) => {
      const query = `/search?kind=idler-wheel&outsideDiameter=71.3mm&shipTo=${shipTo}`;
      const { items } = SearchAnswer.parse((await owner.get(query).expect(200)).body);
      return items.find((item) => item.part.id === part.id);
    };
    const page = async () => PartPage.parse((await owner.get(`/parts/${part.id}?shipTo=DE`).expect(200)).body);
    expect(await search("DE")).toMatchObject({ landedMinor: 2600, part: { dispatchDays: 3 } });
    expect(await search("AT")).toMatchObject({ landedMinor: null });

    await owner.put(address, await changed({ dispatchDays: 9, zones: [zone()] })).expect(200);
    expect(await search("DE")).toMatchObject({ landedMinor: 2430, shippingMinor: 430, part: { dispatchDays: 9 } });
    expect(await search("AT")).toMatchObject({ landedMinor: 2430 });
    expect(await search("NO")).toMatchObject({ landedMinor: null, shippingMinor: null });
    expect(await page()).toMatchObject({ landedMinor: 2430, part: { dispatchDays: 9 } });

    await owner.put(address, await changed({ zones: [zone({ freeOverMinor: 2000 })] })).expect(200);
    expect(await search("DE")).toMatchObject({ landedMinor: 2000, shippingMinor: 0 });
    expect(await page()).toMatchObject({ landedMinor: 2000 });
  });

  it("are not written over by a page that was opened before they changed", async () => {
    const first = await changed({ about: "from the first tab" });
    const second = { ...first, about: "from the second tab", zones: [zone()] };
    await owner.put(address, first).expect(200);
    const res = await owner.put(address, second).expect(409);
    expect(res.body.type).toBe("/problems/changed-meanwhile");
    const { settings } = await read();
    expect(settings).toMatchObject({ about: "from the first tab", zones: [{ zone: "everywhere" }] });
  });

  it("are kept once where two tabs save in the same moment", async () => {
    const body = await changed();
    const statuses = await Promise.all(
      ["one", "two", "three"].map(async (about) => (await owner.put(address, { ...body, about })).status),
    );
    expect(statuses.sort()).toEqual([200, 409, 409]);
  });

  it.each<[string, object, string[]]>([
    ["a country in two zones", { zones: [zone(), zone({ zone: "Far" })] }, ["#/zones/1/countries"]],
    ["a country twice in a zone", { zones: [zone({ countries: ["DE", "DE"] })] }, ["#/zones/0/countries"]],
    ["a country that is none", { zones: [zone({ countries: ["DE", "QQ"] })] }, ["#/zones/0/countries/1"]],
    ["a zone without countries", { zones: [zone({ countries: [] })] }, ["#/zones/0/countries"]],
    ["two zones of one name", { zones: [zone(), zone({ zone: "near", countries: ["NO"] })] }, ["#/zones/1/zone"]],
    ["no zone", { zones: [] }, ["#/zones"]],
    [
      "amounts that are none",
      { zones: [zone({ baseMinor: -1, perItemMinor: 0.5, freeOverMinor: 0 })] },
      ["#/zones/0/baseMinor", "#/zones/0/freeOverMinor", "#/zones/0/perItemMinor"],
    ],
    ["days out of range", { dispatchDays: 61 }, ["#/dispatchDays"]],
    ["a character that is none", { about: "a\u0000b" }, ["#/about"]],
    ["a version that is none", { version: "yesterday" }, ["#/version"]],
    [
      "registrations that are none",
      { taxRegistrations: [{ country: "DE", number: " ", ratePercent: 19.001 }] },
      ["#/taxRegistrations/0/number", "#/taxRegistrations/0/ratePercent"],
    ],
    [
      "a country registered twice",
      { taxRegistrations: [1, 2].map((number) => ({ country: "DE", number: `${number}`, ratePercent: 7 })) },
      ["#/taxRegistrations/1/country"],
    ],
  ])("refuse %s, and nothing is changed", async (_what, wrong, pointers) => {
    const before = await read();
    const res = await owner.put(address, { ...before.settings, about: "new", ...wrong }).expect(422);
    expect(res.body.errors.map(({ pointer }: { pointer: string }) => pointer).sort()).toEqual(pointers);
    expect(await read()).toEqual(before);
  });
});

describe("settings are reached by their owner alone", () => {
  it("not by somebody who is not signed in, nor by other roles", async () => {
    const body = await changed();
    const nobody = await visitor(site);
    await nobody.get(address).expect(401);
    await nobody.put(address, body).expect(401);
    for (const role of ["restorer", "administrator"] as const) {
      const { person } = await signedIn({ role });
      await person.get(address).expect(403);
      await person.put(address, body).expect(403);
    }
  });

  it("not by another workshop, which reads and writes its own", async () => {
    const { user, person } = await signedIn({ role: "workshop" });
    await person.get(address).expect(404);
    await person.put(address, await changed()).expect(404);
    const other = await buildWorkshop({ ownerId: user.id });
    const own = await read(person);
    expect(own.workshop.slug).toBe(other.slug);
    await person.put(address, { ...own.settings, zones: [zone({ baseMinor: 1 })] }).expect(200);
    const rates = await ShippingRate.findAll({ where: { workshopId: workshop.id } });
    expect(rates.map(({ zone: name, baseMinor }) => [name, baseMinor])).toEqual([["everywhere", 500]]);
  });
});
