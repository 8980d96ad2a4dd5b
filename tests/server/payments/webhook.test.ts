import { randomUUID } from "node:crypto";
import fc from "fast-check";
import request from "supertest";
import { afterAll, afterEach, beforeAll, describe, expect, it } from "vitest";
import { applyPaymentEvent } from "#server/commands/applyPaymentEvent";
import { expireOrder } from "#server/commands/expireOrder";
import { balances } from "#server/ledger/balances";
import { AuditEntry } from "#server/models/AuditEntry";
import { LedgerTransaction } from "#server/models/LedgerTransaction";
import { Mail } from "#server/models/Mail";
import { Order } from "#server/models/Order";
import { Parcel } from "#server/models/Parcel";
import { Payment } from "#server/models/Payment";
import { PaymentEvent } from "#server/models/PaymentEvent";
import {
  at,
  checkOut,
  fill,
  loseTheAnswer,
  payAndApply,
  runJobs,
  signedInBuyer,
  waitingOrder,
} from "#tests/server/orders/checkout";
import { buildPart } from "#tests/support/factories";
import { startTestSite, type TestSite } from "#tests/support/testSite";

let site: TestSite;
beforeAll(async () => {
  site = await startTestSite();
});
afterEach(() => site.stripe.control.reset());
afterAll(() => site.close());

const webhook = "/api/v1/webhooks/stripe";
const orderNow = (id: string) => Order.findByPk(id, { rejectOnEmpty: true });

/** An event as the provider would send it, signed with the secret of the site. */
function signed(event: object, { secret, ageSeconds = 0 }: { secret?: string; ageSeconds?: number } = {}) {
  const payload = JSON.stringify(event);
  const header = site.services.payments.webhooks.generateTestHeaderString({
    payload,
    secret: secret ?? site.services.config.stripe.webhookSecret,
    timestamp: Math.floor(Date.now() / 1000) - ageSeconds,
  });
  return request(site.url).post(webhook).set("stripe-signature", header).type("application/json").send(payload);
}

const eventOf = (type: string, object: object, id = `evt_${randomUUID()}`) => ({
  id,
  object: "event",
  type,
  created: Math.floor(Date.now() / 1000),
  data: { object },
});

const completed = (orderId: string, sessionId: string, given: object = {}) => ({
  id: sessionId,
  client_reference_id: orderId,
  amount_total: 2600,
  currency: "eur",
  payment_status: "paid",
  payment_intent: `pi_${randomUUID()}`,
  ...given,
});

async function tell(event: { id: string }) {
  await signed(event).expect(200);
  await runJobs(site);
  return (await PaymentEvent.findByPk(event.id, { rejectOnEmpty: true })).outcome;
}

/** Everything that one paid order leaves behind, and nothing twice. */
async function expectPaidOnce(orderId: string) {
  const order = await orderNow(orderId);
  expect(order).toMatchObject({ state: "paid", refundedMinor: 0 });
  const parcels = await Parcel.findAll({ where: { orderId } });
  expect(await Mail.count({ where: { cause: `order-confirmation:${orderId}:buyer` } })).toBe(1);
  for (const { id } of parcels) expect(await Mail.count({ where: { cause: `new-order:${id}:workshop` } })).toBe(1);
  expect(await LedgerTransaction.count({ where: { orderId } })).toBe(1);
  expect(await AuditEntry.count({ where: { subjectId: orderId, action: "order-paid" } })).toBe(1);
}

