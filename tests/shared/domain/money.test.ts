import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { DomainError } from "#shared/domain/DomainError";
import { currencyExponent, formatMoney, shareOut, taxIncluded, toMinor } from "#shared/domain/money";
import allocations from "../../reference/allocation.json";
import currencies from "../../reference/currencyMinorUnits.json";

describe("shareOut", () => {
  it.each(allocations.map((c) => [c.id, c.inputs.total_minor_units, c.inputs.weights, c.expected.parts] as const))(
    "%s: %d by %j is %j",
    (_id, total, weights, parts) => expect(shareOut(total, weights)).toEqual(parts),
  );

  it("never loses a unit, gives no share to a weight of 0, and mirrors refunds", () => {
    const weights = fc.array(fc.oneof(fc.nat({ max: 1_000_000 }), fc.double({ min: 0, max: 1000, noNaN: true })), {
      minLength: 1,
      maxLength: 10,
    });
    fc.assert(
      fc.property(fc.integer({ min: 1, max: Number.MAX_SAFE_INTEGER }), weights, (total, raw) => {
        fc.pre(raw.some((weight) => weight > 0));
        const shares = shareOut(total, raw);
        expect(shares.reduce((sum, share) => sum + BigInt(share), 0n)).toBe(BigInt(total));
        for (const [i, weight] of raw.entries()) if (weight === 0) expect(shares[i]).toBe(0);
        expect(shareOut(-total, raw)).toEqual(shares.map((share) => (share === 0 ? 0 : -share)));
      }),
      { seed: 21 },
    );
  });
  it("keeps every share within one unit of its exact quota", () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 1, max: 1_000_000 }),
        fc.array(fc.integer({ min: 1, max: 10_000 }), { minLength: 2, maxLength: 10 }),
        (total, weights) => {
          const sum = weights.reduce((a, b) => a + b, 0);
          for (const [i, share] of shareOut(total, weights).entries()) {
            expect(Math.abs(share - (total * weights[i]!) / sum)).toBeLessThan(1);
          }
        },
      ),
      { seed: 22 },
    );
  });
  it.each([
    ["totalMinor", 1.5, [1]],
    ["totalMinor", Number.NaN, [1]],
    ["weights/1", 100, [1, -1]],
    ["weights/0", 100, [Number.NaN]],
    ["weights/0", 100, [Infinity]],
    ["weights", 100, [0, 0]],
    ["weights", 100, []],
  ] as const)("refuses wrong %s", (field, total, weights) => {
    expect(() => shareOut(total, weights)).toThrow(expect.objectContaining({ field }));
    expect(() => shareOut(total, weights)).toThrow(DomainError);
  });
  it("shares nothing among none", () => expect(shareOut(0, [])).toEqual([]));
});

describe("taxIncluded", () => {
  it.each([
    [11_900, 1900, 1900],
    [100, 2000, 17],
    [3, 10_000, 2],
    [1, 10_000, 1],
    [-3, 10_000, -2],
    [999, 0, 0],
    [0, 1900, 0],
    [3890, 1900, 621],
    [Number.MAX_SAFE_INTEGER, 1900, 1_438_124_250_756_965],
  ])("%d at %d basis points contains %d", (gross, rate, tax) => expect(taxIncluded(gross, rate)).toBe(tax));
  it("leaves a net amount whose tax is the same to within half a unit", () => {
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 1e9 }), fc.integer({ min: 0, max: 10_000 }), (gross, rate) => {
        const exact = (gross * rate) / (10_000 + rate);
        expect(Math.abs(taxIncluded(gross, rate) - exact)).toBeLessThanOrEqual(0.5 + 1e-6);
      }),
      { seed: 23 },
    );
  });
  it("refuses rates and amounts that are not whole", () => {
    expect(() => taxIncluded(100, 19.5)).toThrow(expect.objectContaining({ field: "rateBasisPoints" }));
    expect(() => taxIncluded(100, -1)).toThrow(expect.objectContaining({ field: "rateBasisPoints" }));
    expect(() => taxIncluded(0.5, 1900)).toThrow(expect.objectContaining({ field: "grossMinor" }));
  });
});

describe("currencies (ISO 4217 list one)", () => {
  const amounts = currencies.filter((c) => c.expected.minor_units !== undefined);
  it.each(amounts.map((c) => [c.inputs.amount!, c.inputs.currency!, c.expected.minor_units!] as const))(
    "%s %s is %d",
    (amount, currency, minor) => expect(toMinor(amount, currency)).toBe(minor),
  );
  it("knows which have 0, 3 and 4 decimals", () => {
    const sets = currencies.find((c) => c.id === "cur-07-sets")!.expected;
    for (const code of sets.exponent_0!) expect(currencyExponent(code)).toBe(0);
    for (const code of sets.exponent_3!) expect(currencyExponent(code)).toBe(3);
    for (const code of sets.exponent_4!) expect(currencyExponent(code)).toBe(4);
    expect(currencyExponent("EUR")).toBe(2);
  });
  it.each([
    ["12.5", "JPY", "at most 0 decimals"],
    ["1.234", "EUR", "at most 2 decimals"],
    ["1,23", "EUR", "Write an amount"],
    ["", "EUR", "Write an amount"],
    ["99999999999999999", "EUR", "whole number"],
    ["1", "eur", "three capital letters"],
  ])("refuses %j %s", (amount, currency, words) => expect(() => toMinor(amount, currency)).toThrow(words));
});

describe("formatMoney", () => {
  it.each([
    [3890, "EUR", "€38.90"],
    [5, "GBP", "£0.05"],
    [-500, "USD", "-US$5.00"],
    [1234, "JPY", "JP¥1,234"],
    [1234, "KWD", "KWD\u00a01.234"],
    [10_001, "CLF", "CLF\u00a01.0001"],
    [0, "EUR", "€0.00"],
    [9_007_199_254_740_991, "EUR", "€90,071,992,547,409.91"],
  ])("%d %s is %s", (minor, currency, text) => expect(formatMoney(minor, currency)).toBe(text));
  it("follows the reader's locale", () => expect(formatMoney(389_000, "EUR", "de-DE")).toBe("3.890,00\u00a0€"));
  it("refuses fractions of a minor unit", () => expect(() => formatMoney(0.5, "EUR")).toThrow(DomainError));
});
