import { Op, type Transaction } from "sequelize";
import { audit } from "../audit";
import { database } from "../db/inTransaction";
import { bookTransaction } from "../ledger/bookTransaction";
import { paidEntries } from "../ledger/orderEntries";
import type { Order } from "../models/Order";
import { Parcel } from "../models/Parcel";
import { User } from "../models/User";
import { Workshop } from "../models/Workshop";
import { type Pieces, takeStock } from "../orders/stock";
import { queueMail } from "./queueMail";

const dayMs = 24 * 3_600_000;

/** Takes what was bought out of the buyer's basket; what was added on top meanwhile stays. */
async function emptyBasket({ id, buyerId }: Order, transaction: Transaction): Promise<void> {
  const bought = `(SELECT b.id AS basket_id, l.part_id, l.quantity FROM baskets b, parcels p, order_lines l
    WHERE b.user_id = $buyerId AND p.order_id = $id AND l.parcel_id = p.id) bought
    WHERE t.basket_id = bought.basket_id AND t.part_id = bought.part_id`;
  const bind = { id, buyerId };
  const whole = `DELETE FROM basket_lines t USING ${bought} AND t.quantity <= bought.quantity`;
  const rest = `UPDATE basket_lines t SET quantity = t.quantity - bought.quantity FROM ${bought}`;
  await database().query(whole, { bind, transaction });
  await database().query(rest, { bind, transaction });
}

/** The buyer's confirmation, and to each workshop its part of the order. */
async function queueOrderMails(order: Order, parcels: readonly Parcel[], transaction: Transaction): Promise<void> {
  const buyer = await User.findByPk(order.buyerId, { transaction, rejectOnEmpty: true });
  await queueMail(
    {
      cause: `order-confirmation:${order.id}:buyer`,
      template: "order-confirmation",
      recipient: buyer.email,
      payload: { orderId: order.id },
    },
    transaction,
  );
  const workshops = await Workshop.findAll({
    where: { id: { [Op.in]: parcels.map(({ workshopId }) => workshopId) } },
    transaction,
  });
  const emailOf = new Map(workshops.map(({ id, contactEmail }) => [id, contactEmail]));
  for (const { id, workshopId } of parcels) {
    await queueMail(
      {
        cause: `new-order:${id}:workshop`,
        template: "new-order",
        recipient: emailOf.get(workshopId) ?? "",
        payload: { parcelId: id },
      },
      transaction,
    );
  }
}

/** An order whose money is there and whose stock is held becomes paid, with everything that follows from it. */
export async function markOrderPaid(
  order: Order,
  pieces: readonly Pieces[],
  now: Date,
  transaction: Transaction,
): Promise<void> {
  await takeStock(pieces, transaction);
  await order.update({ state: "paid", paidAt: now, holdUntil: null }, { transaction });
  const parcels = await Parcel.findAll({ where: { orderId: order.id }, order: [["id", "ASC"]], transaction });
  for (const parcel of parcels) {
    await parcel.update({ leavesBy: new Date(now.getTime() + parcel.leavesInDays * dayMs) }, { transaction });
  }
  await bookTransaction(
    { cause: `order-paid:${order.id}`, orderId: order.id, at: now, entries: paidEntries(order, parcels) },
    transaction,
  );
  await emptyBasket(order, transaction);
  await audit({ actorId: null, action: "order-paid", subjectType: "order", subjectId: order.id }, transaction);
  await queueOrderMails(order, parcels, transaction);
}
