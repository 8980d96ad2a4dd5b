import { describe, expect, it } from "vitest";
import { needParams, readNeed } from "../../../client/lib/needParams";

const again = (address: string) =>
  needParams(readNeed(new URLSearchParams(address), { shipTo: "DE", unit: "mm" })).toString();

describe("a need in the address", () => {
  it.each([
    "kind=idler-wheel&outsideDiameter=44.1%3B+44.0%3B+44.2&bore=4+mm&condition=glazed&shipTo=NO",
    "kind=flat-belt&insideCircumference=532+%C2%B1+8+mm&condition=missing&shipTo=DE",
    "kind=flat-belt&insideCircumference=532+%2B%2F-+8+mm&width=5.0&condition=slack&shipTo=DE",
  ])("is read and written to the same: %s", (address) => expect(again(address)).toBe(address));

  it("keeps what was worked out of a part that is gone, and leaves out what cannot have been read from it", () => {
    expect(again("kind=flat-belt&insideCircumference=532+%C2%B1+8+mm&width=5.0&condition=melted")).toBe(
      "kind=flat-belt&insideCircumference=532+%C2%B1+8+mm&condition=melted&shipTo=DE",
    );
    expect(again("kind=flat-belt&insideCircumference=532&condition=missing&q=belt")).toBe(
      "condition=missing&shipTo=DE&q=belt",
    );
  });
});
