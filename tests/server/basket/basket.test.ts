import { randomUUID } from "node:crypto";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { Basket } from "#server/models/Basket";
import { BasketLine } from "#server/models/BasketLine";
import { Part } from "#server/models/Part";
import { fill, signedInBuyer } from "#tests/server/orders/checkout";
import { buildPart, buildUser, buildWorkshop, testPassword } from "#tests/support/factories";
import { startTestSite, type TestSite } from "#tests/support/testSite";
import { visitor } from "#tests/support/visitor";

let site: TestSite;
beforeAll(async () => {
  site = await startTestSite();
});
afterAll(() => site.close());

describe("a visitor's basket", () => {
  it("is empty before anything is put in", async () => {
    const someone = await visitor(site);
    const res = await someone.get("/basket").expect(200);
    expect(res.body).toMatchObject({ shipTo: "DE", count: 0, parcels: [], totalMinor: 0, canCheckOut: false });
  });

  it("is priced for the country, one parcel a workshop", async () => {
    const taxed = await buildWorkshop({ tax: { DE: 1900 } });
    const [a, b] = [await buildPart({ workshopId: taxed.id }), await buildPart({ priceMinor: 999 })];
    const someone = await visitor(site);
    await someone.put(`/basket/lines/${a.id}`, { quantity: 2, forNeed: "idler wheel 44.1 mm" }).expect(200);
    const res = await someone.put(`/basket/lines/${b.id}?shipTo=DE`, { quantity: 1 }).expect(200);
    expect(res.body).toMatchObject({
      count: 3,
      partsMinor: 4999,
      shippingMinor: 1300,
      totalMinor: 6299,
      taxMinor: 750,
    });
    expect(res.body.canCheckOut).toBe(true);
    expect(res.body.parcels).toHaveLength(2);
    expect(res.body.parcels[0]).toMatchObject({ taxRatePercent: 19, taxMinor: 750, totalMinor: 4700 });
    expect(res.body.parcels[0].lines[0]).toMatchObject({
      forNeed: "idler wheel 44.1 mm",
      lineMinor: 4000,
      problem: null,
      part: { id: a.id, dimensions: { outsideDiameter: { nominalMm: 44 } } },
    });
    const abroad = await someone.get("/basket?shipTo=NO").expect(200);
    expect(abroad.body).toMatchObject({ totalMinor: 6299, taxMinor: 0 });
  });

  it("says where a workshop does not ship, and cannot be checked out so", async () => {
    const part = await buildPart({ workshopId: (await buildWorkshop({ countries: ["DE"] })).id });
    const someone = await visitor(site);
    await fill(someone, [part]);
    const res = await someone.get("/basket?shipTo=NO").expect(200);
    expect(res.body.parcels[0].problem).toContain("does not ship to Norway");
    expect(res.body.canCheckOut).toBe(false);
  });

  it("shows what became unbuyable, in words, without counting it", async () => {
    const [gone, short, fine] = [await buildPart(), await buildPart({ stockOnHand: 2 }), await buildPart()];
    const someone = await visitor(site);
    await fill(someone, [gone, short, fine], 3);
    await gone.update({ state: "retired" });
    const res = await someone.get("/basket").expect(200);
    const problems = Object.fromEntries(
      res.body.parcels.flatMap((parcel: { lines: { part: { id: string }; problem: string | null }[] }) =>
        parcel.lines.map(({ part, problem }) => [part.id, problem]),
      ),
    );
    expect(problems[gone.id]).toContain("no longer sold");
    expect(problems[short.id]).toContain("Only 2 left");
    expect(problems[fine.id]).toBeNull();
    expect(res.body).toMatchObject({ partsMinor: 6000, canCheckOut: false });
  });

  it("follows a price that changes", async () => {
    const part = await buildPart();
    const someone = await visitor(site);
    await fill(someone, [part]);
    await part.update({ priceMinor: 2500 });
    expect((await someone.get("/basket")).body.partsMinor).toBe(2500);
  });

  it("takes a part out, and is not disturbed by taking out what is not there", async () => {
    const part = await buildPart();
    const someone = await visitor(site);
    await someone.delete(`/basket/lines/${part.id}`).expect(200);
    await fill(someone, [part]);
    expect((await someone.delete(`/basket/lines/${part.id}`).expect(200)).body.count).toBe(0);
  });

  it.each([
    ["none of it", { quantity: 0 }, 422],
    ["a hundred of it", { quantity: 100 }, 422],
    ["half of one", { quantity: 1.5 }, 422],
    ["nothing said", {}, 422],
  ])("refuses %s", async (_what, body, status) => {
    const someone = await visitor(site);
    const res = await someone.put(`/basket/lines/${(await buildPart()).id}`, body).expect(status);
    expect(res.body.errors[0].pointer).toBe("#/quantity");
  });

  it("refuses what is not sold, not there, or too dear to be paid at once", async () => {
    const someone = await visitor(site);
    const draft = await buildPart({ state: "draft" });
    await someone.put(`/basket/lines/${draft.id}`, { quantity: 1 }).expect(404);
    await someone.put(`/basket/lines/${randomUUID()}`, { quantity: 1 }).expect(404);
    await someone.put("/basket/lines/nothing", { quantity: 1 }).expect(404);
    const dear = await buildPart({ priceMinor: 60_000_000 });
    await someone.put(`/basket/lines/${dear.id}`, { quantity: 2 }).expect(422);
    expect((await someone.get("/basket")).body.count).toBe(0);
  });

  it("needs the token of the page", async () => {
    const someone = await visitor(site);
    const part = await buildPart();
    await someone.agent.put(`/api/v1/basket/lines/${part.id}`).send({ quantity: 1 }).expect(403);
  });

  it("holds fifty different parts and no more", async () => {
    const workshopId = (await buildWorkshop()).id;
    const parts = await Promise.all(Array.from({ length: 51 }, () => buildPart({ workshopId })));
    const someone = await visitor(site);
    await fill(someone, [parts[0]!]);
    const basket = await Basket.findOne({ order: [["createdAt", "DESC"]], rejectOnEmpty: true });
    await BasketLine.bulkCreate(parts.slice(1, 50).map(({ id }) => ({ basketId: basket.id, partId: id, quantity: 1 })));
    const res = await someone.put(`/basket/lines/${parts[50]!.id}`, { quantity: 1 }).expect(409);
    expect(res.body.type).toBe("/problems/wrong-state");
    await someone.put(`/basket/lines/${parts[49]!.id}`, { quantity: 2 }).expect(200);
  });

  it("takes any text for what it is for", async () => {
    const someone = await visitor(site);
    const part = await buildPart();
    await someone.put(`/basket/lines/${part.id}`, { quantity: 1, forNeed: "a\u0000b \ud800 '; --" }).expect(200);
  });

  it("is nobody else's", async () => {
    const part = await buildPart();
    const [one, other] = [await visitor(site), await visitor(site)];
    await fill(one, [part]);
    expect((await other.get("/basket")).body.count).toBe(0);
  });
});

