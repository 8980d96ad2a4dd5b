import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { inTransaction } from "#server/db/inTransaction";
import { AuditEntry } from "#server/models/AuditEntry";
import { Mail } from "#server/models/Mail";
import type { Parcel } from "#server/models/Parcel";
import { type ParcelState, parcelStates } from "#shared/domain/parcelState";
import { nextStep, parcelSteps } from "#shared/domain/parcelSteps";
import { runJobs } from "#tests/server/orders/checkout";
import { buildPart } from "#tests/support/factories";
import { startTestSite, type TestSite } from "#tests/support/testSite";
import { visitor } from "#tests/support/visitor";
import { ownerOf, paidParcel } from "./parcels";

let site: TestSite;
beforeAll(async () => {
  site = await startTestSite();
});
afterAll(() => site.close());

const trail = async ({ id }: Parcel) =>
  (await AuditEntry.findAll({ where: { subjectType: "parcel", subjectId: id }, order: [["id", "ASC"]] })).map(
    ({ action }) => action,
  );
const at = (parcel: Parcel, step: string) => `/workshop/parcels/${parcel.id}/${step}`;
const waitingForLocks = async () => {
  const { rows } = await site.services.pool.query(
    "SELECT count(*)::integer AS n FROM pg_stat_activity WHERE datname = current_database() AND wait_event_type = 'Lock'",
  );
  return rows[0].n;
};
const mailsTo = (address: string) => site.mail.messages().filter(({ envelope }) => envelope.to.includes(address));

describe("the steps of a parcel", () => {
  it("lead a stocked part from accepted to dispatched, each with its actor in the audit log", async () => {
    const { owner, parcel } = await paidParcel(site);
    const states: string[] = [];
    for (const step of ["accept", "ready", "dispatch"]) {
      states.push((await owner.post(at(parcel, step)).expect(200)).body.state);
    }
    expect(states).toEqual(["in-work", "ready", "dispatched"]);
    expect(await trail(parcel)).toEqual(["parcel-in-work", "parcel-ready", "parcel-dispatched"]);
    const [entry] = await AuditEntry.findAll({ where: { subjectId: parcel.id } });
    const session = await owner.get("/auth/session");
    expect(entry?.actorId).toBe(session.body.user.id);
    expect(entry?.detail).toEqual({ from: "to-accept" });
    const { body } = await owner.get(`/workshop/parcels/${parcel.id}`);
    expect(body.history.map(({ what }: { what: string }) => what)).toEqual([
      "Paid by the buyer",
      "Work on it began",
      "Packed and ready",
      "Dispatched; the buyer was told",
    ]);
  });

  it("lead a re-mould by way of its core, whose arrival starts the time until it leaves", async () => {
    const { owner, parcel } = await paidParcel(site, { offerType: "re-mould" });
    expect((await owner.post(at(parcel, "accept")).expect(200)).body.state).toBe("core-awaited");
    await parcel.update({ leavesBy: new Date(0) });
    const came = (await owner.post(at(parcel, "core-received")).expect(200)).body;
    expect([came.state, came.steps]).toEqual(["core-received", ["start"]]);
    const { at: arrived } = await AuditEntry.findOne({
      where: { subjectId: parcel.id, action: "parcel-core-received" },
      rejectOnEmpty: true,
    });
    expect(Date.parse(came.leavesBy)).toBe(arrived.getTime() + parcel.leavesInDays * 24 * 3_600_000);
    expect((await owner.post(at(parcel, "start")).expect(200)).body.state).toBe("in-work");
  });

  it.each(parcelSteps)("let nobody else take the step %s", async (step) => {
    const { parcel, buyer } = await paidParcel(site);
    await (await ownerOf(site, await buildPart())).post(at(parcel, step)).expect(404);
    await buyer.me.post(at(parcel, step)).expect(403);
    await (await visitor(site)).post(at(parcel, step)).expect(401);
    expect((await parcel.reload()).state).toBe("to-accept");
    expect(await trail(parcel)).toEqual([]);
  });

  it.each(parcelSteps)("are refused in words where %s is not due", async (step) => {
    const { owner, parcel } = await paidParcel(site, { offerType: "re-mould" });
    // The state that the step leads to is not wrong: it is the same call once more.
    const reached: Record<string, ParcelState> = {
      accept: "core-awaited",
      "core-received": "core-received",
      start: "in-work",
      ready: "ready",
      dispatch: "dispatched",
    };
    const wrong = parcelStates.filter((state) => nextStep(state) !== step && state !== reached[step]);
    expect(wrong).toHaveLength(parcelStates.length - 2);
    for (const state of wrong) {
      await parcel.update({ state, dispatchedAt: new Date() });
      const res = await owner.post(at(parcel, step));
      expect([state, res.status, res.body.type]).toEqual([state, 409, "/problems/wrong-state"]);
      expect(res.body.detail).toMatch(/^This parcel is .+: it cannot be .+ now$/);
      expect((await parcel.reload()).state).toBe(state);
    }
    expect(await trail(parcel)).toEqual([]);
  });

  it("are taken once by two that come at the same moment", async () => {
    const { owner, parcel } = await paidParcel(site);
    const sending = await inTransaction(async (transaction) => {
      await parcel.reload({ transaction, lock: transaction.LOCK.UPDATE });
      const both = [owner.post(at(parcel, "accept")), owner.post(at(parcel, "accept"))].map((call) => call.then());
      // Both wait for the parcel before either writes.
      await expect.poll(waitingForLocks).toBe(2);
      return both;
    });
    const both = await Promise.all(sending);
    expect(both.map(({ status, body }) => [status, body.state])).toEqual([
      [200, "in-work"],
      [200, "in-work"],
    ]);
    expect(await trail(parcel)).toEqual(["parcel-in-work"]);
  });
});

