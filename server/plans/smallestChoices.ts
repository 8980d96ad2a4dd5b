import { reachOf } from "./coverModel";
import type { Market } from "./Market";

/** So many choices are looked at; beyond, the solver has to find it by itself. A matter of milliseconds. */
export const mostChoiceSteps = 20_000;

/**
 * The fewest workshops that can cover every need between them, and all workshops that belong to any such fewest choice;
 * undefined where there are too many choices to look through.
 *
 * Why: whoever is in no smallest choice cannot be in a plan of fewest parcels, and without them the model is small.
 *      Shown of a market in which every need can be met.
 */
export function smallestChoices(
  market: Market,
  mostSteps: number,
): { parcels: number; among: Set<number> } | undefined {
  const reach = reachOf(market);
  const among = new Set<number>();
  let steps = 0;

  const gain = (workshop: number, open: readonly number[]) =>
    open.reduce((sum, left, need) => sum + Math.min(left, reach[workshop]?.[need] ?? 0), 0);
  const helpers = (need: number, left: readonly number[]) =>
    left.filter((workshop) => (reach[workshop]?.[need] ?? 0) > 0);

  /** Looks through all choices of `picks` more workshops out of `left` that close what is open. */
  function look(chosen: readonly number[], open: readonly number[], left: readonly number[], picks: number): void {
    steps += 1;
    if (steps > mostSteps) return;
    const missing = open.reduce((sum, units) => sum + units, 0);
    if (missing === 0) {
      for (const workshop of chosen) among.add(workshop);
      return;
    }
    if (picks === 0) return;
    const best = Math.max(0, ...left.map((workshop) => gain(workshop, open)));
    if (best * picks < missing) return;
    // Every choice holds one of those who help with the need that has the fewest helpers.
    const wanting = open.flatMap((units, need) => (units > 0 ? [helpers(need, left)] : []));
    const fewest = wanting.reduce((least, list) => (list.length < least.length ? list : least));
    let rest = left;
    for (const workshop of fewest) {
      rest = rest.filter((other) => other !== workshop);
      const after = open.map((units, need) => Math.max(0, units - (reach[workshop]?.[need] ?? 0)));
      look([...chosen, workshop], after, rest, picks - 1);
    }
  }

  const everybody = [...new Set(market.offers.map(({ workshop }) => workshop))];
  for (let parcels = 1; parcels <= everybody.length && steps <= mostSteps; parcels += 1) {
    look([], market.quantities, everybody, parcels);
    if (among.size > 0 && steps <= mostSteps) return { parcels, among };
  }
  return undefined;
}
