import { describe, expect, it } from "vitest";
import { askable, needParams, readNeed } from "../../../client/lib/needParams";

const read = (address: string) => readNeed(new URLSearchParams(address), { shipTo: "DE", unit: "mm" });
const again = (address: string) => needParams(read(address)).toString();

describe("a need in the address", () => {
  it.each([
    "kind=idler-wheel&outsideDiameter=44.1%3B+44.0%3B+44.2&bore=4+mm&condition=glazed&shipTo=NO",
    "kind=flat-belt&insideCircumference=532+%C2%B1+8+mm&condition=missing&shipTo=DE",
    "kind=flat-belt&insideCircumference=532+%2B%2F-+8+mm&width=5.0&condition=slack&shipTo=DE",
  ])("is read and written to the same: %s", (address) => expect(again(address)).toBe(address));

  it.each([
    [
      "kind=flat-belt&insideCircumference=532+%C2%B1+8+mm&width=5.0&condition=melted",
      "kind=flat-belt&insideCircumference=532+%C2%B1+8+mm&condition=melted&shipTo=DE",
    ],
    ["kind=flat-belt&insideCircumference=532&condition=missing&q=belt", "condition=missing&shipTo=DE&q=belt"],
    [
      "kind=flat-belt&insideCircumference=532&condition=slack",
      "kind=flat-belt&insideCircumference=532&condition=slack&shipTo=DE",
    ],
  ])("is asked without what cannot have been read from a part that is gone: %s", (address, asked) => {
    expect(needParams(askable(read(address))).toString()).toBe(asked);
  });
});
