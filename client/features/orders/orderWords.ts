import { formatMoney } from "#shared/domain/money";
import type { OrderState } from "#shared/domain/orderState";
import type { ParcelState } from "#shared/domain/parcelState";
import type { Order } from "#shared/schemas/order";
import { formatUntil } from "./formatMoment";

/** An order's state as a heading. */
export const orderStateNames: Record<OrderState, string> = {
  draft: "Not placed yet",
  "awaiting-payment": "Waiting for payment",
  paid: "Paid",
  closed: "Closed",
  expired: "Not paid in time",
  cancelled: "Cancelled",
};

function refundWords({ refundedMinor, totalMinor, currency }: Order): string {
  if (refundedMinor === 0) return "";
  const all = refundedMinor === totalMinor ? "The whole amount" : formatMoney(refundedMinor, currency);
  return ` ${all} was given back to the card it came from.`;
}

/** What an order's state means for its buyer, and what happens next. */
export function nextWords(order: Order, now: Date): string {
  const { state, holdUntil } = order;
  switch (state) {
    case "draft":
      return "Nothing is held and nothing was charged.";
    case "awaiting-payment":
      if (!holdUntil) return "Its parts are held for you. Nothing was charged.";
      return new Date(holdUntil) > now
        ? `Held for you until ${formatUntil(holdUntil, now)}: pay now, or the parts go back on sale.`
        : "The time to pay is over; the parts go back on sale. Nothing was charged.";
    case "paid":
      return `Each workshop was told, packs its own parcel and sends it.${refundWords(order)}`;
    case "closed":
      return `Every parcel has come to its end.${refundWords(order)}`;
    case "expired":
      return `Nothing was charged; the parts are on sale again.${refundWords(order)}`;
    case "cancelled":
      return order.refundedMinor > 0
        ? `The parts are on sale again.${refundWords(order)}`
        : "Nothing was charged; the parts are on sale again.";
  }
}

/** A parcel's state as a heading, and what it waits for. */
export const parcelStateWords: Record<ParcelState, { name: string; next: string }> = {
  "to-accept": { name: "To accept", next: "The workshop has yet to accept it." },
  "core-awaited": { name: "Core awaited", next: "Send the old part to the workshop: its hub is needed." },
  "core-received": { name: "Core received", next: "The workshop has your old part and looks at it." },
  "core-refused": { name: "Core refused", next: "The hub that came cannot be re-moulded; the workshop writes to you." },
  "in-work": { name: "In work", next: "The workshop makes or packs it." },
  ready: { name: "Ready", next: "It is packed and waits to be handed over." },
  dispatched: { name: "Dispatched", next: "It is on its way to you." },
  delivered: { name: "Delivered", next: "Measure what came before you fit it." },
  closed: { name: "Closed", next: "It has come to its end." },
  declined: { name: "Declined", next: "The workshop cannot send it; what you paid for it is given back." },
  cancelled: { name: "Cancelled", next: "It is not sent." },
};

const straight = ["to-accept", "in-work", "ready", "dispatched", "delivered", "closed"] as const;
const withCore = ["to-accept", "core-awaited", "core-received", ...straight.slice(1)] as const;

/** The stations of a parcel on its way, for the rail; null where it left the way. */
export function stationsOf(state: ParcelState): readonly ParcelState[] | null {
  if (state === "declined" || state === "cancelled" || state === "core-refused") return null;
  return state === "core-awaited" || state === "core-received" ? withCore : straight;
}
