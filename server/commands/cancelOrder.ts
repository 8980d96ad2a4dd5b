import { orderMayBecome, orderStateWords } from "#shared/domain/orderState";
import { audit } from "../audit";
import { inTransaction } from "../db/inTransaction";
import { AppError } from "../errors/AppError";
import type { Order } from "../models/Order";
import { Payment } from "../models/Payment";
import { orderTarget } from "../orders/orderTarget";
import { endPaymentPage } from "../payments/endPaymentPage";
import type { Actor } from "../policies/Actor";
import { authorize } from "../policies/authorize";
import { orderPolicy } from "../policies/orderPolicy";
import type { Services } from "../Services";
import { closeUnpaidOrder, lockOrder } from "./closeUnpaidOrder";
import { openPaymentPage } from "./openPaymentPage";
import { settlePayment } from "./settlePayment";

const refusal = (order: Order) =>
  new AppError("wrong-state", `This order is ${orderStateWords[order.state]}: it cannot be cancelled here`);

/** The payment page of the order: the one kept, or where an earlier call was lost, the one that it made. */
async function sessionOf(services: Services, orderId: string, now: Date): Promise<string | null> {
  const { sessionId } = await Payment.findOne({ where: { orderId }, rejectOnEmpty: true });
  if (sessionId) return sessionId;
  return openPaymentPage(services, orderId, now).then(
    (page) => page.sessionId,
    (error: unknown) => {
      // The provider refused to make one, so there is none; the order was undone on the way.
      if (error instanceof AppError && error.problem === "wrong-state") return null;
      throw error;
    },
  );
}

/**
 * Cancels an order that waits for payment: closes its payment page at the provider, then lets go of its stock.
 * Errors: `wrong-state` where it does not wait any more, also where it is paid in the same moment;
 * `payment-unreachable` where the page could not be closed (nothing is changed then).
 */
export async function cancelOrder(services: Services, actor: Actor, orderId: string, now = new Date()): Promise<Order> {
  await inTransaction(async (transaction) => {
    const order = await lockOrder(orderId, transaction);
    authorize(orderPolicy, actor, "cancel", order && (await orderTarget(order, transaction)));
    if (!order || !orderMayBecome(order.state, "cancelled")) throw order ? refusal(order) : new AppError("not-found");
    await audit({ actorId: actor.id, action: "cancel-asked", subjectType: "order", subjectId: orderId }, transaction);
  });

  const sessionId = await sessionOf(services, orderId, now);
  const paid =
    sessionId &&
    (await endPaymentPage(services.payments, sessionId).catch((cause: unknown) => {
      throw new AppError("payment-unreachable", "The order is not cancelled yet: try again in a moment", { cause });
    }));
  const order = await inTransaction(async (transaction) => {
    if (paid) await settlePayment(paid, { logger: services.logger, now }, transaction);
    return closeUnpaidOrder(orderId, { to: "cancelled", actorId: actor.id }, transaction);
  });
  if (order?.state !== "cancelled") throw order ? refusal(order) : new AppError("not-found");
  return order;
}
