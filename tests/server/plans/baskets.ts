import fc from "fast-check";
import type { BasketPlan, BasketPlanRequest } from "#shared/schemas/gauges/basketPlan";

/** Small random baskets, so small that every way of filling them can be tried. */
export const smallBasket: fc.Arbitrary<BasketPlanRequest> = fc
  .record({ needs: fc.integer({ min: 1, max: 3 }), workshops: fc.integer({ min: 1, max: 3 }) })
  .chain((size) =>
    fc.record({
      needs: fc
        .array(fc.integer({ min: 1, max: 2 }), { minLength: size.needs, maxLength: size.needs })
        .map((list) => list.map((quantity, i) => ({ id: `need ${i}`, quantity }))),
      workshops: fc
        .array(
          fc.record({
            shippingBaseMinor: fc.constantFrom(0, 1, 5, 7),
            shippingPerItemMinor: fc.constantFrom(0, 0, 1, 2),
            dispatchDays: fc.integer({ min: 0, max: 3 }),
          }),
          { minLength: size.workshops, maxLength: size.workshops },
        )
        .map((list) => list.map((workshop, i) => ({ id: `workshop ${i}`, ...workshop }))),
      offers: fc
        .array(
          fc.record({
            workshopId: fc.integer({ min: 0, max: size.workshops - 1 }).map((i) => `workshop ${i}`),
            priceMinor: fc.constantFrom(0, 1, 2, 3, 5, 8, 10),
            stock: fc.integer({ min: 0, max: 2 }),
            covers: fc
              .uniqueArray(fc.integer({ min: 0, max: size.needs - 1 }), { minLength: 1, maxLength: size.needs })
              .chain((needs) =>
                fc
                  .array(fc.constantFrom(0.1, 0.5, 0.7, 0.9, 1), { minLength: needs.length, maxLength: needs.length })
                  .map((chances) => needs.map((need, i) => ({ needId: `need ${need}`, chance: chances[i] ?? 0 }))),
              ),
          }),
          { minLength: 2, maxLength: 6 },
        )
        .map((list) => list.map((offer, i) => ({ id: `offer ${i}`, ...offer }))),
      minimumChance: fc.constantFrom(0, 0.2, 0.6),
    }),
  );

/** Every way of buying from the offers. */
function* purchases({ offers }: BasketPlanRequest): Generator<number[]> {
  const units = offers.map(() => 0);
  for (;;) {
    yield [...units];
    let i = 0;
    while (i < units.length && units[i] === offers[i]!.stock) units[i++] = 0;
    if (i === units.length) return;
    units[i] = (units[i] ?? 0) + 1;
  }
}

/** The plan that a purchase is, by the words of the definition; undefined where a need is not met. */
function planOfPurchase(basket: BasketPlanRequest, units: readonly number[]): BasketPlan | undefined {
  const bought = basket.offers
    .map((offer, i) => ({ ...offer, units: units[i] ?? 0 }))
    .filter((offer) => offer.units > 0);
  let lowestChance = 1;
  for (const { id, quantity } of basket.needs) {
    const chances = bought
      .flatMap(({ covers, units: count }) =>
        covers.filter(({ needId }) => needId === id).flatMap(({ chance }) => Array<number>(count).fill(chance)),
      )
      .filter((chance) => chance >= basket.minimumChance)
      .sort((a, b) => b - a);
    const least = chances[quantity - 1];
    if (least === undefined) return undefined;
    lowestChance = Math.min(lowestChance, least);
  }
  const used = basket.workshops.filter(({ id }) => bought.some(({ workshopId }) => workshopId === id));
  const postage = used.map(
    ({ id, shippingBaseMinor, shippingPerItemMinor }) =>
      shippingBaseMinor +
      shippingPerItemMinor *
        bought.filter(({ workshopId }) => workshopId === id).reduce((sum, offer) => sum + offer.units, 0),
  );
  const partsMinor = bought.reduce((sum, { priceMinor, units: count }) => sum + priceMinor * count, 0);
  const shippingMinor = postage.reduce((sum, minor) => sum + minor, 0);
  return {
    lines: bought.map(({ id, units: quantity }) => ({ offerId: id, quantity })),
    partsMinor,
    shippingMinor,
    totalMinor: partsMinor + shippingMinor,
    parcels: used.length,
    lowestChance,
    readyInDays: Math.max(0, ...used.map(({ dispatchDays }) => dispatchDays)),
  };
}

export const unitsOf = (plan: BasketPlan) => plan.lines.reduce((sum, { quantity }) => sum + quantity, 0);

/** What each plan is judged by, in order; the smaller the better. */
export const measures: Record<"cheapest" | "fewestParcels" | "surest" | "soonest", (plan: BasketPlan) => number[]> = {
  cheapest: (plan) => [plan.totalMinor, plan.parcels, unitsOf(plan)],
  fewestParcels: (plan) => [plan.parcels, plan.totalMinor, unitsOf(plan)],
  surest: (plan) => [-plan.lowestChance, plan.totalMinor, plan.parcels, unitsOf(plan)],
  soonest: (plan) => [plan.readyInDays, plan.totalMinor, plan.parcels, unitsOf(plan)],
};

const isLess = (a: readonly number[], b: readonly number[]) => {
  const i = a.findIndex((value, at) => value !== b[at]);
  return i >= 0 && (a[i] ?? 0) < (b[i] ?? 0);
};

/** The best measure that any purchase reaches, by trying them all; undefined where none meets the needs. */
export function bestByTrying(basket: BasketPlanRequest, name: keyof typeof measures): number[] | undefined {
  let best: number[] | undefined;
  for (const units of purchases(basket)) {
    const plan = planOfPurchase(basket, units);
    const measure = plan && measures[name](plan);
    if (measure && (!best || isLess(measure, best))) best = measure;
  }
  return best;
}

/** The plan again, from its lines alone. */
export function recounted(basket: BasketPlanRequest, plan: BasketPlan): BasketPlan | undefined {
  const bought = new Map(plan.lines.map(({ offerId, quantity }) => [offerId, quantity]));
  return planOfPurchase(
    basket,
    basket.offers.map(({ id }) => bought.get(id) ?? 0),
  );
}
