import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { Order } from "#server/models/Order";
import type { Part } from "#server/models/Part";
import { buildPart, buildWorkshop } from "#tests/support/factories";
import { startTestSite, type TestSite } from "#tests/support/testSite";
import { visitor } from "#tests/support/visitor";
import { checkOut, checkoutInput, fill, homeAddress, signedInBuyer } from "./checkout";

let site: TestSite;
beforeAll(async () => {
  site = await startTestSite();
});
afterAll(() => site.close());

const reserved = async (part: Part) => (await part.reload()).stockReserved;

describe("placing an order is refused", () => {
  async function nothingHappened(userId: string, ...parts: Part[]) {
    expect(await Order.count({ where: { buyerId: userId } })).toBe(0);
    for (const part of parts) expect(await reserved(part)).toBe(0);
  }

  it("to a visitor", async () => {
    const someone = await visitor(site);
    const res = await someone.post("/orders", { ...(await checkoutInput(someone)), expectedTotalMinor: 1 });
    expect(res.status).toBe(401);
  });

  it("before the address is confirmed", async () => {
    const part = await buildPart();
    const { user, me } = await signedInBuyer(site, { emailVerifiedAt: null });
    await fill(me, [part]);
    const res = await checkOut(me);
    expect([res.status, res.body.type]).toEqual([403, "/problems/verify-first"]);
    await nothingHappened(user.id, part);
  });

  it("with an empty basket", async () => {
    const { me } = await signedInBuyer(site);
    const res = await checkOut(me);
    expect([res.status, res.body.type]).toEqual([409, "/problems/empty-basket"]);
  });

  it.each([
    ["the price", (part: Part) => part.update({ priceMinor: 2100 })],
    ["the tax", async () => undefined],
  ])("when %s changed the total meanwhile, saying what it is now", async (what, change) => {
    const part = await buildPart();
    const { user, me } = await signedInBuyer(site);
    await fill(me, [part]);
    const input = await checkoutInput(me);
    await change(part);
    const wrong = what === "the tax" ? { ...input, expectedTotalMinor: input.expectedTotalMinor - 1 } : input;
    const res = await me.post("/orders", wrong);
    expect([res.status, res.body.type]).toEqual([409, "/problems/total-changed"]);
    expect(res.body.detail).toContain(what === "the price" ? "€27.00" : "€26.00");
    expect(res.body.errors[0].pointer).toBe("#/expectedTotalMinor");
    await nothingHappened(user.id, part);
  });

  it("in another currency than the market's", async () => {
    const part = await buildPart();
    const { user, me } = await signedInBuyer(site);
    await fill(me, [part]);
    const res = await checkOut(me, { currency: "USD" });
    expect(res.body.type).toBe("/problems/total-changed");
    await nothingHappened(user.id, part);
  });

  it("when one part of several ran out, naming its line and holding none of the others", async () => {
    const [fine, short] = [await buildPart(), await buildPart({ stockOnHand: 3 })];
    const { user, me } = await signedInBuyer(site);
    await fill(me, [fine, short], 2);
    const input = await checkoutInput(me);
    await short.update({ stockOnHand: 1 });
    const res = await me.post("/orders", input);
    expect([res.status, res.body.type]).toEqual([409, "/problems/out-of-stock"]);
    expect(res.body.errors).toEqual([
      { pointer: `#/lines/${short.id}`, detail: expect.stringContaining("Only 1 left") },
    ]);
    await nothingHappened(user.id, fine, short);
  });

  it("when a part is no longer sold", async () => {
    const part = await buildPart();
    const { user, me } = await signedInBuyer(site);
    await fill(me, [part]);
    const input = await checkoutInput(me);
    await part.update({ state: "hidden" });
    expect((await me.post("/orders", input)).body.type).toBe("/problems/out-of-stock");
    await nothingHappened(user.id, part);
  });

  it("when a part is sold in another currency", async () => {
    const part = await buildPart({ currency: "USD" });
    const { user, me } = await signedInBuyer(site);
    await fill(me, [part]);
    expect((await checkOut(me)).body.type).toBe("/problems/wrong-state");
    await nothingHappened(user.id, part);
  });

  it("to a country that a workshop does not ship to", async () => {
    const part = await buildPart({ workshopId: (await buildWorkshop({ countries: ["DE"] })).id });
    const { user, me } = await signedInBuyer(site);
    await fill(me, [part]);
    const res = await checkOut(me, { shippingAddress: { ...homeAddress, country: "NO" } });
    expect([res.status, res.body.type]).toEqual([409, "/problems/not-shipped-there"]);
    expect(res.body.errors[0]).toEqual({
      pointer: "#/shippingAddress/country",
      detail: expect.stringContaining("Norway"),
    });
    await nothingHappened(user.id, part);
  });

  it("with fields that are not right, naming them", async () => {
    const { me } = await signedInBuyer(site);
    const input = await checkoutInput(me);
    const res = await me.post("/orders", {
      ...input,
      shippingAddress: { ...homeAddress, name: "Ada\r\nBcc: x@example.org", country: "Germany" },
      checkoutKey: "1",
    });
    expect(res.status).toBe(422);
    expect(res.body.errors.map(({ pointer }: { pointer: string }) => pointer).sort()).toEqual([
      "#/checkoutKey",
      "#/shippingAddress/country",
      "#/shippingAddress/name",
    ]);
  });

  it("while five orders of the same buyer wait already, until one is cancelled", async () => {
    const part = await buildPart({ stockOnHand: 50 });
    const { me } = await signedInBuyer(site);
    await fill(me, [part]);
    const orders = [];
    for (let i = 0; i < 5; i++) orders.push((await checkOut(me)).body.orderId);
    const res = await checkOut(me);
    expect([res.status, res.body.type]).toEqual([409, "/problems/wrong-state"]);
    expect(await reserved(part)).toBe(5);
    await me.post(`/orders/${orders[0]}/cancel`).expect(200);
    expect((await checkOut(me)).status).toBe(201);
  });
});
