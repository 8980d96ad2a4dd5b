import { afterAll, afterEach, beforeAll, describe, expect, it } from "vitest";
import { expireOrder } from "#server/commands/expireOrder";
import { balances } from "#server/ledger/balances";
import { LedgerTransaction } from "#server/models/LedgerTransaction";
import { Mail } from "#server/models/Mail";
import { Order } from "#server/models/Order";
import { Payment } from "#server/models/Payment";
import { at, loseTheAnswer, payAndApply, runJobs, waitingOrder } from "#tests/server/orders/checkout";
import { buildPart } from "#tests/support/factories";
import { startTestSite, type TestSite } from "#tests/support/testSite";
import { eventOf, expectPaidOnce, orderNow, tell } from "./events";

let site: TestSite;
beforeAll(async () => {
  site = await startTestSite();
});
afterEach(() => site.stripe.control.reset());
afterAll(() => site.close());

describe("a payment that comes too late", () => {
  /** An order that ran out while its payment was on the way to us. */
  async function paidButExpired(stockOnHand: number) {
    const part = await buildPart({ stockOnHand });
    const { user, me, orderId, sessionId } = await waitingOrder(site, [part]);
    site.stripe.control.setWebhooks({ mode: "hold" });
    await tell(site, eventOf("checkout.session.expired", { client_reference_id: orderId }));
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

  it("goes back once, also where the provider's first answer is lost", async () => {
    const { part, orderId, deliver } = await paidButExpired(1);
    await part.update({ stockOnHand: 0 });
    await loseTheAnswer(site, deliver, "POST /v1/refunds");
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
