import type Stripe from "stripe";
import type { Order } from "../models/Order";
import type { OrderLine } from "../models/OrderLine";
import type { Parcel } from "../models/Parcel";
import { pageClosesBeforeMs } from "../orders/holdLife";

type Item = Stripe.Checkout.SessionCreateParams.LineItem;

/**
 * What the payment provider is asked for: one page, one charge for every workshop of the order.
 *
 * Made from what was written with the order and nothing else, so that asking again asks for exactly the same: the
 * provider refuses a repeated key with other parameters.
 */
export function checkoutPage(
  { order, parcels, lines, email }: { order: Order; parcels: Parcel[]; lines: OrderLine[]; email: string },
  publicUrl: string,
): Stripe.Checkout.SessionCreateParams {
  const item = (name: string, unitMinor: number, quantity: number, description?: string): Item => ({
    quantity,
    price_data: {
      currency: order.currency.toLowerCase(),
      unit_amount: unitMinor,
      product_data: { name, ...(description ? { description } : {}) },
    },
  });
  const items = parcels.flatMap((parcel) => [
    ...lines
      .filter(({ parcelId }) => parcelId === parcel.id)
      .map((line) => item(line.title, line.unitMinor, line.quantity, parcel.trader.legalName)),
    ...(parcel.shippingMinor > 0 ? [item("Postage", parcel.shippingMinor, 1, parcel.trader.legalName)] : []),
  ]);
  const page = `${publicUrl}/orders/${order.id}`;
  return {
    mode: "payment",
    line_items: items,
    client_reference_id: order.id,
    customer_email: email,
    metadata: { orderId: order.id },
    payment_intent_data: {
      description: `Order ${order.number}`,
      transfer_group: order.id,
      metadata: { orderId: order.id },
    },
    expires_at: Math.floor(((order.holdUntil?.getTime() ?? 0) - pageClosesBeforeMs) / 1000),
    success_url: `${page}?paid=1`,
    cancel_url: `${page}?left=1`,
  };
}
