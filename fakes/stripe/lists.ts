import type Stripe from "stripe";
import { ProviderError } from "./ProviderError";

interface Paging {
  readonly limit?: number | undefined;
  readonly starting_after?: string | undefined;
  readonly ending_before?: string | undefined;
}

interface Bounds {
  readonly gt?: number | undefined;
  readonly gte?: number | undefined;
  readonly lt?: number | undefined;
  readonly lte?: number | undefined;
}

/** Objects of a map, the most recently made first: the order of every list in the provider's API. */
export const newestFirst = <Item>(items: ReadonlyMap<string, Item>): Item[] => [...items.values()].reverse();

/** Whether a time in whole seconds lies within the bounds; no bounds hold everything. */
export const within = (time: number, { gt, gte, lt, lte }: Bounds = {}): boolean =>
  (gt === undefined || time > gt) &&
  (gte === undefined || time >= gte) &&
  (lt === undefined || time < lt) &&
  (lte === undefined || time <= lte);

/** Whether a filter that may be absent is met. */
export const matches = (wanted: unknown, actual: unknown): boolean => wanted === undefined || wanted === actual;

/** One page (10 unless `limit` says otherwise, at most 100) of items that are already in order and filtered. */
export function page<Item extends { id: string }>(
  items: readonly Item[],
  { limit = 10, starting_after, ending_before }: Paging,
  url: string,
): Stripe.ApiList<Item> {
  const indexOf = (id: string, param: string): number => {
    const index = items.findIndex((item) => item.id === id);
    if (index < 0) throw new ProviderError(400, `No such object: '${id}'`, { code: "resource_missing", param });
    return index;
  };
  if (ending_before !== undefined) {
    const before = items.slice(0, indexOf(ending_before, "ending_before"));
    return { object: "list", data: before.slice(-limit), has_more: before.length > limit, url };
  }
  const after = starting_after === undefined ? items : items.slice(indexOf(starting_after, "starting_after") + 1);
  return { object: "list", data: after.slice(0, limit), has_more: after.length > limit, url };
}
