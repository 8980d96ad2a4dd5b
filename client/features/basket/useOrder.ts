import { useQueryClient } from "@tanstack/react-query";
import { useEffect, useRef, useState } from "react";
import type { UseFormReturn } from "react-hook-form";
import type { Basket } from "#shared/schemas/basket";
import { ApiProblem } from "../../lib/ApiProblem";
import { basketQuery } from "../../lib/basket";
import { leaveTo } from "../../lib/leaveTo";
import { setProblemErrors } from "../../lib/setProblemErrors";
import { type SavedAddress, usePlaceOrder } from "./api";
import { basketChanges } from "./basketChanges";
import { type CheckoutValues, shippingOf } from "./checkoutValues";

const outdated = ["total-changed", "out-of-stock", "not-shipped-there", "empty-basket"] as const;

/** Sends the order once and goes on to pay it, or keeps why it was refused. */
export function useOrder(
  form: UseFormReturn<CheckoutValues>,
  saved: readonly SavedAddress[],
  basket: Basket | undefined,
) {
  const queryClient = useQueryClient();
  const place = usePlaceOrder();
  const [problem, setProblem] = useState<Error | null>(null);
  const [changes, setChanges] = useState<string[]>([]);
  const [isSending, setSending] = useState(false);
  const underWay = useRef(false);
  const stop = () => {
    underWay.current = false;
    setSending(false);
  };

  useEffect(() => {
    // Back from the payment page, a browser may show this very page again, as it was when it was left.
    const onShow = (event: PageTransitionEvent) => {
      if (!event.persisted) return;
      underWay.current = false;
      setSending(false);
    };
    window.addEventListener("pageshow", onShow);
    return () => window.removeEventListener("pageshow", onShow);
  }, []);

  /** Has the page show what the refusal speaks of, and says what differs. */
  const refresh = async (shown: Basket) => {
    try {
      const now = await queryClient.fetchQuery({ ...basketQuery(shown.shipTo), staleTime: 0 });
      setChanges(basketChanges(shown, now));
    } catch {
      // The refusal itself is told; the prices are fetched again with the next try.
    }
  };

  const order = async (values: CheckoutValues) => {
    // The button shows the price of this basket: without it, nothing was agreed to.
    if (underWay.current || !basket) return;
    underWay.current = true;
    setSending(true);
    setProblem(null);
    setChanges([]);
    try {
      const placed = await place.mutateAsync({
        basket,
        order: {
          shippingAddress: shippingOf(values, saved),
          billingAddress: values.hasOtherBilling ? values.billingAddress : null,
          expectedTotalMinor: basket.totalMinor,
          currency: basket.currency,
        },
      });
      // Stays under way: the page is being left.
      leaveTo(placed.paymentUrl);
    } catch (error) {
      if (error instanceof ApiProblem && error.is("invalid-request")) setProblemErrors(error, form.setError);
      else {
        if (error instanceof ApiProblem && outdated.some((name) => error.is(name))) await refresh(basket);
        setProblem(error instanceof Error ? error : new Error("The order could not be sent"));
      }
      stop();
    }
  };
  return { problem, changes, isSending, order };
}
