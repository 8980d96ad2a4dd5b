import type { DimensionName, PartKind } from "#shared/domain/partKinds";
import { type PostageRate, postageOf } from "#shared/domain/postage";
import type { Material, OfferType } from "#shared/schemas/part";
import type { Candidates } from "../adapters/SearchEngine";
import { Statement } from "../db/Statement";
import { select } from "../db/select";
import { selectPrepared } from "../db/selectPrepared";
import { halfWidthOf, nominalOf } from "./windowSql";

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

/** What it costs to send to the country asked for; `baseMinor` null where the workshop does not. */
export type Postage = Omit<PostageRate, "baseMinor"> & { baseMinor: number | null };

/** What one piece costs at the door. */
export function landedOf(priceMinor: number, { baseMinor, perItemMinor, freeOverMinor }: Postage): Landed {
  if (baseMinor === null) return { landedMinor: null, shippingMinor: null };
  const rate = { baseMinor, perItemMinor, freeOverMinor };
  const shippingMinor = postageOf(rate, { pieces: 1, partsMinor: priceMinor });
  return { landedMinor: priceMinor + shippingMinor, shippingMinor };
}

/** Parts that everybody may see, with what they cost to send to a country. */
const partColumns = `p.id AS "partId", p.title, p.price_minor AS "priceMinor", p.currency,
  p.lead_days + w.dispatch_days AS "dispatchDays", p.offer_type AS "offerType", p.material,
  p.workshop_id AS "workshopId", r.base_minor AS "baseMinor", r.per_item_minor AS "perItemMinor",
  r.free_over_minor AS "freeOverMinor"`;
const offered = (shipTo: string) => `
  JOIN workshops w ON w.id = p.workshop_id AND w.state = 'admitted'
  LEFT JOIN shipping_countries s ON s.workshop_id = w.id AND s.country = ${shipTo}
  LEFT JOIN shipping_rates r ON r.id = s.rate_id AND r.currency = p.currency
  WHERE p.state = 'published'`;

type RawRow = Omit<CandidateRow, keyof Landed | "sizes"> & Postage & { sizes: (number | null)[] };

function complete(row: RawRow, dimensions: readonly DimensionName[]): CandidateRow {
  const sizes: CandidateRow["sizes"] = {};
  for (const [n, dimension] of dimensions.entries()) {
    const [nominalUm, halfWidthUm] = [row.sizes[2 * n], row.sizes[2 * n + 1]];
    if (nominalUm != null && halfWidthUm != null) sizes[dimension] = [nominalUm, halfWidthUm];
  }
  const { landedMinor, shippingMinor } = landedOf(row.priceMinor, row);
  // The row is ours alone, and there are many: it is filled in rather than copied.
  return Object.assign(row, { sizes, landedMinor, shippingMinor });
}

/**
 * Candidates that are on offer, with their sizes of the dimensions asked for. What is no longer published is absent.
 * Each of `selects` gives ids of measured items as part of one statement; the ids never leave the database.
 */
export async function loadItems(
  selects: readonly Candidates["select"][],
  { dimensions, shipTo }: { dimensions: readonly DimensionName[]; shipTo: string },
): Promise<CandidateRow[]> {
  const statement = new Statement();
  const candidates = selects.map((give) => `(${give(statement)})`).join(" UNION ");
  const sizes = dimensions.length
    ? `ARRAY[${dimensions.flatMap((name) => [nominalOf(name), halfWidthOf(name)]).join(", ")}]`
    : "'{}'::integer[]";
  const sql = `
    WITH candidates AS MATERIALIZED (${candidates})
    SELECT i.id AS "itemId", i.kit_line_id AS "kitLineId", i.kind, ${partColumns}, ${sizes} AS sizes
    FROM candidates JOIN measured_items i ON i.id = candidates.id JOIN parts p ON p.id = i.part_id
    ${offered(statement.param(shipTo))}`;
  const rows = await selectPrepared<RawRow>(sql, statement);
  return rows.map((row) => complete(row, dimensions));
}

/** Parts on offer that words alone found. */
export async function loadParts(give: Candidates["select"], shipTo: string): Promise<CandidateRow[]> {
  const statement = new Statement();
  const sql = `
    SELECT NULL AS "itemId", NULL AS "kitLineId", NULL AS kind, ${partColumns}, '{}'::integer[] AS sizes
    FROM (${give(statement)}) candidates JOIN parts p ON p.id = candidates.id ${offered(statement.param(shipTo))}`;
  const rows = await selectPrepared<RawRow>(sql, statement);
  return rows.map((row) => complete(row, []));
}

type SizeRow = { itemId: string; dimension: DimensionName; nominalUm: number; halfWidthUm: number };
const sizesSql = `
  SELECT item_id AS "itemId", dimension, nominal_um AS "nominalUm", half_width_um AS "halfWidthUm"
  FROM measured_dimensions WHERE item_id = ANY($ids::uuid[]) AND dimension = ANY($dimensions::text[])`;

/** The sizes of items by id, of the dimensions asked for. */
export async function loadSizes(
  ids: readonly string[],
  dimensions: readonly DimensionName[],
): Promise<Map<string, CandidateRow["sizes"]>> {
  const sizes = new Map<string, CandidateRow["sizes"]>(ids.map((id) => [id, {}]));
  for (const { itemId, dimension, nominalUm, halfWidthUm } of await select<SizeRow>(sizesSql, { ids, dimensions })) {
    sizes.get(itemId)![dimension] = [nominalUm, halfWidthUm];
  }
  return sizes;
}
