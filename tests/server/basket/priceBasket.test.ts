import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { commissionOf, priceBasket } from "#server/basket/priceBasket";

const part = (given = {}) => ({
  id: "p1",
  title: "Wheel",
  priceMinor: 2000,
  currency: "EUR",
  stockOnHand: 10 as number | null,
  stockReserved: 0,
  leadDays: 0,
  madeToSize: false,
  state: "published" as const,
  ...given,
});
const terms = (given = {}) => ({
  workshop: { id: "w1", name: "Works", state: "admitted" as const, dispatchDays: 3, commissionBasisPoints: 800 },
  postage: { baseMinor: 500, perItemMinor: 100, freeOverMinor: null, currency: "EUR" },
  taxRateBasisPoints: 0,
  ...given,
});
const one = (line: object, termsGiven = {}) =>
  priceBasket(
    [{ terms: terms(termsGiven), lines: [{ part: part(line), quantity: 2, forNeed: null, heldAlready: 0 }] }],
    "DE",
  ).parcels[0]!;

describe("priceBasket", () => {
  it("adds parts and postage, and contains the tax of both", () => {
    const parcel = one({}, { taxRateBasisPoints: 1900 });
    // 2 x 20.00 + 5.00 + 2 x 1.00 = 47.00; 47.00 x 19 / 119 = 7.504 -> 7.50.
    expect(parcel).toMatchObject({ partsMinor: 4000, shippingMinor: 700, totalMinor: 4700, taxMinor: 750 });
    // The goods bear 4000/4700 of it: 6.383 -> 6.38.
    expect(parcel.lines[0]).toMatchObject({ unitMinor: 2000, lineMinor: 4000, taxMinor: 638 });
  });

  it("has no tax where the workshop is not registered", () => {
    expect(one({}).taxMinor).toBe(0);
  });

  it.each([
    [4000, 800, 320],
    [1, 5000, 1],
    [1, 4999, 0],
    [1050, 500, 53],
  ])("takes commission of parts %i at %i basis points as %i", (parts, points, commission) => {
    expect(commissionOf(parts, points)).toBe(commission);
  });

  it("takes no commission of postage", () => {
    expect(one({}).commissionMinor).toBe(320);
  });

  it.each([
    ["retired", { state: "retired" }, {}, "not-sold"],
    ["of a workshop that is suspended", {}, { workshop: { ...terms().workshop, state: "suspended" } }, "not-sold"],
    ["in another currency", { currency: "USD" }, {}, "other-currency"],
    ["with one left", { stockOnHand: 4, stockReserved: 3 }, {}, "short"],
    ["with none left", { stockOnHand: 4, stockReserved: 4 }, {}, "short"],
    ["beyond what can be paid at once", { priceMinor: 60_000_000 }, {}, "too-dear"],
  ])("does not count a part %s, and says why", (_what, given, termsGiven, name) => {
    const parcel = one(given, termsGiven);
    expect(parcel.lines[0]?.problem?.name).toBe(name);
    expect(parcel).toMatchObject({ partsMinor: 0, shippingMinor: 0, totalMinor: 0, taxMinor: 0, commissionMinor: 0 });
  });

  it("says how many are left", () => {
    expect(one({ stockOnHand: 1 }).lines[0]?.problem?.words).toContain("Only 1 left");
  });

  it("has no problem with what is made when ordered, and leaves later for it", () => {
    const parcel = one({ stockOnHand: null, leadDays: 12 });
    expect(parcel.lines[0]?.problem).toBeNull();
    expect(parcel.leavesInDays).toBe(15);
  });

  it("says to which country a workshop does not ship", () => {
    const parcel = one({}, { postage: null });
    expect(parcel.problem).toBe("Works does not ship to Germany");
    expect(parcel.shippingMinor).toBe(0);
  });

  it("does not use postage of another currency", () => {
    const usd = { baseMinor: 500, perItemMinor: 100, freeOverMinor: null, currency: "USD" };
    expect(one({}, { postage: usd }).problem).not.toBeNull();
  });

  it("never loses a cent, whatever is bought", () => {
    const line = fc.record({
      priceMinor: fc.integer({ min: 1, max: 50_000 }),
      quantity: fc.integer({ min: 1, max: 99 }),
    });
    fc.assert(
      fc.property(fc.array(line, { minLength: 1, maxLength: 8 }), fc.integer({ min: 0, max: 2700 }), (lines, rate) => {
        const wanted = lines.map(({ priceMinor, quantity }, index) => ({
          part: part({ id: `p${index}`, priceMinor, stockOnHand: null }),
          quantity,
          forNeed: null,
          heldAlready: 0,
        }));
        const basket = priceBasket([{ terms: terms({ taxRateBasisPoints: rate }), lines: wanted }], "DE");
        const [parcel] = basket.parcels;
        const lineSum = parcel!.lines.reduce((sum, { lineMinor }) => sum + lineMinor, 0);
        const taxSum = parcel!.lines.reduce((sum, { taxMinor }) => sum + taxMinor, 0);
        expect(basket.totalMinor).toBe(lineSum + parcel!.shippingMinor);
        expect(taxSum).toBeLessThanOrEqual(parcel!.taxMinor);
        expect(parcel!.taxMinor - taxSum).toBeLessThanOrEqual(Math.ceil(parcel!.shippingMinor * (rate / 10_000)) + 1);
        expect(parcel!.lines.every(({ taxMinor, lineMinor }) => taxMinor >= 0 && taxMinor <= lineMinor)).toBe(true);
      }),
      { seed: 7, numRuns: 300 },
    );
  });
});
