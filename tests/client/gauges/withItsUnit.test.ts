import { describe, expect, it } from "vitest";
import { withItsUnit } from "../../../client/features/gauges/withItsUnit";

describe("withItsUnit", () => {
  it.each([
    ["44.1", "mm", "44.1 mm"],
    ["1.736", "in", "1.736 in"],
    ["523", "mm", "523 mm"],
    ["44,1 mm", "mm", "44,1 mm"],
    ["1.736 in", "mm", "1.736 in"],
    ["3/16", "mm", "3/16"],
    ["3/7", "in", "3/7 in"],
    [" 12 ", "mm", "12 mm"],
    ["nonsense", "mm", "nonsense"],
    ["", "mm", ""],
  ] as const)("%j in %s is %j", (text, unit, written) => expect(withItsUnit(text, unit)).toBe(written));
});