describe("signing in with a basket", () => {
  it("adds what was gathered to what the account has, up to 99, and keeps what it is for", async () => {
    const [a, b] = [await buildPart({ stockOnHand: 200 }), await buildPart()];
    const user = await buildUser();
    const before = await visitor(site);
    await before.signIn(user.email, testPassword);
    await fill(before, [a], 60);

    const later = await visitor(site);
    await later.put(`/basket/lines/${a.id}`, { quantity: 50, forNeed: "deck" }).expect(200);
    await fill(later, [b], 1);
    await later.signIn(user.email, testPassword);

    const basket = await Basket.findOne({ where: { userId: user.id }, rejectOnEmpty: true });
    const lines = await BasketLine.findAll({ where: { basketId: basket.id } });
    const kept = Object.fromEntries(lines.map(({ partId, quantity, forNeed }) => [partId, { quantity, forNeed }]));
    expect(kept).toEqual({ [a.id]: { quantity: 99, forNeed: "deck" }, [b.id]: { quantity: 1, forNeed: null } });
    expect((await before.get("/basket")).body.count).toBe(100);
  });

  it("never takes over the basket of another account", async () => {
    const part = await buildPart();
    const { me: rich } = await signedInBuyer(site);
    await fill(rich, [part]);
    const basket = await Basket.findOne({ order: [["createdAt", "DESC"]], rejectOnEmpty: true });
    const { mergeBasket } = await import("#server/commands/mergeBasket");
    const thief = await buildUser();
    await mergeBasket(basket.id, thief.id);
    expect((await rich.get("/basket")).body.count).toBe(1);
    expect(await Basket.count({ where: { userId: thief.id } })).toBe(0);
  });

  it("keeps the basket of the account over sessions", async () => {
    const part = await buildPart();
    const { user, me } = await signedInBuyer(site);
    await fill(me, [part], 2);
    const again = await visitor(site);
    await again.signIn(user.email, testPassword);
    expect((await again.get("/basket")).body.count).toBe(2);
  });

  it("lets a part be put in by two windows at once", async () => {
    const part = await buildPart();
    const { user, me } = await signedInBuyer(site);
    const both = await Promise.all([1, 2].map((quantity) => me.put(`/basket/lines/${part.id}`, { quantity })));
    expect(both.map(({ status }) => status)).toEqual([200, 200]);
    expect(await Basket.count({ where: { userId: user.id } })).toBe(1);
    expect(await Part.count({ where: { id: part.id } })).toBe(1);
  });
});
