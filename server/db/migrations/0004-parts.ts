import type { Migration } from "../Migration";

const measuredKinds = `('idler-wheel', 'pinch-roller', 'flat-belt', 'square-belt', 'round-belt', 'drive-ring',
  'motor-mount', 'brake-pad', 'clutch-felt')`;

export const parts: Migration = {
  name: "0004-parts",
  up: `
    CREATE TABLE parts (
      id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
      workshop_id uuid NOT NULL REFERENCES workshops,
      reference text NOT NULL,
      kind text NOT NULL CONSTRAINT parts_kind_known CHECK (kind = 'rebuild-kit' OR kind IN ${measuredKinds}),
      title text NOT NULL CONSTRAINT parts_title_length CHECK (length(title) BETWEEN 1 AND 140),
      description text NOT NULL DEFAULT '',
      material text CONSTRAINT parts_material_known CHECK (material IN ('NBR', 'CR', 'EPDM', 'silicone',
        'polyurethane', 'natural-rubber', 'cork', 'felt')),
      hardness_shore_a integer CONSTRAINT parts_hardness_range CHECK (hardness_shore_a BETWEEN 0 AND 100),
      offer_type text NOT NULL
        CONSTRAINT parts_offer_type_known CHECK (offer_type IN ('stocked', 'made-to-order', 're-mould')),
      price_minor bigint NOT NULL CONSTRAINT parts_price_positive CHECK (price_minor > 0),
      currency char(3) NOT NULL CONSTRAINT parts_currency_code CHECK (currency ~ '^[A-Z]{3}$'),
      stock_on_hand integer CONSTRAINT parts_stock_not_negative CHECK (stock_on_hand >= 0),
      stock_reserved integer NOT NULL DEFAULT 0
        CONSTRAINT parts_reserved_not_negative CHECK (stock_reserved >= 0),
      lead_days integer NOT NULL DEFAULT 0 CONSTRAINT parts_lead_days_range CHECK (lead_days BETWEEN 0 AND 365),
      made_to_size boolean NOT NULL DEFAULT false,
      core_terms text,
      weight_g integer NOT NULL DEFAULT 20 CONSTRAINT parts_weight_positive CHECK (weight_g > 0),
      state text NOT NULL DEFAULT 'draft'
        CONSTRAINT parts_state_known CHECK (state IN ('draft', 'published', 'hidden', 'retired')),
      search_text text NOT NULL DEFAULT '',
      search_words tsvector GENERATED ALWAYS AS (to_tsvector('english', search_text)) STORED,
      created_at timestamptz NOT NULL DEFAULT now(),
      updated_at timestamptz NOT NULL DEFAULT now(),
      CONSTRAINT parts_reference_once UNIQUE (workshop_id, reference),
      CONSTRAINT parts_only_stocked_have_stock CHECK ((offer_type = 'stocked') = (stock_on_hand IS NOT NULL)),
      CONSTRAINT parts_reserved_within_stock CHECK (stock_reserved <= coalesce(stock_on_hand, 0)),
      CONSTRAINT parts_remould_says_core_terms CHECK ((offer_type = 're-mould') = (core_terms IS NOT NULL))
    );
    CREATE INDEX parts_workshop ON parts (workshop_id, state);
    CREATE INDEX parts_search_words ON parts USING gin (search_words);
    CREATE INDEX parts_search_trigrams ON parts USING gin (search_text gin_trgm_ops);

    CREATE TABLE kit_lines (
      id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
      part_id uuid NOT NULL REFERENCES parts ON DELETE CASCADE,
      position integer NOT NULL CONSTRAINT kit_lines_position_positive CHECK (position > 0),
      kind text CONSTRAINT kit_lines_kind_known CHECK (kind IN ${measuredKinds}),
      title text NOT NULL,
      quantity integer NOT NULL CONSTRAINT kit_lines_quantity_positive CHECK (quantity > 0),
      service_point_id uuid REFERENCES service_points,
      CONSTRAINT kit_lines_position_once UNIQUE (part_id, position)
    );

    -- One row for each thing that has sizes: a part of its own, or the line of a kit.
    CREATE TABLE measured_items (
      id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
      part_id uuid NOT NULL REFERENCES parts ON DELETE CASCADE,
      kit_line_id uuid CONSTRAINT measured_items_one_a_kit_line UNIQUE REFERENCES kit_lines ON DELETE CASCADE,
      kind text NOT NULL CONSTRAINT measured_items_kind_known CHECK (kind IN ${measuredKinds}),
      primary_dimension text NOT NULL,
      CONSTRAINT measured_items_with_kind UNIQUE (id, kind),
      CONSTRAINT measured_items_primary_of_kind CHECK (primary_dimension = CASE
        WHEN kind IN ('idler-wheel', 'pinch-roller', 'motor-mount', 'clutch-felt') THEN 'outsideDiameter'
        WHEN kind IN ('flat-belt', 'square-belt', 'round-belt') THEN 'insideCircumference'
        WHEN kind = 'drive-ring' THEN 'insideDiameter'
        ELSE 'length' END)
    );
    CREATE UNIQUE INDEX measured_items_one_a_part ON measured_items (part_id) WHERE kit_line_id IS NULL;
    CREATE INDEX measured_items_part ON measured_items (part_id);

    -- half_width_um is the tolerance in force: as stated, by its class, or assumed; it feeds the search window.
    CREATE TABLE measured_dimensions (
      item_id uuid NOT NULL,
      kind text NOT NULL,
      dimension text NOT NULL CONSTRAINT measured_dimensions_name_known CHECK (dimension IN ('outsideDiameter', 'bore',
        'treadWidth', 'overallHeight', 'secondTreadDiameter', 'insideCircumference', 'width', 'thickness', 'section',
        'insideDiameter', 'grooveDiameter', 'grooveWidth', 'height', 'length')),
      nominal_um integer NOT NULL CONSTRAINT measured_dimensions_nominal_positive CHECK (nominal_um > 0),
      half_width_um integer NOT NULL CONSTRAINT measured_dimensions_half_width_not_negative CHECK (half_width_um >= 0),
      tolerance text NOT NULL
        CONSTRAINT measured_dimensions_tolerance_known CHECK (tolerance IN ('stated', 'class', 'assumed')),
      tolerance_class text
        CONSTRAINT measured_dimensions_class_known CHECK (tolerance_class IN ('M1', 'M2', 'M3', 'M4')),
      PRIMARY KEY (item_id, dimension),
      CONSTRAINT measured_dimensions_of_item
        FOREIGN KEY (item_id, kind) REFERENCES measured_items (id, kind) ON DELETE CASCADE,
      CONSTRAINT measured_dimensions_class_when_not_stated CHECK ((tolerance = 'stated') = (tolerance_class IS NULL)),
      CONSTRAINT measured_dimensions_half_width_sane CHECK (half_width_um <= nominal_um)
    );
    CREATE INDEX measured_dimensions_window ON measured_dimensions (kind, dimension, nominal_um)
      INCLUDE (item_id, half_width_um);
    CREATE INDEX measured_dimensions_widest ON measured_dimensions (kind, dimension, half_width_um);

    ALTER TABLE measured_items ADD CONSTRAINT measured_items_state_their_primary
      FOREIGN KEY (id, primary_dimension) REFERENCES measured_dimensions (item_id, dimension)
      DEFERRABLE INITIALLY DEFERRED;

    CREATE TABLE fit_claims (
      id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
      part_id uuid NOT NULL REFERENCES parts ON DELETE CASCADE,
      service_point_id uuid NOT NULL REFERENCES service_points,
      evidence text NOT NULL CONSTRAINT fit_claims_evidence_known
        CHECK (evidence IN ('measured-on-machine', 'fitted-here', 'from-drawing', 'customer-report')),
      CONSTRAINT fit_claims_once UNIQUE (part_id, service_point_id)
    );
    CREATE INDEX fit_claims_service_point ON fit_claims (service_point_id);

    CREATE TABLE fit_reports (
      id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
      part_id uuid NOT NULL REFERENCES parts,
      service_point_id uuid REFERENCES service_points,
      user_id uuid NOT NULL REFERENCES users,
      outcome text NOT NULL
        CONSTRAINT fit_reports_outcome_known CHECK (outcome IN ('fitted', 'fitted-after-work', 'did-not-fit')),
      note text NOT NULL DEFAULT '',
      created_at timestamptz NOT NULL DEFAULT now(),
      CONSTRAINT fit_reports_once UNIQUE (part_id, user_id, service_point_id)
    );

    CREATE TABLE photos (
      id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
      part_id uuid NOT NULL REFERENCES parts ON DELETE CASCADE,
      position integer NOT NULL CONSTRAINT photos_position_positive CHECK (position > 0),
      file text NOT NULL CONSTRAINT photos_file_once UNIQUE,
      alt text NOT NULL,
      width integer NOT NULL,
      height integer NOT NULL,
      created_at timestamptz NOT NULL DEFAULT now(),
      CONSTRAINT photos_position_once UNIQUE (part_id, position) DEFERRABLE INITIALLY DEFERRED
    );
  `,
  down: `
    ALTER TABLE measured_items DROP CONSTRAINT measured_items_state_their_primary;
    DROP TABLE photos, fit_reports, fit_claims, measured_dimensions, measured_items, kit_lines, parts;
  `,
};
