import { afterEach, beforeEach, describe, expect, it } from "vitest";
import { type Bench, openBench, paidOrder, refusalOf } from "./bench";

describe("transfers", () => {
  let bench: Bench;
  beforeEach(async () => {
    bench = await openBench();
  });
  afterEach(() => bench.close());

  const to = (amount: number, source_transaction?: string) =>
    bench.stripe.transfers.create({
      amount,
      currency: "eur",
      destination: "acct_workshop",
      ...(source_transaction === undefined ? {} : { source_transaction }),
    });

  it("share out a charge before its money has come, never more than it", async () => {
    const { charge } = await paidOrder(bench);
    const first = await to(2000, charge.id);
    expect(first).toMatchObject({ amount: 2000, transfer_group: "order-7", source_transaction: charge.id });
    expect((await refusalOf(to(991, charge.id))).param).toBe("amount");
    await to(900, charge.id);
    const listed = await bench.stripe.transfers.list({ transfer_group: "order-7" });
    expect(listed.data.map(({ amount }) => amount)).toEqual([900, 2000]);
    expect((await bench.stripe.balance.retrieve()).pending[0]?.amount).toBe(2990 - 70 - 2900);
    expect((await bench.stripe.transfers.retrieve(first.id)).id).toBe(first.id);
  });

  it("need available money when they name no charge", async () => {
    await paidOrder(bench);
    expect((await refusalOf(to(1000))).code).toBe("balance_insufficient");
    bench.fake.control.advanceClock(7 * 86_400);
    expect((await to(1000)).amount).toBe(1000);
    expect((await bench.stripe.balance.retrieve()).available[0]?.amount).toBe(1920);
  });

  it("are reversed in parts until nothing is left", async () => {
    const { charge } = await paidOrder(bench);
    const { id } = await to(1000, charge.id);
    const part = await bench.stripe.transfers.createReversal(id, { amount: 300, metadata: { why: "refund" } });
    expect(part).toMatchObject({ object: "transfer_reversal", amount: 300, transfer: id });
    expect((await refusalOf(bench.stripe.transfers.createReversal(id, { amount: 701 }))).param).toBe("amount");
    await bench.stripe.transfers.createReversal(id);
    expect(await bench.stripe.transfers.retrieve(id)).toMatchObject({ amount_reversed: 1000, reversed: true });
    const reversals = await bench.stripe.transfers.listReversals(id);
    expect(reversals.data.map(({ amount }) => amount)).toEqual([700, 300]);
    await refusalOf(bench.stripe.transfers.createReversal(id));
    expect(
      bench.fake.control
        .events()
        .map(({ type }) => type)
        .slice(-3),
    ).toEqual(["transfer.created", "transfer.reversed", "transfer.reversed"]);
  });

  it("go to accounts only", async () => {
    const params = { amount: 100, currency: "eur", destination: "elsewhere" };
    expect((await refusalOf(bench.stripe.transfers.create(params))).param).toBe("destination");
  });
});
