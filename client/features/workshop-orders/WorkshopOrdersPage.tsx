import { useInfiniteQuery } from "@tanstack/react-query";
import { useSearchParams } from "react-router-dom";
import { parcelFilters, type WorkshopParcelQuery } from "#shared/schemas/workshopParcel";
import { useTitle } from "../../lib/useTitle";
import { MorePages } from "../../ui/MorePages";
import { Notice } from "../../ui/Notice";
import { Skeleton } from "../../ui/Skeleton";
import { workshopParcelsQuery } from "./api";
import { OrdersFailure } from "./OrdersFailure";
import { ParcelRow } from "./ParcelRow";
import { workshopParcelWords } from "./parcelWords";
import { StateLinks } from "./StateLinks";

function ParcelsSkeleton() {
  return (
    <div role="status">
      <span className="sr-only">Fetching your workshop’s parcels</span>
      {[0, 1, 2].map((row) => (
        <div key={row} className="grid gap-5 border-b border-rule py-4 md:grid-cols-[14rem_1fr_1fr]">
          <Skeleton className="h-16 w-32" />
          <Skeleton className="h-16 w-full max-w-xs" />
          <Skeleton className="h-11 w-full max-w-sm" />
        </div>
      ))}
    </div>
  );
}

const stateFrom = (given: string | null): WorkshopParcelQuery["state"] =>
  parcelFilters.find((state) => state === given) ?? "open";

/** A workshop's parcels of paid orders, with what to do next; the state shown is in the address. */
export function WorkshopOrdersPage() {
  useTitle("Parcels to send");
  const [search] = useSearchParams();
  const state = stateFrom(search.get("state"));
  const { data, error, isFetchingNextPage, hasNextPage, fetchNextPage, refetch } = useInfiniteQuery(
    workshopParcelsQuery(state),
  );
  const parcels = data?.pages.flatMap(({ items }) => items);
  return (
    <div className="page grid grid-cols-1 gap-6 py-8">
      <h1>Parcels to send</h1>
      {data && <StateLinks shown={state} counts={data.pages.at(-1)?.counts ?? {}} />}
      {error && (
        <OrdersFailure
          error={error}
          what={parcels ? "No more parcels could be fetched" : "Your workshop’s parcels could not be fetched"}
          onRetry={() => void (parcels ? fetchNextPage() : refetch())}
        />
      )}
      {!parcels && !error && <ParcelsSkeleton />}
      {parcels?.length === 0 && (
        <Notice title={state === "open" ? "Nothing waits to be sent" : "No parcel stands here"}>
          <p>
            {state === "open"
              ? "A mail tells you when a part of yours is paid; it then stands here."
              : `None of yours is ${workshopParcelWords[state].name.toLowerCase()} now.`}
          </p>
        </Notice>
      )}
      {parcels && parcels.length > 0 && (
        <div>
          <ul className="border-t border-rule">
            {parcels.map((parcel) => (
              <ParcelRow key={parcel.id} parcel={parcel} />
            ))}
          </ul>
          <MorePages
            shown={parcels.length}
            what="parcels"
            hasMore={hasNextPage}
            isLoading={isFetchingNextPage}
            onMore={() => void fetchNextPage()}
          />
        </div>
      )}
    </div>
  );
}
