import Stripe from "stripe";
import { audit } from "../audit";
import { inTransaction } from "../db/inTransaction";
import { bookTransaction } from "../ledger/bookTransaction";
import { paidBackEntries } from "../ledger/orderEntries";
import { Payment } from "../models/Payment";
import { User } from "../models/User";
import type { Services } from "../Services";
import { lockOrder } from "./closeUnpaidOrder";
import { queueMail } from "./queueMail";

/** Asks the provider to give the whole payment back. Asked again, it is the same refund. */
async function giveBack(services: Services, orderId: string, paymentIntentId: string): Promise<void> {
  try {
    await services.payments.refunds.create(
      { payment_intent: paymentIntentId, metadata: { orderId } },
      { idempotencyKey: `order:${orderId}:refund` },
    );
  } catch (error) {
    // The provider forgets keys after a day or so; the charge remembers.
    const done = error instanceof Stripe.errors.StripeError && error.code === "charge_already_refunded";
    if (!done) throw error;
  }
}

/**
 * Gives back the payment of an order that cannot be carried out, books it and has the buyer told.
 * Safe to repeat. Errors: the provider's, so that the job is tried again.
 */
export async function refundOrder(
  services: Services,
  orderId: string,
  reason: string,
  now = new Date(),
): Promise<void> {
  const payment = await Payment.findOne({ where: { orderId } });
  if (payment?.state !== "succeeded") return;
  if (!payment.paymentIntentId) throw new Error(`the payment of order ${orderId} has no intent to refund`);
  await giveBack(services, orderId, payment.paymentIntentId);

  await inTransaction(async (transaction) => {
    const order = await lockOrder(orderId, transaction);
    const current = await Payment.findOne({ where: { orderId }, transaction });
    if (!order || current?.state !== "succeeded") return;
    await current.update({ state: "refunded" }, { transaction });
    await order.update({ refundedMinor: order.totalMinor }, { transaction });
    await bookTransaction(
      { cause: `order-refunded:${orderId}`, orderId, at: now, entries: paidBackEntries(order) },
      transaction,
    );
    await audit(
      { actorId: null, action: "order-refunded", subjectType: "order", subjectId: orderId, detail: { reason } },
      transaction,
    );
    const buyer = await User.findByPk(order.buyerId, { transaction, rejectOnEmpty: true });
    await queueMail(
      {
        cause: `order-refunded:${orderId}:buyer`,
        template: "order-refunded",
        recipient: buyer.email,
        payload: { orderId, reason },
      },
      transaction,
    );
  });
}
