import { inTransaction } from "../db/inTransaction";
import { addJob } from "../jobs/addJob";
import { Order } from "../models/Order";
import { Payment } from "../models/Payment";
import { expiryKey } from "../orders/holdLife";
import { endPaymentPage } from "../payments/endPaymentPage";
import type { Services } from "../Services";
import { closeUnpaidOrder } from "./closeUnpaidOrder";
import { settlePayment } from "./settlePayment";

/**
 * Ends the hold of an order that still waits for payment: closes its payment page first, so that it cannot be paid
 * afterwards, then lets go of its stock. Where the buyer had paid already, the order is paid.
 * Safe to repeat. Errors: the provider's, so that the job is tried again.
 */
export async function expireOrder(services: Services, orderId: string, now = new Date()): Promise<void> {
  const order = await Order.findByPk(orderId);
  if (order?.state !== "awaiting-payment") return;
  if (order.holdUntil && order.holdUntil > now) {
    // The queue's clock runs before ours: once more, when the time has come.
    const again = { runAt: order.holdUntil, key: expiryKey(orderId) };
    return inTransaction((transaction) => addJob("expireOrder", { orderId }, transaction, again));
  }
  const payment = await Payment.findOne({ where: { orderId }, rejectOnEmpty: true });
  // A page that we never learned of was due to close before the hold ends, at the provider's own clock.
  const paid = payment.sessionId ? await endPaymentPage(services.payments, payment.sessionId) : null;
  await inTransaction(async (transaction) => {
    if (paid) await settlePayment(paid, { logger: services.logger, now }, transaction);
    await closeUnpaidOrder(orderId, { to: "expired", actorId: null }, transaction);
  });
}
