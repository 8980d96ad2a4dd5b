import { randomUUID } from "node:crypto";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { expireOrder } from "#server/commands/expireOrder";
import { Order } from "#server/models/Order";
import type { Part } from "#server/models/Part";
import { Payment } from "#server/models/Payment";
import { User } from "#server/models/User";
import { Workshop } from "#server/models/Workshop";
import { buildPart, buildUser, testPassword } from "#tests/support/factories";
import { startTestSite, type TestSite } from "#tests/support/testSite";
import { visitor } from "#tests/support/visitor";
import {
  at,
  checkOut,
  fill,
  homeAddress,
  loseTheAnswer,
  payAndApply,
  runJobs,
  signedInBuyer,
  waitingOrder,
} from "./checkout";

let site: TestSite;
beforeAll(async () => {
  site = await startTestSite();
});
afterAll(() => site.close());

async function as(user: User) {
  const someone = await visitor(site);
  await someone.signIn(user.email, testPassword);
  return someone;
}
const ownerOf = async (part: Part) => {
  const workshop = await Workshop.findByPk(part.workshopId, { rejectOnEmpty: true });
  return as(await User.findByPk(workshop.ownerId, { rejectOnEmpty: true }));
};
const stateOf = async (orderId: string) => (await Order.findByPk(orderId, { rejectOnEmpty: true })).state;

describe("reading an order", () => {
  it("shows the buyer all of it, before and after it is paid", async () => {
    const [a, b] = [await buildPart(), await buildPart()];
    const { me, orderId, sessionId } = await waitingOrder(site, [a, b]);
    const before = await me.get(`/orders/${orderId}`).expect(200);
    expect(before.body).toMatchObject({ state: "awaiting-payment", paidAt: null, can: { pay: true, cancel: true } });
    expect(before.body.history.map(({ what }: { what: string }) => what)).toEqual([
      "Order placed; the parts are held for you",
    ]);
    await payAndApply(site, sessionId);
    const after = await me.get(`/orders/${orderId}`).expect(200);
    expect(after.body).toMatchObject({
      state: "paid",
      holdUntil: null,
      totalMinor: 5200,
      refundedMinor: 0,
      shippingAddress: homeAddress,
      can: { pay: false, cancel: false },
    });
    expect(after.body.parcels).toHaveLength(2);
    expect(after.body.parcels[0].trader.registration).toMatch(/^REG-/);
    expect(after.body.parcels[0].leavesBy).not.toBeNull();
    expect(after.body.history).toHaveLength(2);
  });

  it("shows a workshop its own parcel with its own sums, once it is paid", async () => {
    const [a, b] = [await buildPart({ priceMinor: 1000 }), await buildPart()];
    const { orderId, sessionId } = await waitingOrder(site, [a, b]);
    const workshop = await ownerOf(a);
    await workshop.get(`/orders/${orderId}`).expect(404);
    await payAndApply(site, sessionId);
    const res = await workshop.get(`/orders/${orderId}`).expect(200);
    expect(res.body.parcels.map((parcel: { workshop: { id: string } }) => parcel.workshop.id)).toEqual([a.workshopId]);
    expect(res.body).toMatchObject({
      partsMinor: 1000,
      totalMinor: 1600,
      history: [],
      can: { pay: false, cancel: false },
    });
    expect(res.text).not.toContain(b.title);
  });

  it("hides it from strangers, from other workshops and from visitors", async () => {
    const part = await buildPart();
    const { orderId, sessionId } = await waitingOrder(site, [part]);
    await payAndApply(site, sessionId);
    const stranger = (await signedInBuyer(site)).me;
    const otherWorkshop = await ownerOf(await buildPart());
    for (const someone of [stranger, otherWorkshop]) {
      await someone.get(`/orders/${orderId}`).expect(404);
      await someone.post(`/orders/${orderId}/pay`).expect(404);
      await someone.post(`/orders/${orderId}/cancel`).expect(404);
    }
    await (await visitor(site)).get(`/orders/${orderId}`).expect(401);
    await stranger.get(`/orders/${randomUUID()}`).expect(404);
    await stranger.get("/orders/mine").expect(404);
  });

  it("lets a workshop that sells in it neither pay nor cancel it", async () => {
    const part = await buildPart();
    const { orderId, sessionId } = await waitingOrder(site, [part]);
    await payAndApply(site, sessionId);
    const workshop = await ownerOf(part);
    await workshop.post(`/orders/${orderId}/pay`).expect(403);
    await workshop.post(`/orders/${orderId}/cancel`).expect(403);
  });

  it("lets an administrator read it, and only read it", async () => {
    const { orderId } = await waitingOrder(site, [await buildPart()]);
    const admin = await as(await buildUser({ role: "administrator" }));
    expect((await admin.get(`/orders/${orderId}`).expect(200)).body.can).toEqual({ pay: false, cancel: false });
    await admin.post(`/orders/${orderId}/cancel`).expect(403);
  });
});

