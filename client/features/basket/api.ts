import { type QueryClient, queryOptions, useMutation, useQueryClient } from "@tanstack/react-query";
import type { z } from "zod";
import { type Basket, PutBasketLine } from "#shared/schemas/basket";
import type { AddressList, PlacedOrder, PlaceOrder } from "#shared/schemas/order";
import { ApiProblem } from "../../lib/ApiProblem";
import { api } from "../../lib/api";
import { basketKeys } from "../../lib/basket";
import { checkoutKeyFor, forgetAttempt, keepOrderOfCheckout, keptOrderId } from "../../lib/keptCheckout";
import { orderQuery } from "../../lib/orders";

/** Shows the basket as the server answered it; what it costs elsewhere is fetched when it is looked at. */
async function showBasket(queryClient: QueryClient, basket: Basket): Promise<void> {
  queryClient.setQueryData(basketKeys.to(basket.shipTo), basket);
  await queryClient.invalidateQueries({
    queryKey: basketKeys.all,
    predicate: ({ queryKey }) => queryKey[1] !== basket.shipTo,
    refetchType: "none",
  });
}

/** A change of one line. Changes wait for each other, so that the last one asked for is the one that stays. */
function useLineChange<Input>(shipTo: string, send: (input: Input, query: string) => Promise<Basket>) {
  const queryClient = useQueryClient();
  return useMutation({
    scope: { id: "basket" },
    mutationFn: (input: Input) => send(input, `?shipTo=${encodeURIComponent(shipTo)}`),
    // An answer that is still on its way tells of the basket before this change.
    onMutate: () => queryClient.cancelQueries({ queryKey: basketKeys.all }),
    onSuccess: (basket) => showBasket(queryClient, basket),
  });
}

export type WantedLine = { partId: string; quantity: number; forNeed?: string | undefined };

export const usePutLine = (shipTo: string) =>
  useLineChange<WantedLine>(shipTo, ({ partId, ...body }, query) =>
    api<Basket>(`/basket/lines/${partId}${query}`, { method: "PUT", body }),
  );

export const useRemoveLine = (shipTo: string) =>
  useLineChange<string>(shipTo, (partId, query) =>
    api<Basket>(`/basket/lines/${partId}${query}`, { method: "DELETE" }),
  );

export type ReadQuantity = { ok: true; quantity: number } | { ok: false; message: string };

/** A quantity as somebody writes it, by the rule that the server has. */
export function readQuantity(text: string): ReadQuantity {
  const written = text.trim();
  if (written === "") return { ok: false, message: "Write how many, or remove it" };
  if (!/^\d+$/.test(written)) return { ok: false, message: "Write a whole number, such as 2" };
  const { success, data, error } = PutBasketLine.shape.quantity.safeParse(Number(written));
  return success
    ? { ok: true, quantity: data }
    : { ok: false, message: error.issues[0]?.message ?? "Write a whole number" };
}

export type SavedAddress = z.infer<typeof AddressList>["items"][number];

export const addressesQuery = queryOptions({
  queryKey: ["addresses"] as const,
  queryFn: ({ signal }) => api<z.infer<typeof AddressList>>("/addresses", { signal }),
});

/** An earlier attempt whose order has been settled since does not answer for this one. */
async function forgetSettledAttempt(queryClient: QueryClient): Promise<void> {
  const orderId = keptOrderId();
  if (!orderId) return;
  try {
    const order = await queryClient.fetchQuery(orderQuery(orderId));
    if (order.state !== "awaiting-payment") forgetAttempt();
  } catch (error) {
    if (!(error instanceof ApiProblem && error.is("not-found"))) throw error;
    forgetAttempt();
  }
}

export type OrderRequest = { order: Omit<PlaceOrder, "checkoutKey">; basket: Basket };

/** Orders what is shown. However often it is asked for, the same content gives one order. */
export function usePlaceOrder() {
  const queryClient = useQueryClient();
  return useMutation({
    mutationFn: async ({ order, basket }: OrderRequest) => {
      await forgetSettledAttempt(queryClient);
      const lines = basket.parcels.flatMap((parcel) => parcel.lines);
      const what = JSON.stringify([lines.map(({ part, quantity }) => [part.id, quantity]), order]);
      const body: PlaceOrder = { ...order, checkoutKey: checkoutKeyFor(what) };
      return api<PlacedOrder>("/orders", { method: "POST", body });
    },
    onSuccess: ({ orderId }) => keepOrderOfCheckout(orderId),
    onError: (error) => {
      // The order of this key cannot be paid any more: the next try is another order.
      if (error instanceof ApiProblem && error.is("wrong-state")) forgetAttempt();
    },
  });
}
