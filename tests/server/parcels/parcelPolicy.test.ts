import { describe, expect, it } from "vitest";
import type { Actor } from "#server/policies/Actor";
import { allowedSteps, parcelPolicy, sentBy } from "#server/policies/parcelPolicy";
import { orderStates } from "#shared/domain/orderState";
import { parcelStates } from "#shared/domain/parcelState";

const seller: Actor = { id: "seller", role: "workshop", workshopId: "w1" };
const others: [string, Actor][] = [
  ["another workshop", { id: "other", role: "workshop", workshopId: "w2" }],
  ["a workshop account without a workshop", { id: "applied", role: "workshop", workshopId: null }],
  ["the buyer", { id: "buyer", role: "restorer", workshopId: null }],
  ["an administrator", { id: "admin", role: "administrator", workshopId: null }],
];
const parcels = orderStates.flatMap((orderState) =>
  parcelStates.map((state) => ({ workshopId: "w1", orderState, state })),
);

describe("parcelPolicy", () => {
  it("lets a workshop read and take on its own parcels of paid orders alone", () => {
    for (const verb of ["read", "advance"] as const) {
      const states = new Set(parcels.filter((parcel) => parcelPolicy[verb](seller, parcel)).map((p) => p.orderState));
      expect([verb, [...states]]).toEqual([verb, ["paid", "closed"]]);
    }
  });

  it("names the step that is due, and none before the order is paid", () => {
    const steps = (orderState: "paid" | "expired") =>
      parcelStates.map((state) => allowedSteps(seller, { workshopId: "w1", orderState, state }).join());
    expect(steps("paid")).toEqual(["accept", "core-received", "start", "", "ready", "dispatch", "", "", "", "", ""]);
    expect(steps("expired").filter(Boolean)).toEqual([]);
  });

  it.each(others)("lets %s do nothing", (_who, actor) => {
    expect(parcels.filter((parcel) => parcelPolicy.read(actor, parcel))).toEqual([]);
    expect(parcels.flatMap((parcel) => allowedSteps(actor, parcel))).toEqual([]);
  });

  it("lists for nobody what they may not read", () => {
    for (const [, actor] of [["the seller", seller] as const, ...others]) {
      const listed = sentBy(actor).workshopId.includes("w1");
      expect([actor.id, listed]).toEqual([actor.id, parcels.some((parcel) => parcelPolicy.read(actor, parcel))]);
    }
  });
});