describe("dispatching", () => {
  const sent = { carrier: " Harbour Post ", trackingNumber: "HP 12 <b>" };

  it("keeps carrier, number and time, and shows them to the buyer", async () => {
    const { owner, parcel, buyer } = await paidParcel(site, { state: "ready" });
    const { body } = await owner.post(at(parcel, "dispatch"), sent).expect(200);
    expect(body).toMatchObject({
      state: "dispatched",
      carrier: "Harbour Post",
      trackingNumber: "HP 12 <b>",
      steps: [],
    });
    const order = (await buyer.me.get(`/orders/${buyer.orderId}`).expect(200)).body;
    expect(order.parcels[0]).toMatchObject({
      state: "dispatched",
      carrier: "Harbour Post",
      trackingNumber: "HP 12 <b>",
      dispatchedAt: body.dispatchedAt,
    });
    const [entry] = await AuditEntry.findAll({ where: { subjectId: parcel.id } });
    expect(entry?.detail).toEqual({ from: "ready", carrier: "Harbour Post", trackingNumber: "HP 12 <b>" });
  });

  it("tells the buyer in one mail, with the parts drawn, whatever is sent twice", async () => {
    const { owner, parcel, buyer } = await paidParcel(site, { state: "ready", title: "Ground wheel" });
    await runJobs(site);
    site.mail.clear();
    await Promise.all([owner.post(at(parcel, "dispatch"), sent), owner.post(at(parcel, "dispatch"), sent)]);
    await owner.post(at(parcel, "dispatch"), sent).expect(200);
    await runJobs(site);
    const [mail, ...more] = mailsTo(buyer.user.email);
    expect(more).toEqual([]);
    const row = await Mail.findOne({ where: { cause: `parcel-dispatched:${parcel.id}:buyer` }, rejectOnEmpty: true });
    expect(mail).toMatchObject({ messageId: `${row.id}@127.0.0.1`, arrivals: 1 });
    expect(mail?.subject).toMatch(/^Order \d\d-\d+: Works \d+ has sent its parcel$/);
    for (const words of ["Harbour Post", "HP 12 <b>", "Ground wheel", "44.0 ±0.1", "1 Workbench Row"]) {
      expect(mail?.text).toContain(words);
    }
    expect(mail?.html).toContain("HP 12 &lt;b&gt;");
    expect(mail?.links.filter((link) => link.startsWith(site.url))).toEqual([`${site.url}/orders/${buyer.orderId}`]);
    // The mark and the part.
    expect(mail?.attachments).toHaveLength(2);
    expect(await trail(parcel)).toEqual(["parcel-dispatched"]);
  });

  it("says nothing of a carrier that was not named", async () => {
    const { owner, parcel, buyer } = await paidParcel(site, { state: "ready" });
    const { body } = await owner.post(at(parcel, "dispatch"), { carrier: " " }).expect(200);
    expect([body.carrier, body.trackingNumber]).toEqual([null, null]);
    await runJobs(site);
    const mail = mailsTo(buyer.user.email).find(({ subject }) => subject?.includes("has sent"));
    expect(mail?.text).toContain("Left on");
    expect(mail?.text).not.toContain("Carried by");
  });

  it("does not change what was said once it has left", async () => {
    const { owner, parcel } = await paidParcel(site, { state: "ready" });
    await owner.post(at(parcel, "dispatch"), sent).expect(200);
    await owner.post(at(parcel, "dispatch"), { ...sent, trackingNumber: "another" }).expect(409);
    expect((await parcel.reload()).trackingNumber).toBe("HP 12 <b>");
  });

  it.each([
    [{ carrier: "x".repeat(81) }, "#/carrier"],
    [{ trackingNumber: "one\ntwo" }, "#/trackingNumber"],
    [{ trackingNumber: 7 }, "#/trackingNumber"],
    [{ weight: "1 kg" }, "#/weight"],
  ])("refuses %j", async (body, pointer) => {
    const { owner, parcel } = await paidParcel(site, { state: "ready" });
    const res = await owner.post(at(parcel, "dispatch"), body).expect(422);
    expect(res.body.errors[0].pointer).toBe(pointer);
    expect((await parcel.reload()).state).toBe("ready");
  });
});
