import { z } from "zod";
import { parcelStates } from "../domain/parcelState";
import { parcelSteps } from "../domain/parcelSteps";
import { Currency, Cursor, Id, Minor, Time } from "./common";
import { Address, OrderLine, ParcelState } from "./order";
import { PartSummary } from "./part";

const ParcelStep = z.enum(parcelSteps);

/** A parcel as its workshop sees it in a list. */
export const WorkshopParcelSummary = z.object({
  id: Id,
  orderNumber: z.string(),
  state: ParcelState,
  paidAt: Time.nullable(),
  /** When it is to leave; for a re-mould counted anew from when the core arrives. */
  leavesBy: Time.nullable(),
  leavesInDays: z.int().nonnegative(),
  recipient: z.string(),
  town: z.string(),
  country: z.string(),
  countryName: z.string(),
  pieces: z.int().positive(),
  titles: z.array(z.string()),
  /** What its workshop may do with it now. */
  steps: z.array(ParcelStep),
});
export type WorkshopParcelSummary = z.infer<typeof WorkshopParcelSummary>;

/** One part to make and pack, as it was listed when bought. */
export const WorkshopParcelLine = OrderLine.extend({
  offerType: PartSummary.shape.offerType,
  material: PartSummary.shape.material,
  hardnessShoreA: PartSummary.shape.hardnessShoreA,
  kitLines: PartSummary.shape.kitLines,
});
export type WorkshopParcelLine = z.infer<typeof WorkshopParcelLine>;

export const WorkshopParcel = WorkshopParcelSummary.extend({
  shippingAddress: Address,
  lines: z.array(WorkshopParcelLine),
  partsMinor: Minor,
  shippingMinor: Minor,
  taxMinor: Minor,
  totalMinor: Minor,
  commissionMinor: Minor,
  /** What the workshop is owed for it. */
  shareMinor: Minor,
  currency: Currency,
  carrier: z.string().nullable(),
  trackingNumber: z.string().nullable(),
  dispatchedAt: Time.nullable(),
  history: z.array(z.object({ at: Time, what: z.string() })),
});
export type WorkshopParcel = z.infer<typeof WorkshopParcel>;

export const parcelFilters = ["open", ...parcelStates] as const;

export const WorkshopParcelQuery = z.object({
  /** `open`: what has not left yet and still will. */
  state: z.enum(parcelFilters).default("open"),
  cursor: Cursor.optional(),
  limit: z.coerce.number().int().min(1).max(50).default(20),
});
export type WorkshopParcelQuery = z.infer<typeof WorkshopParcelQuery>;

export const WorkshopParcelList = z.object({
  items: z.array(WorkshopParcelSummary),
  /** How many there are in each state that has any. */
  counts: z.partialRecord(ParcelState, z.int().positive()),
  nextCursor: z.string().nullable(),
});
export type WorkshopParcelList = z.infer<typeof WorkshopParcelList>;

const oneLine = z
  .string()
  .trim()
  .max(80, "Use at most 80 characters")
  .regex(/^\P{Cc}*$/u, "Use letters and numbers on one line")
  .default("");

/** Who carries a parcel, and the number to follow it by; either may be left empty. */
export const DispatchParcel = z.strictObject({ carrier: oneLine, trackingNumber: oneLine });
export type DispatchParcel = z.infer<typeof DispatchParcel>;
