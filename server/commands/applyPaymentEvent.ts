import type { Transaction } from "sequelize";
import { z } from "zod";
import { audit } from "../audit";
import { inTransaction } from "../db/inTransaction";
import { Order } from "../models/Order";
import { PaymentEvent } from "../models/PaymentEvent";
import type { Services } from "../Services";
import { closeUnpaidOrder } from "./closeUnpaidOrder";
import { settlePayment } from "./settlePayment";

const Told = z.object({ data: z.object({ object: z.unknown() }) });
const ExpiredSession = z.object({ client_reference_id: z.uuid() });
const RefusedIntent = z.object({ metadata: z.object({ orderId: z.uuid() }) });

type Apply = (object: unknown, context: { services: Services; now: Date }, transaction: Transaction) => Promise<string>;

const settle: Apply = (object, { services, now }, transaction) =>
  settlePayment(object, { logger: services.logger, now }, transaction);

const expire: Apply = async (object, _context, transaction) => {
  const session = ExpiredSession.safeParse(object);
  if (!session.success) return "unreadable";
  const order = await closeUnpaidOrder(session.data.client_reference_id, { to: "expired", actorId: null }, transaction);
  return order?.state ?? "unknown-order";
};

/** A refused card ends nothing, since the buyer may try another; it is only remembered. */
const remember: Apply = async (object, _context, transaction) => {
  const intent = RefusedIntent.safeParse(object);
  if (!intent.success) return "unreadable";
  const { orderId } = intent.data.metadata;
  if (!(await Order.findByPk(orderId, { transaction }))) return "unknown-order";
  await audit({ actorId: null, action: "payment-failed", subjectType: "order", subjectId: orderId }, transaction);
  return "noted";
};

const applied: Record<string, Apply> = {
  "checkout.session.completed": settle,
  "checkout.session.async_payment_succeeded": settle,
  "checkout.session.expired": expire,
  "payment_intent.payment_failed": remember,
};

/** Whether an event of this type changes anything here. */
export const isApplied = (type: string): boolean => type in applied;

/** Applies an event that was kept, once, and writes down what came of it. */
export function applyPaymentEvent(services: Services, eventId: string, now = new Date()): Promise<void> {
  return inTransaction(async (transaction) => {
    const event = await PaymentEvent.findByPk(eventId, { transaction, lock: transaction.LOCK.UPDATE });
    const apply = event && applied[event.type];
    if (!apply || event.appliedAt) return;
    const { object } = Told.parse(event.payload).data;
    const outcome = await apply(object, { services, now }, transaction);
    await event.update({ appliedAt: now, outcome }, { transaction });
  });
}
