import { z } from "zod";
import { CountryCode, Currency, Id, Minor } from "./common";
import { PartSummary, WorkshopSummary } from "./part";

export const BasketQuery = z.object({ shipTo: CountryCode.default("DE") });

export const PutBasketLine = z.object({
  quantity: z.int().min(1, "Take at least one").max(99, "At most 99 of one part"),
  /** What it is for, as shown on the basket and the order: the search that found it. */
  forNeed: z.string().trim().max(200).optional(),
});
export type PutBasketLine = z.infer<typeof PutBasketLine>;

export const BasketLine = z.object({
  part: PartSummary,
  quantity: z.int().positive(),
  forNeed: z.string().nullable(),
  unitMinor: Minor,
  lineMinor: Minor,
  madeToSize: z.boolean(),
  /** Why this line cannot be bought as it stands, in words; null where it can. */
  problem: z.string().nullable(),
});
export type BasketLine = z.infer<typeof BasketLine>;

export const BasketParcel = z.object({
  workshop: WorkshopSummary,
  lines: z.array(BasketLine),
  partsMinor: Minor,
  shippingMinor: Minor,
  /** Tax contained in parts and postage; 0 where the workshop is not registered in that country. */
  taxMinor: Minor,
  taxRatePercent: z.number(),
  totalMinor: Minor,
  leavesInDays: z.int().nonnegative(),
  problem: z.string().nullable(),
});
export type BasketParcel = z.infer<typeof BasketParcel>;

export const Basket = z.object({
  shipTo: CountryCode,
  count: z.int().nonnegative(),
  parcels: z.array(BasketParcel),
  partsMinor: Minor,
  shippingMinor: Minor,
  taxMinor: Minor,
  totalMinor: Minor,
  currency: Currency,
  canCheckOut: z.boolean(),
});
export type Basket = z.infer<typeof Basket>;

export const BasketLineParams = z.object({ partId: Id });
