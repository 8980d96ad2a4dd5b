import type { Transaction } from "sequelize";
import { countryName } from "#shared/domain/countries";
import { formatMoney } from "#shared/domain/money";
import type { PlaceOrder } from "#shared/schemas/order";
import type { PartSummary } from "#shared/schemas/part";
import { audit } from "../audit";
import { takeBasket } from "../basket/basketOf";
import { marketCurrency } from "../basket/marketCurrency";
import { type ReadBasket, readBasket } from "../basket/readBasket";
import { inTransaction } from "../db/inTransaction";
import { AppError } from "../errors/AppError";
import { addJob } from "../jobs/addJob";
import { Order } from "../models/Order";
import { User } from "../models/User";
import { expiryKey, holdMs, mostWaitingOrders } from "../orders/holdLife";
import { reserveStock } from "../orders/stock";
import type { Actor } from "../policies/Actor";
import { saveAddress } from "./saveAddress";
import { writeOrder } from "./writeOrder";

const mostLines = 50;

function refuseWhatCannotBeBought({ parcels }: ReadBasket): void {
  const unshipped = parcels.flatMap(({ problem }) => problem ?? []);
  if (unshipped.length > 0) {
    const errors = unshipped.map((detail) => ({ pointer: "#/shippingAddress/country", detail }));
    throw new AppError("not-shipped-there", unshipped.join(". "), { errors });
  }
  const lines = parcels.flatMap((parcel) => parcel.lines);
  const wrong = lines.flatMap(({ part, problem }) => (problem ? [{ part, problem }] : []));
  if (wrong.length > 0) {
    const short = wrong.some(({ problem }) => problem.name === "short" || problem.name === "not-sold");
    const errors = wrong.map(({ part, problem }) => ({ pointer: `#/lines/${part.id}`, detail: problem.words }));
    const detail = wrong.map(({ part, problem }) => `${part.title}: ${problem.words}`).join(". ");
    throw new AppError(short ? "out-of-stock" : "wrong-state", detail, { errors });
  }
  if (lines.length > mostLines) {
    throw new AppError(
      "wrong-state",
      `One order holds ${mostLines} different parts: take out ${lines.length - mostLines}`,
    );
  }
}

function refuseAnotherTotal(basket: ReadBasket, { expectedTotalMinor, currency, shippingAddress }: PlaceOrder): void {
  if (basket.totalMinor === expectedTotalMinor && currency === marketCurrency) return;
  const money = (minor: number) => formatMoney(minor, marketCurrency);
  throw new AppError(
    "total-changed",
    `It is now ${money(basket.totalMinor)} (parts ${money(basket.partsMinor)}, postage to ${countryName(
      shippingAddress.country,
    )} ${money(basket.shippingMinor)}); you were shown ${formatMoney(expectedTotalMinor, currency)}.`,
    { errors: [{ pointer: "#/expectedTotalMinor", detail: `It is now ${money(basket.totalMinor)}` }] },
  );
}

async function refuseHoarding(buyerId: string, transaction: Transaction): Promise<void> {
  if ((await Order.count({ where: { buyerId, state: "awaiting-payment" }, transaction })) < mostWaitingOrders) return;
  throw new AppError(
    "wrong-state",
    `${mostWaitingOrders} of your orders wait for payment already: pay or cancel one of them first`,
  );
}

/**
 * Turns the basket into an order that waits for payment, with its stock held. The same checkout key gives the order it
 * gave before.
 *
 * `listings` are the parts as read just before; price, currency and stock are those of the locked rows.
 */
export function startOrder(
  actor: Actor,
  input: PlaceOrder,
  listings: Map<string, PartSummary>,
  now: Date,
): Promise<Order> {
  return inTransaction(async (transaction) => {
    const buyer = await User.findByPk(actor.id, { transaction, rejectOnEmpty: true });
    if (!buyer.emailVerifiedAt) {
      throw new AppError("verify-first", "Open the link in the mail we sent you, so that order mail reaches you");
    }
    // The lock on the basket makes checkouts of one buyer wait for each other: the second finds the first one's order.
    const { id: basketId } = await takeBasket({ userId: actor.id }, transaction);
    const known = await Order.findOne({ where: { buyerId: actor.id, checkoutKey: input.checkoutKey }, transaction });
    if (known) return known;
    await refuseHoarding(actor.id, transaction);

    const basket = await readBasket(basketId, input.shippingAddress.country, {
      buyerId: actor.id,
      transaction,
      lock: true,
    });
    if (basket.parcels.length === 0) throw new AppError("empty-basket");
    refuseWhatCannotBeBought(basket);
    refuseAnotherTotal(basket, input);

    const lines = basket.parcels.flatMap((parcel) => parcel.lines);
    const pieces = lines
      .filter(({ part }) => part.stockOnHand !== null)
      .map(({ part, quantity }) => ({ partId: part.id, quantity }));
    if (!(await reserveStock(pieces, transaction))) throw new AppError("out-of-stock");

    const holdUntil = new Date(now.getTime() + holdMs);
    const order = await writeOrder({ buyerId: actor.id, input, basket, listings, holdUntil }, transaction);
    await saveAddress(actor.id, input.shippingAddress, transaction);
    await audit({ actorId: actor.id, action: "order-placed", subjectType: "order", subjectId: order.id }, transaction);
    await addJob("expireOrder", { orderId: order.id }, transaction, { runAt: holdUntil, key: expiryKey(order.id) });
    return order;
  });
}
