import type { Logger } from "pino";
import type { Transaction } from "sequelize";
import { orderMayBecome } from "#shared/domain/orderState";
import { audit } from "../audit";
import { addJob } from "../jobs/addJob";
import { bookTransaction } from "../ledger/bookTransaction";
import { owedBackEntries } from "../ledger/orderEntries";
import type { Order } from "../models/Order";
import { Payment } from "../models/Payment";
import { reserveStock, stockOf } from "../orders/stock";
import { SettledSession } from "../payments/SettledSession";
import { lockOrder } from "./closeUnpaidOrder";
import { markOrderPaid } from "./markOrderPaid";

export type PaymentOutcome =
  | "unreadable"
  | "unknown-order"
  | "not-paid-yet"
  | "already-applied"
  | "mismatch"
  | "paid"
  | "owed-back";

type Context = { logger: Logger; now: Date };

function differences(session: SettledSession, order: Order, payment: Payment): string[] {
  return [
    session.amount_total !== order.totalMinor && "amount",
    session.currency.toUpperCase() !== order.currency && "currency",
    payment.sessionId !== null && payment.sessionId !== session.id && "session",
  ].filter((difference) => typeof difference === "string");
}

/** Money for an order that cannot be carried out any more: owed back at once, and told. */
async function oweBack(order: Order, reason: "stock-gone" | "cancelled", now: Date, transaction: Transaction) {
  await bookTransaction(
    { cause: `order-paid-late:${order.id}`, orderId: order.id, at: now, entries: owedBackEntries(order) },
    transaction,
  );
  await audit(
    { actorId: null, action: "paid-too-late", subjectType: "order", subjectId: order.id, detail: { reason } },
    transaction,
  );
  await addJob("refundOrder", { orderId: order.id, reason }, transaction, { key: `refund:${order.id}` });
}

/**
 * Applies what the provider says of a checkout session, once: an order that waits becomes paid, with everything that
 * follows. However often it is told, in whatever order and however late, the state of the locked order decides.
 *
 * An order that expired before takes its stock again where it is still there; else the money goes back. A session of
 * another amount or currency never makes an order paid: it is written to the audit log and left to a person.
 */
export async function settlePayment(
  told: unknown,
  { logger, now }: Context,
  transaction: Transaction,
): Promise<PaymentOutcome> {
  const read = SettledSession.safeParse(told);
  if (!read.success) {
    logger.error({ err: read.error }, "a payment session could not be read");
    return "unreadable";
  }
  const session = read.data;
  const orderId = session.client_reference_id;
  const order = await lockOrder(orderId, transaction);
  const payment = order && (await Payment.findOne({ where: { orderId }, transaction }));
  if (!order || !payment) {
    logger.error({ orderId }, "a payment for an order that is not here");
    return "unknown-order";
  }
  if (session.payment_status !== "paid") return "not-paid-yet";
  if (payment.state === "succeeded" || payment.state === "refunded") return "already-applied";

  const wrong = differences(session, order, payment);
  if (wrong.length > 0) {
    logger.error({ orderId, wrong }, "a payment does not match its order");
    await audit(
      { actorId: null, action: "payment-mismatch", subjectType: "order", subjectId: orderId, detail: { wrong } },
      transaction,
    );
    return "mismatch";
  }

  const late = order.state !== "awaiting-payment";
  await payment.update(
    { state: "succeeded", sessionId: session.id, paymentIntentId: session.payment_intent },
    { transaction },
  );
  if (!orderMayBecome(order.state, "paid")) {
    await oweBack(order, "cancelled", now, transaction);
    return "owed-back";
  }
  const pieces = await stockOf(orderId, transaction);
  if (late && !(await reserveStock(pieces, transaction))) {
    await oweBack(order, "stock-gone", now, transaction);
    return "owed-back";
  }
  await markOrderPaid(order, pieces, now, transaction);
  return "paid";
}
