import type { BasketPlan, BasketPlanAnswer, BasketPlanRequest } from "#shared/schemas/gauges/basketPlan";
import { coverModel } from "./coverModel";
import { type Market, marketOf, narrowed, waysOf } from "./Market";
import { rowOf } from "./Milp";
import { lowestChance, planOf, soonestDays } from "./planOf";
import { mostChoiceSteps, smallestChoices } from "./smallestChoices";
import { solveInOrder } from "./solveInOrder";

type Seconds = () => number;

/** Units of each offer for the least total; then the fewest parcels, then the fewest units. */
function leastTotal(market: Market, seconds: Seconds): Promise<number[]> {
  const { objectives, ...model } = coverModel(market);
  return solveInOrder(model, [objectives.total, objectives.parcels, objectives.bought], seconds);
}

/** Units of each offer for the fewest parcels; then the least total, then the fewest units. */
async function fewestParcels(market: Market, seconds: Seconds, mostSteps: number) {
  const smallest = smallestChoices(market, mostSteps);
  const left = smallest ? narrowed(market, { among: smallest.among }) : market;
  const { objectives, rows, uppers } = coverModel(left);
  const { parcels, total, bought } = objectives;
  const held = smallest ? [rowOf(parcels.costs, 0, smallest.parcels)] : [];
  const order = smallest ? [total, bought] : [parcels, total, bought];
  return { market: left, units: await solveInOrder({ rows: [...rows, ...held], uppers }, order, seconds) };
}

/**
 * The four best plans for a basket, each proved the best by its own measure; what is equal by that goes by the least
 * total, then the fewest parcels, then the fewest units.
 *
 * Shape:    whole units of each offer, at most its stock; a unit covers one of each need that it lists with a chance of at
 *           least `minimumChance`; postage = base + per item x units of the workshops used.
 *           surest: the largest chance t at which all needs are still covered by coverings of chance t or more;
 *           soonest: the fewest days after which the workshops used have all sent.
 * Infeasible: buying everything would cover the most of every need at once, since a kit's coverings do not compete; so the
 *           needs that cannot be met are just those that all stock together does not cover, and each is named.
 * Errors:   DomainError for ids that stand twice or name nothing; NotProved where `seconds` (what is left) ran out.
 */
export async function solveBasket(
  request: BasketPlanRequest,
  seconds: Seconds,
  mostSteps = mostChoiceSteps,
): Promise<BasketPlanAnswer> {
  const market = marketOf(request);
  const infeasible = request.needs.flatMap(({ id, quantity }, need) => {
    const units = waysOf(market, need).reduce((sum, way) => sum + way.units, 0);
    return units < quantity ? [id] : [];
  });
  if (infeasible.length > 0) {
    return {
      plans: { cheapest: null, fewestParcels: null, surest: null, soonest: null },
      optimal: true,
      infeasible,
    };
  }
  const cheapest = planOf(request, market, await leastTotal(market, seconds));
  const fewest = await fewestParcels(market, seconds, mostSteps);

  /** The least total of a narrower market: the least of all where that already keeps within it. */
  const within = async (limits: Parameters<typeof narrowed>[1], isKept: (plan: BasketPlan) => boolean) => {
    if (isKept(cheapest)) return cheapest;
    const narrower = narrowed(market, limits);
    return planOf(request, narrower, await leastTotal(narrower, seconds));
  };
  const leastChance = lowestChance(market);
  const latestDays = soonestDays(market);
  return {
    plans: {
      cheapest,
      fewestParcels: planOf(request, fewest.market, fewest.units),
      surest: await within({ leastChance }, (plan) => plan.lowestChance >= leastChance),
      soonest: await within({ latestDays }, (plan) => plan.readyInDays <= latestDays),
    },
    optimal: true,
  };
}