describe("a payment event", () => {
  it("makes the order paid, with everything that follows", async () => {
    const part = await buildPart({ priceMinor: 2000 });
    const { user, me, orderId, sessionId } = await waitingOrder(site, [part], 2);
    const extra = await buildPart();
    await fill(me, [part], 3);
    await fill(me, [extra]);
    await payAndApply(site, sessionId);

    await expectPaidOnce(orderId);
    expect(await part.reload()).toMatchObject({ stockOnHand: 8, stockReserved: 0 });
    const order = await orderNow(orderId);
    const parcel = await Parcel.findOne({ where: { orderId }, rejectOnEmpty: true });
    expect(parcel.leavesBy?.getTime()).toBe(order.paidAt!.getTime() + 3 * 86_400_000);
    const payment = await Payment.findOne({ where: { orderId }, rejectOnEmpty: true });
    expect(payment).toMatchObject({ state: "succeeded", sessionId });
    expect(payment.paymentIntentId).toMatch(/^pi_/);
    const held = (await balances()).find(({ workshopId }) => workshopId === part.workshopId);
    expect(held?.amountMinor).toBe(-(4700 - 320));
    // Two of three were bought; the other part stays.
    const basket = await me.get("/basket");
    expect(basket.body.count).toBe(2);
    expect(await Mail.count({ where: { recipient: user.email, template: "order-confirmation" } })).toBe(1);
  });

  it("told ten times, is kept once and counts once", async () => {
    const { orderId, sessionId } = await waitingOrder(site, [await buildPart()]);
    site.stripe.control.setWebhooks({ copies: 10 });
    await payAndApply(site, sessionId);
    await expectPaidOnce(orderId);
    const kept = await PaymentEvent.findAll({
      where: { type: "checkout.session.completed" },
      order: [["receivedAt", "DESC"]],
    });
    expect(kept[0]).toMatchObject({ deliveries: 10, outcome: "paid" });
    await site.stripe.control.redeliver(kept[0]!.id);
    await runJobs(site);
    await expectPaidOnce(orderId);
  });

  it("told by two events, counts once", async () => {
    const { orderId, sessionId } = await waitingOrder(site, [await buildPart()]);
    site.stripe.control.setWebhooks({ twinEvents: true });
    await payAndApply(site, sessionId);
    await expectPaidOnce(orderId);
  });

  it("comes to the same in any order and number", async () => {
    const part = await buildPart({ stockOnHand: 100 });
    const order = fc.array(fc.integer({ min: 0, max: 3 }), { minLength: 4, maxLength: 10 });
    await fc.assert(
      fc.asyncProperty(order, async (sequence) => {
        const { orderId, sessionId } = await waitingOrder(site, [part]);
        const { stockOnHand } = await part.reload();
        const session = completed(orderId, sessionId);
        const events = [
          eventOf("checkout.session.completed", session),
          eventOf("checkout.session.completed", session),
          eventOf("checkout.session.expired", { ...session, payment_status: "unpaid" }),
          eventOf("payment_intent.payment_failed", { id: "pi", metadata: { orderId } }),
        ];
        for (const index of [...sequence, 0]) {
          await signed(events[index]!).expect(200);
          await applyPaymentEvent(site.services, events[index]!.id);
        }
        await runJobs(site);
        await expectPaidOnce(orderId);
        expect(await part.reload()).toMatchObject({ stockOnHand: stockOnHand! - 1, stockReserved: 0 });
      }),
      { seed: 11, numRuns: 12 },
    );
  }, 120_000);

  it("that arrives before we know of the payment page is enough", async () => {
    const part = await buildPart();
    const { user, me } = await signedInBuyer(site);
    await fill(me, [part]);
    expect((await loseTheAnswer(site, () => checkOut(me))).status).toBe(503);
    const order = await Order.findOne({ where: { buyerId: user.id }, rejectOnEmpty: true });
    expect((await Payment.findOne({ where: { orderId: order.id } }))?.sessionId).toBeNull();
    const { data } = await site.services.payments.checkout.sessions.list({ limit: 100 });
    const session = data.find(({ client_reference_id }) => client_reference_id === order.id)!;
    await payAndApply(site, session.id);
    await expectPaidOnce(order.id);
    expect((await Payment.findOne({ where: { orderId: order.id } }))?.sessionId).toBe(session.id);
  });

  it("of a type that means nothing here is kept and marked so", async () => {
    const event = eventOf("customer.created", { id: "cus_1" });
    expect(await tell(event)).toBe("ignored");
    expect(await PaymentEvent.findByPk(event.id)).toMatchObject({ type: "customer.created", deliveries: 1 });
  });

  it("of a refused card ends nothing and is remembered", async () => {
    const { me, orderId, sessionId } = await waitingOrder(site, [await buildPart()]);
    await site.stripe.control.decline(sessionId);
    await site.stripe.control.settled();
    await runJobs(site);
    const res = await me.get(`/orders/${orderId}`).expect(200);
    expect(res.body.state).toBe("awaiting-payment");
    expect(res.body.history.at(-1).what).toContain("refused");
    await payAndApply(site, sessionId);
    await expectPaidOnce(orderId);
  });

  it("of an expired page ends the order and lets go of its stock", async () => {
    const part = await buildPart();
    const { orderId, sessionId } = await waitingOrder(site, [part], 2);
    await site.services.payments.checkout.sessions.expire(sessionId);
    await site.stripe.control.settled();
    await runJobs(site);
    expect((await orderNow(orderId)).state).toBe("expired");
    expect(await part.reload()).toMatchObject({ stockOnHand: 10, stockReserved: 0 });
  });
});

