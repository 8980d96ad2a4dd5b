import type { Migration } from "../Migration";

export const orders: Migration = {
  name: "0005-orders",
  up: `
    CREATE TABLE baskets (
      id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
      user_id uuid CONSTRAINT baskets_one_a_user UNIQUE REFERENCES users ON DELETE CASCADE,
      created_at timestamptz NOT NULL DEFAULT now(),
      updated_at timestamptz NOT NULL DEFAULT now()
    );
    CREATE TABLE basket_lines (
      basket_id uuid NOT NULL REFERENCES baskets ON DELETE CASCADE,
      part_id uuid NOT NULL REFERENCES parts ON DELETE CASCADE,
      quantity integer NOT NULL CONSTRAINT basket_lines_quantity_range CHECK (quantity BETWEEN 1 AND 99),
      for_need text,
      added_at timestamptz NOT NULL DEFAULT now(),
      PRIMARY KEY (basket_id, part_id)
    );

    CREATE SEQUENCE order_numbers START 10001;

    CREATE TABLE orders (
      id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
      number text NOT NULL DEFAULT to_char(now(), 'YY') || '-' || nextval('order_numbers')
        CONSTRAINT orders_number_once UNIQUE,
      buyer_id uuid NOT NULL REFERENCES users,
      checkout_key uuid NOT NULL,
      state text NOT NULL CONSTRAINT orders_state_known
        CHECK (state IN ('draft', 'awaiting-payment', 'paid', 'closed', 'expired', 'cancelled')),
      shipping_address jsonb NOT NULL,
      billing_address jsonb NOT NULL,
      currency char(3) NOT NULL CONSTRAINT orders_currency_code CHECK (currency ~ '^[A-Z]{3}$'),
      parts_minor bigint NOT NULL CONSTRAINT orders_parts_positive CHECK (parts_minor > 0),
      shipping_minor bigint NOT NULL CONSTRAINT orders_shipping_not_negative CHECK (shipping_minor >= 0),
      tax_minor bigint NOT NULL CONSTRAINT orders_tax_contained CHECK (tax_minor BETWEEN 0 AND total_minor),
      total_minor bigint NOT NULL CONSTRAINT orders_total_is_sum CHECK (total_minor = parts_minor + shipping_minor),
      refunded_minor bigint NOT NULL DEFAULT 0
        CONSTRAINT orders_refunded_within_total CHECK (refunded_minor BETWEEN 0 AND total_minor),
      hold_until timestamptz,
      paid_at timestamptz,
      created_at timestamptz NOT NULL DEFAULT now(),
      updated_at timestamptz NOT NULL DEFAULT now(),
      CONSTRAINT orders_checkout_key_once UNIQUE (buyer_id, checkout_key),
      CONSTRAINT orders_paid_have_time CHECK (state NOT IN ('paid', 'closed') OR paid_at IS NOT NULL),
      CONSTRAINT orders_awaiting_have_hold CHECK (state <> 'awaiting-payment' OR hold_until IS NOT NULL)
    );
    CREATE INDEX orders_buyer ON orders (buyer_id, created_at DESC, id);
    CREATE INDEX orders_hold ON orders (hold_until) WHERE state = 'awaiting-payment';

    CREATE TABLE parcels (
      id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
      order_id uuid NOT NULL REFERENCES orders,
      workshop_id uuid NOT NULL REFERENCES workshops,
      state text NOT NULL CONSTRAINT parcels_state_known CHECK (state IN ('to-accept', 'core-awaited', 'core-received',
        'core-refused', 'in-work', 'ready', 'dispatched', 'delivered', 'closed', 'declined', 'cancelled')),
      trader jsonb NOT NULL,
      parts_minor bigint NOT NULL CONSTRAINT parcels_parts_positive CHECK (parts_minor > 0),
      shipping_minor bigint NOT NULL CONSTRAINT parcels_shipping_not_negative CHECK (shipping_minor >= 0),
      tax_minor bigint NOT NULL CONSTRAINT parcels_tax_contained CHECK (tax_minor BETWEEN 0 AND total_minor),
      tax_rate_basis_points integer NOT NULL,
      total_minor bigint NOT NULL CONSTRAINT parcels_total_is_sum CHECK (total_minor = parts_minor + shipping_minor),
      commission_minor bigint NOT NULL
        CONSTRAINT parcels_commission_within_parts CHECK (commission_minor BETWEEN 0 AND parts_minor),
      leaves_in_days integer NOT NULL,
      leaves_by timestamptz,
      created_at timestamptz NOT NULL DEFAULT now(),
      updated_at timestamptz NOT NULL DEFAULT now(),
      CONSTRAINT parcels_one_a_workshop UNIQUE (order_id, workshop_id)
    );
    CREATE INDEX parcels_workshop ON parcels (workshop_id, state);

    CREATE TABLE order_lines (
      id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
      parcel_id uuid NOT NULL REFERENCES parcels,
      part_id uuid NOT NULL REFERENCES parts,
      title text NOT NULL,
      -- The listing as it was bought: kind, dimensions, material, offer.
      listing jsonb NOT NULL,
      for_need text,
      quantity integer NOT NULL CONSTRAINT order_lines_quantity_positive CHECK (quantity > 0),
      unit_minor bigint NOT NULL CONSTRAINT order_lines_unit_positive CHECK (unit_minor > 0),
      line_minor bigint NOT NULL CONSTRAINT order_lines_line_is_product CHECK (line_minor = unit_minor * quantity),
      tax_minor bigint NOT NULL CONSTRAINT order_lines_tax_contained CHECK (tax_minor BETWEEN 0 AND line_minor),
      made_to_size boolean NOT NULL,
      holds_stock boolean NOT NULL,
      CONSTRAINT order_lines_part_once UNIQUE (parcel_id, part_id)
    );

    CREATE TABLE payments (
      id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
      order_id uuid NOT NULL CONSTRAINT payments_one_an_order UNIQUE REFERENCES orders,
      idempotency_key text NOT NULL CONSTRAINT payments_key_once UNIQUE,
      session_id text CONSTRAINT payments_session_once UNIQUE,
      payment_intent_id text CONSTRAINT payments_intent_once UNIQUE,
      url text,
      state text NOT NULL
        CONSTRAINT payments_state_known CHECK (state IN ('starting', 'open', 'succeeded', 'expired', 'refunded')),
      amount_minor bigint NOT NULL CONSTRAINT payments_amount_positive CHECK (amount_minor > 0),
      currency char(3) NOT NULL,
      created_at timestamptz NOT NULL DEFAULT now(),
      updated_at timestamptz NOT NULL DEFAULT now()
    );

    CREATE TABLE payment_events (
      id text PRIMARY KEY,
      type text NOT NULL,
      payload jsonb NOT NULL,
      occurred_at timestamptz NOT NULL,
      received_at timestamptz NOT NULL DEFAULT now(),
      deliveries integer NOT NULL DEFAULT 1,
      applied_at timestamptz,
      outcome text
    );
  `,
  down: `
    DROP TABLE payment_events, payments, order_lines, parcels, orders, basket_lines, baskets;
    DROP SEQUENCE order_numbers;
  `,
};
