import type { Migration } from "../Migration";

/** The places of dimensions in the arrays below: those of `dimensionNames`, which only ever grows at its end. */
const names = `ARRAY['outsideDiameter', 'bore', 'treadWidth', 'overallHeight', 'secondTreadDiameter',
  'insideCircumference', 'width', 'thickness', 'section', 'insideDiameter', 'grooveDiameter', 'grooveWidth', 'height',
  'length']`;

export const itemSizes: Migration = {
  name: "0009-item-sizes",
  up: `
    -- Copying what is there takes longer than a request ever may.
    SET LOCAL statement_timeout = 0;
    -- The sizes of an item once more, in one row, so that an index over the primary size can tell about all of them.
    -- measured_dimensions stays what is true; the triggers below copy it.
    ALTER TABLE measured_items
      ADD COLUMN primary_um integer,
      ADD COLUMN nominals_um integer[] NOT NULL DEFAULT '{}',
      ADD COLUMN half_widths_um integer[] NOT NULL DEFAULT '{}';

    CREATE FUNCTION copy_item_sizes(ids uuid[]) RETURNS void LANGUAGE sql AS $$
      UPDATE measured_items i
      SET primary_um = s.primary_um, nominals_um = s.nominals, half_widths_um = s.half_widths
      FROM (
        SELECT j.id, max(m.nominal_um) FILTER (WHERE m.dimension = j.primary_dimension) AS primary_um,
          array_agg(m.nominal_um ORDER BY t.place) AS nominals,
          array_agg(m.half_width_um ORDER BY t.place) AS half_widths
        FROM measured_items j
          CROSS JOIN unnest(${names}) WITH ORDINALITY AS t (name, place)
          LEFT JOIN measured_dimensions m ON m.item_id = j.id AND m.dimension = t.name
        WHERE j.id = ANY(ids) GROUP BY j.id
      ) s
      WHERE i.id = s.id
    $$;
    CREATE FUNCTION copy_changed_sizes() RETURNS trigger LANGUAGE plpgsql AS $$
    BEGIN
      PERFORM copy_item_sizes(ARRAY(SELECT DISTINCT item_id FROM changed));
      RETURN NULL;
    END $$;
    CREATE TRIGGER measured_dimensions_copied_when_new AFTER INSERT ON measured_dimensions
      REFERENCING NEW TABLE AS changed FOR EACH STATEMENT EXECUTE FUNCTION copy_changed_sizes();
    CREATE TRIGGER measured_dimensions_copied_when_changed AFTER UPDATE ON measured_dimensions
      REFERENCING NEW TABLE AS changed FOR EACH STATEMENT EXECUTE FUNCTION copy_changed_sizes();
    CREATE TRIGGER measured_dimensions_copied_when_moved AFTER UPDATE ON measured_dimensions
      REFERENCING OLD TABLE AS changed FOR EACH STATEMENT EXECUTE FUNCTION copy_changed_sizes();
    CREATE TRIGGER measured_dimensions_copied_when_gone AFTER DELETE ON measured_dimensions
      REFERENCING OLD TABLE AS changed FOR EACH STATEMENT EXECUTE FUNCTION copy_changed_sizes();

    SELECT copy_item_sizes(ARRAY(SELECT id FROM measured_items));
    CREATE INDEX measured_items_window ON measured_items (kind, primary_um)
      INCLUDE (id, nominals_um, half_widths_um);
  `,
  down: `
    DROP TRIGGER measured_dimensions_copied_when_new ON measured_dimensions;
    DROP TRIGGER measured_dimensions_copied_when_changed ON measured_dimensions;
    DROP TRIGGER measured_dimensions_copied_when_moved ON measured_dimensions;
    DROP TRIGGER measured_dimensions_copied_when_gone ON measured_dimensions;
    DROP FUNCTION copy_changed_sizes, copy_item_sizes;
    DROP INDEX measured_items_window;
    ALTER TABLE measured_items DROP COLUMN primary_um, DROP COLUMN nominals_um, DROP COLUMN half_widths_um;
  `,
};