describe("the list of orders", () => {
  it("holds one's own, newest first, page by page", async () => {
    const part = await buildPart({ title: "Listed wheel" });
    const { me } = await signedInBuyer(site);
    await fill(me, [part]);
    const placed: string[] = [];
    for (let i = 0; i < 3; i++) placed.unshift((await checkOut(me)).body.orderId);
    await waitingOrder(site, [part]);

    const first = await me.get("/orders?limit=2").expect(200);
    const second = await me.get(`/orders?limit=2&cursor=${first.body.nextCursor}`).expect(200);
    const ids = [...first.body.items, ...second.body.items].map(({ id }: { id: string }) => id);
    expect(ids).toEqual(placed);
    expect(second.body.nextCursor).toBeNull();
    expect(first.body.items[0]).toMatchObject({ titles: ["Listed wheel"], totalMinor: 2600, currency: "EUR" });
  });

  it("refuses a cursor that it did not give", async () => {
    const { me } = await signedInBuyer(site);
    for (const cursor of ["x", Buffer.from('["2026-01-01","x"]').toString("base64url")]) {
      const res = await me.get(`/orders?cursor=${cursor}`).expect(422);
      expect(res.body.errors[0].pointer).toBe("#/cursor");
    }
  });
});

describe("paying later", () => {
  it("gives the open page once more", async () => {
    const { me, orderId, sessionId } = await waitingOrder(site, [await buildPart()]);
    const res = await me.post(`/orders/${orderId}/pay`).expect(200);
    expect(res.body.paymentUrl).toContain(sessionId);
  });

  it("is refused once the order is paid", async () => {
    const { me, orderId, sessionId } = await waitingOrder(site, [await buildPart()]);
    await payAndApply(site, sessionId);
    expect((await me.post(`/orders/${orderId}/pay`).expect(409)).body.detail).toContain("paid");
  });
});

describe("cancelling", () => {
  it("closes the page first, then lets go of the stock; what its events say after changes nothing", async () => {
    const part = await buildPart();
    const { me, orderId, sessionId } = await waitingOrder(site, [part], 3);
    const res = await me.post(`/orders/${orderId}/cancel`).expect(200);
    expect(res.body).toMatchObject({ state: "cancelled", can: { pay: false, cancel: false } });
    expect((await site.services.payments.checkout.sessions.retrieve(sessionId)).status).toBe("expired");
    expect((await part.reload()).stockReserved).toBe(0);
    await site.stripe.control.settled();
    await runJobs(site);
    expect(await stateOf(orderId)).toBe("cancelled");
    expect((await part.reload()).stockReserved).toBe(0);
    await me.post(`/orders/${orderId}/cancel`).expect(409);
  });

  it("keeps the order and its stock while the provider does not answer", async () => {
    const part = await buildPart();
    const { me, orderId } = await waitingOrder(site, [part]);
    site.stripe.control.trouble({ kind: "fail", times: 3, on: "POST /v1/checkout/sessions/:session/expire" });
    const res = await me.post(`/orders/${orderId}/cancel`);
    expect([res.status, res.body.type]).toEqual([503, "/problems/payment-unreachable"]);
    expect(await stateOf(orderId)).toBe("awaiting-payment");
    expect((await part.reload()).stockReserved).toBe(1);
    await me.post(`/orders/${orderId}/cancel`).expect(200);
  });

  it("is what happens to an order whose buyer asked for it, when its page then closes by itself", async () => {
    const part = await buildPart();
    const { me, orderId, sessionId } = await waitingOrder(site, [part]);
    site.stripe.control.trouble({ kind: "fail", times: 3, on: "POST /v1/checkout/sessions/:session/expire" });
    await me.post(`/orders/${orderId}/cancel`).expect(503);
    await site.services.payments.checkout.sessions.expire(sessionId);
    await site.stripe.control.settled();
    await runJobs(site);
    expect(await stateOf(orderId)).toBe("cancelled");
    expect((await part.reload()).stockReserved).toBe(0);
  });

  it("finds the page that was lost on the way, and closes it too", async () => {
    const part = await buildPart();
    const { me, user } = await signedInBuyer(site);
    await fill(me, [part]);
    expect((await loseTheAnswer(site, () => checkOut(me))).status).toBe(503);
    const order = await Order.findOne({ where: { buyerId: user.id }, rejectOnEmpty: true });
    await me.post(`/orders/${order.id}/cancel`).expect(200);
    const payment = await Payment.findOne({ where: { orderId: order.id }, rejectOnEmpty: true });
    expect((await site.services.payments.checkout.sessions.retrieve(payment.sessionId!)).status).toBe("expired");
  });

  it("gives way to a payment that came first", async () => {
    const part = await buildPart();
    const { me, orderId, sessionId } = await waitingOrder(site, [part]);
    site.stripe.control.setWebhooks({ mode: "hold" });
    await site.stripe.control.pay(sessionId);
    const res = await me.post(`/orders/${orderId}/cancel`).expect(409);
    expect(res.body.detail).toContain("paid");
    expect(await stateOf(orderId)).toBe("paid");
    expect(await part.reload()).toMatchObject({ stockOnHand: 9, stockReserved: 0 });
    site.stripe.control.setWebhooks({ mode: "send" });
    await site.stripe.control.deliver();
    await runJobs(site);
    expect((await part.reload()).stockOnHand).toBe(9);
  });
});

