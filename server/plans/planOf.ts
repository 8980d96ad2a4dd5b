import type { BasketPlan, BasketPlanRequest } from "#shared/schemas/gauges/basketPlan";
import { type Market, waysOf } from "./Market";

/** The least chance relied on: of each need the surest coverings are taken, as many as it asks for. */
export function lowestChance(market: Market): number {
  const relied = market.quantities.map((quantity, need) => {
    let left = quantity;
    const surestFirst = waysOf(market, need).sort((a, b) => b.chance - a.chance);
    return surestFirst.find(({ units }) => {
      left -= units;
      return left <= 0;
    })?.chance;
  });
  return Math.min(...relied.map((chance) => chance ?? 0));
}

/** The days until everything can be had at the soonest: of each need the quickest offers are taken. */
export function soonestDays(market: Market): number {
  const days = market.quantities.map((quantity, need) => {
    let left = quantity;
    const quickestFirst = waysOf(market, need).sort((a, b) => a.days - b.days);
    return quickestFirst.find(({ units }) => {
      left -= units;
      return left <= 0;
    })?.days;
  });
  return Math.max(...days.map((day) => day ?? 0));
}

/** A plan from the units bought of each offer of a market: every sum is made from the lines, in whole minor units. */
export function planOf({ offers }: BasketPlanRequest, market: Market, units: readonly number[]): BasketPlan {
  const bought = market.offers.flatMap((offer, i) => {
    const quantity = units[i] ?? 0;
    return quantity > 0 ? [{ ...offer, stock: quantity }] : [];
  });
  const used = [...new Set(bought.map(({ workshop }) => workshop))].map((workshop) => market.workshops[workshop]!);
  const partsMinor = bought.reduce((sum, { priceMinor, stock }) => sum + priceMinor * stock, 0);
  const perItem = bought.reduce(
    (sum, { workshop, stock }) => sum + market.workshops[workshop]!.perItemMinor * stock,
    0,
  );
  const shippingMinor = used.reduce((sum, { baseMinor }) => sum + baseMinor, perItem);
  return {
    lines: bought.map(({ place, stock }) => ({ offerId: offers[place]!.id, quantity: stock })),
    partsMinor,
    shippingMinor,
    totalMinor: partsMinor + shippingMinor,
    parcels: used.length,
    lowestChance: lowestChance({ ...market, offers: bought }),
    readyInDays: Math.max(0, ...used.map(({ days }) => days)),
  };
}
