import { countryName } from "#shared/domain/countries";
import { type PostageRate, postageOf } from "#shared/domain/postage";
import type { WorkshopSummary } from "#shared/schemas/part";
import { select } from "./select";

/** A workshop as search needs it: how it is shown, how soon it sends, and what it asks to send to one country. */
export type Seller = {
  summary: WorkshopSummary;
  dispatchDays: number;
  /** Null where it does not ship there. */
  postage: (PostageRate & { currency: string }) | null;
};

type Row = Omit<WorkshopSummary, "countryName"> & {
  dispatchDays: number;
  baseMinor: number | null;
  perItemMinor: number;
  freeOverMinor: number | null;
  currency: string;
};

const sql = `
  SELECT w.id, w.slug, w.name, w.town, w.country, w.dispatch_days AS "dispatchDays", r.base_minor AS "baseMinor",
    r.per_item_minor AS "perItemMinor", r.free_over_minor AS "freeOverMinor", r.currency
  FROM workshops w
  LEFT JOIN shipping_countries c ON c.workshop_id = w.id AND c.country = $shipTo
  LEFT JOIN shipping_rates r ON r.id = c.rate_id
  WHERE w.id = ANY($ids::uuid[])`;

/** Workshops by id, with their postage to a country. */
export async function loadSellers(ids: Iterable<string>, shipTo: string): Promise<Map<string, Seller>> {
  const rows = await select<Row>(sql, { ids: [...new Set(ids)], shipTo });
  return new Map(
    rows.map(({ dispatchDays, baseMinor, perItemMinor, freeOverMinor, currency, ...workshop }) => [
      workshop.id,
      {
        summary: { ...workshop, countryName: countryName(workshop.country) },
        dispatchDays,
        postage: baseMinor === null ? null : { baseMinor, perItemMinor, freeOverMinor, currency },
      },
    ]),
  );
}

export type Landed = { landedMinor: number | null; shippingMinor: number | null };

/** Price of one piece and its postage in minor units; null where the workshop does not ship there in this currency. */
export function landedOf({ priceMinor, currency }: { priceMinor: number; currency: string }, seller: Seller): Landed {
  if (seller.postage?.currency !== currency) return { landedMinor: null, shippingMinor: null };
  const shippingMinor = postageOf(seller.postage, { pieces: 1, partsMinor: priceMinor });
  return { landedMinor: priceMinor + shippingMinor, shippingMinor };
}
