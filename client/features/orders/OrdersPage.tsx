import { useInfiniteQuery } from "@tanstack/react-query";
import { useTitle } from "../../lib/useTitle";
import { FailureNotice } from "../../ui/FailureNotice";
import { LinkButton } from "../../ui/LinkButton";
import { MorePages } from "../../ui/MorePages";
import { Notice } from "../../ui/Notice";
import { Skeleton } from "../../ui/Skeleton";
import { ordersQuery } from "./api";
import { OrderRow } from "./OrderRow";

function OrdersSkeleton() {
  return (
    <div role="status">
      <span className="sr-only">Fetching your orders</span>
      {[0, 1, 2].map((row) => (
        <div key={row} className="grid grid-cols-2 gap-5 border-b border-rule py-4 md:grid-cols-[9rem_12rem_1fr_7rem]">
          <Skeleton className="h-11 w-24" />
          <Skeleton className="h-6 w-36" />
          <Skeleton className="h-11 w-full max-w-md" />
          <Skeleton className="h-7 w-20 justify-self-end" />
        </div>
      ))}
    </div>
  );
}

/** What one has bought, newest first. */
export function OrdersPage() {
  useTitle("Your orders");
  const { data, error, isFetchingNextPage, hasNextPage, fetchNextPage, refetch } = useInfiniteQuery(ordersQuery);
  const orders = data?.pages.flatMap(({ items }) => items);
  return (
    <div className="page grid grid-cols-1 gap-6 py-8">
      <h1>Your orders</h1>
      {error && (
        <FailureNotice
          error={error}
          what={orders ? "No more orders could be fetched" : "Your orders could not be fetched"}
          kept="Nothing has changed with them."
          onRetry={() => void (orders ? fetchNextPage() : refetch())}
        />
      )}
      {!orders && !error && <OrdersSkeleton />}
      {orders?.length === 0 && (
        <Notice title="You have ordered nothing yet">
          <p>Measure the worn part: what fits it is shown with its chance and its price at your door.</p>
          <LinkButton to="/" look="primary" className="justify-self-start">
            Measure a part
          </LinkButton>
        </Notice>
      )}
      {orders && orders.length > 0 && (
        <div>
          <ul className="border-t border-rule">
            {orders.map((order) => (
              <OrderRow key={order.id} order={order} />
            ))}
          </ul>
          <MorePages
            shown={orders.length}
            what="orders"
            hasMore={hasNextPage}
            isLoading={isFetchingNextPage}
            onMore={() => void fetchNextPage()}
          />
        </div>
      )}
    </div>
  );
}
