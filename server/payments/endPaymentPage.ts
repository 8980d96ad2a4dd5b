import type Stripe from "stripe";
import type { PaymentProvider } from "../adapters/PaymentProvider";
import { refusedForGood } from "./providerFailure";

/**
 * Closes a payment page, so that nobody can pay on it any more. Gives null once it is closed, or the session where the
 * buyer had paid before. Errors: the provider's, where it does not answer.
 */
export async function endPaymentPage(
  payments: PaymentProvider,
  sessionId: string,
): Promise<Stripe.Checkout.Session | null> {
  try {
    await payments.checkout.sessions.expire(sessionId);
    return null;
  } catch (error) {
    if (!refusedForGood(error)) throw error;
  }
  // Refused: it is not open. A page that the provider does not know cannot be paid on either.
  const session = await payments.checkout.sessions.retrieve(sessionId).catch((error: unknown) => {
    if (refusedForGood(error)) return null;
    throw error;
  });
  return session?.status === "complete" ? session : null;
}
