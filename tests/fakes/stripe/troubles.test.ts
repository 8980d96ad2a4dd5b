import Stripe from "stripe";
import { afterEach, beforeEach, describe, expect, it } from "vitest";
import { type Bench, openBench, orderParams, paidOrder, refusalOf } from "./bench";

const SESSIONS = "POST /v1/checkout/sessions";

describe("bad days", () => {
  let bench: Bench;
  beforeEach(async () => {
    bench = await openBench();
  });
  afterEach(() => bench.close());

  const key = { idempotencyKey: "order-7:attempt-1" };
  const create = (client = bench.stripe) => client.checkout.sessions.create(orderParams(), key);
  const sessions = async () => (await bench.stripe.checkout.sessions.list()).data.length;

  it("fails as many requests as told, and no others", async () => {
    bench.fake.control.trouble({ kind: "fail", times: 2, on: SESSIONS });
    expect((await bench.stripe.balance.retrieve()).object).toBe("balance");
    expect((await refusalOf(create())).statusCode).toBe(500);
    expect((await refusalOf(create())).statusCode).toBe(500);
    expect((await create()).status).toBe("open");
    expect(await sessions()).toBe(1);
  });

  it("is got over by the SDK's own retries", async () => {
    bench.fake.control.trouble({ kind: "fail", on: SESSIONS });
    expect((await create(bench.client({ maxNetworkRetries: 1 }))).status).toBe("open");
  });

  it("keeps a failure of the work, which a retry meets again", async () => {
    bench.fake.control.trouble({ kind: "fail-kept", on: SESSIONS });
    expect((await refusalOf(create())).statusCode).toBe(500);
    const again = await refusalOf(create());
    expect(again).toMatchObject({ statusCode: 500, rawType: "api_error" });
    expect(again.headers?.["stripe-should-retry"]).toBe("false");
    expect(await sessions()).toBe(0);
  });

  it("hangs after committing; the retry with the same key finds the one object", async () => {
    bench.fake.control.trouble({ kind: "hang-after-commit", on: SESSIONS });
    const silence = await refusalOf(create(bench.client({ timeout: 100 })));
    expect(silence).toBeInstanceOf(Stripe.errors.StripeConnectionError);
    expect(await sessions()).toBe(1);
    const { id } = await create();
    expect((await bench.stripe.checkout.sessions.list()).data.map((session) => session.id)).toEqual([id]);
  });

  it("cuts the line after committing; the SDK retries by itself and one refund is made", async () => {
    const { charge } = await paidOrder(bench);
    bench.fake.control.trouble({ kind: "cut-after-commit", on: "POST /v1/refunds" });
    const refund = await bench.client({ maxNetworkRetries: 1 }).refunds.create({ charge: charge.id, amount: 500 });
    expect(refund.lastResponse.headers["idempotent-replayed"]).toBe("true");
    expect((await bench.stripe.charges.retrieve(charge.id)).amount_refunded).toBe(500);
  });

  it("ends with a reset", async () => {
    bench.fake.control.trouble({ kind: "fail", times: 100 });
    bench.fake.control.reset();
    expect((await create()).status).toBe("open");
  });

  it("closes while a request hangs", async () => {
    const other = await openBench();
    other.fake.control.trouble({ kind: "hang-after-commit" });
    const hanging = refusalOf(other.stripe.paymentIntents.create({ amount: 100, currency: "eur" }));
    while (other.fake.control.events().length === 0) await new Promise(setImmediate);
    await other.close();
    expect(await hanging).toBeInstanceOf(Stripe.errors.StripeConnectionError);
  });
});
