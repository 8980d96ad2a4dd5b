import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { solveBasket } from "#server/plans/solveBasket";
import { type BasketPlanRequest, planNames } from "#shared/schemas/gauges/basketPlan";
import { bestByTrying, measures, recounted, smallBasket } from "./baskets";

const solve = (basket: BasketPlanRequest) => solveBasket(basket, () => 60);

describe("the four plans", () => {
  it("are the best that any purchase reaches, by trying them all", async () => {
    let [met, unmet] = [0, 0];
    await fc.assert(
      fc.asyncProperty(smallBasket, async (basket) => {
        const { plans, infeasible } = await solve(basket);
        for (const name of planNames) {
          const best = bestByTrying(basket, name);
          const plan = plans[name];
          if (plan) {
            expect(measures[name](plan), name).toEqual(best);
            expect(recounted(basket, plan), name).toEqual(plan);
            for (const { offerId, quantity } of plan.lines) {
              expect(quantity).toBeLessThanOrEqual(basket.offers.find(({ id }) => id === offerId)?.stock ?? 0);
            }
          } else expect(best, name).toBeUndefined();
        }
        if (infeasible) unmet += 1;
        else met += 1;
        for (const needId of infeasible ?? []) {
          // Each need named cannot be met even alone; all the others can.
          expect(bestByTrying({ ...basket, needs: basket.needs.filter(({ id }) => id === needId) }, "cheapest")).toBe(
            undefined,
          );
        }
        const others = basket.needs.filter(({ id }) => !infeasible?.includes(id));
        if (infeasible && others.length > 0) {
          expect(bestByTrying({ ...basket, needs: others }, "cheapest")).toBeDefined();
        }
      }),
      { numRuns: 150, seed: 20261201 },
    );
    expect(met).toBeGreaterThan(30);
    expect(unmet).toBeGreaterThan(10);
  }, 300_000);

  it("keep their sums exact where money is large", async () => {
    await fc.assert(
      fc.asyncProperty(smallBasket, fc.constantFrom(9_999_991, 99_999_989), async (basket, unit) => {
        const large = {
          ...basket,
          offers: basket.offers.map((offer, i) => ({ ...offer, priceMinor: offer.priceMinor * unit + i })),
        };
        const { plans } = await solve(large);
        for (const name of planNames) {
          const plan = plans[name];
          if (plan) expect(measures[name](plan), name).toEqual(bestByTrying(large, name));
        }
      }),
      { numRuns: 40, seed: 7 },
    );
  }, 300_000);

  it("have the fewest parcels as well where the solver has to find them by itself", async () => {
    for (const basket of fc.sample(smallBasket, { numRuns: 40, seed: 11 })) {
      const { plans } = await solveBasket(basket, () => 60, 0);
      const plan = plans.fewestParcels;
      if (plan) expect(measures.fewestParcels(plan)).toEqual(bestByTrying(basket, "fewestParcels"));
    }
  }, 300_000);

  it("are the same when asked again", async () => {
    for (const basket of fc.sample(smallBasket, { numRuns: 10, seed: 3 })) {
      expect(await solve(basket)).toEqual(await solve(basket));
    }
  });
});

const workshop = (id: string, base: number, perItem = 0, dispatchDays = 1) => ({
  id,
  shippingBaseMinor: base,
  shippingPerItemMinor: perItem,
  dispatchDays,
});
const offer = (id: string, workshopId: string, priceMinor: number, covers: Record<string, number>, stock = 9) => ({
  id,
  workshopId,
  priceMinor,
  stock,
  covers: Object.entries(covers).map(([needId, chance]) => ({ needId, chance })),
});
const need = (id: string, quantity = 1) => ({ id, quantity });
const basketOf = (basket: Partial<BasketPlanRequest>): BasketPlanRequest => ({
  needs: [need("idler")],
  workshops: [workshop("A", 500)],
  offers: [],
  minimumChance: 0.5,
  ...basket,
});
const bought = (lines: readonly { offerId: string; quantity: number }[] = []) =>
  Object.fromEntries(lines.map(({ offerId, quantity }) => [offerId, quantity]));

