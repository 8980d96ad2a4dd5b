import { afterAll, afterEach, beforeAll, describe, expect, it } from "vitest";
import { placeOrder } from "#server/commands/placeOrder";
import { Order } from "#server/models/Order";
import { Payment } from "#server/models/Payment";
import { checkOut, checkoutInput, fill, loseTheAnswer, signedInBuyer } from "#tests/server/orders/checkout";
import { buildPart, buildWorkshop } from "#tests/support/factories";
import { startTestSite, type TestSite } from "#tests/support/testSite";

let site: TestSite;
beforeAll(async () => {
  site = await startTestSite();
});
afterEach(() => site.stripe.control.reset());
afterAll(() => site.close());

const creating = "POST /v1/checkout/sessions";
const sessions = async (orderId: string) => {
  const { data } = await site.services.payments.checkout.sessions.list({ limit: 100 });
  return data.filter(({ client_reference_id }) => client_reference_id === orderId);
};
const orderOf = (buyerId: string) => Order.findOne({ where: { buyerId }, rejectOnEmpty: true });

async function readyToPay(given: Parameters<typeof buildPart>[0] = {}) {
  const part = await buildPart(given);
  const { user, me } = await signedInBuyer(site);
  await fill(me, [part]);
  return { part, user, me, input: await checkoutInput(me) };
}

describe("a payment provider that does not answer", () => {
  type Send = () => PromiseLike<{ status: number; body: { type: string } }>;
  it.each([
    ["its answer is lost on the way back", (send: Send) => loseTheAnswer(site, send)],
    [
      "it is down",
      (send: Send) => {
        site.stripe.control.trouble({ kind: "fail", times: 3, on: creating });
        return send();
      },
    ],
  ])("keeps the order when %s, and the same key then gives one page", async (_what, inTrouble) => {
    const { part, user, me, input } = await readyToPay();
    const first = await inTrouble(() => me.post("/orders", input));
    expect([first.status, first.body.type]).toEqual([503, "/problems/payment-unreachable"]);
    const order = await orderOf(user.id);
    expect(order.state).toBe("awaiting-payment");
    expect((await part.reload()).stockReserved).toBe(1);

    const second = await me.post("/orders", input);
    expect(second.status).toBe(201);
    expect(second.body.orderId).toBe(order.id);
    const made = await sessions(order.id);
    expect(made).toHaveLength(1);
    expect(second.body.paymentUrl).toBe(made[0]?.url);
    expect((await part.reload()).stockReserved).toBe(1);
  });

  it("does not give up where its own fault is kept under the key, since a page may exist", async () => {
    const { user, me, input } = await readyToPay();
    site.stripe.control.trouble({ kind: "fail-kept", on: creating });
    expect((await me.post("/orders", input)).status).toBe(503);
    expect((await orderOf(user.id)).state).toBe("awaiting-payment");
  });

  it("gives one page to two calls of which the first is still waiting", async () => {
    const { user, me, input } = await readyToPay();
    site.stripe.control.trouble({ kind: "hold", on: creating });
    // Sent when `then` is called, which a bare request waits for.
    const first = me.post("/orders", input).then((res) => res);
    await expect.poll(() => site.stripe.control.heldRequests()).toBe(1);
    const second = me.post("/orders", input).then((res) => res);
    await expect.poll(() => Order.count({ where: { buyerId: user.id } })).toBe(1);
    site.stripe.control.releaseRequests();
    const both = await Promise.all([first, second]);
    expect(both.map(({ status }) => status)).toEqual([201, 201]);
    expect(both[0].text).toBe(both[1].text);
    expect(await sessions(both[0].body.orderId)).toHaveLength(1);
  });
});

describe("a payment provider that refuses", () => {
  it("has the order cancelled and its stock let go, and says why", async () => {
    const workshop = await buildWorkshop({ countries: [] });
    const { ShippingRate } = await import("#server/models/ShippingRate");
    const { ShippingCountry } = await import("#server/models/ShippingCountry");
    const rate = await ShippingRate.findOne({ where: { workshopId: workshop.id }, rejectOnEmpty: true });
    await rate.update({ baseMinor: 0, perItemMinor: 0 });
    await ShippingCountry.create({ workshopId: workshop.id, country: "DE", rateId: rate.id });
    const { part, user, me, input } = await readyToPay({ workshopId: workshop.id, priceMinor: 20 });

    const res = await me.post("/orders", input);
    expect([res.status, res.body.type]).toEqual([409, "/problems/wrong-state"]);
    expect(res.body.detail).toContain("too small");
    const order = await orderOf(user.id);
    expect(order.state).toBe("cancelled");
    expect((await part.reload()).stockReserved).toBe(0);
    expect((await Payment.findOne({ where: { orderId: order.id } }))?.state).toBe("expired");
    expect((await me.get("/basket")).body.count).toBe(1);
    expect((await me.post("/orders", input)).status).toBe(409);
  });

  it("does so too when the first call was lost and the page would now live too short", async () => {
    const { part, user, me, input } = await readyToPay();
    site.stripe.control.trouble({ kind: "fail", times: 3, on: creating });
    expect((await me.post("/orders", input)).status).toBe(503);
    site.stripe.control.advanceClock(10 * 60);
    const res = await me.post("/orders", input);
    expect(res.status).toBe(409);
    expect((await orderOf(user.id)).state).toBe("cancelled");
    expect((await part.reload()).stockReserved).toBe(0);
    // Nothing is left of it: with a key of its own the basket can be bought.
    site.stripe.control.advanceClock(-10 * 60);
    expect((await checkOut(me)).status).toBe(201);
  });
});

describe("an order that no longer waits", () => {
  it("gives no page once its time is over", async () => {
    const { user, me, input } = await readyToPay();
    await me.post("/orders", input).expect(201);
    const order = await orderOf(user.id);
    const actor = { id: user.id, role: "restorer" as const, workshopId: null };
    const late = new Date(order.createdAt.getTime() + 36 * 60_000);
    await expect(placeOrder(site.services, actor, { ...input, checkoutKey: order.checkoutKey }, late)).rejects.toThrow(
      "The time to pay this order is over",
    );
  });
});
