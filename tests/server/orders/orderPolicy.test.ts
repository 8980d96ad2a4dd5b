import { describe, expect, it } from "vitest";
import type { Actor } from "#server/policies/Actor";
import { orderPolicy } from "#server/policies/orderPolicy";
import { type OrderState, orderStates } from "#shared/domain/orderState";

const buyer: Actor = { id: "buyer", role: "restorer", workshopId: null };
const stranger: Actor = { id: "stranger", role: "restorer", workshopId: null };
const seller: Actor = { id: "seller", role: "workshop", workshopId: "w1" };
const otherSeller: Actor = { id: "other", role: "workshop", workshopId: "w2" };
const noWorkshop: Actor = { id: "applied", role: "workshop", workshopId: null };
const administrator: Actor = { id: "admin", role: "administrator", workshopId: null };
const sellerWhoBuys: Actor = { id: "buyer", role: "workshop", workshopId: "w1" };

const order = (state: OrderState) => ({ buyerId: "buyer", state, workshopIds: ["w1"] });
const told = ["paid", "closed"] as const;

/** For each: the states in which they may. */
const all = [...orderStates];
const table: [string, Actor, Record<keyof typeof orderPolicy, readonly OrderState[]>][] = [
  ["the buyer", buyer, { read: all, readWhole: all, pay: all, cancel: all }],
  ["another restorer", stranger, { read: [], readWhole: [], pay: [], cancel: [] }],
  ["a workshop with a parcel in it", seller, { read: told, readWhole: [], pay: [], cancel: [] }],
  ["another workshop", otherSeller, { read: [], readWhole: [], pay: [], cancel: [] }],
  ["a workshop account without a workshop", noWorkshop, { read: [], readWhole: [], pay: [], cancel: [] }],
  ["an administrator", administrator, { read: all, readWhole: all, pay: [], cancel: [] }],
  ["a workshop that buys of itself", sellerWhoBuys, { read: all, readWhole: all, pay: all, cancel: all }],
];

describe("orderPolicy", () => {
  it.each(table)("lets %s do what is theirs", (_who, actor, allowed) => {
    for (const [verb, states] of Object.entries(allowed) as [keyof typeof orderPolicy, OrderState[]][]) {
      expect([verb, all.filter((state) => orderPolicy[verb](actor, order(state)))]).toEqual([verb, [...states]]);
    }
  });
});
