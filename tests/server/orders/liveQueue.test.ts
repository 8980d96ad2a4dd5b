import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { Order } from "#server/models/Order";
import { buildPart } from "#tests/support/factories";
import { startTestSite, type TestSite } from "#tests/support/testSite";
import { waitingOrder } from "./checkout";

let site: TestSite;
beforeAll(async () => {
  site = await startTestSite({ worker: true });
});
afterAll(() => site.close());

describe("the running queue", () => {
  it("brings a payment to the order, the buyer and both workshops by itself", async () => {
    const [a, b] = [await buildPart(), await buildPart()];
    const { user, orderId, sessionId } = await waitingOrder(site, [a, b]);
    await site.stripe.control.pay(sessionId);

    const confirmation = await site.mail.waitFor(({ envelope }) => envelope.to.includes(user.email), 15_000);
    const order = await Order.findByPk(orderId, { rejectOnEmpty: true });
    expect([order.state, confirmation.subject]).toEqual(["paid", `Order ${order.number} is paid`]);
    const isNewOrder = ({ subject }: { subject: string }) => subject === `New order ${order.number}`;
    const first = await site.mail.waitFor(isNewOrder, 15_000);
    const second = await site.mail.waitFor((mail) => isNewOrder(mail) && mail.id !== first.id, 15_000);
    expect(first.envelope.to).not.toEqual(second.envelope.to);
    expect((await a.reload()).stockOnHand).toBe(9);
  }, 60_000);
});
