import Stripe from "stripe";
import type { Config } from "../config";

export type PaymentProvider = Stripe;

/**
 * The payment provider's own client. It is pointed at the stand-in where one is configured.
 * Retries are its own, with the caller's idempotency key; no call waits longer than ten seconds.
 */
export function createPaymentProvider({ secretKey, apiUrl }: Config["stripe"]): PaymentProvider {
  const url = apiUrl ? new URL(apiUrl) : undefined;
  return new Stripe(secretKey, {
    ...(url ? { host: url.hostname, port: url.port, protocol: url.protocol === "http:" ? "http" : "https" } : {}),
    telemetry: false,
    maxNetworkRetries: 2,
    timeout: 10_000,
  });
}
