import { randomUUID } from "node:crypto";
import fc from "fast-check";
import { afterAll, afterEach, beforeAll, describe, expect, it } from "vitest";
import { applyPaymentEvent } from "#server/commands/applyPaymentEvent";
import { balances } from "#server/ledger/balances";
import { AuditEntry } from "#server/models/AuditEntry";
import { LedgerTransaction } from "#server/models/LedgerTransaction";
import { Mail } from "#server/models/Mail";
import { Order } from "#server/models/Order";
import { Parcel } from "#server/models/Parcel";
import { Payment } from "#server/models/Payment";
import { PaymentEvent } from "#server/models/PaymentEvent";
import {
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
import { completed, eventOf, expectPaidOnce, orderNow, signed, tell } from "./events";

let site: TestSite;
beforeAll(async () => {
  site = await startTestSite();
});
afterEach(() => site.stripe.control.reset());
afterAll(() => site.close());

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
          await signed(site, events[index]!).expect(200);
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
    expect(await tell(site, event)).toBe("ignored");
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
    expect(await tell(site, eventOf("checkout.session.completed", completed(orderId, sessionId, given)))).toBe(
      "mismatch",
    );
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
    expect(await tell(site, eventOf("checkout.session.completed", object))).toBe(outcome);
  });

  it("yet, because the money is still on its way, waits", async () => {
    const { orderId, sessionId } = await waitingOrder(site, [await buildPart()]);
    const unpaid = completed(orderId, sessionId, { payment_status: "unpaid" });
    expect(await tell(site, eventOf("checkout.session.completed", unpaid))).toBe("not-paid-yet");
    expect((await orderNow(orderId)).state).toBe("awaiting-payment");
    const later = completed(orderId, sessionId);
    expect(await tell(site, eventOf("checkout.session.async_payment_succeeded", later))).toBe("paid");
  });
});