describe("a plan", () => {
  it("is not the sum of the cheapest landed offers", async () => {
    // Alone, A's part for each need is cheaper with postage; together B's single parcel wins.
    const { plans } = await solve(
      basketOf({
        needs: [need("idler"), need("belt")],
        workshops: [workshop("A1", 300), workshop("A2", 300), workshop("B", 500)],
        offers: [
          offer("a1", "A1", 1000, { idler: 0.9 }),
          offer("a2", "A2", 1000, { belt: 0.9 }),
          offer("b1", "B", 900, { idler: 0.9 }),
          offer("b2", "B", 900, { belt: 0.9 }),
        ],
      }),
    );
    expect(plans.cheapest).toMatchObject({ totalMinor: 2300, partsMinor: 1800, shippingMinor: 500, parcels: 1 });
    expect(bought(plans.cheapest?.lines)).toEqual({ b1: 1, b2: 1 });
  });

  it("takes a kit for the needs that it covers, and fills up what the kit has too few of", async () => {
    const { plans } = await solve(
      basketOf({
        needs: [need("idler"), need("belt"), need("mount", 3)],
        offers: [
          offer("kit", "A", 3000, { idler: 0.9, belt: 0.9, mount: 0.8 }, 1),
          offer("mount", "A", 100, { mount: 0.9 }),
          offer("idler", "A", 2500, { idler: 0.95 }),
          offer("belt", "A", 900, { belt: 0.95 }),
        ],
      }),
    );
    expect(bought(plans.cheapest?.lines)).toEqual({ kit: 1, mount: 2 });
    expect(plans.cheapest?.lowestChance).toBe(0.8);
    expect(bought(plans.surest?.lines)).toEqual({ mount: 3, kit: 1 });
    expect(plans.surest).toMatchObject({ lowestChance: 0.9, totalMinor: 3800 });
  });

  it("does not rely on a covering below the chance asked for, and takes one just at it", async () => {
    const offers = [offer("poor", "A", 1, { idler: 0.49 }), offer("fair", "A", 1000, { idler: 0.5 })];
    const { plans } = await solve(basketOf({ offers }));
    expect(bought(plans.cheapest?.lines)).toEqual({ fair: 1 });
  });

  it("never buys more than there is, and splits a quantity where it must", async () => {
    const { plans } = await solve(
      basketOf({
        needs: [need("pad", 5)],
        workshops: [workshop("A", 100), workshop("B", 100, 50)],
        offers: [offer("a", "A", 10, { pad: 0.9 }, 3), offer("b", "B", 10, { pad: 0.9 }, 9)],
      }),
    );
    expect(bought(plans.cheapest?.lines)).toEqual({ a: 3, b: 2 });
    expect(plans.cheapest).toMatchObject({ partsMinor: 50, shippingMinor: 300, parcels: 2 });
    expect(bought(plans.fewestParcels?.lines)).toEqual({ b: 5 });
    expect(plans.fewestParcels).toMatchObject({ totalMinor: 400, parcels: 1 });
  });

  it("is the soonest by when the last parcel leaves, then the cheapest of those", async () => {
    const { plans } = await solve(
      basketOf({
        needs: [need("idler"), need("belt")],
        workshops: [workshop("slow", 0, 0, 20), workshop("quick", 400, 0, 2), workshop("same", 0, 0, 2)],
        offers: [
          offer("s1", "slow", 100, { idler: 0.9, belt: 0.9 }),
          offer("q1", "quick", 100, { idler: 0.9, belt: 0.9 }),
          offer("t1", "same", 400, { belt: 0.9 }),
        ],
      }),
    );
    expect(plans.cheapest).toMatchObject({ totalMinor: 100, readyInDays: 20 });
    expect(bought(plans.soonest?.lines)).toEqual({ q1: 1 });
    expect(plans.soonest).toMatchObject({ totalMinor: 500, readyInDays: 2 });
  });

  it("buys nothing that is not needed, though it were free", async () => {
    const offers = [offer("free", "A", 0, { idler: 0.9 }), offer("gift", "A", 0, { idler: 0.6, belt: 0.9 })];
    const { plans } = await solve(basketOf({ needs: [need("idler"), need("belt")], offers }));
    expect(bought(plans.cheapest?.lines)).toEqual({ gift: 1 });
  });

  it("goes by fewer parcels where the totals are equal", async () => {
    const { plans } = await solve(
      basketOf({
        needs: [need("idler"), need("belt")],
        workshops: [workshop("A", 0), workshop("B", 0)],
        offers: [
          offer("a1", "A", 100, { idler: 0.9 }),
          offer("b1", "B", 100, { idler: 0.9 }),
          offer("b2", "B", 100, { belt: 0.9 }),
        ],
      }),
    );
    expect(bought(plans.cheapest?.lines)).toEqual({ b1: 1, b2: 1 });
  });
});

describe("needs that cannot be met", () => {
  it("are named, and nothing is planned", async () => {
    const answer = await solve(
      basketOf({
        needs: [need("idler"), need("belt", 3), need("pad")],
        offers: [
          offer("i", "A", 1, { idler: 0.9 }),
          offer("b", "A", 1, { belt: 0.9 }, 2),
          offer("p", "A", 1, { pad: 0.2 }),
        ],
      }),
    );
    expect(answer.infeasible).toEqual(["belt", "pad"]);
    expect(answer.plans).toEqual({ cheapest: null, fewestParcels: null, surest: null, soonest: null });
  });
});

describe("a basket whose parts do not hold together is refused, naming", () => {
  it.each([
    ["a workshop that is not there", { offers: [offer("x", "Z", 1, { idler: 0.9 })] }, "offers/0/workshopId"],
    ["a need that is not there", { offers: [offer("x", "A", 1, { nothing: 0.9 })] }, "offers/0/covers/0/needId"],
    ["two needs alike", { needs: [need("idler"), need("idler")] }, "needs/1/id"],
    ["two workshops alike", { workshops: [workshop("A", 1), workshop("A", 2)] }, "workshops/1/id"],
    ["two offers alike", { offers: [offer("x", "A", 1, {}), offer("x", "A", 2, {})] }, "offers/1/id"],
    [
      "one need covered twice by one offer",
      {
        offers: [
          {
            ...offer("x", "A", 1, {}),
            covers: [
              { needId: "idler", chance: 0.9 },
              { needId: "idler", chance: 0.8 },
            ],
          },
        ],
      },
      "offers/0/covers/1/needId",
    ],
  ])("%s", async (_what, basket, field) => {
    await expect(solve(basketOf(basket))).rejects.toMatchObject({ name: "DomainError", field });
  });
});
