import type { Migration } from "../Migration";

export const families: Migration = {
  name: "0003-families",
  up: `
    CREATE TABLE families (
      id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
      slug text NOT NULL CONSTRAINT families_slug_once UNIQUE
        CONSTRAINT families_slug_form CHECK (slug ~ '^[a-z0-9]+(-[a-z0-9]+)*$'),
      name text NOT NULL,
      maker text NOT NULL,
      kind text NOT NULL CONSTRAINT families_kind_known CHECK (kind IN ('record-changer', 'manual-turntable',
        'reel-to-reel-deck', 'cassette-deck', 'wire-recorder', 'dictation-machine', 'cine-projector')),
      models text[] NOT NULL DEFAULT '{}',
      about text NOT NULL DEFAULT '',
      drive_train text NOT NULL DEFAULT '',
      drive_map jsonb NOT NULL,
      created_at timestamptz NOT NULL DEFAULT now(),
      updated_at timestamptz NOT NULL DEFAULT now(),
      CONSTRAINT families_name_once UNIQUE (maker, name)
    );

    CREATE TABLE service_points (
      id uuid PRIMARY KEY DEFAULT gen_random_uuid(),
      family_id uuid NOT NULL REFERENCES families ON DELETE CASCADE,
      number integer NOT NULL CONSTRAINT service_points_number_positive CHECK (number > 0),
      name text NOT NULL,
      part_kind text NOT NULL CONSTRAINT service_points_kind_known CHECK (part_kind IN ('idler-wheel', 'pinch-roller',
        'flat-belt', 'square-belt', 'round-belt', 'drive-ring', 'motor-mount', 'brake-pad', 'clutch-felt')),
      note text NOT NULL DEFAULT '',
      x_um integer NOT NULL,
      y_um integer NOT NULL,
      CONSTRAINT service_points_number_once UNIQUE (family_id, number)
    );

    CREATE TABLE service_point_sizes (
      service_point_id uuid NOT NULL REFERENCES service_points ON DELETE CASCADE,
      dimension text NOT NULL,
      nominal_um integer NOT NULL,
      lower_um integer NOT NULL CONSTRAINT service_point_sizes_lower_positive CHECK (lower_um > 0),
      upper_um integer NOT NULL,
      PRIMARY KEY (service_point_id, dimension),
      CONSTRAINT service_point_sizes_in_order CHECK (lower_um <= nominal_um AND nominal_um <= upper_um)
    );
  `,
  down: "DROP TABLE service_point_sizes, service_points, families;",
};