describe("a payment that does not match", () => {
  it.each([
    ["amount", { amount_total: 2599 }],
    ["currency", { currency: "usd" }],
    ["session", { id: "cs_test_other" }],
  ])("in its %s never makes an order paid, and is written down", async (difference, given) => {
    const part = await buildPart();
    const { orderId, sessionId } = await waitingOrder(site, [part]);
    expect(await tell(eventOf("checkout.session.completed", completed(orderId, sessionId, given)))).toBe("mismatch");
    expect((await orderNow(orderId)).state).toBe("awaiting-payment");
    expect(await part.reload()).toMatchObject({ stockOnHand: 10, stockReserved: 1 });
    const entry = await AuditEntry.findOne({ where: { subjectId: orderId, action: "payment-mismatch" } });
    expect(entry?.detail).toEqual({ wrong: [difference] });
    expect(await LedgerTransaction.count({ where: { orderId } })).toBe(0);
  });

  it.each([
    ["of an order that is not here", completed(randomUUID(), "cs_1"), "unknown-order"],
    ["without an order", completed("", "cs_1"), "unreadable"],
    ["without an amount", { ...completed(randomUUID(), "cs_1"), amount_total: null }, "unreadable"],
  ])("%s changes nothing", async (_what, object, outcome) => {
    expect(await tell(eventOf("checkout.session.completed", object))).toBe(outcome);
  });

  it("yet, because the money is still on its way, waits", async () => {
    const { orderId, sessionId } = await waitingOrder(site, [await buildPart()]);
    const unpaid = completed(orderId, sessionId, { payment_status: "unpaid" });
    expect(await tell(eventOf("checkout.session.completed", unpaid))).toBe("not-paid-yet");
    expect((await orderNow(orderId)).state).toBe("awaiting-payment");
    const later = completed(orderId, sessionId);
    expect(await tell(eventOf("checkout.session.async_payment_succeeded", later))).toBe("paid");
  });
});

