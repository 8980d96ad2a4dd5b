import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { balances } from "#server/ledger/balances";
import { Mail } from "#server/models/Mail";
import { Order } from "#server/models/Order";
import { buildPart } from "#tests/support/factories";
import { startTestSite, type TestSite } from "#tests/support/testSite";
import { type Buyer, checkoutInput, fill, runJobs, sessionOf, signedInBuyer } from "./checkout";

let site: TestSite;
beforeAll(async () => {
  site = await startTestSite();
});
afterAll(() => site.close());

const buyers = 40;
const stock = 7;

describe("forty buyers at once for the last seven", () => {
  it("sells seven, tells thirty-three so, and leaves nothing else behind", async () => {
    const part = await buildPart({ stockOnHand: stock });
    const ready: (Buyer & { input: object })[] = [];
    for (let n = 0; n < buyers; n++) {
      const buyer = await signedInBuyer(site);
      await fill(buyer.me, [part]);
      ready.push({ ...buyer, input: await checkoutInput(buyer.me) });
    }

    const answers = await Promise.all(ready.map(({ me, input }) => me.post("/orders", input)));
    const placed = answers.filter(({ status }) => status === 201);
    const told = answers.filter(({ status }) => status === 409);
    expect([placed.length, told.length]).toEqual([stock, buyers - stock]);
    for (const { body } of told) {
      expect(body.type).toBe("/problems/out-of-stock");
      expect(body.errors[0].pointer).toBe(`#/lines/${part.id}`);
    }
    expect(await part.reload()).toMatchObject({ stockOnHand: stock, stockReserved: stock });

    for (const { body } of placed) await site.stripe.control.pay(await sessionOf(body.orderId));
    await site.stripe.control.settled();
    await runJobs(site);

    expect(await part.reload()).toMatchObject({ stockOnHand: 0, stockReserved: 0 });
    const states = await Order.findAll({ attributes: ["state"] });
    expect(states.map(({ state }) => state)).toEqual(Array(stock).fill("paid"));
    expect(await Mail.count({ where: { template: "order-confirmation" } })).toBe(stock);
    expect(await Mail.count({ where: { template: "new-order" } })).toBe(stock);
    const accounts = await balances();
    expect(accounts.reduce((sum, { amountMinor }) => sum + amountMinor, 0)).toBe(0);
    expect(accounts.find(({ account }) => account === "provider-balance")?.amountMinor).toBe(stock * 2600);
  }, 120_000);
});
