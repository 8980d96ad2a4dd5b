import { afterEach, beforeEach, describe, expect, it } from "vitest";
import { type Bench, openBench, orderParams, paidOrder, refusalOf } from "./bench";

describe("refunds", () => {
  let bench: Bench;
  beforeEach(async () => {
    bench = await openBench();
  });
  afterEach(() => bench.close());

  it("gives back in parts until nothing is left", async () => {
    const { charge, intent } = await paidOrder(bench);
    const first = await bench.stripe.refunds.create({ charge: charge.id, amount: 990, metadata: { parcel: "a" } });
    expect(first).toMatchObject({ amount: 990, charge: charge.id, payment_intent: intent.id, status: "succeeded" });
    const tooMuch = await refusalOf(bench.stripe.refunds.create({ charge: charge.id, amount: 2001 }));
    expect(tooMuch).toMatchObject({ statusCode: 400, param: "amount" });

    const rest = await bench.stripe.refunds.create({ payment_intent: intent.id, reason: "requested_by_customer" });
    expect(rest.amount).toBe(2000);
    const after = await bench.stripe.charges.retrieve(charge.id, { expand: ["refunds"] });
    expect(after).toMatchObject({ amount_refunded: 2990, refunded: true });
    expect(after.refunds?.data.map(({ id }) => id)).toEqual([rest.id, first.id]);
    const none = await refusalOf(bench.stripe.refunds.create({ charge: charge.id }));
    expect(none.code).toBe("charge_already_refunded");
  });

  it("takes the money from the balance and keeps the fee", async () => {
    const { charge } = await paidOrder(bench);
    await bench.stripe.refunds.create({ charge: charge.id });
    bench.fake.control.advanceClock(8 * 86_400);
    const balance = await bench.stripe.balance.retrieve();
    expect([balance.available[0]?.amount, balance.pending[0]?.amount]).toEqual([-70, 0]);
  });

  it("gives refunds one by one, as a list and with new metadata", async () => {
    const { charge } = await paidOrder(bench);
    const { id } = await bench.stripe.refunds.create({ charge: charge.id, amount: 100, metadata: { a: "1", b: "2" } });
    const changed = await bench.stripe.refunds.update(id, { metadata: { b: "", c: "3" } });
    expect(changed.metadata).toEqual({ a: "1", c: "3" });
    expect((await bench.stripe.refunds.retrieve(id)).metadata).toEqual({ a: "1", c: "3" });
    expect((await bench.stripe.refunds.list({ charge: charge.id })).data.map((one) => one.id)).toEqual([id]);
    expect((await bench.stripe.refunds.list({ charge: "ch_other" })).data).toEqual([]);
  });

  it("refuses to refund what was not paid", async () => {
    const { id } = await bench.stripe.checkout.sessions.create(orderParams());
    const { payment_intent } = await bench.fake.control.decline(id);
    const refusal = await refusalOf(bench.stripe.refunds.create({ payment_intent: payment_intent as string }));
    expect(refusal.code).toBe("payment_intent_unexpected_state");
    const nothing = await refusalOf(bench.stripe.refunds.create({}));
    expect(nothing.code).toBe("parameter_missing");
  });

  it("lets a slow refund fail and puts the money back", async () => {
    const { charge } = await paidOrder(bench);
    bench.fake.control.setRefunds("pending");
    const slow = await bench.stripe.refunds.create({ charge: charge.id, amount: 1000 });
    expect(slow.status).toBe("pending");
    await bench.fake.control.settleRefund(slow.id, "failed");
    expect(await bench.stripe.refunds.retrieve(slow.id)).toMatchObject({ status: "failed" });
    expect((await bench.stripe.charges.retrieve(charge.id)).amount_refunded).toBe(0);
    expect((await bench.stripe.balance.retrieve()).available[0]?.amount).toBe(0);
    await expect(bench.fake.control.settleRefund(slow.id, "succeeded")).rejects.toThrow("not pending");
    expect(
      bench.fake.control
        .events()
        .map(({ type }) => type)
        .slice(-3),
    ).toEqual(["refund.created", "charge.refunded", "refund.updated"]);
  });
});
