import { z } from "zod";

/** The most that one plan takes. Chosen by measurement: see server/plans/planBasket.ts. */
export const basketPlanLimits = { needs: 40, workshops: 60, offers: 400, quantity: 99, stock: 9999, priceMinor: 1e9 };

const Name = z.string().min(1, "Give it an id.").max(100);
const whole = (least: number, most: number) =>
  z
    .int()
    .min(least, `Give a whole number from ${least} to ${most}.`)
    .max(most, `Give a whole number from ${least} to ${most}.`);
const price = whole(0, basketPlanLimits.priceMinor);
const chance = z.number().min(0, "A chance is 0 to 1.").max(1, "A chance is 0 to 1.");
const listOf = <T extends z.ZodType>(schema: T, most: number, words: string) =>
  z.array(schema).max(most, `At most ${most} ${words} can be planned at once.`);

export const BasketPlanRequest = z.object({
  needs: listOf(
    z.object({ id: Name, quantity: whole(1, basketPlanLimits.quantity) }),
    basketPlanLimits.needs,
    "needs",
  ).min(1, "Give at least one need."),
  workshops: listOf(
    z.object({ id: Name, shippingBaseMinor: price, shippingPerItemMinor: price, dispatchDays: whole(0, 365) }),
    basketPlanLimits.workshops,
    "workshops",
  ),
  offers: listOf(
    z.object({
      id: Name,
      workshopId: Name,
      priceMinor: price,
      stock: whole(0, basketPlanLimits.stock),
      covers: listOf(z.object({ needId: Name, chance }), basketPlanLimits.needs, "coverings of one offer"),
    }),
    basketPlanLimits.offers,
    "offers",
  ),
  minimumChance: chance,
});
export type BasketPlanRequest = z.infer<typeof BasketPlanRequest>;

export const BasketPlan = z.object({
  lines: z.array(z.object({ offerId: z.string(), quantity: z.int().positive() })),
  partsMinor: z.int().nonnegative(),
  shippingMinor: z.int().nonnegative(),
  totalMinor: z.int().nonnegative(),
  parcels: z.int().nonnegative(),
  /** The least chance among the coverings that the plan relies on. */
  lowestChance: z.number().min(0).max(1),
  readyInDays: z.int().nonnegative(),
});
export type BasketPlan = z.infer<typeof BasketPlan>;

export const planNames = ["cheapest", "fewestParcels", "surest", "soonest"] as const;

const planOrNone = BasketPlan.nullable();
export const BasketPlanAnswer = z.object({
  /** Each null where some need cannot be met: see `infeasible`. */
  plans: z.object({ cheapest: planOrNone, fewestParcels: planOrNone, surest: planOrNone, soonest: planOrNone }),
  /** Nothing is answered that was not proved the best. */
  optimal: z.literal(true),
  infeasible: z.array(z.string()).optional(),
});
export type BasketPlanAnswer = z.infer<typeof BasketPlanAnswer>;
