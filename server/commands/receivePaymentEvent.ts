import { QueryTypes } from "sequelize";
import type Stripe from "stripe";
import { database, inTransaction } from "../db/inTransaction";
import { addJob } from "../jobs/addJob";
import { isApplied } from "./applyPaymentEvent";

/**
 * Keeps an event of the provider, once however often it is delivered, with the job that applies it in the same
 * transaction. An event whose type means nothing here is kept and marked so.
 */
export function receivePaymentEvent(event: Stripe.Event): Promise<void> {
  const known = isApplied(event.type);
  return inTransaction(async (transaction) => {
    const [kept] = await database().query<{ appliedAt: Date | null }>(
      `INSERT INTO payment_events (id, type, payload, occurred_at, applied_at, outcome)
       VALUES ($id, $type, $payload::jsonb, to_timestamp($created), CASE WHEN $known THEN NULL ELSE now() END,
         CASE WHEN $known THEN NULL ELSE 'ignored' END)
       ON CONFLICT (id) DO UPDATE SET deliveries = payment_events.deliveries + 1
       RETURNING applied_at AS "appliedAt"`,
      {
        bind: { id: event.id, type: event.type, payload: JSON.stringify(event), created: event.created, known },
        type: QueryTypes.SELECT,
        transaction,
      },
    );
    if (known && !kept?.appliedAt) {
      await addJob("applyPaymentEvent", { eventId: event.id }, transaction, { key: `payment-event:${event.id}` });
    }
  });
}
