import { Op } from "sequelize";
import { orderStateWords } from "#shared/domain/orderState";
import { inTransaction } from "../db/inTransaction";
import { AppError } from "../errors/AppError";
import { Order } from "../models/Order";
import { OrderLine } from "../models/OrderLine";
import { Parcel } from "../models/Parcel";
import { Payment } from "../models/Payment";
import { User } from "../models/User";
import { checkoutPage } from "../payments/checkoutPage";
import { endPaymentPage } from "../payments/endPaymentPage";
import { refusedForGood } from "../payments/providerFailure";
import type { Services } from "../Services";
import { closeUnpaidOrder, lockOrder } from "./closeUnpaidOrder";

export type PaymentPage = { sessionId: string; url: string };

const notWaiting = (order: Order) => new AppError("wrong-state", `This order is ${orderStateWords[order.state]}`);

async function readPage(orderId: string) {
  const order = await Order.findByPk(orderId, { rejectOnEmpty: true });
  const inOrder = { order: [["id", "ASC"]] as [string, string][] };
  const parcels = await Parcel.findAll({ where: { orderId }, ...inOrder });
  const [lines, payment, buyer] = await Promise.all([
    OrderLine.findAll({ where: { parcelId: { [Op.in]: parcels.map(({ id }) => id) } }, ...inOrder }),
    Payment.findOne({ where: { orderId }, rejectOnEmpty: true }),
    User.findByPk(order.buyerId, { rejectOnEmpty: true }),
  ]);
  return { order, parcels, lines, payment, email: buyer.email };
}

const refusals: Record<string, string> = {
  amount_too_small: "The total is too small to be paid by card",
  amount_too_large: "The total is too large to be paid at once",
};

/** Undoes an order that the provider will not take: nothing exists there under its key. */
async function giveUp(orderId: string, code: string | undefined, cause: unknown): Promise<never> {
  await inTransaction((transaction) =>
    closeUnpaidOrder(orderId, { to: "cancelled", actorId: null, detail: { refused: code ?? "unknown" } }, transaction),
  );
  const why = refusals[code ?? ""] ?? "The payment service refused this order";
  throw new AppError("wrong-state", `${why}. Nothing was charged and nothing is held; your basket is as it was.`, {
    cause,
  });
}

/** Writes down where the order is paid; tells in which state it is now. */
function keepPage(orderId: string, { sessionId, url }: PaymentPage): Promise<Order> {
  return inTransaction(async (transaction) => {
    const order = await lockOrder(orderId, transaction);
    if (!order) throw new AppError("not-found");
    const payment = await Payment.findOne({ where: { orderId }, transaction, rejectOnEmpty: true });
    // A fast buyer's payment may have been told to us before this.
    if (payment.state === "starting") await payment.update({ sessionId, url, state: "open" }, { transaction });
    else if (!payment.sessionId) await payment.update({ sessionId, url }, { transaction });
    return order;
  });
}

/**
 * The page on which an order is paid, made at the provider where there is none yet.
 *
 * Asking again, also at the same moment or after the provider did not answer, gives the same page: the provider is
 * asked with the order's own key.
 * Errors: `payment-unreachable` where it does not answer (the order keeps waiting), `wrong-state` where the order does
 * not wait for payment or the provider refuses it; a refused order is cancelled.
 */
export async function openPaymentPage(services: Services, orderId: string, now: Date): Promise<PaymentPage> {
  const { payments, config, logger } = services;
  const read = await readPage(orderId);
  const { order, payment } = read;
  if (order.state !== "awaiting-payment") throw notWaiting(order);
  if (order.holdUntil && order.holdUntil <= now)
    throw new AppError("wrong-state", "The time to pay this order is over");
  if (payment.sessionId && payment.url) return { sessionId: payment.sessionId, url: payment.url };

  const session = await payments.checkout.sessions
    .create(checkoutPage(read, config.publicUrl), { idempotencyKey: payment.idempotencyKey })
    .catch((cause: unknown) => {
      logger.warn({ err: cause, orderId }, "the payment page was not made");
      if (refusedForGood(cause)) return giveUp(orderId, cause.code, cause);
      throw new AppError("payment-unreachable", "Your order is kept: try again in a moment. Nothing was charged.", {
        cause,
      });
    });
  if (!session.url) throw new Error(`the payment page of order ${orderId} has no address`);

  const page = { sessionId: session.id, url: session.url };
  const after = await keepPage(orderId, page);
  if (after.state === "awaiting-payment") return page;
  // Cancelled or expired while the page was being made: nobody must pay on it.
  if (after.state !== "paid") await endPaymentPage(payments, page.sessionId);
  throw notWaiting(after);
}
