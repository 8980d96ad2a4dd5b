import Stripe from "stripe";
import { checkAmount } from "./checkAmount";
import { ProviderError } from "./ProviderError";
import type { CreateSession } from "./parameters";
import type { World } from "./World";

/** "Anywhere from 30 minutes to 24 hours after Checkout Session creation" (`expires_at`), in seconds. */
const SHORTEST_LIFE = 30 * 60;
const LONGEST_LIFE = 24 * 60 * 60;

function expiryOf(world: World, asked: number | undefined): number {
  const age = asked === undefined ? LONGEST_LIFE : asked - world.now();
  if (age < SHORTEST_LIFE || age > LONGEST_LIFE) {
    throw new ProviderError(
      400,
      "The `expires_at` timestamp must be from 30 minutes to 24 hours after Checkout Session creation.",
      { param: "expires_at" },
    );
  }
  return world.now() + age;
}

function buildLineItem(world: World, line: CreateSession["line_items"][number]): Stripe.LineItem {
  const { currency, product_data, unit_amount } = line.price_data;
  const amount = unit_amount * line.quantity;
  return {
    id: world.newId("li"),
    object: "item",
    adjustable_quantity: null,
    amount_discount: 0,
    amount_subtotal: amount,
    amount_tax: 0,
    amount_total: amount,
    currency,
    description: product_data.name,
    metadata: null,
    price: {
      id: world.newId("price"),
      object: "price",
      active: false,
      billing_scheme: "per_unit",
      created: world.now(),
      currency,
      custom_unit_amount: null,
      livemode: false,
      lookup_key: null,
      metadata: {},
      nickname: null,
      product: world.newId("prod", 14),
      recurring: null,
      tax_behavior: "unspecified",
      tiers_mode: null,
      transform_quantity: null,
      type: "one_time",
      unit_amount,
      unit_amount_decimal: Stripe.Decimal.from(unit_amount),
    },
    quantity: line.quantity,
  };
}

/** `POST /v1/checkout/sessions`: an open session whose total is the sum of its lines. */
export function createSession(world: World, params: CreateSession): Stripe.Checkout.Session {
  const lines = params.line_items.map((line) => buildLineItem(world, line));
  const currency = lines[0]!.currency;
  if (lines.some((line) => line.currency !== currency) || (params.currency ?? currency) !== currency) {
    throw new ProviderError(400, "All line items of a session must have the same currency.", { param: "line_items" });
  }
  const total = lines.reduce((sum, line) => sum + line.amount_total, 0);
  checkAmount(total);
  const id = world.newId("cs_test", 58);
  const session: Stripe.Checkout.Session = {
    id,
    object: "checkout.session",
    adaptive_pricing: null,
    after_expiration: null,
    allow_promotion_codes: null,
    allowed_payment_method_types: null,
    amount_subtotal: total,
    amount_total: total,
    automatic_tax: { enabled: false, liability: null, provider: null, status: null },
    billing_address_collection: null,
    cancel_url: params.cancel_url ?? null,
    client_reference_id: params.client_reference_id ?? null,
    client_secret: null,
    collected_information: null,
    consent: null,
    consent_collection: null,
    created: world.now(),
    currency,
    currency_conversion: null,
    custom_fields: [],
    custom_text: { after_submit: null, shipping_address: null, submit: null, terms_of_service_acceptance: null },
    customer: null,
    customer_account: null,
    customer_creation: "if_required",
    customer_details: null,
    customer_email: params.customer_email ?? null,
    discounts: [],
    expires_at: expiryOf(world, params.expires_at),
    integration_identifier: null,
    invoice: null,
    invoice_creation: null,
    livemode: false,
    locale: params.locale ?? null,
    managed_payments: null,
    metadata: params.metadata ?? {},
    mode: params.mode,
    origin_context: null,
    payment_intent: null,
    payment_link: null,
    payment_method_collection: "if_required",
    payment_method_configuration_details: null,
    payment_method_options: {},
    payment_method_types: params.payment_method_types ?? ["card"],
    payment_status: "unpaid",
    permissions: null,
    phone_number_collection: { enabled: false },
    recovered_from: null,
    saved_payment_method_options: null,
    setup_intent: null,
    shipping_address_collection: null,
    shipping_cost: null,
    shipping_options: [],
    status: "open",
    submit_type: params.submit_type ?? null,
    subscription: null,
    success_url: params.success_url,
    total_details: { amount_discount: 0, amount_shipping: 0, amount_tax: 0 },
    ui_mode: null,
    url: `${world.publicUrl}/pay/${id}`,
    wallet_options: null,
  };
  world.store.sessions.set(id, session);
  world.store.lineItems.set(id, lines);
  world.store.intentData.set(id, params.payment_intent_data ?? {});
  return session;
}
