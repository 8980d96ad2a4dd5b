import { createServer } from "node:http";
import type { AddressInfo } from "node:net";
import Stripe from "stripe";
import { type StripeFake, startStripeFake } from "#fakes/stripe/startStripeFake";

export const API_KEY = "sk_test_bench";
export const WEBHOOK_SECRET = "whsec_bench";
/** The stand-in's clock starts here and moves only when it is told to. */
export const START = new Date("2026-12-01T12:00:00Z");
export const START_S = START.getTime() / 1000;

export interface Received {
  readonly payload: string;
  readonly signature: string;
}

export interface Bench {
  readonly fake: StripeFake;
  readonly stripe: Stripe;
  /** Webhooks as they came in, accepted or not. */
  readonly received: Received[];
  /** What the receiver answers from now on. */
  answerWith(status: number): void;
  /** Another client of the same stand-in. */
  client(config?: { apiKey?: string; timeout?: number; maxNetworkRetries?: number }): Stripe;
  close(): Promise<void>;
}

/** The same numbers in the same order every time (a linear congruential generator, Numerical Recipes' constants). */
function seeded(seed = 1): () => number {
  let state = seed;
  return () => {
    state = (Math.imul(state, 1664525) + 1013904223) >>> 0;
    return state / 2 ** 32;
  };
}

/** A stand-in on a free port, the real SDK pointed at it, and a receiver for its webhooks. */
export async function openBench(): Promise<Bench> {
  const received: Received[] = [];
  let status = 200;
  const receiver = createServer((req, res) => {
    const chunks: Buffer[] = [];
    req.on("data", (chunk: Buffer) => chunks.push(chunk));
    req.on("end", () => {
      const payload = Buffer.concat(chunks).toString("utf8");
      received.push({ payload, signature: String(req.headers["stripe-signature"]) });
      res.writeHead(status, { location: "/elsewhere" }).end();
    });
  });
  await new Promise<void>((resolve) => receiver.listen(0, "127.0.0.1", resolve));
  const webhookUrl = `http://127.0.0.1:${(receiver.address() as AddressInfo).port}/webhooks`;

  const fake = await startStripeFake({
    apiKey: API_KEY,
    webhookSecret: WEBHOOK_SECRET,
    webhookUrl,
    clock: () => START,
    random: seeded(),
  });
  const client: Bench["client"] = ({ apiKey = API_KEY, timeout = 5_000, maxNetworkRetries = 0 } = {}) =>
    new Stripe(apiKey, {
      host: "127.0.0.1",
      port: fake.port,
      protocol: "http",
      telemetry: false,
      maxNetworkRetries,
      timeout,
    });
  return {
    fake,
    stripe: client(),
    received,
    answerWith: (next) => {
      status = next;
    },
    client,
    async close() {
      await fake.close();
      receiver.closeAllConnections();
      await new Promise((resolve) => receiver.close(resolve));
    },
  };
}

/** A sound order of two lines, 24.00 + 5.90 EUR. */
export function orderParams(): Stripe.Checkout.SessionCreateParams {
  return {
    mode: "payment",
    client_reference_id: "order-7",
    customer_email: "restorer@example.test",
    success_url: "http://shop.test/orders/7?session={CHECKOUT_SESSION_ID}&done=1",
    cancel_url: "http://shop.test/basket?from={CHECKOUT_SESSION_ID}",
    metadata: { orderId: "7" },
    payment_intent_data: { transfer_group: "order-7", metadata: { orderId: "7" }, description: "Order 7" },
    line_items: [
      {
        quantity: 2,
        price_data: { currency: "eur", unit_amount: 1200, product_data: { name: "Idler wheel <44 mm>" } },
      },
      { quantity: 1, price_data: { currency: "eur", unit_amount: 590, product_data: { name: "Postage and tax" } } },
    ],
  };
}

/** A session that has been paid, with its charge. */
export async function paidOrder({ fake, stripe }: Bench) {
  const { id } = await stripe.checkout.sessions.create(orderParams());
  await fake.control.pay(id);
  const session = await stripe.checkout.sessions.retrieve(id, { expand: ["payment_intent.latest_charge"] });
  const intent = session.payment_intent as Stripe.PaymentIntent;
  return { session, intent, charge: intent.latest_charge as Stripe.Charge };
}

/** What a promise was rejected with; fails if it was not. */
export async function refusalOf(promise: Promise<unknown>): Promise<Stripe.errors.StripeError> {
  const outcome = await promise.then(
    () => null,
    (error: unknown) => error,
  );
  if (!(outcome instanceof Stripe.errors.StripeError)) throw new Error(`No refusal by the API: ${String(outcome)}`);
  return outcome;
}
