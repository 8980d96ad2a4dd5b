import { z } from "zod";
import { orderStates } from "../domain/orderState";
import { parcelStates } from "../domain/parcelState";
import { TraderIdentity } from "./catalogue";
import { CountryCode, Currency, Cursor, Id, Minor, Time } from "./common";
import { ListingKind, StatedDimensions, WorkshopSummary } from "./part";

const line = (label: string, max: number) =>
  z
    .string()
    .trim()
    .min(1, label)
    .max(max, `Use at most ${max} characters`)
    .regex(/^\P{Cc}*$/u, "Use letters and numbers on one line");

export const Address = z.object({
  name: line("Give a name", 120),
  line1: line("Give the street and house", 120),
  line2: line("", 120).or(z.literal("")).default(""),
  postcode: line("Give the postcode", 20),
  town: line("Give the town", 80),
  region: line("", 80).or(z.literal("")).default(""),
  country: CountryCode,
});
export type Address = z.infer<typeof Address>;

export const OrderState = z.enum(orderStates);

export const ParcelState = z.enum(parcelStates);

/** Asks for an order from the basket as it stands, and for the page to pay it on. */
export const PlaceOrder = z.object({
  shippingAddress: Address,
  /** Null where it is the shipping address. */
  billingAddress: Address.nullable().default(null),
  /** What the buyer was shown; another total now is refused and told. */
  expectedTotalMinor: Minor,
  currency: Currency,
  /** Made once by the page; the same key gives the same order, however often it is sent. */
  checkoutKey: Id,
});
export type PlaceOrder = z.infer<typeof PlaceOrder>;

export const PlacedOrder = z.object({ orderId: Id, number: z.string(), paymentUrl: z.string() });
export type PlacedOrder = z.infer<typeof PlacedOrder>;

export const OrderLine = z.object({
  id: Id,
  partId: Id,
  title: z.string(),
  kind: ListingKind,
  dimensions: StatedDimensions,
  forNeed: z.string().nullable(),
  quantity: z.int().positive(),
  unitMinor: Minor,
  lineMinor: Minor,
  taxMinor: Minor,
  madeToSize: z.boolean(),
});
export type OrderLine = z.infer<typeof OrderLine>;

export const OrderParcel = z.object({
  id: Id,
  state: ParcelState,
  workshop: WorkshopSummary,
  trader: TraderIdentity,
  lines: z.array(OrderLine),
  partsMinor: Minor,
  shippingMinor: Minor,
  taxMinor: Minor,
  taxRatePercent: z.number(),
  totalMinor: Minor,
  leavesBy: Time.nullable(),
  dispatchedAt: Time.nullable(),
  carrier: z.string().nullable(),
  trackingNumber: z.string().nullable(),
});
export type OrderParcel = z.infer<typeof OrderParcel>;

export const Order = z.object({
  id: Id,
  number: z.string(),
  state: OrderState,
  createdAt: Time,
  paidAt: Time.nullable(),
  /** Until when the stock is held for it; null once it no longer matters. */
  holdUntil: Time.nullable(),
  shippingAddress: Address,
  billingAddress: Address,
  parcels: z.array(OrderParcel),
  partsMinor: Minor,
  shippingMinor: Minor,
  taxMinor: Minor,
  totalMinor: Minor,
  refundedMinor: Minor,
  currency: Currency,
  history: z.array(z.object({ at: Time, what: z.string() })),
  can: z.object({ pay: z.boolean(), cancel: z.boolean() }),
});
export type Order = z.infer<typeof Order>;

export const OrderSummary = z.object({
  id: Id,
  number: z.string(),
  state: OrderState,
  createdAt: Time,
  totalMinor: Minor,
  currency: Currency,
  workshops: z.array(z.string()),
  titles: z.array(z.string()),
});
export type OrderSummary = z.infer<typeof OrderSummary>;

export const OrderListQuery = z.object({
  cursor: Cursor.optional(),
  limit: z.coerce.number().int().min(1).max(50).default(20),
});
export const OrderList = z.object({ items: z.array(OrderSummary), nextCursor: z.string().nullable() });
export type OrderList = z.infer<typeof OrderList>;

export const AddressList = z.object({ items: z.array(Address.extend({ id: Id })) });
