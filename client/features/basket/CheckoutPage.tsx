import { useQuery } from "@tanstack/react-query";
import type { ReactNode } from "react";
import { basketQuery } from "../../lib/basket";
import { useShipTo } from "../../lib/preferences";
import { useSessionUser } from "../../lib/session";
import { useTitle } from "../../lib/useTitle";
import { Skeleton } from "../../ui/Skeleton";
import { addressesQuery } from "./api";
import { CheckoutForm } from "./CheckoutForm";
import { EmptyBasket } from "./EmptyBasket";
import { PendingOrder } from "./PendingOrder";

/** Three steps on one page, from the basket to the payment page. Only for whoever is signed in. */
export function CheckoutPage({ sendVerification }: { sendVerification: ReactNode }) {
  useTitle("Check out");
  const user = useSessionUser();
  const addresses = useQuery(addressesQuery);
  const isEmpty = useQuery(basketQuery(useShipTo())).data?.count === 0;
  // Without the saved ones an address can still be written.
  const isSettled = addresses.data !== undefined || addresses.isError;
  return (
    <div className="page py-8">
      <div className="grid max-w-4xl grid-cols-1 gap-8">
        <h1>Check out</h1>
        <PendingOrder />
        {isEmpty && <EmptyBasket />}
        {addresses.isError && !isEmpty && (
          <p role="status">The addresses used before could not be fetched. You can write one below.</p>
        )}
        {!isSettled && (
          <div role="status" className="grid max-w-xl gap-5">
            <span className="sr-only">Fetching your addresses</span>
            {[0, 1, 2, 3].map((row) => (
              <Skeleton key={row} className="h-16 w-full" />
            ))}
          </div>
        )}
        {isSettled && user && !isEmpty && (
          <CheckoutForm userId={user.id} saved={addresses.data?.items ?? []} sendVerification={sendVerification} />
        )}
      </div>
    </div>
  );
}
