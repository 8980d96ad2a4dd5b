import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { parseSize } from "#shared/domain/parseSize";
import { withUnit } from "../../../client/lib/withUnit";

const turned = (outsideDiameter: string, from: "mm" | "in", to: "mm" | "in") =>
  withUnit(new URLSearchParams({ outsideDiameter }), from, to).get("outsideDiameter") ?? "";

describe("withUnit", () => {
  it.each([
    ["44.1", "mm", "in", "44.1 mm"],
    ["44.1 mm", "mm", "in", "44.1 mm"],
    ["1.736", "in", "mm", "1.736 in"],
    ["1-47/64", "mm", "in", "1-47/64"],
    ["44.1; 44.0 mm; 1-47/64", "mm", "in", "44.1 mm; 44.0 mm; 1-47/64"],
    ["44.1;", "mm", "in", "44.1 mm"],
    ["532 ± 8", "mm", "in", "532 ± 8 mm"],
    ["532 mm ± 8", "mm", "in", "532 mm ± 8"],
    ["20.9 +/- 0.3", "in", "mm", "20.9 +/- 0.3 in"],
    ["about so", "mm", "in", "about so"],
  ] as const)("writes the unit out where a meaning hangs on it: %s", (text, from, to, expected) => {
    expect(turned(text, from, to)).toBe(expected);
  });

  it("keeps every other word of the address, and names the unit", () => {
    const next = withUnit(new URLSearchParams("kind=flat-belt&width=5&family=lean&sort=price"), "mm", "in");
    expect(next.toString()).toBe("kind=flat-belt&width=5+mm&family=lean&sort=price&unit=in");
  });

  it("never changes what a size means", () => {
    const number = fc.integer({ min: 100, max: 199 }).map((tenths) => (tenths / 10).toFixed(1));
    const reading = fc.tuple(number, fc.constantFrom("", " mm", " in")).map((parts) => parts.join(""));
    const text = fc.oneof(
      fc.array(reading, { minLength: 1, maxLength: 4 }).map((readings) => readings.join("; ")),
      fc.tuple(reading, fc.constantFrom("0.2", "0.2 mm", "0.02 in")).map((parts) => parts.join(" ± ")),
    );
    const meaning = (words: string, unit: "mm" | "in") => {
      const size = parseSize(words, unit);
      return size.ok && { ...size, echo: "" };
    };
    fc.assert(
      fc.property(text, fc.constantFrom("mm" as const, "in" as const), (words, from) => {
        const to = from === "mm" ? "in" : "mm";
        if (meaning(words, from)) expect(meaning(turned(words, from, to), to)).toEqual(meaning(words, from));
      }),
      { numRuns: 200, seed: 254 },
    );
  });
});
