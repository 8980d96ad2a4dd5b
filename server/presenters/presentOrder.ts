import { orderMayBecome } from "#shared/domain/orderState";
import type { Order, OrderParcel, OrderSummary } from "#shared/schemas/order";
import { totalsOf } from "../basket/priceBasket";
import { AuditEntry } from "../models/AuditEntry";
import type { Order as OrderRow } from "../models/Order";
import type { OrderLine } from "../models/OrderLine";
import type { Parcel } from "../models/Parcel";
import type { Workshop } from "../models/Workshop";
import { readParcels } from "../orders/readParcels";
import type { Actor } from "../policies/Actor";
import { orderPolicy } from "../policies/orderPolicy";
import { presentOrderLine } from "./presentOrderLine";
import { presentWorkshop } from "./presentWorkshop";

const time = (at: Date | null) => at?.toISOString() ?? null;
const inOrder = { order: [["id", "ASC"]] as [string, string][] };

/** What a buyer reads of what happened; what is not here is for the audit log alone. */
const historyWords: Record<string, string> = {
  "order-placed": "Order placed; the parts are held for you",
  "payment-failed": "A payment was refused; nothing was charged",
  "order-paid": "Paid; each workshop was told",
  "order-expired": "Not paid in time; the parts are on sale again",
  "order-cancelled": "Cancelled; nothing was charged",
  "paid-too-late": "A payment came too late; it is being given back",
  "order-refunded": "The payment was given back",
  "payment-mismatch": "A payment does not match this order; we are looking into it",
};

function presentParcel(parcel: Parcel, lines: readonly OrderLine[], workshop: Workshop): OrderParcel {
  const { id, state, trader, partsMinor, shippingMinor, taxMinor, totalMinor } = parcel;
  return {
    id,
    state,
    workshop: presentWorkshop(workshop),
    trader,
    lines: lines.filter(({ parcelId }) => parcelId === id).map(presentOrderLine),
    partsMinor,
    shippingMinor,
    taxMinor,
    taxRatePercent: parcel.taxRateBasisPoints / 100,
    totalMinor,
    leavesBy: time(parcel.leavesBy),
    dispatchedAt: time(parcel.dispatchedAt),
    carrier: parcel.carrier,
    trackingNumber: parcel.trackingNumber,
  };
}

async function readHistory(orderId: string): Promise<Order["history"]> {
  const entries = await AuditEntry.findAll({ where: { subjectType: "order", subjectId: orderId }, ...inOrder });
  return entries.flatMap(({ at, action }) => {
    const what = historyWords[action];
    return what ? [{ at: at.toISOString(), what }] : [];
  });
}

/** An order as its reader may see it: whole, or for a workshop its own parcel with the sums of that parcel. */
export async function presentOrder(order: OrderRow, actor: Actor): Promise<Order> {
  const all = await readParcels([order.id]);
  const target = { ...order.get(), workshopIds: all.map(({ parcel }) => parcel.workshopId) };
  const whole = orderPolicy.readWhole(actor, target);
  const seen = whole ? all : all.filter(({ parcel }) => parcel.workshopId === actor.workshopId);
  const totals = totalsOf(seen.map(({ parcel }) => parcel));
  const refundedWhole = order.refundedMinor === order.totalMinor;
  return {
    id: order.id,
    number: order.number,
    state: order.state,
    createdAt: order.createdAt.toISOString(),
    paidAt: time(order.paidAt),
    holdUntil: time(order.holdUntil),
    shippingAddress: order.shippingAddress,
    billingAddress: order.billingAddress,
    parcels: seen.map(({ parcel, lines, workshop }) => presentParcel(parcel, lines, workshop)),
    ...totals,
    refundedMinor: whole ? order.refundedMinor : refundedWhole ? totals.totalMinor : 0,
    currency: order.currency,
    history: whole ? await readHistory(order.id) : [],
    can: {
      pay: orderPolicy.pay(actor, target) && order.state === "awaiting-payment",
      cancel: orderPolicy.cancel(actor, target) && orderMayBecome(order.state, "cancelled"),
    },
  };
}

/** Orders as rows of a list, in the order given. */
export async function presentOrders(orders: readonly OrderRow[]): Promise<OrderSummary[]> {
  const all = await readParcels(orders.map(({ id }) => id));
  return orders.map((order) => {
    const own = all.filter(({ parcel }) => parcel.orderId === order.id);
    return {
      id: order.id,
      number: order.number,
      state: order.state,
      createdAt: order.createdAt.toISOString(),
      totalMinor: order.totalMinor,
      currency: order.currency,
      workshops: own.map(({ workshop }) => workshop.name),
      titles: own.flatMap(({ lines }) => lines.map(({ title }) => title)),
    };
  });
}
