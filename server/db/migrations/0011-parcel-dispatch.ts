import type { Migration } from "../Migration";

export const parcelDispatch: Migration = {
  name: "0011-parcel-dispatch",
  up: `
    ALTER TABLE parcels
      ADD COLUMN carrier text CONSTRAINT parcels_carrier_length CHECK (char_length(carrier) BETWEEN 1 AND 80),
      ADD COLUMN tracking_number text
        CONSTRAINT parcels_tracking_number_length CHECK (char_length(tracking_number) BETWEEN 1 AND 80),
      ADD COLUMN dispatched_at timestamptz;
    -- When a parcel left was not kept so far; its last change is the nearest that is known.
    UPDATE parcels SET dispatched_at = updated_at WHERE state IN ('dispatched', 'delivered', 'closed');
    ALTER TABLE parcels ADD CONSTRAINT parcels_dispatched_have_time
      CHECK (state NOT IN ('dispatched', 'delivered', 'closed') OR dispatched_at IS NOT NULL);
  `,
  down: "ALTER TABLE parcels DROP COLUMN carrier, DROP COLUMN tracking_number, DROP COLUMN dispatched_at;",
};
