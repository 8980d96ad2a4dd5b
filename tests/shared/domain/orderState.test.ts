import { describe, expect, it } from "vitest";
import { orderMayBecome, orderStates, orderStateWords } from "#shared/domain/orderState";
import { parcelMayBecome, parcelStates } from "#shared/domain/parcelState";

/** Every move there is; any pair that is not listed is refused. */
const orderMoves = [
  "draft>awaiting-payment",
  "draft>cancelled",
  "awaiting-payment>paid",
  "awaiting-payment>expired",
  "awaiting-payment>cancelled",
  "expired>paid",
  "paid>closed",
];
const parcelMoves = [
  "to-accept>core-awaited",
  "to-accept>in-work",
  "to-accept>declined",
  "to-accept>cancelled",
  "core-awaited>core-received",
  "core-awaited>cancelled",
  "core-received>core-refused",
  "core-received>in-work",
  "core-received>cancelled",
  "core-refused>core-awaited",
  "core-refused>cancelled",
  "in-work>ready",
  "in-work>cancelled",
  "ready>dispatched",
  "ready>cancelled",
  "dispatched>delivered",
  "delivered>closed",
];

function movesOf<State extends string>(states: readonly State[], may: (from: State, to: State) => boolean): string[] {
  return states.flatMap((from) => states.filter((to) => may(from, to)).map((to) => `${from}>${to}`));
}

describe("states", () => {
  it("lets an order make these moves and no others", () => {
    expect(movesOf(orderStates, orderMayBecome).sort()).toEqual([...orderMoves].sort());
  });

  it("lets a parcel make these moves and no others", () => {
    expect(movesOf(parcelStates, parcelMayBecome).sort()).toEqual([...parcelMoves].sort());
  });

  it("has words for every state of an order", () => {
    expect(orderStates.map((state) => orderStateWords[state]).every((words) => words.length > 0)).toBe(true);
  });
});
