import type { DimensionName, PartKind } from "#shared/domain/partKinds";
import type { Material, OfferType } from "#shared/schemas/part";
import { select } from "./select";

/** What ranking has to know of one candidate: small, so that hundreds can be loaded at once. */
export type CandidateRow = {
  partId: string;
  /** Null for a part found by words alone. */
  itemId: string | null;
  kitLineId: string | null;
  kind: PartKind | null;
  /** [nominal, half width] in micrometres of the dimensions asked for. */
  sizes: Partial<Record<DimensionName, readonly [nominalUm: number, halfWidthUm: number]>>;
  title: string;
  priceMinor: number;
  currency: string;
  leadDays: number;
  offerType: OfferType;
  material: Material | null;
  workshopId: string;
};

const partColumns = `p.id AS "partId", p.title, p.price_minor AS "priceMinor", p.currency, p.lead_days AS "leadDays",
  p.offer_type AS "offerType", p.material, p.workshop_id AS "workshopId"`;

const itemsSql = (which: "i.id = ANY($ids::uuid[])" | "i.part_id = ANY($ids::uuid[])") => `
  SELECT ${partColumns}, i.id AS "itemId", i.kit_line_id AS "kitLineId", i.kind, s.sizes
  FROM measured_items i JOIN parts p ON p.id = i.part_id
  CROSS JOIN LATERAL (
    SELECT json_object_agg(m.dimension, json_build_array(m.nominal_um, m.half_width_um)) AS sizes
    FROM measured_dimensions m WHERE m.item_id = i.id AND m.dimension = ANY($dimensions::text[])
  ) s
  WHERE ${which}`;
const itemsById = itemsSql("i.id = ANY($ids::uuid[])");
const itemsByPart = itemsSql("i.part_id = ANY($ids::uuid[])");

const partsSql = `SELECT ${partColumns} FROM parts p WHERE p.id = ANY($partIds::uuid[])`;

/** Measured items with their parts, by the ids of the items or of the parts. Ids with nothing behind them are absent. */
export async function loadItems(
  by: "item" | "part",
  ids: readonly string[],
  dimensions: readonly DimensionName[],
): Promise<CandidateRow[]> {
  if (ids.length === 0) return [];
  const sql = by === "item" ? itemsById : itemsByPart;
  const rows = await select<CandidateRow & { sizes: CandidateRow["sizes"] | null }>(sql, { ids, dimensions });
  return rows.map((row) => ({ ...row, sizes: row.sizes ?? {} }));
}

/** Parts found by words alone. */
export async function loadParts(partIds: readonly string[]): Promise<CandidateRow[]> {
  if (partIds.length === 0) return [];
  const rows = await select<Omit<CandidateRow, "itemId" | "kitLineId" | "kind" | "sizes">>(partsSql, { partIds });
  return rows.map((row) => ({ ...row, itemId: null, kitLineId: null, kind: null, sizes: {} }));
}
