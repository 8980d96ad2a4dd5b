import type Stripe from "stripe";
import { afterEach, beforeEach, describe, expect, it } from "vitest";
import { feeOf } from "#fakes/stripe/balance";
import { type Bench, openBench, orderParams, paidOrder, refusalOf, START_S } from "./bench";

const DAY = 86_400;

describe("payments", () => {
  let bench: Bench;
  beforeEach(async () => {
    bench = await openBench();
  });
  afterEach(() => bench.close());

  it("completes session, intent and charge together", async () => {
    const { session, intent, charge } = await paidOrder(bench);
    expect(session).toMatchObject({ status: "complete", payment_status: "paid", url: null });
    expect(session.customer_details?.email).toBe("restorer@example.test");
    expect(intent).toMatchObject({
      amount: 2990,
      amount_received: 2990,
      metadata: { orderId: "7" },
      status: "succeeded",
      transfer_group: "order-7",
    });
    expect(charge).toMatchObject({ amount: 2990, paid: true, payment_intent: intent.id, status: "succeeded" });
    expect(charge.payment_method_details?.card).toMatchObject({ brand: "unknown", last4: "0000" });
  });

  it("gives intents and charges one by one and as lists", async () => {
    const { intent, charge } = await paidOrder(bench);
    expect((await bench.stripe.paymentIntents.retrieve(intent.id)).latest_charge).toBe(charge.id);
    expect((await bench.stripe.charges.retrieve(charge.id)).payment_intent).toBe(intent.id);
    expect((await bench.stripe.paymentIntents.list()).data.map(({ id }) => id)).toEqual([intent.id]);
    const byGroup = await bench.stripe.charges.list({ transfer_group: "order-7" });
    expect(byGroup.data.map(({ id }) => id)).toEqual([charge.id]);
    expect((await bench.stripe.charges.list({ created: { gt: START_S } })).data).toEqual([]);
  });

  it("refuses a second payment of the same session", async () => {
    const { session } = await paidOrder(bench);
    await expect(bench.fake.control.pay(session.id)).rejects.toThrow("complete");
    expect((await bench.stripe.charges.list()).data).toHaveLength(1);
  });

  it("keeps a refused payment open and lets it succeed later, on one intent", async () => {
    const { id } = await bench.stripe.checkout.sessions.create(orderParams());
    await bench.fake.control.decline(id);
    const refused = await bench.stripe.checkout.sessions.retrieve(id, { expand: ["payment_intent.latest_charge"] });
    const intent = refused.payment_intent as Stripe.PaymentIntent;
    expect(refused).toMatchObject({ status: "open", payment_status: "unpaid" });
    expect(intent).toMatchObject({
      last_payment_error: { code: "card_declined", type: "card_error" },
      latest_charge: { paid: false, status: "failed", balance_transaction: null },
      status: "requires_payment_method",
    });

    await bench.fake.control.pay(id);
    const paid = await bench.stripe.paymentIntents.retrieve(intent.id);
    expect(paid).toMatchObject({ status: "succeeded", last_payment_error: null });
  });

  it("cancels an intent that stands alone, and not one of a session", async () => {
    const alone = await bench.stripe.paymentIntents.create({ amount: 500, currency: "eur" });
    const canceled = await bench.stripe.paymentIntents.cancel(alone.id, { cancellation_reason: "abandoned" });
    expect(canceled).toMatchObject({ status: "canceled", cancellation_reason: "abandoned", canceled_at: START_S });

    const { id } = await bench.stripe.checkout.sessions.create(orderParams());
    const declined = await bench.fake.control.decline(id);
    const refusal = await refusalOf(bench.stripe.paymentIntents.cancel(declined.payment_intent as string));
    expect(refusal.message).toContain("Expire the Checkout Session instead");

    const { intent } = await paidOrder(bench);
    const tooLate = await refusalOf(bench.stripe.paymentIntents.cancel(intent.id));
    expect(tooLate.code).toBe("payment_intent_unexpected_state");
  });

  it.each([
    [50, 26],
    [2990, 70],
    [3000, 70],
    [3034, 71],
    [99_999_999, 1_500_025],
  ])("keeps of %i a fee of %i", (amount, fee) => {
    expect(feeOf(amount)).toBe(fee);
  });

  it("books the net and makes it available after seven days", async () => {
    const { charge } = await paidOrder(bench);
    const id = charge.balance_transaction as string;
    const net = 2990 - feeOf(2990);
    const movement = await bench.stripe.balanceTransactions.retrieve(id, { expand: ["source"] });
    expect(movement).toMatchObject({ amount: 2990, fee: 70, net, status: "pending", source: { id: charge.id } });
    const before = await bench.stripe.balance.retrieve();
    expect([before.available[0]?.amount, before.pending[0]?.amount]).toEqual([0, net]);

    bench.fake.control.advanceClock(7 * DAY);
    const after = await bench.stripe.balance.retrieve();
    expect([after.available[0]?.amount, after.pending[0]?.amount]).toEqual([net, 0]);
    const listed = await bench.stripe.balanceTransactions.list({ source: charge.id, type: "charge" });
    expect(listed.data.map((one) => [one.id, one.status])).toEqual([[id, "available"]]);
  });
});