describe("running out of time", () => {
  it("closes the page, lets go of the stock and ends the order, once", async () => {
    const part = await buildPart();
    const { orderId, sessionId, me } = await waitingOrder(site, [part], 4);
    const order = await Order.findByPk(orderId, { rejectOnEmpty: true });
    await expireOrder(site.services, orderId, at(order, 34));
    expect(await stateOf(orderId)).toBe("awaiting-payment");
    for (let i = 0; i < 2; i++) await expireOrder(site.services, orderId, at(order, 36));
    expect(await stateOf(orderId)).toBe("expired");
    expect(await part.reload()).toMatchObject({ stockOnHand: 10, stockReserved: 0 });
    expect((await site.services.payments.checkout.sessions.retrieve(sessionId)).status).toBe("expired");
    await me.post(`/orders/${orderId}/pay`).expect(409);
    await me.post(`/orders/${orderId}/cancel`).expect(409);
  });

  it("is done by a job that waits for the end of the hold", async () => {
    const { orderId } = await waitingOrder(site, [await buildPart()]);
    const { rows } = await site.services.pool.query(
      "SELECT run_at FROM graphile_worker.jobs WHERE key = $1 AND task_identifier = 'expireOrder'",
      [`expire:${orderId}`],
    );
    const order = await Order.findByPk(orderId, { rejectOnEmpty: true });
    expect(rows.map(({ run_at }) => run_at)).toEqual([order.holdUntil]);
  });

  it("takes a payment that it finds at the provider as a payment", async () => {
    const part = await buildPart();
    const { orderId, sessionId } = await waitingOrder(site, [part]);
    site.stripe.control.setWebhooks({ mode: "drop" });
    await site.stripe.control.pay(sessionId);
    const order = await Order.findByPk(orderId, { rejectOnEmpty: true });
    await expireOrder(site.services, orderId, at(order, 36));
    site.stripe.control.setWebhooks({ mode: "send" });
    expect(await stateOf(orderId)).toBe("paid");
    expect(await part.reload()).toMatchObject({ stockOnHand: 9, stockReserved: 0 });
  });

  it("keeps the stock while the provider does not answer, and is tried again", async () => {
    const part = await buildPart();
    const { orderId } = await waitingOrder(site, [part]);
    const order = await Order.findByPk(orderId, { rejectOnEmpty: true });
    site.stripe.control.trouble({ kind: "fail", times: 3, on: "POST /v1/checkout/sessions/:session/expire" });
    await expect(expireOrder(site.services, orderId, at(order, 36))).rejects.toThrow();
    expect((await part.reload()).stockReserved).toBe(1);
    await expireOrder(site.services, orderId, at(order, 36));
    expect((await part.reload()).stockReserved).toBe(0);
  });
});

describe("saved addresses", () => {
  it("are kept once, listed to their owner and forgotten when told", async () => {
    const { me } = await signedInBuyer(site);
    const one = await me.post("/addresses", homeAddress).expect(201);
    const same = await me.post("/addresses", homeAddress).expect(201);
    expect(same.body.id).toBe(one.body.id);
    expect((await me.get("/addresses").expect(200)).body.items).toEqual([one.body]);
    const stranger = (await signedInBuyer(site)).me;
    expect((await stranger.get("/addresses")).body.items).toEqual([]);
    await stranger.delete(`/addresses/${one.body.id}`).expect(404);
    await me.delete(`/addresses/${one.body.id}`).expect(204);
    await me.delete(`/addresses/${one.body.id}`).expect(404);
    await (await visitor(site)).get("/addresses").expect(401);
  });

  it("are fifty at most", async () => {
    const { me } = await signedInBuyer(site);
    for (let n = 0; n < 50; n++) await me.post("/addresses", { ...homeAddress, line1: `${n} Row` }).expect(201);
    await me.post("/addresses", { ...homeAddress, line1: "50 Row" }).expect(409);
    await me.post("/addresses", { ...homeAddress, line1: "49 Row" }).expect(201);
  });

  it("are refused where a field is not right", async () => {
    const { me } = await signedInBuyer(site);
    const res = await me.post("/addresses", { ...homeAddress, postcode: " " }).expect(422);
    expect(res.body.errors[0].pointer).toBe("#/postcode");
  });
});
