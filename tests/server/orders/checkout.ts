import { randomUUID } from "node:crypto";
import { Logger, runOnce } from "graphile-worker";
import { expect } from "vitest";
import { tasksOf } from "#server/jobs/tasks";
import type { Order } from "#server/models/Order";
import { Payment } from "#server/models/Payment";
import type { User } from "#server/models/User";
import type { Address, PlaceOrder } from "#shared/schemas/order";
import { buildUser, testPassword } from "#tests/support/factories";
import type { TestSite } from "#tests/support/testSite";
import { type Visitor, visitor } from "#tests/support/visitor";

export const homeAddress: Address = {
  name: "Ada Example",
  line1: "1 Workbench Row",
  line2: "",
  postcode: "00010",
  town: "Testby",
  region: "",
  country: "DE",
};

export type Buyer = { user: User; me: Visitor };

/** Somebody with an account, signed in. */
export async function signedInBuyer(site: TestSite, given: Parameters<typeof buildUser>[0] = {}): Promise<Buyer> {
  const user = await buildUser(given);
  const me = await visitor(site);
  await me.signIn(user.email, testPassword);
  return { user, me };
}

export async function fill(me: Visitor, parts: readonly { id: string }[], quantity = 1): Promise<void> {
  for (const { id } of parts) await me.put(`/basket/lines/${id}`, { quantity }).expect(200);
}

/** What a checkout page would send now, for what it was shown. */
export async function checkoutInput(me: Visitor, given: Partial<PlaceOrder> = {}): Promise<PlaceOrder> {
  const country = given.shippingAddress?.country ?? homeAddress.country;
  const basket = await me.get(`/basket?shipTo=${country}`).expect(200);
  return {
    shippingAddress: homeAddress,
    billingAddress: null,
    expectedTotalMinor: basket.body.totalMinor,
    currency: "EUR",
    checkoutKey: randomUUID(),
    ...given,
  };
}

export async function checkOut(me: Visitor, given: Partial<PlaceOrder> = {}) {
  return me.post("/orders", await checkoutInput(me, given));
}

/** A buyer with an order of these parts that waits for payment. */
export async function waitingOrder(site: TestSite, parts: readonly { id: string }[], quantity = 1) {
  const buyer = await signedInBuyer(site);
  await fill(buyer.me, parts, quantity);
  const res = await checkOut(buyer.me);
  if (res.status !== 201) throw new Error(`checkout answered ${res.status}: ${res.text}`);
  const orderId: string = res.body.orderId;
  return { ...buyer, orderId, sessionId: await sessionOf(orderId) };
}

export async function sessionOf(orderId: string): Promise<string> {
  const payment = await Payment.findOne({ where: { orderId }, rejectOnEmpty: true });
  return payment.sessionId ?? "";
}

/**
 * Does something whose call to the provider is carried out there while its answer is lost: the connection is cut after
 * the work, and the client's own two further tries fail. `on` is the call: to make a payment page, unless given.
 */
export async function loseTheAnswer<Answer>(
  { stripe: { control } }: TestSite,
  act: () => PromiseLike<Answer>,
  on = "POST /v1/checkout/sessions",
): Promise<Answer> {
  control.trouble({ kind: "hold", on });
  control.trouble({ kind: "cut-after-commit", on });
  const answer = Promise.resolve(act());
  // Held, it is past the check for failures, which then meet the tries that follow alone.
  await expect.poll(() => control.heldRequests()).toBe(1);
  control.trouble({ kind: "fail", times: 2, on });
  control.releaseRequests();
  return answer;
}

/** Works through every job that is due, and those that they make, and comes back. */
export async function runJobs({ services }: TestSite): Promise<void> {
  await runOnce({
    pgPool: services.pool,
    taskList: tasksOf(services),
    noHandleSignals: true,
    logger: new Logger(() => () => undefined),
  });
}

/** The buyer pays on the provider's page, its events arrive and are applied. */
export async function payAndApply(site: TestSite, sessionId: string): Promise<void> {
  await site.stripe.control.pay(sessionId);
  await site.stripe.control.settled();
  await runJobs(site);
}

export const at = (order: Pick<Order, "createdAt">, minutes: number) =>
  new Date(order.createdAt.getTime() + minutes * 60_000);
