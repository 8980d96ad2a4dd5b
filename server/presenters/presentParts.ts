import { dimensionsOf, type PartKind } from "#shared/domain/partKinds";
import type { KitLine, PartSummary, Photo, StatedDimension, StatedDimensions } from "#shared/schemas/part";
import { photoUrl } from "../adapters/PhotoStore";
import { select } from "../db/select";

type PhotoFacts = { file: string; alt: string; width: number; height: number };
type Sizes = Record<
  string,
  [nominalUm: number, halfWidthUm: number, StatedDimension["tolerance"], StatedDimension["toleranceClass"]]
>;
type LineRow = Omit<KitLine, "dimensions"> & { sizes: Sizes | null };
type Row = Omit<PartSummary, "dimensions" | "kitLines" | "photo"> & {
  sizes: Sizes | null;
  lines: LineRow[] | null;
  photo: PhotoFacts | null;
};

const sizesWhere = (condition: string) => `
  (SELECT json_object_agg(m.dimension, json_build_array(m.nominal_um, m.half_width_um, m.tolerance, m.tolerance_class))
   FROM measured_items i JOIN measured_dimensions m ON m.item_id = i.id WHERE ${condition})`;

const sql = `
  SELECT p.id, p.kind, p.title, p.offer_type AS "offerType", p.material, p.hardness_shore_a AS "hardnessShoreA",
    p.price_minor AS "priceMinor", p.currency, p.stock_on_hand - p.stock_reserved AS available,
    w.dispatch_days + p.lead_days AS "dispatchDays",
    ${sizesWhere("i.part_id = p.id AND i.kit_line_id IS NULL")} AS sizes,
    CASE WHEN p.kind = 'rebuild-kit' THEN (
      SELECT json_agg(json_build_object('id', l.id, 'kind', l.kind, 'title', l.title, 'quantity', l.quantity,
        'servicePointName', s.name, 'sizes', ${sizesWhere("i.kit_line_id = l.id")}) ORDER BY l.position)
      FROM kit_lines l LEFT JOIN service_points s ON s.id = l.service_point_id WHERE l.part_id = p.id
    ) END AS lines,
    (SELECT json_build_object('file', f.file, 'alt', f.alt, 'width', f.width, 'height', f.height)
     FROM photos f WHERE f.part_id = p.id AND f.position = 1) AS photo
  FROM parts p JOIN workshops w ON w.id = p.workshop_id WHERE p.id = ANY($ids::uuid[])`;

/** Sizes in mm, in the canonical order of their kind. */
function presentDimensions(kind: PartKind, sizes: Sizes): StatedDimensions {
  const dimensions: StatedDimensions = {};
  for (const name of dimensionsOf(kind)) {
    const size = sizes[name];
    if (!size) continue;
    const [nominalUm, halfWidthUm, tolerance, toleranceClass] = size;
    dimensions[name] = { nominalMm: nominalUm / 1000, plusMinusMm: halfWidthUm / 1000, tolerance, toleranceClass };
  }
  return dimensions;
}

export const presentPhoto = ({ file, alt, width, height }: PhotoFacts, wanted: 320 | 960): Photo => ({
  url: photoUrl(file, wanted),
  alt,
  width: wanted,
  height: Math.round((height * wanted) / width),
});

const presentLine = ({ sizes, ...line }: LineRow): KitLine => ({
  ...line,
  dimensions: line.kind ? presentDimensions(line.kind, sizes ?? {}) : {},
});

function presentPart({ sizes, lines, photo, ...part }: Row): PartSummary {
  return {
    ...part,
    dimensions: part.kind === "rebuild-kit" ? {} : presentDimensions(part.kind, sizes ?? {}),
    kitLines: (lines ?? []).map(presentLine),
    photo: photo && presentPhoto(photo, 320),
  };
}

/**
 * Parts as they stand in a row, by id, in one query however many there are. Ids with nothing behind them are absent.
 * `available` is what can still be bought; null where the part is made when ordered.
 */
export async function presentParts(ids: readonly string[]): Promise<Map<string, PartSummary>> {
  if (ids.length === 0) return new Map();
  const rows = await select<Row>(sql, { ids: [...new Set(ids)] });
  return new Map(rows.map((row) => [row.id, presentPart(row)]));
}
