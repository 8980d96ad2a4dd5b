import type { Transaction } from "sequelize";
import type { PlaceOrder } from "#shared/schemas/order";
import type { PartSummary } from "#shared/schemas/part";
import { marketCurrency } from "../basket/marketCurrency";
import type { ReadBasket } from "../basket/readBasket";
import { AppError } from "../errors/AppError";
import { Order } from "../models/Order";
import { OrderLine } from "../models/OrderLine";
import { Parcel } from "../models/Parcel";
import { Payment } from "../models/Payment";
import { presentTrader } from "../presenters/presentWorkshop";

type Line = ReadBasket["parcels"][number]["lines"][number];

/** The listing as bought: sizes as read just before, what is paid for as locked. */
function listingOf({ part }: Line, listings: Map<string, PartSummary>): PartSummary {
  const listing = listings.get(part.id);
  if (!listing) throw new AppError("total-changed", "The basket changed while you were paying: look at it once more");
  return { ...listing, title: part.title, priceMinor: part.priceMinor, currency: part.currency };
}

/** The key under which the provider makes the payment page of an order once, however often it is asked. */
export const checkoutKeyOf = (orderId: string): string => `order:${orderId}:checkout`;

/** Writes an order with its parcels, lines and the payment that is about to start. */
export async function writeOrder(
  {
    buyerId,
    input,
    basket,
    listings,
    holdUntil,
  }: {
    buyerId: string;
    input: PlaceOrder;
    basket: ReadBasket;
    listings: Map<string, PartSummary>;
    holdUntil: Date;
  },
  transaction: Transaction,
): Promise<Order> {
  const { parcels, ...totals } = basket;
  const order = await Order.create(
    {
      buyerId,
      checkoutKey: input.checkoutKey,
      state: "awaiting-payment",
      shippingAddress: input.shippingAddress,
      billingAddress: input.billingAddress ?? input.shippingAddress,
      currency: marketCurrency,
      ...totals,
      holdUntil,
    },
    { transaction },
  );
  for (const { workshop, lines, problem: _, ...terms } of parcels) {
    const parcel = await Parcel.create(
      { orderId: order.id, workshopId: workshop.id, state: "to-accept", trader: presentTrader(workshop), ...terms },
      { transaction },
    );
    await OrderLine.bulkCreate(
      lines.map((line) => ({
        parcelId: parcel.id,
        partId: line.part.id,
        title: line.part.title,
        listing: listingOf(line, listings),
        forNeed: line.forNeed,
        quantity: line.quantity,
        unitMinor: line.unitMinor,
        lineMinor: line.lineMinor,
        taxMinor: line.taxMinor,
        madeToSize: line.part.madeToSize,
        holdsStock: line.part.stockOnHand !== null,
      })),
      { transaction },
    );
  }
  await Payment.create(
    {
      orderId: order.id,
      idempotencyKey: checkoutKeyOf(order.id),
      state: "starting",
      amountMinor: order.totalMinor,
      currency: order.currency,
    },
    { transaction },
  );
  return order;
}
