import { describe, expect, it } from "vitest";
import { formatLength, parseLength } from "#shared/domain/length";

describe("millimetres to inches and back", () => {
  /** A step that meets every last digit and shares no factor with 10 or 254. */
  const stride = 1_237;

  it("loses nothing of the micrometres in which sizes are kept", () => {
    // Five decimals of an inch are a quarter of a micrometre.
    for (let micrometres = 1; micrometres <= 10_000_000; micrometres += stride) {
      const inches = formatLength(micrometres / 1000, "in", { decimals: 5 });
      const read = parseLength(inches, "mm");
      expect(read.ok && Math.round(read.mm * 1000)).toBe(micrometres);
    }
  });
  it("loses no more than the last bit of a number that is divided by 25.4", () => {
    for (let micrometres = 1; micrometres <= 10_000_000; micrometres += stride) {
      const mm = micrometres / 1000;
      const read = parseLength(`${mm / 25.4} in`, "mm");
      expect(read.ok && Math.abs(read.mm / mm - 1)).toBeLessThan(5e-16);
    }
  });
});
