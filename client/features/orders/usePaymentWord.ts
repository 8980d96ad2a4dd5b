import { useQuery, useQueryClient } from "@tanstack/react-query";
import { useEffect, useRef, useState } from "react";
import { announce } from "../../lib/announcements";
import { basketKeys } from "../../lib/basket";
import { orderQuery } from "../../lib/orders";

/** How often the order is looked at while the payment service's word is awaited, and for how long, ms. */
export const askEvery = 2_000;
export const waitAtMost = 60_000;
/** How often an order that waits for payment is looked at otherwise: it may be paid in another tab, or run out. */
const glanceEvery = 30_000;

/**
 * An order, followed while it may change by itself. `cameBack`: its buyer comes from the payment page, where they paid.
 * The page decides nothing: an order is paid when the payment service has said so to the server.
 */
export function usePaymentWord(id: string, cameBack: boolean) {
  const queryClient = useQueryClient();
  const [since, setSince] = useState(() => Date.now());
  const [isOver, setOver] = useState(false);
  const query = useQuery({
    ...orderQuery(id),
    refetchInterval: ({ state }) => {
      if (state.data?.state !== "awaiting-payment") return false;
      return cameBack && !isOver ? askEvery : glanceEvery;
    },
  });
  const state = query.data?.state;
  const isWaiting = cameBack && state === "awaiting-payment" && !isOver;

  useEffect(() => {
    if (!isWaiting) return;
    const timer = setTimeout(() => setOver(true), Math.max(0, since + waitAtMost - Date.now()));
    return () => clearTimeout(timer);
  }, [isWaiting, since]);

  const before = useRef(state);
  useEffect(() => {
    const isNews = before.current === "awaiting-payment" && state === "paid";
    before.current = state;
    if (!isNews) return;
    announce("Paid");
    // What was paid has left the basket.
    void queryClient.invalidateQueries({ queryKey: basketKeys.all });
  }, [state, queryClient]);

  const lookAgain = () => {
    setSince(Date.now());
    setOver(false);
    void query.refetch();
  };
  return { query, isWaiting, waitedInVain: cameBack && state === "awaiting-payment" && isOver, lookAgain };
}
