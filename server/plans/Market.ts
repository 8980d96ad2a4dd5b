import type { BasketPlanRequest } from "#shared/schemas/gauges/basketPlan";
import { checkBasket } from "./checkBasket";

/** One need that an offer covers, and how surely. */
export type Covering = { need: number; chance: number };
/** An offer that covers something, by its place in the request. */
export type Offer = { place: number; workshop: number; priceMinor: number; stock: number; covers: readonly Covering[] };
export type Workshop = { baseMinor: number; perItemMinor: number; days: number };

/** A basket in numbers: ids are places in the request's lists, and what cannot be relied on is left out. */
export type Market = { quantities: readonly number[]; workshops: readonly Workshop[]; offers: readonly Offer[] };

/** The market of a request. Errors: those of `checkBasket`. */
export function marketOf(request: BasketPlanRequest): Market {
  const places = checkBasket(request);
  const offers = request.offers.map(({ workshopId, priceMinor, stock, covers }, place) => ({
    place,
    workshop: places.workshops.get(workshopId) ?? 0,
    priceMinor,
    stock,
    covers: covers.map(({ needId, chance }) => ({ need: places.needs.get(needId) ?? 0, chance })),
  }));
  const workshops = request.workshops.map(({ shippingBaseMinor, shippingPerItemMinor, dispatchDays }) => ({
    baseMinor: shippingBaseMinor,
    perItemMinor: shippingPerItemMinor,
    days: dispatchDays,
  }));
  const whole = { quantities: request.needs.map(({ quantity }) => quantity), workshops, offers };
  return narrowed(whole, { leastChance: request.minimumChance });
}

/** The market without coverings less sure than `leastChance`, workshops later than `latestDays`, or others than `among`. */
export function narrowed(
  market: Market,
  { leastChance = 0, latestDays = Infinity, among }: { leastChance?: number; latestDays?: number; among?: Set<number> },
): Market {
  const offers = market.offers
    .filter(({ workshop }) => (market.workshops[workshop]?.days ?? 0) <= latestDays && (among?.has(workshop) ?? true))
    .map((offer) => ({ ...offer, covers: offer.covers.filter(({ chance }) => chance >= leastChance) }))
    .filter(({ stock, covers }) => stock > 0 && covers.length > 0);
  return { ...market, offers };
}

/** More than this of an offer never helps: what is in stock, or the most that a need that it covers asks for. */
export const mostUseful = ({ quantities }: Market, { stock, covers }: Offer): number =>
  Math.min(stock, Math.max(...covers.map(({ need }) => quantities[need] ?? 0)));

/** Every way in which a need can be covered, with how many there are of it. */
export function waysOf(market: Market, need: number): { units: number; chance: number; days: number }[] {
  return market.offers.flatMap(({ stock, workshop, covers }) =>
    covers
      .filter((covering) => covering.need === need)
      .map(({ chance }) => ({ units: stock, chance, days: market.workshops[workshop]?.days ?? 0 })),
  );
}
