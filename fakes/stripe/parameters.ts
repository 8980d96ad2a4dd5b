import { z } from "zod";
import {
  address,
  created,
  currency,
  expand,
  flag,
  integer,
  list,
  metadata,
  notPlayed,
  paging,
  text,
} from "./formFields";

/*
 * What each endpoint accepts. Source: the provider's published OpenAPI description (spec3, MIT licence), `info.version`
 * 2023-08-16, the `parameters` and form `requestBody` of each path. A name that is not here is not described there.
 */

const since = created().optional();

/** Text that reads null when it is left out, as answers show it. */
const textOrNull = text().nullable().default(null);

const shipping = z.strictObject({
  address: z.strictObject({
    city: textOrNull,
    country: textOrNull,
    line1: textOrNull,
    line2: textOrNull,
    postal_code: textOrNull,
    state: textOrNull,
  }),
  carrier: textOrNull,
  name: text(),
  phone: textOrNull,
  tracking_number: textOrNull,
});

const lineItem = z.strictObject({
  adjustable_quantity: notPlayed(),
  dynamic_tax_rates: notPlayed(),
  price: notPlayed(),
  price_data: z.strictObject({
    currency: currency(),
    product: notPlayed(),
    product_data: z.strictObject({
      description: text(40_000).optional(),
      images: list(address(), 8).optional(),
      metadata: metadata().optional(),
      name: text(),
      tax_code: notPlayed(),
    }),
    recurring: notPlayed(),
    tax_behavior: notPlayed(),
    unit_amount: integer(),
    unit_amount_decimal: notPlayed(),
  }),
  quantity: integer(1, 999_999),
  tax_rates: notPlayed(),
});

const paymentIntentData = z.strictObject({
  application_fee_amount: notPlayed(),
  capture_method: notPlayed(),
  description: text(1000).optional(),
  metadata: metadata().optional(),
  on_behalf_of: notPlayed(),
  receipt_email: text().optional(),
  setup_future_usage: notPlayed(),
  shipping: shipping.optional(),
  statement_descriptor: text(22).optional(),
  statement_descriptor_suffix: text(22).optional(),
  transfer_data: notPlayed(),
  transfer_group: text().optional(),
});

export const CreateSession = z.strictObject({
  after_expiration: notPlayed(),
  allow_promotion_codes: notPlayed(),
  automatic_tax: notPlayed(),
  billing_address_collection: notPlayed(),
  cancel_url: address().optional(),
  client_reference_id: text(200).optional(),
  consent_collection: notPlayed(),
  currency: currency().optional(),
  custom_fields: notPlayed(),
  custom_text: notPlayed(),
  customer: notPlayed(),
  customer_creation: notPlayed(),
  customer_email: text().optional(),
  customer_update: notPlayed(),
  discounts: notPlayed(),
  expand,
  expires_at: integer().optional(),
  invoice_creation: notPlayed(),
  line_items: list(lineItem).refine((items) => items.length > 0, "Give at least one line item"),
  locale: text(10).optional(),
  metadata: metadata().optional(),
  mode: z.enum(["payment"]),
  payment_intent_data: paymentIntentData.optional(),
  payment_method_collection: notPlayed(),
  payment_method_options: notPlayed(),
  payment_method_types: list(z.enum(["card"])).optional(),
  phone_number_collection: notPlayed(),
  setup_intent_data: notPlayed(),
  shipping_address_collection: notPlayed(),
  shipping_options: notPlayed(),
  submit_type: z.enum(["auto", "book", "donate", "pay"]).optional(),
  subscription_data: notPlayed(),
  success_url: address(),
  tax_id_collection: notPlayed(),
});
export type CreateSession = z.output<typeof CreateSession>;

export const ListSessions = z.strictObject({
  ...paging,
  customer: notPlayed(),
  customer_details: z.strictObject({ email: text() }).optional(),
  expand,
  payment_intent: text().optional(),
  payment_link: notPlayed(),
  subscription: notPlayed(),
});

