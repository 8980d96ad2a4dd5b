import { randomUUID } from "node:crypto";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { Parcel } from "#server/models/Parcel";
import { homeAddress, payAndApply, signedInBuyer, waitingOrder } from "#tests/server/orders/checkout";
import { buildPart, buildUser, buildWorkshop, testPassword } from "#tests/support/factories";
import { startTestSite, type TestSite } from "#tests/support/testSite";
import { visitor } from "#tests/support/visitor";
import { ownerOf, paidParcel } from "./parcels";

let site: TestSite;
beforeAll(async () => {
  site = await startTestSite();
});
afterAll(() => site.close());

const idsOf = (items: { id: string }[]) => items.map(({ id }) => id);

describe("reading a parcel", () => {
  it("gives its workshop what to pack, where it goes, by when, its share and what may be done", async () => {
    const { owner, parcel, part } = await paidParcel(site, { title: "Ground wheel" });
    const { body } = await owner.get(`/workshop/parcels/${parcel.id}`).expect(200);
    expect(body).toMatchObject({
      id: parcel.id,
      state: "to-accept",
      recipient: homeAddress.name,
      countryName: "Germany",
      shippingAddress: homeAddress,
      pieces: 1,
      titles: ["Ground wheel"],
      steps: ["accept"],
      // 20.00 and 6.00 of postage, less 8 % of 20.00.
      totalMinor: 2600,
      commissionMinor: 160,
      shareMinor: 2440,
      dispatchedAt: null,
      carrier: null,
    });
    expect(body.lines).toMatchObject([{ partId: part.id, quantity: 1, offerType: "stocked", kind: "idler-wheel" }]);
    expect(body.lines[0].dimensions.outsideDiameter).toMatchObject({ nominalMm: 44, plusMinusMm: 0.1 });
    expect(body.leavesBy).toBe((await parcel.reload()).leavesBy?.toISOString());
    expect(body.history.map(({ what }: { what: string }) => what)).toEqual(["Paid by the buyer"]);
  });

  it("shows neither the other parcels of the order nor their sums", async () => {
    const [a, b] = [await buildPart(), await buildPart({ title: "Of somebody else", priceMinor: 7777 })];
    const { orderId, sessionId } = await waitingOrder(site, [a, b]);
    await payAndApply(site, sessionId);
    const own = await Parcel.findOne({ where: { orderId, workshopId: a.workshopId }, rejectOnEmpty: true });
    const res = await (await ownerOf(site, a)).get(`/workshop/parcels/${own.id}`).expect(200);
    expect(res.text).not.toContain("Of somebody else");
    expect(res.text).not.toContain("7777");
    await (await ownerOf(site, b)).get(`/workshop/parcels/${own.id}`).expect(404);
  });

  it("is for its workshop alone, and only once it is paid for", async () => {
    const { parcel, buyer } = await paidParcel(site);
    const other = await ownerOf(site, await buildPart());
    await other.get(`/workshop/parcels/${parcel.id}`).expect(404);
    await other.get(`/workshop/parcels/${randomUUID()}`).expect(404);
    await buyer.me.get(`/workshop/parcels/${parcel.id}`).expect(403);
    await (await visitor(site)).get(`/workshop/parcels/${parcel.id}`).expect(401);
    const admin = await visitor(site);
    await admin.signIn((await buildUser({ role: "administrator" })).email, testPassword);
    await admin.get(`/workshop/parcels/${parcel.id}`).expect(403);

    const part = await buildPart();
    const { orderId } = await waitingOrder(site, [part]);
    const unpaid = await Parcel.findOne({ where: { orderId }, rejectOnEmpty: true });
    const owner = await ownerOf(site, part);
    await owner.get(`/workshop/parcels/${unpaid.id}`).expect(404);
    expect((await owner.get("/workshop/parcels").expect(200)).body).toEqual({
      items: [],
      counts: {},
      nextCursor: null,
    });
  });
});

describe("the list of parcels", () => {
  /** Parcels of one workshop that must leave so many hours after the first of December 2026. */
  async function parcelsLeaving(hours: readonly number[]) {
    const workshop = await buildWorkshop();
    const part = await buildPart({ workshopId: workshop.id, stockOnHand: 50 });
    const ids: string[] = [];
    for (const hour of hours) {
      const { orderId, sessionId } = await waitingOrder(site, [part]);
      await payAndApply(site, sessionId);
      const parcel = await Parcel.findOne({ where: { orderId }, rejectOnEmpty: true });
      await parcel.update({ leavesBy: new Date(Date.UTC(2026, 11, 1, hour)) });
      ids.push(parcel.id);
    }
    return { ids, owner: await ownerOf(site, part) };
  }

  it("goes by when each must leave, page by page, and holds no other workshop's", async () => {
    await paidParcel(site);
    const { ids, owner } = await parcelsLeaving([5, 1, 3]);
    const inTurn = [ids[1], ids[2], ids[0]];
    const first = (await owner.get("/workshop/parcels?limit=2").expect(200)).body;
    expect(idsOf(first.items)).toEqual(inTurn.slice(0, 2));
    expect(first.counts).toEqual({ "to-accept": 3 });
    const rest = (await owner.get(`/workshop/parcels?limit=2&cursor=${first.nextCursor}`).expect(200)).body;
    expect(idsOf(rest.items)).toEqual(inTurn.slice(2));
    expect(rest.nextCursor).toBeNull();
  });

  it("shows one state where asked to; what has left comes latest first", async () => {
    const { ids, owner } = await parcelsLeaving([1, 5, 3]);
    await Parcel.update({ state: "dispatched", dispatchedAt: new Date() }, { where: { id: [ids[0]!, ids[1]!] } });
    const open = (await owner.get("/workshop/parcels").expect(200)).body;
    expect(idsOf(open.items)).toEqual([ids[2]]);
    expect(open.counts).toEqual({ "to-accept": 1, dispatched: 2 });
    const left = (await owner.get("/workshop/parcels?state=dispatched&limit=1").expect(200)).body;
    expect(idsOf(left.items)).toEqual([ids[1]]);
    expect(left.items[0].steps).toEqual([]);
    const more = (await owner.get(`/workshop/parcels?state=dispatched&cursor=${left.nextCursor}`).expect(200)).body;
    expect(idsOf(more.items)).toEqual([ids[0]]);
  });

  it("refuses a state and a cursor that do not exist, visitors and restorers", async () => {
    const owner = await ownerOf(site, await buildPart());
    expect((await owner.get("/workshop/parcels?state=lost").expect(422)).body.errors[0].pointer).toBe("#/state");
    expect((await owner.get("/workshop/parcels?cursor=x").expect(422)).body.errors[0].pointer).toBe("#/cursor");
    await (await visitor(site)).get("/workshop/parcels").expect(401);
    await (await signedInBuyer(site)).me.get("/workshop/parcels").expect(403);
  });

  it("is empty for an account that has no workshop yet", async () => {
    const me = await visitor(site);
    await me.signIn((await buildUser({ role: "workshop" })).email, testPassword);
    expect((await me.get("/workshop/parcels").expect(200)).body.items).toEqual([]);
  });
});
