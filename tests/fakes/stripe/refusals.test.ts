import Stripe from "stripe";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { API_KEY, type Bench, openBench, orderParams, refusalOf } from "./bench";

describe("what the API refuses", () => {
  let bench: Bench;
  beforeAll(async () => {
    bench = await openBench();
  });
  afterAll(() => bench.close());

  const raw = (method: string, path: string, form: Record<string, string> = {}, key: string | null = API_KEY) =>
    fetch(bench.fake.url + path, {
      method,
      headers: key === null ? {} : { authorization: `Bearer ${key}` },
      ...(method === "GET" ? {} : { body: new URLSearchParams(form) }),
    });

  it("a wrong key and none", async () => {
    const refusal = await refusalOf(bench.client({ apiKey: "sk_test_other_key" }).balance.retrieve());
    expect(refusal).toBeInstanceOf(Stripe.errors.StripeAuthenticationError);
    expect(refusal.message).not.toContain("sk_test_other_key");
    const none = await raw("GET", "/v1/balance", {}, null);
    expect(none.status).toBe(401);
    expect(await none.json()).toEqual({
      error: { type: "invalid_request_error", message: "You did not provide an API key." },
    });
  });

  it("takes the key by basic authentication as well", async () => {
    const authorization = `Basic ${Buffer.from(`${API_KEY}:`).toString("base64")}`;
    expect((await fetch(`${bench.fake.url}/v1/balance`, { headers: { authorization } })).status).toBe(200);
  });

  it.each([
    ["GET", "/v1/customers"],
    ["DELETE", "/v1/balance"],
    ["POST", "/v1/balance"],
  ])("%s %s, which is not described here", async (method, path) => {
    const answer = await raw(method, path);
    expect(answer.status).toBe(404);
    expect(await answer.json()).toEqual({
      error: { type: "invalid_request_error", message: `Unrecognized request URL (${method}: ${path}).` },
    });
  });

  it.each([
    ["/v1/checkout/sessions/cs_none", "session"],
    ["/v1/payment_intents/pi_none", "intent"],
    ["/v1/charges/ch_none", "charge"],
    ["/v1/refunds/re_none", "refund"],
    ["/v1/events/evt_none", "id"],
    ["/v1/balance_transactions/txn_none", "id"],
    ["/v1/transfers/tr_none", "transfer"],
  ])("an id that is not there: %s", async (path, param) => {
    const answer = await raw("GET", path);
    expect(answer.status).toBe(404);
    expect(await answer.json()).toMatchObject({
      error: { type: "invalid_request_error", code: "resource_missing", param },
    });
  });

  const withUnknown = (extra: object) =>
    refusalOf(bench.stripe.checkout.sessions.create({ ...orderParams(), ...extra } as never));

  it("an unknown parameter, at the top and deep inside", async () => {
    const top = await withUnknown({ colour: "red" });
    expect(top).toBeInstanceOf(Stripe.errors.StripeInvalidRequestError);
    expect(top).toMatchObject({ statusCode: 400, code: "parameter_unknown", param: "colour" });
    const line = { ...orderParams().line_items![0], weight: 3 };
    expect(await withUnknown({ line_items: [line] })).toMatchObject({
      code: "parameter_unknown",
      param: "line_items[0][weight]",
    });
    const listed = await raw("GET", "/v1/charges?colour=red");
    expect(await listed.json()).toMatchObject({ error: { code: "parameter_unknown", param: "colour" } });
  });

  it("a described parameter that is not acted out, aloud", async () => {
    const refusal = await withUnknown({ discounts: [{ coupon: "x" }] });
    expect(refusal).toMatchObject({ statusCode: 400, param: "discounts" });
    expect(refusal.message).toContain("does not act out");
  });

  it.each([
    [{ success_url: undefined }, "parameter_missing", "success_url"],
    [{ line_items: undefined }, "parameter_missing", "line_items"],
    [{ success_url: "shop" }, "url_invalid", "success_url"],
    [{ client_reference_id: "" }, "parameter_invalid_empty", "client_reference_id"],
    [{ client_reference_id: "x".repeat(201) }, undefined, "client_reference_id"],
    [{ expires_at: "soon" }, "parameter_invalid_integer", "expires_at"],
    [{ mode: "setup" }, undefined, "mode"],
    [{ metadata: { note: "x".repeat(501) } }, undefined, "metadata[note]"],
  ])("a value that does not do: %j", async (extra, code, param) => {
    expect(await withUnknown(extra)).toMatchObject({ statusCode: 400, code, param });
  });

  it("more lines than the description allows", async () => {
    const [line] = orderParams().line_items!;
    const refusal = await withUnknown({ line_items: Array.from({ length: 101 }, () => line) });
    expect(refusal).toMatchObject({ statusCode: 400, param: "line_items" });
  });

  it("what cannot be expanded", async () => {
    const { id } = await bench.stripe.checkout.sessions.create(orderParams());
    const refusal = await refusalOf(bench.stripe.checkout.sessions.retrieve(id, { expand: ["colour"] }));
    expect(refusal).toMatchObject({ statusCode: 400, param: "expand" });
  });

  it("a body that cannot be read", async () => {
    const answer = await fetch(`${bench.fake.url}/v1/refunds`, {
      method: "POST",
      headers: { authorization: `Bearer ${API_KEY}`, "content-type": "application/x-www-form-urlencoded; charset=x" },
      body: "charge=1",
    });
    expect(answer.status).toBe(400);
  });

  it("refuses to start with a live key", async () => {
    const { startStripeFake } = await import("#fakes/stripe/startStripeFake");
    await expect(startStripeFake({ apiKey: "sk_live_x", webhookSecret: "whsec" })).rejects.toThrow("live keys");
  });
});
