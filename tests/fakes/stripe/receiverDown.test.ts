import { expect, it } from "vitest";
import { startStripeFake } from "#fakes/stripe/startStripeFake";
import { START } from "./bench";

it("lives on when nobody receives its webhooks", async () => {
  const fake = await startStripeFake({
    apiKey: "sk_test_bench",
    webhookSecret: "whsec_bench",
    // Port 9 (discard, RFC 863) has no listener here: the connection is refused.
    webhookUrl: "http://127.0.0.1:9/webhooks",
    clock: () => START,
  });
  const authorization = "Bearer sk_test_bench";
  const form = { amount: "100", currency: "eur" };
  const made = await fetch(`${fake.url}/v1/payment_intents`, {
    method: "POST",
    headers: { authorization },
    body: new URLSearchParams(form),
  });
  await fake.control.settled();
  expect(made.status).toBe(200);
  expect(fake.control.attempts()).toMatchObject([{ status: null, delivered: false }]);
  expect((await fetch(`${fake.url}/v1/balance`, { headers: { authorization } })).status).toBe(200);
  await fake.close();
});

it("says when its port is taken", async () => {
  const options = { apiKey: "sk_test_bench", webhookSecret: "whsec_bench" };
  const first = await startStripeFake(options);
  await expect(startStripeFake({ ...options, port: first.port })).rejects.toThrow("EADDRINUSE");
  await first.close();
});
