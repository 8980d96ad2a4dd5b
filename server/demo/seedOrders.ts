import type { Transaction } from "sequelize";
import type { OrderState } from "#shared/domain/orderState";
import type { ParcelState } from "#shared/domain/parcelState";
import type { Address } from "#shared/schemas/order";
import { audit } from "../audit";
import { readBasket } from "../basket/readBasket";
import { writeOrder } from "../commands/writeOrder";
import { addJob } from "../jobs/addJob";
import { bookTransaction } from "../ledger/bookTransaction";
import { paidEntries } from "../ledger/orderEntries";
import { Basket } from "../models/Basket";
import { BasketLine } from "../models/BasketLine";
import { Order } from "../models/Order";
import { Parcel } from "../models/Parcel";
import { Part } from "../models/Part";
import { Payment } from "../models/Payment";
import { holdMs } from "../orders/holdLife";
import { releaseStock, reserveStock, takeStock } from "../orders/stock";
import { presentParts } from "../presenters/presentParts";
import { idOf, pick } from "./dice";
import { restorerNames, userId, workshopId } from "./seedPeople";
import { demoWorkshops } from "./workshopData";

const dayMs = 24 * 3_600_000;

type Plan = {
  buyer: number;
  daysAgo: number;
  state: OrderState;
  parcels: readonly ParcelState[];
  country: string;
  /** Its first parcel is of the workshop whose account is given out. */
  ofGivenWorkshop?: true;
};

/** One order of each sort that exists so far, many of them of the restorer or the workshop whose account is given out. */
const plans: readonly Plan[] = [
  { buyer: 0, daysAgo: 41, state: "closed", parcels: ["closed", "closed"], country: "DE" },
  { buyer: 0, daysAgo: 16, state: "paid", parcels: ["delivered", "dispatched"], country: "DE" },
  { buyer: 0, daysAgo: 9, state: "expired", parcels: ["cancelled"], country: "DE" },
  { buyer: 0, daysAgo: 6, state: "paid", parcels: ["in-work", "ready", "core-awaited"], country: "DE" },
  { buyer: 0, daysAgo: 3, state: "cancelled", parcels: ["cancelled", "cancelled"], country: "DE" },
  { buyer: 0, daysAgo: 1, state: "paid", parcels: ["to-accept", "to-accept"], country: "DE" },
  { buyer: 0, daysAgo: 0, state: "awaiting-payment", parcels: ["to-accept"], country: "DE" },
  { buyer: 1, daysAgo: 12, state: "paid", parcels: ["dispatched"], country: "NO" },
  { buyer: 2, daysAgo: 30, state: "closed", parcels: ["closed"], country: "US" },
  { buyer: 3, daysAgo: 2, state: "paid", parcels: ["to-accept", "in-work"], country: "NL" },
  { buyer: 4, daysAgo: 5, state: "paid", parcels: ["core-received"], country: "SE" },
  { buyer: 4, daysAgo: 0, state: "paid", parcels: ["to-accept"], country: "SE", ofGivenWorkshop: true },
  { buyer: 3, daysAgo: 1, state: "paid", parcels: ["to-accept", "to-accept"], country: "NL", ofGivenWorkshop: true },
  { buyer: 1, daysAgo: 7, state: "paid", parcels: ["core-awaited"], country: "NO", ofGivenWorkshop: true },
  { buyer: 0, daysAgo: 4, state: "paid", parcels: ["in-work"], country: "DE", ofGivenWorkshop: true },
  { buyer: 0, daysAgo: 1, state: "paid", parcels: ["ready", "in-work"], country: "DE", ofGivenWorkshop: true },
];

const places: Record<string, [string, string, string]> = {
  DE: ["Uferstraße 12", "20999", "Neuwarden"],
  NO: ["Bryggeveien 4", "5099", "Havnesund"],
  US: ["77 Alder Street", "55999", "Carrow Falls"],
  NL: ["Kadelaan 31", "9999 ZZ", "Osterwolde"],
  SE: ["Kvarngatan 8", "999 99", "Vassborg"],
};

function addressOf(name: string, country: string): Address {
  const [line1 = "", postcode = "", town = ""] = places[country] ?? [];
  return { name, line1, line2: "", postcode, town, region: "", country };
}

/** The first workshop's account is the one that is given out. */
const givenWorkshop = workshopId(demoWorkshops[0]?.slug ?? "");

/** One part for each parcel of a plan, each of another workshop, re-moulds where a core is spoken of. */
function partsFor(plan: Plan, n: number, parts: readonly Part[]): Part[] {
  const chosen: Part[] = [];
  for (const [index, state] of plan.parcels.entries()) {
    const remould = state.startsWith("core-");
    const open = parts.filter(
      (part) =>
        !chosen.some((one) => one.workshopId === part.workshopId) &&
        (!plan.ofGivenWorkshop || index > 0 || part.workshopId === givenWorkshop) &&
        (remould ? part.offerType === "re-mould" : part.offerType === "stocked" && (part.stockOnHand ?? 0) > 3),
    );
    chosen.push(pick(open, "order", n, index));
  }
  return chosen;
}

