import type { DimensionName, PartKind } from "#shared/domain/partKinds";
import { type PostageRate, postageOf } from "#shared/domain/postage";
import type { Material, OfferType } from "#shared/schemas/part";
import { select } from "../db/select";

/** Price of one piece and its postage in minor units; null where the workshop does not ship there in this currency. */
export type Landed = { landedMinor: number | null; shippingMinor: number | null };

/** What ranking has to know of one candidate: small, so that hundreds can be loaded at once. */
export type CandidateRow = Landed & {
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
  dispatchDays: number;
  offerType: OfferType;
  material: Material | null;
  workshopId: string;
};

type PartColumns = Omit<CandidateRow, "itemId" | "kitLineId" | "kind" | "sizes" | keyof Landed> & {
  baseMinor: number | null;
  perItemMinor: number;
  freeOverMinor: number | null;
};

/** Parts that everybody may see, with what they cost to send to a country. */
const columns = `p.id AS "partId", p.title, p.price_minor AS "priceMinor", p.currency,
  p.lead_days + w.dispatch_days AS "dispatchDays", p.offer_type AS "offerType", p.material,
  p.workshop_id AS "workshopId", r.base_minor AS "baseMinor", r.per_item_minor AS "perItemMinor",
  r.free_over_minor AS "freeOverMinor"`;
const offered = `JOIN workshops w ON w.id = p.workshop_id AND w.state = 'admitted'
  LEFT JOIN shipping_countries c ON c.workshop_id = w.id AND c.country = $shipTo
  LEFT JOIN shipping_rates r ON r.id = c.rate_id AND r.currency = p.currency
  WHERE p.state = 'published'`;

const itemsSql = `SELECT i.id AS "itemId", i.kit_line_id AS "kitLineId", i.kind, ${columns}
  FROM measured_items i JOIN parts p ON p.id = i.part_id ${offered}`;
const itemsById = `${itemsSql} AND i.id = ANY($ids::uuid[])`;
const partsById = `SELECT ${columns} FROM parts p ${offered} AND p.id = ANY($ids::uuid[])`;
const sizesById = `SELECT item_id AS "itemId", dimension, nominal_um AS "nominalUm", half_width_um AS "halfWidthUm"
  FROM measured_dimensions WHERE item_id = ANY($ids::uuid[]) AND dimension = ANY($dimensions::text[])`;

/** What one piece costs at the door: price and postage, where the workshop ships there in the part's currency. */
export function landedOf(
  priceMinor: number,
  rate: Omit<PostageRate, "baseMinor"> & { baseMinor: number | null },
): Landed {
  const { baseMinor } = rate;
  if (baseMinor === null) return { landedMinor: null, shippingMinor: null };
  const shippingMinor = postageOf({ ...rate, baseMinor }, { pieces: 1, partsMinor: priceMinor });
  return { landedMinor: priceMinor + shippingMinor, shippingMinor };
}

function withLanded<Row extends PartColumns>({ baseMinor, perItemMinor, freeOverMinor, ...row }: Row) {
  return { ...row, ...landedOf(row.priceMinor, { baseMinor, perItemMinor, freeOverMinor }) };
}

type SizeRow = { itemId: string; dimension: DimensionName; nominalUm: number; halfWidthUm: number };

/** The sizes of items, of the dimensions asked for. */
export async function loadSizes(
  ids: readonly string[],
  dimensions: readonly DimensionName[],
): Promise<Map<string, CandidateRow["sizes"]>> {
  const sizes = new Map<string, CandidateRow["sizes"]>();
  for (const row of await select<SizeRow>(sizesById, { ids, dimensions })) {
    const known = sizes.get(row.itemId);
    if (known) known[row.dimension] = [row.nominalUm, row.halfWidthUm];
    else sizes.set(row.itemId, { [row.dimension]: [row.nominalUm, row.halfWidthUm] });
  }
  return sizes;
}

/** Measured items of published parts, with their sizes. Ids with nothing behind them are absent. */
export async function loadItems(
  ids: readonly string[],
  { dimensions, shipTo }: { dimensions: readonly DimensionName[]; shipTo: string },
): Promise<CandidateRow[]> {
  if (ids.length === 0) return [];
  const [rows, sizes] = await Promise.all([
    select<PartColumns & { itemId: string; kitLineId: string | null; kind: PartKind }>(itemsById, { ids, shipTo }),
    loadSizes(ids, dimensions),
  ]);
  return rows.map((row) => ({ ...withLanded(row), sizes: sizes.get(row.itemId) ?? {} }));
}

/** Published parts, found by words alone. */
export async function loadParts(ids: readonly string[], shipTo: string): Promise<CandidateRow[]> {
  if (ids.length === 0) return [];
  const rows = await select<PartColumns>(partsById, { ids, shipTo });
  return rows.map((row) => ({ ...withLanded(row), itemId: null, kitLineId: null, kind: null, sizes: {} }));
}
