import { randomUUID } from "node:crypto";
import request from "supertest";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { PaymentEvent } from "#server/models/PaymentEvent";
import { startTestSite, type TestSite } from "#tests/support/testSite";
import { eventOf, signed, webhook } from "./events";

let site: TestSite;
beforeAll(async () => {
  site = await startTestSite();
});
afterAll(() => site.close());

describe("what is not from the provider", () => {
  const event = () => eventOf("checkout.session.expired", { client_reference_id: randomUUID() });

  it.each([
    ["signed with another secret", () => signed(site, event(), { secret: "whsec_other" })],
    ["signed too long ago", () => signed(site, event(), { ageSeconds: 400 })],
    ["not signed", () => request(site.url).post(webhook).send(event())],
    ["empty", () => request(site.url).post(webhook)],
    ["changed after signing", () => signed(site, event()).send(" ")],
  ])("is refused when it is %s, and not kept", async (_what, send) => {
    const before = await PaymentEvent.count();
    const res = await send();
    expect([res.status, res.type]).toEqual([400, "application/problem+json"]);
    expect(await PaymentEvent.count()).toBe(before);
  });

  it("is refused when it is too large", async () => {
    const res = await request(site.url).post(webhook).type("application/json").send("x".repeat(600_000));
    expect(res.status).toBe(413);
  });

  it("gets 405 for anything but a post", async () => {
    await request(site.url).get(webhook).expect(405);
  });
});
