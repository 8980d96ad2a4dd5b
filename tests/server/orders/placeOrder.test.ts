import { randomUUID } from "node:crypto";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { inTransaction } from "#server/db/inTransaction";
import { AuditEntry } from "#server/models/AuditEntry";
import { Order } from "#server/models/Order";
import { OrderLine } from "#server/models/OrderLine";
import { Parcel } from "#server/models/Parcel";
import type { Part } from "#server/models/Part";
import { Payment } from "#server/models/Payment";
import { SavedAddress } from "#server/models/SavedAddress";
import { TaxRegistration } from "#server/models/TaxRegistration";
import { buildPart, buildWorkshop } from "#tests/support/factories";
import { startTestSite, type TestSite } from "#tests/support/testSite";
import { checkOut, checkoutInput, fill, homeAddress, signedInBuyer, waitingOrder } from "./checkout";

let site: TestSite;
beforeAll(async () => {
  site = await startTestSite();
});
afterAll(() => site.close());

const reserved = async (part: Part) => (await part.reload()).stockReserved;

describe("placing an order", () => {
  it("holds the stock, writes what was bought, and gives one page for every workshop", async () => {
    const taxed = await buildWorkshop({ tax: { DE: 1900 } });
    const [a, b] = [await buildPart({ workshopId: taxed.id, madeToSize: true }), await buildPart({ priceMinor: 999 })];
    const { user, me } = await signedInBuyer(site);
    await me.put(`/basket/lines/${a.id}`, { quantity: 2, forNeed: "idler" }).expect(200);
    await fill(me, [b]);
    const res = await checkOut(me);
    expect(res.status).toBe(201);

    const order = await Order.findByPk(res.body.orderId, { rejectOnEmpty: true });
    expect(order).toMatchObject({
      buyerId: user.id,
      state: "awaiting-payment",
      partsMinor: 4999,
      shippingMinor: 1300,
      taxMinor: 750,
      totalMinor: 6299,
      billingAddress: homeAddress,
    });
    expect(res.body.number).toBe(order.number);
    expect(order.holdUntil?.getTime()).toBeGreaterThan(Date.now() + 34 * 60_000);
    expect(await reserved(a)).toBe(2);
    expect(a.stockOnHand).toBe(10);

    const parcels = await Parcel.findAll({ where: { orderId: order.id } });
    expect(parcels.map(({ state }) => state)).toEqual(["to-accept", "to-accept"]);
    const parcel = parcels.find(({ workshopId }) => workshopId === taxed.id)!;
    expect(parcel).toMatchObject({
      commissionMinor: 320,
      taxRateBasisPoints: 1900,
      trader: { legalName: taxed.legalName },
    });
    const line = await OrderLine.findOne({ where: { parcelId: parcel.id }, rejectOnEmpty: true });
    expect(line).toMatchObject({ quantity: 2, forNeed: "idler", madeToSize: true, holdsStock: true, lineMinor: 4000 });
    expect(line.listing.dimensions.outsideDiameter?.nominalMm).toBe(44);

    const payment = await Payment.findOne({ where: { orderId: order.id }, rejectOnEmpty: true });
    expect(payment).toMatchObject({ state: "open", url: res.body.paymentUrl, amountMinor: 6299 });
    const session = await site.services.payments.checkout.sessions.retrieve(payment.sessionId!);
    expect(session).toMatchObject({
      amount_total: 6299,
      currency: "eur",
      client_reference_id: order.id,
      metadata: { orderId: order.id },
      customer_email: user.email,
      success_url: `${site.url}/orders/${order.id}?paid=1`,
      cancel_url: `${site.url}/orders/${order.id}?left=1`,
    });
    expect(session.expires_at * 1000).toBeLessThan(order.holdUntil!.getTime());
    const items = await site.services.payments.checkout.sessions.listLineItems(session.id);
    expect(items.data.map(({ amount_total }) => amount_total).sort((x, y) => x - y)).toEqual([600, 700, 999, 4000]);

    expect((await me.get("/basket")).body.count).toBe(3);
    expect(await SavedAddress.count({ where: { userId: user.id } })).toBe(1);
    expect(await AuditEntry.count({ where: { subjectId: order.id, action: "order-placed", actorId: user.id } })).toBe(
      1,
    );
  });

  it("gives the same order and page for the same key, also when it is sent twice at once", async () => {
    const part = await buildPart();
    const { user, me } = await signedInBuyer(site);
    await fill(me, [part]);
    const input = await checkoutInput(me);
    const both = await Promise.all([me.post("/orders", input), me.post("/orders", input)]);
    const again = await me.post("/orders", input);
    expect([...both, again].map(({ status }) => status)).toEqual([201, 201, 201]);
    expect(new Set([...both, again].map(({ text }) => text)).size).toBe(1);
    expect(await Order.count({ where: { buyerId: user.id } })).toBe(1);
    expect(await reserved(part)).toBe(1);
  });

  it("lets two buyers use the same key without meeting", async () => {
    const part = await buildPart();
    const checkoutKey = randomUUID();
    const orders = [];
    for (let i = 0; i < 2; i++) {
      const { me } = await signedInBuyer(site);
      await fill(me, [part]);
      orders.push((await checkOut(me, { checkoutKey })).body.orderId);
    }
    expect(new Set(orders).size).toBe(2);
  });

  it("keeps an address once, however often it is used", async () => {
    const part = await buildPart();
    const { user, me } = await signedInBuyer(site);
    await fill(me, [part]);
    await checkOut(me);
    await checkOut(me, { shippingAddress: { ...homeAddress, name: "Somebody else" } });
    await checkOut(me);
    expect(await SavedAddress.count({ where: { userId: user.id } })).toBe(2);
  });

  it("keeps the listing as it was bought when it changes later", async () => {
    const part = await buildPart({ title: "As bought" });
    const { me, orderId } = await waitingOrder(site, [part]);
    await part.update({ title: "Changed", priceMinor: 1 });
    const res = await me.get(`/orders/${orderId}`).expect(200);
    expect(res.body.parcels[0].lines[0]).toMatchObject({ title: "As bought", unitMinor: 2000 });
  });

  it("takes an address in any writing, and text that is none", async () => {
    const part = await buildPart();
    const { me } = await signedInBuyer(site);
    await fill(me, [part]);
    const res = await checkOut(me, { shippingAddress: { ...homeAddress, name: "Ærøskøbing 東京 \ud800" } });
    expect(res.status).toBe(201);
    const order = await me.get(`/orders/${res.body.orderId}`).expect(200);
    expect(order.body.shippingAddress.name).toBe("Ærøskøbing 東京 \ufffd");
  });

  it("tells a buyer whose own unpaid order holds the last one", async () => {
    const part = await buildPart({ stockOnHand: 1 });
    const { me } = await waitingOrder(site, [part]);
    const [line] = (await me.get("/basket").expect(200)).body.parcels[0].lines;
    expect(line.problem).toContain("Your own unpaid order holds 1 of it");
    const other = (await signedInBuyer(site)).me;
    await fill(other, [part]);
    expect((await other.get("/basket")).body.parcels[0].lines[0].problem).toContain("None is left");
  });

  it("takes no stock of what is made when ordered", async () => {
    const part = await buildPart({ offerType: "made-to-order", leadDays: 10 });
    const { orderId } = await waitingOrder(site, [part], 20);
    const parcel = await Parcel.findOne({ where: { orderId }, rejectOnEmpty: true });
    expect(parcel.leavesInDays).toBe(13);
    expect(await reserved(part)).toBe(0);
  });
});

describe("the database", () => {
  it("refuses to hold more than there is, whatever the program does", async () => {
    const part = await buildPart({ stockOnHand: 1 });
    await expect(part.update({ stockReserved: 2 })).rejects.toThrow(/parts_reserved_within_stock/);
  });

  it("refuses an order whose total is not the sum", async () => {
    const { orderId } = await waitingOrder(site, [await buildPart()]);
    await expect(
      inTransaction((transaction) => Order.update({ totalMinor: 1 }, { where: { id: orderId }, transaction })),
    ).rejects.toThrow(/orders_tax_contained|orders_total_is_sum/);
  });

  it("keeps a tax registration of a workshop once a country", async () => {
    const workshop = await buildWorkshop({ tax: { DE: 1900 } });
    await expect(
      TaxRegistration.create({ workshopId: workshop.id, country: "DE", number: "X", rateBasisPoints: 700 }),
    ).rejects.toThrow();
  });
});
