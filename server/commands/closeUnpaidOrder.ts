import type { Transaction } from "sequelize";
import { orderMayBecome } from "#shared/domain/orderState";
import { audit } from "../audit";
import { AuditEntry } from "../models/AuditEntry";
import { Order } from "../models/Order";
import { Payment } from "../models/Payment";
import { releaseStock, stockOf } from "../orders/stock";

/** Locks an order, as everything does that changes its state. */
export const lockOrder = (orderId: string, transaction: Transaction): Promise<Order | null> =>
  Order.findByPk(orderId, { transaction, lock: transaction.LOCK.UPDATE });

/**
 * Ends an order that nobody paid, and lets go of its stock; an order in another state is left as it is.
 * Where its buyer asked to cancel, it is cancelled, whoever comes first to say that the payment page is closed.
 */
export async function closeUnpaidOrder(
  orderId: string,
  { to, actorId, detail }: { to: "expired" | "cancelled"; actorId: string | null; detail?: Record<string, unknown> },
  transaction: Transaction,
): Promise<Order | null> {
  const order = await lockOrder(orderId, transaction);
  if (!order) return null;
  const asked = await AuditEntry.findOne({
    where: { subjectType: "order", subjectId: orderId, action: "cancel-asked" },
    transaction,
  });
  const state = asked ? "cancelled" : to;
  if (!orderMayBecome(order.state, state)) return order;

  await releaseStock(await stockOf(orderId, transaction), transaction);
  await order.update({ state, holdUntil: null }, { transaction });
  await Payment.update({ state: "expired" }, { where: { orderId }, transaction });
  await audit(
    {
      actorId: asked?.actorId ?? actorId,
      action: `order-${state}`,
      subjectType: "order",
      subjectId: orderId,
      detail: detail ?? {},
    },
    transaction,
  );
  return order;
}
