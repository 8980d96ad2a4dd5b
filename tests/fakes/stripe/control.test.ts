import { afterEach, beforeEach, describe, expect, it } from "vitest";
import { type Bench, openBench, orderParams } from "./bench";

describe("the controls over HTTP", () => {
  let bench: Bench;
  beforeEach(async () => {
    bench = await openBench();
  });
  afterEach(() => bench.close());

  const read = async (path: string) => (await fetch(`${bench.fake.url}/_control${path}`)).json();
  const act = async (path: string, input: object = {}) => {
    const res = await fetch(`${bench.fake.url}/_control${path}`, {
      method: "POST",
      headers: { "content-type": "application/json" },
      body: JSON.stringify(input),
    });
    return { status: res.status, body: (await res.json()) as Record<string, unknown> };
  };

  it("hold webhooks, pay, deliver and redeliver", async () => {
    const { id } = await bench.stripe.checkout.sessions.create(orderParams());
    expect((await act("/webhooks", { mode: "hold" })).body).toMatchObject({ mode: "hold", copies: 1 });
    expect((await act("/pay", { sessionId: id })).body).toMatchObject({ id, status: "complete" });
    const held = (await read("/held")) as { id: string; type: string }[];
    expect(held.at(-1)?.type).toBe("checkout.session.completed");
    const eventId = held.at(-1)!.id;
    expect((await act("/deliver", { eventIds: [eventId] })).body).toMatchObject([{ eventId, delivered: true }]);
    expect((await act("/redeliver", { eventId })).body).toMatchObject({ eventId, delivered: true });
    expect(bench.received).toHaveLength(2);
    expect(await read("/attempts")).toHaveLength(2);
    expect(await read("/events?type=charge.succeeded")).toHaveLength(1);
  });

  it("decline, slow refunds down and end them", async () => {
    const { id } = await bench.stripe.checkout.sessions.create(orderParams());
    expect((await act("/decline", { sessionId: id })).body).toMatchObject({ status: "open" });
    const { body } = await act("/pay", { sessionId: id });
    await act("/refunds", { status: "pending" });
    const refund = await bench.stripe.refunds.create({ payment_intent: String(body.payment_intent) });
    const ended = await act("/settle-refund", { refundId: refund.id, status: "succeeded" });
    expect(ended.body).toMatchObject({ status: "succeeded" });
  });

  it("move the clock, make trouble and end it", async () => {
    const { id } = await bench.stripe.checkout.sessions.create(orderParams());
    await act("/advance-clock", { seconds: 86_400 });
    await act("/settled");
    expect((await bench.stripe.checkout.sessions.retrieve(id)).status).toBe("expired");
    await act("/trouble", { kind: "fail", times: 9 });
    await expect(bench.stripe.balance.retrieve()).rejects.toThrow();
    await act("/reset");
    await act("/release-requests");
    expect((await bench.stripe.balance.retrieve()).object).toBe("balance");
  });

  it.each([
    ["/pay", { sessionId: "cs_none" }, 404],
    ["/pay", {}, 400],
    ["/trouble", { kind: "fire" }, 400],
    ["/other", {}, 404],
  ])("refuse %s %j", async (path, input, status) => {
    expect((await act(path, input)).status).toBe(status);
  });
});
