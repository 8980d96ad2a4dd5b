import { queryOptions } from "@tanstack/react-query";
import type { Order } from "#shared/schemas/order";
import { api } from "./api";

export const orderKeys = {
  all: ["orders"] as const,
  list: () => [...orderKeys.all, "list"] as const,
  detail: (id: string) => [...orderKeys.all, "detail", id] as const,
};

/** An order as it stands. Never taken for fresh: payment changes it behind this page's back. */
export const orderQuery = (id: string) =>
  queryOptions({
    queryKey: orderKeys.detail(id),
    queryFn: ({ signal }) => api<Order>(`/orders/${encodeURIComponent(id)}`, { signal }),
    staleTime: 0,
  });
