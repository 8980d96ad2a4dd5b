import { describe, expect, it } from "vitest";
import { readPlainNumber } from "../../../client/features/gauges/readPlainNumber";

describe("readPlainNumber", () => {
  it.each([
    ["3.5", 3.5],
    ["3,5", 3.5],
    [" -2 ", -2],
    ["\u22122", -2],
    [".5", 0.5],
    ["7.", 7],
  ])("reads %j", (text, value) => {
    expect(readPlainNumber(text)).toBe(value);
  });

  it.each(["", "-", ".", "1e5", "1,234.5", "0x10", "NaN", "Infinity", "3 %", "9".repeat(400)])("refuses %j", (text) => {
    expect(readPlainNumber(text)).toBeNull();
  });
});
