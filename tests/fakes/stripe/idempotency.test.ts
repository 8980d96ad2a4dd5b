import Stripe from "stripe";
import { afterEach, beforeEach, describe, expect, it } from "vitest";
import { type Bench, openBench, orderParams, paidOrder, refusalOf } from "./bench";

describe("idempotency keys", () => {
  let bench: Bench;
  beforeEach(async () => {
    bench = await openBench();
  });
  afterEach(() => bench.close());

  const key = { idempotencyKey: "order-7:attempt-1" };
  const create = (params = orderParams(), client = bench.stripe) => client.checkout.sessions.create(params, key);
  const sessions = async () => (await bench.stripe.checkout.sessions.list()).data.length;

  it("gives the first answer again, and says so", async () => {
    const first = await create();
    await bench.fake.control.pay(first.id);
    const again = await create();
    expect(again).toEqual(first);
    expect(again.status).toBe("open");
    expect(first.lastResponse.headers["idempotent-replayed"]).toBeUndefined();
    expect(again.lastResponse.headers["idempotent-replayed"]).toBe("true");
    expect(again.lastResponse.headers["original-request"]).toBe(first.lastResponse.requestId);
    expect(await sessions()).toBe(1);
  });

  it("does not mind the order of parameters", async () => {
    const { mode, ...rest } = orderParams();
    const first = await create({ mode, ...rest });
    expect((await create({ ...rest, mode })).id).toBe(first.id);
  });

  it("refuses the key with other parameters or another path", async () => {
    await create();
    const other = await refusalOf(create({ ...orderParams(), client_reference_id: "order-8" }));
    expect(other).toBeInstanceOf(Stripe.errors.StripeIdempotencyError);
    expect(other).toMatchObject({ statusCode: 400, rawType: "idempotency_error" });
    const elsewhere = await refusalOf(bench.stripe.paymentIntents.create({ amount: 100, currency: "eur" }, key));
    expect(elsewhere.rawType).toBe("idempotency_error");
    expect(await sessions()).toBe(1);
  });

  it("refuses the key while another request holds it, then replays", async () => {
    bench.fake.control.trouble({ kind: "hold" });
    const first = create();
    while (bench.fake.control.heldRequests() === 0) await new Promise(setImmediate);
    const second = await refusalOf(create());
    expect(second).toMatchObject({ statusCode: 409, code: "idempotency_key_in_use" });
    bench.fake.control.releaseRequests();
    const { id } = await first;
    expect((await create()).id).toBe(id);
    expect(await sessions()).toBe(1);
  });

  it("does not keep what fails validation", async () => {
    await refusalOf(create({ ...orderParams(), expires_at: "soon" } as never));
    const session = await create();
    expect(session.status).toBe("open");
    expect(session.lastResponse.headers["idempotent-replayed"]).toBeUndefined();
  });

  it("keeps a refusal that the work itself gave", async () => {
    const { charge } = await paidOrder(bench);
    const refund = () => bench.stripe.refunds.create({ charge: charge.id, amount: 5000 }, key);
    await refusalOf(refund());
    const again = await refusalOf(refund());
    expect(again).toMatchObject({ statusCode: 400, param: "amount" });
    expect(again.headers?.["idempotent-replayed"]).toBe("true");
  });

  it("takes a key as new after a day", async () => {
    const first = await create();
    bench.fake.control.advanceClock(86_399);
    expect((await create()).id).toBe(first.id);
    bench.fake.control.advanceClock(1);
    expect((await create()).id).not.toBe(first.id);
  });

  it("refuses a key that is too long", async () => {
    const long = { idempotencyKey: "k".repeat(256) };
    expect((await refusalOf(bench.stripe.checkout.sessions.create(orderParams(), long))).statusCode).toBe(400);
  });
});