describe("a payment that comes too late", () => {
  /** An order that ran out while its payment was on the way to us. */
  async function paidButExpired(stockOnHand: number) {
    const part = await buildPart({ stockOnHand });
    const { user, me, orderId, sessionId } = await waitingOrder(site, [part]);
    site.stripe.control.setWebhooks({ mode: "hold" });
    await tell(eventOf("checkout.session.expired", { client_reference_id: orderId }));
    expect((await orderNow(orderId)).state).toBe("expired");
    await site.stripe.control.pay(sessionId);
    const deliver = async () => {
      await site.stripe.control.deliver();
      await runJobs(site);
    };
    return { part, user, me, orderId, sessionId, deliver };
  }

  it("takes the stock again where it is still there", async () => {
    const { part, orderId, deliver } = await paidButExpired(1);
    await deliver();
    await expectPaidOnce(orderId);
    expect(await part.reload()).toMatchObject({ stockOnHand: 0, stockReserved: 0 });
  });

  it("goes back where the stock is gone: once, booked both ways, and told", async () => {
    const { part, user, me, orderId, sessionId, deliver } = await paidButExpired(1);
    await part.update({ stockOnHand: 0 });
    await deliver();
    await site.stripe.control.deliver(
      site.stripe.control
        .events("checkout.session.completed")
        .slice(-1)
        .map(({ id }) => id),
    );
    await runJobs(site);

    expect(await orderNow(orderId)).toMatchObject({ state: "expired", refundedMinor: 2600 });
    expect(await part.reload()).toMatchObject({ stockOnHand: 0, stockReserved: 0 });
    const payment = await Payment.findOne({ where: { orderId }, rejectOnEmpty: true });
    expect(payment).toMatchObject({ state: "refunded", sessionId });
    const refunds = await site.services.payments.refunds.list({ payment_intent: payment.paymentIntentId! });
    expect(refunds.data.map(({ amount, status }) => [amount, status])).toEqual([[2600, "succeeded"]]);
    const booked = await LedgerTransaction.findAll({ where: { orderId }, order: [["id", "ASC"]] });
    expect(booked.map(({ cause }) => cause)).toEqual([`order-paid-late:${orderId}`, `order-refunded:${orderId}`]);
    const owed = (await balances()).filter(({ account }) => account === "refunds");
    expect(owed.every(({ amountMinor }) => amountMinor === 0)).toBe(true);
    const mails = await Mail.findAll({ where: { recipient: user.email } });
    expect(mails.map(({ template }) => template)).toEqual(["order-refunded"]);
    const { body } = await me.get(`/orders/${orderId}`);
    expect(body.history.map(({ what }: { what: string }) => what).slice(-2)).toEqual([
      "A payment came too late; it is being given back",
      "The payment was given back",
    ]);
  });

  it("goes back once the provider answers again, and only once", async () => {
    const { part, orderId, deliver } = await paidButExpired(1);
    await part.update({ stockOnHand: 0 });
    site.stripe.control.trouble({ kind: "fail", times: 3, on: "POST /v1/refunds" });
    await deliver();
    expect((await orderNow(orderId)).refundedMinor).toBe(0);
    await site.services.pool.query("UPDATE graphile_worker._private_jobs SET run_at = now() WHERE key = $1", [
      `refund:${orderId}`,
    ]);
    await runJobs(site);
    expect((await orderNow(orderId)).refundedMinor).toBe(2600);
    const payment = await Payment.findOne({ where: { orderId }, rejectOnEmpty: true });
    const refunds = await site.services.payments.refunds.list({ payment_intent: payment.paymentIntentId! });
    expect(refunds.data).toHaveLength(1);
  });

  it("goes back where the order was cancelled meanwhile", async () => {
    const { orderId, sessionId } = await waitingOrder(site, [await buildPart()]);
    site.stripe.control.setWebhooks({ mode: "hold" });
    await Order.update({ state: "cancelled" }, { where: { id: orderId } });
    await site.stripe.control.pay(sessionId);
    await site.stripe.control.deliver();
    await runJobs(site);
    expect(await orderNow(orderId)).toMatchObject({ state: "cancelled", refundedMinor: 2600 });
  });

  it("may meet the job that ends the hold, whichever comes first", async () => {
    const part = await buildPart({ stockOnHand: 5 });
    const { orderId, sessionId } = await waitingOrder(site, [part]);
    const order = await orderNow(orderId);
    await Promise.all([
      payAndApply(site, sessionId),
      expireOrder(site.services, orderId, at(order, 36)).catch(() => undefined),
    ]).catch(() => undefined);
    await site.stripe.control.settled();
    await runJobs(site);
    const { state } = await orderNow(orderId);
    const { stockOnHand, stockReserved } = await part.reload();
    expect([
      ["paid", 4, 0],
      ["expired", 5, 0],
    ]).toContainEqual([state, stockOnHand, stockReserved]);
  });
});

describe("what is not from the provider", () => {
  const event = () => eventOf("checkout.session.expired", { client_reference_id: randomUUID() });

  it.each([
    ["signed with another secret", () => signed(event(), { secret: "whsec_other" })],
    ["signed too long ago", () => signed(event(), { ageSeconds: 400 })],
    ["not signed", () => request(site.url).post(webhook).send(event())],
    ["empty", () => request(site.url).post(webhook)],
    ["changed after signing", () => signed(event()).send(" ")],
  ])("is refused when it is %s, and not kept", async (_what, send) => {
    const before = await PaymentEvent.count();
    const res = await send();
    expect([res.status, res.type]).toEqual([400, "application/problem+json"]);
    expect(await PaymentEvent.count()).toBe(before);
  });

  it("is refused when it is too large", async () => {
    const res = await request(site.url).post(webhook).type("application/json").send("x".repeat(600_000));
    expect(res.status).toBe(413);
  });

  it("gets 405 for anything but a post", async () => {
    await request(site.url).get(webhook).expect(405);
  });
});
