import type { OrderState } from "#shared/domain/orderState";
import type { Actor } from "./Actor";

/** An order as its policy sees it: who bought, in what state, and whose parcels it has. */
export type OrderTarget = { buyerId: string; state: OrderState; workshopIds: readonly string[] };

const isBuyer = (actor: Actor, order: OrderTarget) => order.buyerId === actor.id;
const isAdministrator = (actor: Actor) => actor.role === "administrator";

/** A workshop learns of an order once it is paid, and then of its own parcels only. */
const sellsIn = (actor: Actor, order: OrderTarget) =>
  actor.role === "workshop" &&
  actor.workshopId !== null &&
  order.workshopIds.includes(actor.workshopId) &&
  (order.state === "paid" || order.state === "closed");

export const orderPolicy = {
  read: (actor: Actor, order: OrderTarget) => isBuyer(actor, order) || isAdministrator(actor) || sellsIn(actor, order),
  /** Every parcel, what was charged and what happened; without it, the reader's own parcels alone. */
  readWhole: (actor: Actor, order: OrderTarget) => isBuyer(actor, order) || isAdministrator(actor),
  pay: isBuyer,
  cancel: isBuyer,
};

/** The orders of a restorer's own list, as a query. */
export const boughtBy = (actor: Actor) => ({ buyerId: actor.id });
