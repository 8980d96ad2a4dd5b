import { afterEach, beforeEach, describe, expect, it } from "vitest";
import { type Bench, openBench, orderParams, paidOrder, refusalOf, START_S } from "./bench";

describe("checkout sessions", () => {
  let bench: Bench;
  beforeEach(async () => {
    bench = await openBench();
  });
  afterEach(() => bench.close());

  it("opens with the total of its lines and an address on this server", async () => {
    const session = await bench.stripe.checkout.sessions.create(orderParams());
    expect(session).toMatchObject({
      object: "checkout.session",
      amount_subtotal: 2990,
      amount_total: 2990,
      client_reference_id: "order-7",
      created: START_S,
      currency: "eur",
      expires_at: START_S + 86_400,
      metadata: { orderId: "7" },
      payment_intent: null,
      payment_status: "unpaid",
      status: "open",
      url: `${bench.fake.url}/pay/${session.id}`,
    });
    expect(session.id).toMatch(/^cs_test_\w{58}$/);
  });

  it("gives a session and its lines back", async () => {
    const { id } = await bench.stripe.checkout.sessions.create(orderParams());
    const session = await bench.stripe.checkout.sessions.retrieve(id, { expand: ["line_items"] });
    const lines = await bench.stripe.checkout.sessions.listLineItems(id);
    expect(lines.data.map((line) => [line.description, line.quantity, line.amount_total])).toEqual([
      ["Idler wheel <44 mm>", 2, 2400],
      ["Postage and tax", 1, 590],
    ]);
    expect(session.line_items?.data.map((line) => line.id)).toEqual(lines.data.map((line) => line.id));
    expect(lines.data[0]?.price?.unit_amount_decimal?.toString()).toBe("1200");
  });

  it("reads more lines than a form parser keeps as a list by itself", async () => {
    const [line] = orderParams().line_items!;
    const many = { ...orderParams(), line_items: Array.from({ length: 100 }, () => line!) };
    const { id, amount_total } = await bench.stripe.checkout.sessions.create(many);
    expect(amount_total).toBe(240_000);
    const lines = await bench.stripe.checkout.sessions.listLineItems(id, { limit: 100 });
    expect(lines.data).toHaveLength(100);
  });

  it("lists the newest first, page by page", async () => {
    const ids: string[] = [];
    for (let i = 0; i < 3; i++) ids.unshift((await bench.stripe.checkout.sessions.create(orderParams())).id);
    const first = await bench.stripe.checkout.sessions.list({ limit: 2 });
    const second = await bench.stripe.checkout.sessions.list({ limit: 2, starting_after: ids[1]! });
    expect([first.data.map(({ id }) => id), first.has_more]).toEqual([ids.slice(0, 2), true]);
    expect([second.data.map(({ id }) => id), second.has_more]).toEqual([ids.slice(2), false]);
    const back = await bench.stripe.checkout.sessions.list({ ending_before: ids[2]! });
    expect(back.data.map(({ id }) => id)).toEqual(ids.slice(0, 2));
  });

  it("finds the session of a payment", async () => {
    await bench.stripe.checkout.sessions.create(orderParams());
    const { session, intent } = await paidOrder(bench);
    const found = await bench.stripe.checkout.sessions.list({ payment_intent: intent.id });
    expect(found.data.map(({ id }) => id)).toEqual([session.id]);
  });

  it("expires on request, once", async () => {
    const { id } = await bench.stripe.checkout.sessions.create(orderParams());
    const expired = await bench.stripe.checkout.sessions.expire(id);
    expect(expired).toMatchObject({ status: "expired", payment_status: "unpaid", url: null });
    expect((await refusalOf(bench.stripe.checkout.sessions.expire(id))).statusCode).toBe(400);
    expect(bench.fake.control.events("checkout.session.expired")).toHaveLength(1);
  });

  it("expires by the clock, and its refused payment with it", async () => {
    const { id } = await bench.stripe.checkout.sessions.create({ ...orderParams(), expires_at: START_S + 1800 });
    await bench.fake.control.decline(id);
    bench.fake.control.advanceClock(1799);
    expect((await bench.stripe.checkout.sessions.retrieve(id)).status).toBe("open");
    bench.fake.control.advanceClock(1);
    const session = await bench.stripe.checkout.sessions.retrieve(id, { expand: ["payment_intent"] });
    expect(session).toMatchObject({ status: "expired", payment_intent: { status: "canceled" } });
    await expect(bench.fake.control.pay(id)).rejects.toThrow("expired");
  });

  it.each([
    ["too soon", START_S + 1799],
    ["too late", START_S + 86_401],
  ])("refuses an end that is %s", async (_, expires_at) => {
    const refusal = await refusalOf(bench.stripe.checkout.sessions.create({ ...orderParams(), expires_at }));
    expect(refusal).toMatchObject({ statusCode: 400, param: "expires_at" });
  });

  it.each([
    [49, "amount_too_small"],
    [100_000_000, "amount_too_large"],
  ])("refuses a total of %i", async (unit_amount, code) => {
    const line = { quantity: 1, price_data: { currency: "eur", unit_amount, product_data: { name: "Belt" } } };
    const refusal = await refusalOf(bench.stripe.checkout.sessions.create({ ...orderParams(), line_items: [line] }));
    expect(refusal).toMatchObject({ statusCode: 400, code });
  });

  it("takes the smallest total there is", async () => {
    const line = { quantity: 1, price_data: { currency: "eur", unit_amount: 50, product_data: { name: "Felt" } } };
    const session = await bench.stripe.checkout.sessions.create({ ...orderParams(), line_items: [line] });
    expect(session.amount_total).toBe(50);
  });

  it("refuses lines in two currencies", async () => {
    const [first] = orderParams().line_items!;
    const other = { quantity: 1, price_data: { currency: "chf", unit_amount: 900, product_data: { name: "Belt" } } };
    const mixed = { ...orderParams(), line_items: [first!, other] };
    expect((await refusalOf(bench.stripe.checkout.sessions.create(mixed))).param).toBe("line_items");
  });
});
