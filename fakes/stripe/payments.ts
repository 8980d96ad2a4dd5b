import type Stripe from "stripe";
import { addCharge, REFUSAL } from "./addCharge";
import { ProviderError } from "./ProviderError";
import { addIntent, findPaymentIntent } from "./paymentIntents";
import { findSession } from "./sessions";
import type { World } from "./World";

function openSession(world: World, id: string): Stripe.Checkout.Session {
  const session = findSession(world, id);
  if (session.status !== "open") {
    throw new ProviderError(400, `This Checkout Session is ${session.status}; it can no longer be paid.`);
  }
  return session;
}

/** The session's intent, made at the first attempt to pay. */
function intentOf(world: World, session: Stripe.Checkout.Session): Stripe.PaymentIntent {
  if (typeof session.payment_intent === "string") return findPaymentIntent(world, session.payment_intent);
  const intent = addIntent(world, {
    ...world.store.intentData.get(session.id),
    amount: session.amount_total!,
    currency: session.currency!,
  });
  session.payment_intent = intent.id;
  return intent;
}

/** The buyer pays: intent, charge and session succeed in one step. Throws a 400 unless the session is open. */
export function paySession(world: World, id: string): Stripe.Checkout.Session {
  const session = openSession(world, id);
  const intent = intentOf(world, session);
  const charge = addCharge(world, { intent, email: session.customer_email, paid: true });

  intent.status = "succeeded";
  intent.amount_received = intent.amount;
  intent.latest_charge = charge.id;
  intent.payment_method = charge.payment_method;
  intent.last_payment_error = null;
  session.status = "complete";
  session.payment_status = "paid";
  session.url = null;
  session.customer_details = {
    address: null,
    business_name: null,
    email: session.customer_email,
    individual_name: null,
    name: null,
    phone: null,
    tax_exempt: "none",
    tax_ids: [],
  };

  world.emit("charge.succeeded", charge);
  world.emit("payment_intent.succeeded", intent);
  world.emit("checkout.session.completed", session);
  return session;
}

/** The card is refused: the session stays open and may be tried again. Throws a 400 unless the session is open. */
export function declineSession(world: World, id: string): Stripe.Checkout.Session {
  const session = openSession(world, id);
  const intent = intentOf(world, session);
  const charge = addCharge(world, { intent, email: session.customer_email, paid: false });

  intent.latest_charge = charge.id;
  intent.last_payment_error = { ...REFUSAL, charge: charge.id, type: "card_error" };

  world.emit("charge.failed", charge);
  world.emit("payment_intent.payment_failed", intent);
  return session;
}
