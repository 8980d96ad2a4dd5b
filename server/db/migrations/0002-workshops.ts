import type { Migration } from "../Migration";

export const workshops: Migration = {
  name: "0002-workshops",
  up: `
    CREATE TABLE workshops (
      id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
      owner_id uuid NOT NULL CONSTRAINT workshops_one_an_owner UNIQUE REFERENCES users,
      slug text NOT NULL CONSTRAINT workshops_slug_once UNIQUE
        CONSTRAINT workshops_slug_form CHECK (slug ~ '^[a-z0-9]+(-[a-z0-9]+)*$'),
      name text NOT NULL,
      state text NOT NULL DEFAULT 'draft'
        CONSTRAINT workshops_state_known CHECK (state IN ('draft', 'applied', 'admitted', 'refused', 'suspended')),
      about text NOT NULL DEFAULT '',
      town text NOT NULL,
      country char(2) NOT NULL CONSTRAINT workshops_country_code CHECK (country ~ '^[A-Z]{2}$'),
      legal_name text NOT NULL,
      legal_address text[] NOT NULL CONSTRAINT workshops_legal_address_given CHECK (cardinality(legal_address) > 0),
      phone text NOT NULL,
      contact_email citext NOT NULL,
      registration text,
      dispatch_days integer NOT NULL DEFAULT 3
        CONSTRAINT workshops_dispatch_days_range CHECK (dispatch_days BETWEEN 0 AND 60),
      returns_terms text NOT NULL DEFAULT '',
      commission_basis_points integer NOT NULL DEFAULT 800
        CONSTRAINT workshops_commission_range CHECK (commission_basis_points BETWEEN 0 AND 10000),
      created_at timestamptz NOT NULL DEFAULT now(),
      updated_at timestamptz NOT NULL DEFAULT now()
    );

    CREATE TABLE tax_registrations (
      workshop_id uuid NOT NULL REFERENCES workshops ON DELETE CASCADE,
      country char(2) NOT NULL CONSTRAINT tax_registrations_country_code CHECK (country ~ '^[A-Z]{2}$'),
      number text NOT NULL,
      rate_basis_points integer NOT NULL
        CONSTRAINT tax_registrations_rate_range CHECK (rate_basis_points BETWEEN 0 AND 5000),
      PRIMARY KEY (workshop_id, country)
    );

    CREATE TABLE shipping_rates (
      id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
      workshop_id uuid NOT NULL REFERENCES workshops ON DELETE CASCADE,
      zone text NOT NULL,
      base_minor bigint NOT NULL CONSTRAINT shipping_rates_base_not_negative CHECK (base_minor >= 0),
      per_item_minor bigint NOT NULL CONSTRAINT shipping_rates_per_item_not_negative CHECK (per_item_minor >= 0),
      free_over_minor bigint CONSTRAINT shipping_rates_free_over_positive CHECK (free_over_minor > 0),
      currency char(3) NOT NULL,
      CONSTRAINT shipping_rates_zone_once UNIQUE (workshop_id, zone),
      CONSTRAINT shipping_rates_of_workshop UNIQUE (id, workshop_id)
    );

    -- A country lies in one zone of a workshop at most: the key says so.
    CREATE TABLE shipping_countries (
      workshop_id uuid NOT NULL,
      country char(2) NOT NULL CONSTRAINT shipping_countries_country_code CHECK (country ~ '^[A-Z]{2}$'),
      rate_id uuid NOT NULL,
      PRIMARY KEY (workshop_id, country),
      CONSTRAINT shipping_countries_rate_of_workshop
        FOREIGN KEY (rate_id, workshop_id) REFERENCES shipping_rates (id, workshop_id) ON DELETE CASCADE
    );
    CREATE INDEX shipping_countries_rate ON shipping_countries (rate_id);
  `,
  down: "DROP TABLE shipping_countries, shipping_rates, tax_registrations, workshops;",
};
