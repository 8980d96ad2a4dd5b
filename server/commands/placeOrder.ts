import type { Address, PlacedOrder, PlaceOrder } from "#shared/schemas/order";
import { findBasket } from "../basket/basketOf";
import { BasketLine } from "../models/BasketLine";
import type { Actor } from "../policies/Actor";
import { presentParts } from "../presenters/presentParts";
import type { Services } from "../Services";
import { openPaymentPage } from "./openPaymentPage";
import { startOrder } from "./startOrder";

/** UTF-8 has no lone surrogates, and the database takes no JSON with them: each becomes U+FFFD, as in a text column. */
const wellFormed = (address: Address): Address =>
  Object.fromEntries(Object.entries(address).map(([field, text]) => [field, Buffer.from(text).toString()])) as Address;

const writable = (input: PlaceOrder): PlaceOrder => ({
  ...input,
  shippingAddress: wellFormed(input.shippingAddress),
  billingAddress: input.billingAddress && wellFormed(input.billingAddress),
});

/** Makes an order from the basket and gives the page to pay it on; the same checkout key gives the same again. */
export async function placeOrder(
  services: Services,
  actor: Actor,
  input: PlaceOrder,
  now = new Date(),
): Promise<PlacedOrder> {
  const basket = await findBasket({ userId: actor.id });
  const lines = basket ? await BasketLine.findAll({ where: { basketId: basket.id } }) : [];
  const listings = await presentParts(lines.map(({ partId }) => partId));
  const order = await startOrder(actor, writable(input), listings, now);
  const paid = order.state === "paid" || order.state === "closed";
  const url = paid
    ? `${services.config.publicUrl}/orders/${order.id}`
    : (await openPaymentPage(services, order.id, now)).url;
  return { orderId: order.id, number: order.number, paymentUrl: url };
}
