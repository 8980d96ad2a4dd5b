import { infiniteQueryOptions, useMutation, useQueryClient } from "@tanstack/react-query";
import type { Order, OrderList, PlacedOrder } from "#shared/schemas/order";
import { api } from "../../lib/api";
import { orderKeys, orderQuery } from "../../lib/orders";

/** Own orders, newest first, page by page. */
export const ordersQuery = infiniteQueryOptions({
  queryKey: orderKeys.list(),
  queryFn: ({ signal, pageParam }) =>
    api<OrderList>(`/orders${pageParam ? `?cursor=${encodeURIComponent(pageParam)}` : ""}`, { signal }),
  initialPageParam: null as string | null,
  getNextPageParam: (last) => last.nextCursor,
  staleTime: 10_000,
});

/** The payment page of an order that waits for payment. */
export const usePayOrder = (id: string) =>
  useMutation({ mutationFn: () => api<PlacedOrder>(`/orders/${encodeURIComponent(id)}/pay`, { method: "POST" }) });

export function useCancelOrder(id: string) {
  const queryClient = useQueryClient();
  return useMutation({
    mutationFn: () => api<Order>(`/orders/${encodeURIComponent(id)}/cancel`, { method: "POST" }),
    onSuccess: async (order) => {
      queryClient.setQueryData(orderQuery(id).queryKey, order);
      await queryClient.invalidateQueries({ queryKey: orderKeys.list() });
    },
    // It may have been paid or have run out meanwhile: show what it is now.
    onError: () => queryClient.invalidateQueries({ queryKey: orderQuery(id).queryKey }),
  });
}
