import { useMutation, useQuery, useQueryClient } from "@tanstack/react-query";
import type { PutBasketLine } from "#shared/schemas/basket";
import { api } from "./api";
import { basketKeys, basketQuery } from "./basket";
import { useShipTo } from "./preferences";

/** How many of this part lie in the basket. */
export function usePartInBasket(partId: string): number {
  const basket = useQuery(basketQuery(useShipTo())).data;
  const lines = basket?.parcels.flatMap((parcel) => parcel.lines) ?? [];
  return lines.find(({ part }) => part.id === partId)?.quantity ?? 0;
}

type Put = PutBasketLine & { partId: string };

/** Sets how many of a part lie in the basket, and has every view of the basket follow. */
export function usePutInBasket() {
  const queryClient = useQueryClient();
  return useMutation({
    mutationFn: ({ partId, ...line }: Put) => api<unknown>(`/basket/lines/${partId}`, { method: "PUT", body: line }),
    onSuccess: () => queryClient.invalidateQueries({ queryKey: basketKeys.all }),
  });
}
