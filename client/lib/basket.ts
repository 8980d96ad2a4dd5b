import { queryOptions, useQuery } from "@tanstack/react-query";
import type { Basket } from "#shared/schemas/basket";
import { api } from "./api";
import { useShipTo } from "./preferences";

export const basketKeys = { all: ["basket"] as const, to: (shipTo: string) => ["basket", shipTo] as const };

/** The basket with postage to this country. */
export const basketQuery = (shipTo: string) =>
  queryOptions({
    queryKey: basketKeys.to(shipTo),
    queryFn: ({ signal }) => api<Basket>(`/basket?shipTo=${encodeURIComponent(shipTo)}`, { signal }),
  });

/** Pieces in the basket; undefined while it is not known. */
export function useBasketCount(): number | undefined {
  return useQuery(basketQuery(useShipTo())).data?.count;
}
