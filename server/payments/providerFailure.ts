import Stripe from "stripe";

/**
 * Whether the payment provider refused a call for good: it read it, said no, and did nothing. Everything else (no
 * answer, its own faults, a key in use, too many calls) leaves open whether the call was carried out.
 * Source: the provider's API documentation, "Errors" and "Idempotent requests".
 */
export function refusedForGood(error: unknown): error is Stripe.errors.StripeError {
  const refusals = [Stripe.errors.StripeInvalidRequestError, Stripe.errors.StripeCardError];
  return refusals.some((kind) => error instanceof kind && [400, 402, 404].includes(error.statusCode ?? 0));
}
