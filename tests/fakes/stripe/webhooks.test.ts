import { afterEach, beforeEach, describe, expect, it } from "vitest";
import { type Bench, openBench, orderParams, paidOrder, type Received, WEBHOOK_SECRET } from "./bench";

const PAID = ["payment_intent.created", "charge.succeeded", "payment_intent.succeeded", "checkout.session.completed"];

describe("webhooks", () => {
  let bench: Bench;
  beforeEach(async () => {
    bench = await openBench();
  });
  afterEach(() => bench.close());

  const open = ({ payload, signature }: Received) =>
    bench.stripe.webhooks.constructEvent(payload, signature, WEBHOOK_SECRET);
  const typesIn = (received: readonly Received[]) =>
    received.map(({ payload }) => (JSON.parse(payload) as { type: string }).type);
  const undelivered = async () => (await bench.stripe.events.list({ delivery_success: false })).data;

  it("tells of a payment, signed so that the SDK accepts it", async () => {
    const { session } = await paidOrder(bench);
    await bench.fake.control.settled();
    const events = bench.received.map(open);
    expect(events.map(({ type }) => type)).toEqual(PAID);
    expect(events[3]).toMatchObject({
      object: "event",
      api_version: "2026-10-28.endive",
      data: { object: { id: session.id, status: "complete", payment_status: "paid" } },
      livemode: false,
      request: null,
    });
    expect(await undelivered()).toEqual([]);
  });

  it("tells of a refusal, an expiry and a refund", async () => {
    const { id } = await bench.stripe.checkout.sessions.create(orderParams());
    await bench.fake.control.decline(id);
    await bench.stripe.checkout.sessions.expire(id);
    const { charge } = await paidOrder(bench);
    await bench.fake.control.settled();
    const before = bench.received.length;
    const refund = await bench.stripe.refunds.create({ charge: charge.id }, { idempotencyKey: "refund-7" });
    await bench.stripe.refunds.update(refund.id, { metadata: { a: "1" } });
    await bench.fake.control.settled();
    const kinds = typesIn(bench.received);
    expect(kinds.slice(0, 5)).toEqual([
      "payment_intent.created",
      "charge.failed",
      "payment_intent.payment_failed",
      "checkout.session.expired",
      "payment_intent.canceled",
    ]);
    expect(kinds.slice(before)).toEqual(["refund.created", "charge.refunded", "refund.updated"]);
    expect(open(bench.received[before]!).request).toEqual({
      id: refund.lastResponse.requestId,
      idempotency_key: "refund-7",
    });
  });

  it("shows an object as it was at the time", async () => {
    const { charge } = await paidOrder(bench);
    await bench.stripe.refunds.create({ charge: charge.id, amount: 100 });
    await bench.stripe.refunds.create({ charge: charge.id, amount: 200 });
    const told = bench.fake.control.events("charge.refunded").map(({ data }) => data);
    expect(told).toMatchObject([
      { object: { amount_refunded: 100 }, previous_attributes: { amount_refunded: 0 } },
      { object: { amount_refunded: 300 }, previous_attributes: { amount_refunded: 100 } },
    ]);
  });

  it.each(["forged", "stale"] as const)("can be %s, which the SDK refuses", async (signature) => {
    bench.fake.control.setWebhooks({ signature });
    await bench.stripe.paymentIntents.create({ amount: 100, currency: "eur" });
    await bench.fake.control.settled();
    expect(bench.received).toHaveLength(1);
    expect(() => open(bench.received[0]!)).toThrow();
  });

  it("are dropped, found by listing what was not delivered, and delivered again", async () => {
    bench.fake.control.setWebhooks({ mode: "drop" });
    await paidOrder(bench);
    await bench.fake.control.settled();
    expect(bench.received).toEqual([]);
    const lost = await undelivered();
    expect(lost.map(({ type }) => type)).toEqual([...PAID].reverse());
    expect(await bench.fake.control.redeliver(lost[0]!.id)).toMatchObject({ delivered: true, status: 200 });
    expect(await undelivered()).toHaveLength(3);
    expect((await bench.stripe.events.retrieve(lost[0]!.id)).pending_webhooks).toBe(0);
  });

  it("come twice with one id", async () => {
    bench.fake.control.setWebhooks({ copies: 2 });
    await paidOrder(bench);
    await bench.fake.control.settled();
    expect(typesIn(bench.received)).toEqual([...PAID, ...PAID]);
    expect(new Set(bench.received.map((one) => open(one).id)).size).toBe(4);
  });

  it("tell one change by two events", async () => {
    bench.fake.control.setWebhooks({ twinEvents: true });
    await paidOrder(bench);
    await bench.fake.control.settled();
    const completed = bench.received.map(open).filter(({ type }) => type === "checkout.session.completed");
    expect(new Set(completed.map(({ id }) => id)).size).toBe(2);
  });

  it("come in reverse and in a shuffled order", async () => {
    bench.fake.control.setWebhooks({ order: "reversed" });
    await paidOrder(bench);
    await bench.fake.control.settled();
    expect(typesIn(bench.received)).toEqual([...PAID].reverse());
    bench.fake.control.setWebhooks({ order: "shuffled" });
    await paidOrder(bench);
    await bench.fake.control.settled();
    expect(typesIn(bench.received.slice(4)).sort()).toEqual([...PAID].sort());
  });

  it("are held and delivered in a chosen order, as often as named", async () => {
    bench.fake.control.setWebhooks({ mode: "hold" });
    await paidOrder(bench);
    await bench.fake.control.settled();
    expect(bench.received).toEqual([]);
    const [created, , , completed] = bench.fake.control.held();
    await bench.fake.control.deliver([completed!.id, created!.id, completed!.id]);
    expect(typesIn(bench.received)).toEqual([PAID[3], PAID[0], PAID[3]]);
    await bench.fake.control.deliver();
    expect(typesIn(bench.received.slice(3))).toEqual([PAID[1], PAID[2]]);
    expect(bench.fake.control.held()).toEqual([]);
  });

  it("wait as long as told", async () => {
    bench.fake.control.setWebhooks({ delayMs: 60_000 });
    await paidOrder(bench);
    bench.fake.control.advanceClock(59);
    await bench.fake.control.settled();
    expect(bench.received).toEqual([]);
    bench.fake.control.advanceClock(1);
    await bench.fake.control.settled();
    expect(typesIn(bench.received)).toEqual(PAID);
  });

  it("are tried again, later each time and not for ever, while the receiver fails", async () => {
    bench.answerWith(503);
    await bench.stripe.paymentIntents.create({ amount: 100, currency: "eur" });
    for (const wait of [0, 1, 5, 30, 120, 600, 86_400]) {
      bench.fake.control.advanceClock(wait);
      await bench.fake.control.settled();
    }
    expect(bench.fake.control.attempts().map(({ status }) => status)).toEqual([503, 503, 503, 503, 503, 503]);
    expect(await undelivered()).toHaveLength(1);
  });

  it("do not follow a receiver that points elsewhere", async () => {
    bench.answerWith(307);
    await bench.stripe.paymentIntents.create({ amount: 100, currency: "eur" });
    await bench.fake.control.settled();
    expect(bench.received).toHaveLength(1);
    expect(bench.fake.control.attempts()).toMatchObject([{ status: 307, delivered: false }]);
  });

  it("reach a receiver that comes back", async () => {
    bench.answerWith(500);
    await bench.stripe.paymentIntents.create({ amount: 100, currency: "eur" });
    await bench.fake.control.settled();
    bench.answerWith(204);
    bench.fake.control.advanceClock(1);
    await bench.fake.control.settled();
    expect(bench.fake.control.attempts().map(({ delivered }) => delivered)).toEqual([false, true]);
    expect(await undelivered()).toEqual([]);
  });

  it("list by type, also by a wildcard, for thirty days", async () => {
    await paidOrder(bench);
    const typed = async (params: object) => (await bench.stripe.events.list(params)).data.map(({ type }) => type);
    expect(await typed({ type: "charge.succeeded" })).toEqual(["charge.succeeded"]);
    expect(await typed({ types: ["charge.*", "checkout.session.completed"] })).toEqual([PAID[3], PAID[1]]);
    bench.fake.control.advanceClock(30 * 86_400);
    expect(await typed({})).toEqual([]);
  });
});
