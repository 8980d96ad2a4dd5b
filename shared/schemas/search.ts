import { z } from "zod";
import { Currency, Cursor, Id, Minor } from "./common";
import { Need, NeedQuery } from "./need";
import { DimensionName, Evidence, Fit, Material, OfferType, PartSummary, Verdict, WorkshopSummary } from "./part";

export const searchSorts = ["fit", "price", "dispatch"] as const;

export const SearchQuery = NeedQuery.extend({
  q: z.string().trim().max(120, "Use at most 120 characters").optional(),
  minChance: z.coerce.number().min(0).max(1).optional(),
  offer: OfferType.optional(),
  material: Material.optional(),
  sort: z.enum(searchSorts).default("fit"),
  cursor: Cursor.optional(),
  limit: z.coerce.number().int().min(1).max(50).default(20),
});
export type SearchQuery = z.infer<typeof SearchQuery>;

export const SearchItem = z.object({
  part: PartSummary,
  workshop: WorkshopSummary,
  /** Null where nothing was measured: found by words alone. */
  fit: Fit.nullable(),
  /** The line of a kit that fits; null for a part of its own. */
  kitLineId: Id.nullable(),
  /** Price of one and its postage to the country asked for; null where the workshop does not ship there. */
  landedMinor: Minor.nullable(),
  shippingMinor: Minor.nullable(),
  currency: Currency,
  evidence: Evidence,
});
export type SearchItem = z.infer<typeof SearchItem>;

export const NearMiss = SearchItem.extend({
  failing: z.object({ dimension: DimensionName, reason: z.string() }),
});
export type NearMiss = z.infer<typeof NearMiss>;

export const RailTick = z.object({
  partId: Id,
  title: z.string(),
  nominalMm: z.number(),
  plusMinusMm: z.number(),
  verdict: Verdict,
});
export type RailTick = z.infer<typeof RailTick>;

export const Rail = z.object({
  dimension: DimensionName,
  fromMm: z.number(),
  toMm: z.number(),
  ticks: z.array(RailTick),
});
export type Rail = z.infer<typeof Rail>;

export const SearchAnswer = z.object({
  need: Need,
  items: z.array(SearchItem),
  /** Null where no dimension is known to lay the parts along. */
  rail: Rail.nullable(),
  nearMisses: z.array(NearMiss),
  total: z.int().nonnegative(),
  nextCursor: z.string().nullable(),
});
export type SearchAnswer = z.infer<typeof SearchAnswer>;
