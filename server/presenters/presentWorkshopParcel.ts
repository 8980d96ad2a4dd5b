import { Op } from "sequelize";
import { countryName } from "#shared/domain/countries";
import type { WorkshopParcel, WorkshopParcelLine, WorkshopParcelSummary } from "#shared/schemas/workshopParcel";
import { AuditEntry } from "../models/AuditEntry";
import { Order } from "../models/Order";
import { OrderLine } from "../models/OrderLine";
import type { Parcel } from "../models/Parcel";
import type { Actor } from "../policies/Actor";
import { allowedSteps } from "../policies/parcelPolicy";
import { presentOrderLine } from "./presentOrderLine";

const time = (at: Date | null) => at?.toISOString() ?? null;
const inOrder = { order: [["id", "ASC"]] as [string, string][] };

/** What its workshop reads of what happened to a parcel. */
const historyWords: Record<string, string> = {
  "parcel-core-awaited": "Accepted; the core is awaited",
  "parcel-core-received": "The core came",
  "parcel-in-work": "Work on it began",
  "parcel-ready": "Packed and ready",
  "parcel-dispatched": "Dispatched; the buyer was told",
};

function presentSummary(
  parcel: Parcel,
  order: Order,
  lines: readonly OrderLine[],
  actor: Actor,
): WorkshopParcelSummary {
  const { id, state, leavesInDays, workshopId } = parcel;
  const { name, town, country } = order.shippingAddress;
  return {
    id,
    orderNumber: order.number,
    state,
    paidAt: time(order.paidAt),
    leavesBy: time(parcel.leavesBy),
    leavesInDays,
    recipient: name,
    town,
    country,
    countryName: countryName(country),
    pieces: lines.reduce((sum, { quantity }) => sum + quantity, 0),
    titles: lines.map(({ title }) => title),
    steps: allowedSteps(actor, { workshopId, orderState: order.state, state }),
  };
}

function presentLine(line: OrderLine): WorkshopParcelLine {
  const { offerType, material, hardnessShoreA, kitLines } = line.listing;
  return { ...presentOrderLine(line), offerType, material, hardnessShoreA, kitLines };
}

async function readHistory(order: Order, parcelId: string): Promise<WorkshopParcel["history"]> {
  const entries = await AuditEntry.findAll({ where: { subjectType: "parcel", subjectId: parcelId }, ...inOrder });
  const steps = entries.flatMap(({ at, action }) => {
    const what = historyWords[action];
    return what ? [{ at: at.toISOString(), what }] : [];
  });
  return [...(order.paidAt ? [{ at: order.paidAt.toISOString(), what: "Paid by the buyer" }] : []), ...steps];
}

/** Parcels as rows of their workshop's list, in the order given. */
export async function presentWorkshopParcels(
  parcels: readonly Parcel[],
  actor: Actor,
): Promise<WorkshopParcelSummary[]> {
  const [orders, lines] = await Promise.all([
    Order.findAll({ where: { id: { [Op.in]: parcels.map(({ orderId }) => orderId) } } }),
    OrderLine.findAll({ where: { parcelId: { [Op.in]: parcels.map(({ id }) => id) } }, ...inOrder }),
  ]);
  const orderOf = new Map(orders.map((order) => [order.id, order]));
  return parcels.flatMap((parcel) => {
    const order = orderOf.get(parcel.orderId);
    const own = lines.filter(({ parcelId }) => parcelId === parcel.id);
    return order ? [presentSummary(parcel, order, own, actor)] : [];
  });
}

/** A parcel as its workshop works on it. */
export async function presentWorkshopParcel(parcel: Parcel, actor: Actor): Promise<WorkshopParcel> {
  const order = await Order.findByPk(parcel.orderId, { rejectOnEmpty: true });
  const lines = await OrderLine.findAll({ where: { parcelId: parcel.id }, ...inOrder });
  const { partsMinor, shippingMinor, taxMinor, totalMinor, commissionMinor, carrier, trackingNumber } = parcel;
  return {
    ...presentSummary(parcel, order, lines, actor),
    shippingAddress: order.shippingAddress,
    lines: lines.map(presentLine),
    partsMinor,
    shippingMinor,
    taxMinor,
    totalMinor,
    commissionMinor,
    shareMinor: totalMinor - commissionMinor,
    currency: order.currency,
    carrier,
    trackingNumber,
    dispatchedAt: time(parcel.dispatchedAt),
    history: await readHistory(order, parcel.id),
  };
}