/** Parcels that have left; the demo's leave on the last day. */
const gone: readonly ParcelState[] = ["dispatched", "delivered", "closed"];

const history: Partial<Record<OrderState, string>> = {
  paid: "order-paid",
  closed: "order-paid",
  expired: "order-expired",
  cancelled: "order-cancelled",
};

async function settle(
  order: Order,
  plan: Plan,
  at: Date,
  bought: readonly Part[],
  transaction: Transaction,
): Promise<void> {
  const pieces = bought
    .filter(({ stockOnHand }) => stockOnHand !== null)
    .map(({ id }) => ({ partId: id, quantity: 1 }));
  if (!(await reserveStock(pieces, transaction))) throw new Error("the demo sells only what is there");
  const parcels = await Parcel.findAll({ where: { orderId: order.id }, transaction });
  for (const parcel of parcels) {
    const index = bought.findIndex(({ workshopId }) => workshopId === parcel.workshopId);
    const paid = plan.state === "paid" || plan.state === "closed";
    const leavesBy = paid ? new Date(at.getTime() + parcel.leavesInDays * dayMs) : null;
    const state = plan.parcels[index] ?? "to-accept";
    const dispatchedAt = gone.includes(state) ? leavesBy : null;
    await parcel.update({ state, leavesBy, dispatchedAt }, { transaction });
  }
  if (plan.state === "awaiting-payment") {
    await addJob("expireOrder", { orderId: order.id }, transaction, {
      runAt: new Date(at.getTime() + holdMs),
      key: `expire:${order.id}`,
    });
    return;
  }
  if (plan.state === "paid" || plan.state === "closed") {
    await takeStock(pieces, transaction);
    await bookTransaction(
      { cause: `order-paid:${order.id}`, orderId: order.id, at, entries: paidEntries(order, parcels) },
      transaction,
    );
    await order.update({ state: plan.state, paidAt: at, holdUntil: null }, { transaction });
  } else {
    await releaseStock(pieces, transaction);
    await order.update({ state: plan.state, holdUntil: null }, { transaction });
  }
  const over = plan.state === "expired" || plan.state === "cancelled";
  await Payment.update({ state: over ? "expired" : "succeeded" }, { where: { orderId: order.id }, transaction });
}

async function seedOrder(
  plan: Plan,
  n: number,
  parts: readonly Part[],
  transaction: Transaction,
  now: Date,
): Promise<void> {
  const name = restorerNames[plan.buyer] ?? "";
  const buyerId = userId(name);
  const at = new Date(now.getTime() - plan.daysAgo * dayMs);
  const bought = partsFor(plan, n, parts);
  const listings = await presentParts(bought.map(({ id }) => id));
  const basket = await Basket.create({}, { transaction });
  await BasketLine.bulkCreate(
    bought.map(({ id }, index) => ({
      basketId: basket.id,
      partId: id,
      quantity: 1,
      addedAt: new Date(at.getTime() + index),
    })),
    { transaction },
  );
  const priced = await readBasket(basket.id, plan.country, { transaction });
  const problem = priced.parcels
    .flatMap(({ problem, lines }) => [problem, ...lines.map((line) => line.problem?.words)])
    .find(Boolean);
  if (problem) throw new Error(`demo order ${n}: ${problem}`);
  const input = {
    shippingAddress: addressOf(name, plan.country),
    billingAddress: null,
    expectedTotalMinor: priced.totalMinor,
    currency: "EUR",
    checkoutKey: idOf("checkout", n),
  };
  const order = await writeOrder(
    { buyerId, input, basket: priced, listings, holdUntil: new Date(at.getTime() + holdMs) },
    transaction,
  );
  await audit({ actorId: buyerId, action: "order-placed", subjectType: "order", subjectId: order.id, at }, transaction);
  await settle(order, plan, at, bought, transaction);
  const action = history[plan.state];
  if (action) await audit({ actorId: null, action, subjectType: "order", subjectId: order.id, at }, transaction);
  await Order.update({ createdAt: at }, { where: { id: order.id }, transaction, silent: true });
  await basket.destroy({ transaction });
}

/** Orders in several states. The parts must be committed: listings are read as any reader reads them. */
export async function seedOrders(transaction: Transaction, now: Date): Promise<void> {
  const parts = await Part.findAll({ order: [["id", "ASC"]], transaction });
  for (const [n, plan] of plans.entries()) await seedOrder(plan, n, parts, transaction, now);
}
