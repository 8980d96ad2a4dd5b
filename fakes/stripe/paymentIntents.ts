import type Stripe from "stripe";
import { checkAmount } from "./checkAmount";
import { missing, ProviderError } from "./ProviderError";
import type { CreatePaymentIntent } from "./parameters";
import type { World } from "./World";

interface IntentSource extends Partial<Stripe.PaymentIntent> {
  readonly amount: number;
  readonly currency: string;
}

/** A new intent, waiting for a means of payment. Announced by `payment_intent.created`. */
export function addIntent(world: World, source: IntentSource): Stripe.PaymentIntent {
  const id = world.newId("pi");
  const intent: Stripe.PaymentIntent = {
    id,
    object: "payment_intent",
    allowed_payment_method_types: null,
    amount: source.amount,
    amount_capturable: 0,
    amount_details: { tip: {} },
    amount_received: 0,
    application: null,
    application_fee_amount: null,
    automatic_payment_methods: null,
    canceled_at: null,
    cancellation_reason: null,
    capture_method: "automatic",
    client_secret: `${id}_secret_${world.newId("s", 24).slice(2)}`,
    confirmation_method: "automatic",
    created: world.now(),
    currency: source.currency,
    customer: null,
    customer_account: null,
    description: source.description ?? null,
    excluded_payment_method_types: null,
    last_payment_error: null,
    latest_charge: null,
    livemode: false,
    managed_payments: null,
    metadata: source.metadata ?? {},
    next_action: null,
    on_behalf_of: null,
    payment_method: null,
    payment_method_configuration_details: null,
    payment_method_options: {},
    payment_method_types: ["card"],
    payment_record: null,
    processing: null,
    receipt_email: source.receipt_email ?? null,
    review: null,
    setup_future_usage: null,
    shipping: source.shipping ?? null,
    source: null,
    statement_descriptor: source.statement_descriptor ?? null,
    statement_descriptor_suffix: source.statement_descriptor_suffix ?? null,
    status: "requires_payment_method",
    transfer_data: null,
    transfer_group: source.transfer_group ?? null,
  };
  world.store.paymentIntents.set(id, intent);
  world.emit("payment_intent.created", intent);
  return intent;
}

/** `POST /v1/payment_intents`, unconfirmed: the stand-in takes payments through sessions only. */
export function createPaymentIntent(world: World, params: CreatePaymentIntent): Stripe.PaymentIntent {
  checkAmount(params.amount, "amount");
  return addIntent(world, params);
}

/** The intent with this id, or the provider's 404. */
export function findPaymentIntent(world: World, id: string): Stripe.PaymentIntent {
  const intent = world.store.paymentIntents.get(id);
  if (!intent) throw missing("payment_intent", id, "intent");
  return intent;
}

export function cancelIntent(
  world: World,
  intent: Stripe.PaymentIntent,
  reason: Stripe.PaymentIntent.CancellationReason | null,
): void {
  intent.status = "canceled";
  intent.canceled_at = world.now();
  intent.cancellation_reason = reason;
  world.emit("payment_intent.canceled", intent);
}

/**
 * `POST /v1/payment_intents/{intent}/cancel`. "You cannot cancel the PaymentIntent for a Checkout Session. Expire the
 * Checkout Session instead." (the description of that path)
 */
export function cancelPaymentIntent(
  world: World,
  id: string,
  reason: Stripe.PaymentIntent.CancellationReason | undefined,
): Stripe.PaymentIntent {
  const intent = findPaymentIntent(world, id);
  if (intent.status !== "requires_payment_method") {
    throw new ProviderError(
      400,
      `You cannot cancel this PaymentIntent because it has a status of ${intent.status}. Only a PaymentIntent with one of the following statuses may be canceled: requires_payment_method, requires_capture, requires_confirmation, requires_action, processing.`,
      { code: "payment_intent_unexpected_state" },
    );
  }
  if ([...world.store.sessions.values()].some((session) => session.payment_intent === id)) {
    throw new ProviderError(
      400,
      "You cannot cancel the PaymentIntent for a Checkout Session. Expire the Checkout Session instead.",
    );
  }
  cancelIntent(world, intent, reason ?? null);
  return intent;
}
