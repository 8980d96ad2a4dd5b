import { describe, expect, it } from "vitest";
import { formatLength, parseLength } from "#shared/domain/length";
import { shareOut } from "#shared/domain/money";

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

describe("an amount shared equally", () => {
  /** Sums to the whole, and no two shares differ by more than one unit. */
  function check(total: number, count: number): boolean {
    const shares = shareOut(total, equal[count]!);
    let sum = 0;
    for (const share of shares) sum += share;
    return shares.length === count && sum === total && Math.max(...shares) - Math.min(...shares) <= 1;
  }
  const equal = Array.from({ length: 11 }, (_, count) => new Array<number>(count).fill(1));

  // What is left over depends on the amount modulo the count, so every amount modulo 2520 (the least multiple of 2 to 10) is
  // met at both ends of the range; between them in steps of a prime. All nine million would take minutes.
  it("is whole again: all amounts to 10,080 and from 997,480 to 1,000,000, each 97th between, 2 to 10 shares", () => {
    const wrong: string[] = [];
    for (let total = 0; total <= 1_000_000; total += total < 10_080 || total >= 997_480 ? 1 : 97) {
      for (let count = 2; count <= 10; count++) if (!check(total, count)) wrong.push(`${total} by ${count}`);
    }
    expect(wrong).toEqual([]);
  });
});
