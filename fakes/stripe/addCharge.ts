import type Stripe from "stripe";
import { addBalanceTransaction, feeOf, SETTLING_TIME } from "./balance";
import type { World } from "./World";

interface ChargeSource {
  readonly intent: Stripe.PaymentIntent;
  readonly email: string | null;
  readonly paid: boolean;
}

/** Reason given for every refusal (https://docs.stripe.com/declines/codes). */
export const REFUSAL = { code: "card_declined", decline_code: "generic_decline", message: "Your card was declined." };

/** No card exists here, so the one that is reported is marked as unknown throughout. */
const NO_CARD: Stripe.Charge.PaymentMethodDetails.Card = {
  amount_authorized: null,
  authorization_code: null,
  brand: "unknown",
  checks: { address_line1_check: null, address_postal_code_check: null, cvc_check: null },
  country: null,
  electronic_commerce_indicator: null,
  exp_month: 12,
  exp_year: 2099,
  fingerprint: null,
  funding: "unknown",
  installments: null,
  last4: "0000",
  mandate: null,
  network: null,
  network_transaction_id: null,
  regulated_status: null,
  three_d_secure: null,
  transaction_link_id: null,
  wallet: null,
};

function outcomeOf(paid: boolean): Stripe.Charge.Outcome {
  return {
    advice_code: null,
    network_advice_code: null,
    network_decline_code: null,
    network_status: paid ? "approved_by_network" : "declined_by_network",
    reason: paid ? null : REFUSAL.decline_code,
    risk_level: "normal",
    seller_message: paid ? "Payment complete." : "The stand-in was told to refuse.",
    type: paid ? "authorized" : "issuer_declined",
  };
}

/** One attempt to take the intent's money; a successful one moves the balance. Emits nothing. */
export function addCharge(world: World, { intent, email, paid }: ChargeSource): Stripe.Charge {
  const id = world.newId("ch");
  const charge: Stripe.Charge = {
    id,
    object: "charge",
    amount: intent.amount,
    amount_captured: paid ? intent.amount : 0,
    amount_refunded: 0,
    application: null,
    application_fee: null,
    application_fee_amount: null,
    balance_transaction: null,
    billing_details: {
      address: { city: null, country: null, line1: null, line2: null, postal_code: null, state: null },
      email,
      name: null,
      phone: null,
      tax_id: null,
    },
    calculated_statement_descriptor: intent.statement_descriptor,
    captured: paid,
    created: world.now(),
    currency: intent.currency,
    customer: null,
    description: intent.description,
    disputed: false,
    failure_balance_transaction: null,
    failure_code: paid ? null : REFUSAL.code,
    failure_message: paid ? null : REFUSAL.message,
    fraud_details: {},
    livemode: false,
    metadata: { ...intent.metadata },
    on_behalf_of: null,
    outcome: outcomeOf(paid),
    paid,
    payment_intent: intent.id,
    payment_method: world.newId("pm"),
    payment_method_details: { card: NO_CARD, type: "card" },
    receipt_email: intent.receipt_email,
    receipt_number: null,
    receipt_url: null,
    refunded: false,
    review: null,
    shipping: intent.shipping,
    source: null,
    source_transfer: null,
    statement_descriptor: intent.statement_descriptor,
    statement_descriptor_suffix: intent.statement_descriptor_suffix,
    status: paid ? "succeeded" : "failed",
    transfer_data: null,
    transfer_group: intent.transfer_group,
  };
  if (paid) {
    const { amount, currency, description } = charge;
    charge.balance_transaction = addBalanceTransaction(world, {
      amount,
      availableOn: world.now() + SETTLING_TIME,
      currency,
      description,
      fee: feeOf(amount),
      source: id,
      type: "charge",
    }).id;
  }
  world.store.charges.set(id, charge);
  return charge;
}
