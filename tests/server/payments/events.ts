import { randomUUID } from "node:crypto";
import request from "supertest";
import { expect } from "vitest";
import { AuditEntry } from "#server/models/AuditEntry";
import { LedgerTransaction } from "#server/models/LedgerTransaction";
import { Mail } from "#server/models/Mail";
import { Order } from "#server/models/Order";
import { Parcel } from "#server/models/Parcel";
import { PaymentEvent } from "#server/models/PaymentEvent";
import { runJobs } from "#tests/server/orders/checkout";
import type { TestSite } from "#tests/support/testSite";

export const webhook = "/api/v1/webhooks/stripe";
export const orderNow = (id: string) => Order.findByPk(id, { rejectOnEmpty: true });

/** An event as the provider would send it, signed with the secret of the site. */
export function signed(
  site: TestSite,
  event: object,
  { secret, ageSeconds = 0 }: { secret?: string; ageSeconds?: number } = {},
) {
  const payload = JSON.stringify(event);
  const header = site.services.payments.webhooks.generateTestHeaderString({
    payload,
    secret: secret ?? site.services.config.stripe.webhookSecret,
    timestamp: Math.floor(Date.now() / 1000) - ageSeconds,
  });
  return request(site.url).post(webhook).set("stripe-signature", header).type("application/json").send(payload);
}

export const eventOf = (type: string, object: object, id = `evt_${randomUUID()}`) => ({
  id,
  object: "event",
  type,
  created: Math.floor(Date.now() / 1000),
  data: { object },
});

export const completed = (orderId: string, sessionId: string, given: object = {}) => ({
  id: sessionId,
  client_reference_id: orderId,
  amount_total: 2600,
  currency: "eur",
  payment_status: "paid",
  payment_intent: `pi_${randomUUID()}`,
  ...given,
});

/** Sends an event, has it applied, and gives what came of it. */
export async function tell(site: TestSite, event: { id: string }) {
  await signed(site, event).expect(200);
  await runJobs(site);
  return (await PaymentEvent.findByPk(event.id, { rejectOnEmpty: true })).outcome;
}

/** Everything that one paid order leaves behind, and nothing twice. */
export async function expectPaidOnce(orderId: string) {
  const order = await orderNow(orderId);
  expect(order).toMatchObject({ state: "paid", refundedMinor: 0 });
  const parcels = await Parcel.findAll({ where: { orderId } });
  expect(await Mail.count({ where: { cause: `order-confirmation:${orderId}:buyer` } })).toBe(1);
  for (const { id } of parcels) expect(await Mail.count({ where: { cause: `new-order:${id}:workshop` } })).toBe(1);
  expect(await LedgerTransaction.count({ where: { orderId } })).toBe(1);
  expect(await AuditEntry.count({ where: { subjectId: orderId, action: "order-paid" } })).toBe(1);
}