export const RetrieveOne = z.strictObject({ expand });
export const ListPlain = z.strictObject({ ...paging, expand });

export const RetrievePaymentIntent = z.strictObject({ client_secret: text().optional(), expand });
export const ListPaymentIntents = z.strictObject({ ...paging, created: since, customer: notPlayed(), expand });
export const CancelPaymentIntent = z.strictObject({
  cancellation_reason: z.enum(["abandoned", "duplicate", "fraudulent", "requested_by_customer"]).optional(),
  expand,
});
export const CreatePaymentIntent = z.strictObject({
  amount: integer(1),
  application_fee_amount: notPlayed(),
  automatic_payment_methods: notPlayed(),
  capture_method: notPlayed(),
  confirm: notPlayed(),
  confirmation_method: notPlayed(),
  currency: currency(),
  customer: notPlayed(),
  description: text(1000).optional(),
  error_on_requires_action: notPlayed(),
  expand,
  mandate: notPlayed(),
  mandate_data: notPlayed(),
  metadata: metadata().optional(),
  off_session: notPlayed(),
  on_behalf_of: notPlayed(),
  payment_method: notPlayed(),
  payment_method_data: notPlayed(),
  payment_method_options: notPlayed(),
  payment_method_types: list(z.enum(["card"])).optional(),
  radar_options: notPlayed(),
  receipt_email: text().optional(),
  return_url: notPlayed(),
  setup_future_usage: notPlayed(),
  shipping: shipping.optional(),
  statement_descriptor: text(22).optional(),
  statement_descriptor_suffix: text(22).optional(),
  transfer_data: notPlayed(),
  transfer_group: text().optional(),
  use_stripe_sdk: notPlayed(),
});
export type CreatePaymentIntent = z.output<typeof CreatePaymentIntent>;

export const ListCharges = z.strictObject({
  ...paging,
  created: since,
  customer: notPlayed(),
  expand,
  payment_intent: text().optional(),
  transfer_group: text().optional(),
});

export const CreateRefund = z.strictObject({
  amount: integer(1).optional(),
  charge: text().optional(),
  currency: notPlayed(),
  customer: notPlayed(),
  expand,
  instructions_email: notPlayed(),
  metadata: metadata().optional(),
  origin: notPlayed(),
  payment_intent: text().optional(),
  reason: z.enum(["duplicate", "fraudulent", "requested_by_customer"]).optional(),
  refund_application_fee: notPlayed(),
  reverse_transfer: notPlayed(),
});
export type CreateRefund = z.output<typeof CreateRefund>;

export const UpdateRefund = z.strictObject({ expand, metadata: metadata().optional() });
export const ListRefunds = z.strictObject({
  ...paging,
  charge: text().optional(),
  created: since,
  expand,
  payment_intent: text().optional(),
});

export const ListEvents = z.strictObject({
  ...paging,
  created: since,
  delivery_success: flag().optional(),
  expand,
  type: text().optional(),
  types: list(text(), 20).optional(),
});
export type ListEvents = z.output<typeof ListEvents>;

export const ListBalanceTransactions = z.strictObject({
  ...paging,
  created: since,
  currency: currency().optional(),
  expand,
  payout: notPlayed(),
  source: text().optional(),
  type: text().optional(),
});

export const CreateTransfer = z.strictObject({
  amount: integer(1),
  currency: currency(),
  description: text().optional(),
  destination: text(),
  expand,
  metadata: metadata().optional(),
  source_transaction: text().optional(),
  source_type: z.enum(["card"]).optional(),
  transfer_group: text().optional(),
});
export type CreateTransfer = z.output<typeof CreateTransfer>;

export const ListTransfers = z.strictObject({
  ...paging,
  created: since,
  destination: text().optional(),
  expand,
  transfer_group: text().optional(),
});

export const CreateTransferReversal = z.strictObject({
  amount: integer(1).optional(),
  description: text().optional(),
  expand,
  metadata: metadata().optional(),
  refund_application_fee: notPlayed(),
});
export type CreateTransferReversal = z.output<typeof CreateTransferReversal>;
