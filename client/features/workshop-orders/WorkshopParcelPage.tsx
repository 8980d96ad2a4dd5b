import { useQuery } from "@tanstack/react-query";
import { Link, useParams } from "react-router-dom";
import { useTitle } from "../../lib/useTitle";
import { Button } from "../../ui/Button";
import { LineSkeletons } from "../../ui/LineSkeletons";
import { Skeleton } from "../../ui/Skeleton";
import { workshopParcelQuery } from "./api";
import { NextStep } from "./NextStep";
import { OrdersFailure } from "./OrdersFailure";
import { ParcelDetails } from "./ParcelDetails";
import { ParcelLines } from "./ParcelLines";

/** A workshop's parcel: what to do next with it, what is in it, where it goes. */
export function WorkshopParcelPage() {
  const { id = "" } = useParams();
  const { data: parcel, error, refetch } = useQuery(workshopParcelQuery(id));
  useTitle(parcel ? `Parcel of order ${parcel.orderNumber}` : "Parcel");
  return (
    <div className="page grid grid-cols-1 gap-9 py-8">
      <header className="flex flex-wrap items-end justify-between gap-4">
        <div>
          <p className="print:hidden">
            <Link to="/workshop/orders" className="inline-block min-h-6">
              Parcels to send
            </Link>
          </p>
          <h1>{parcel ? `Parcel of order ${parcel.orderNumber}` : "Parcel"}</h1>
          {parcel && (
            <p className="text-soft">
              for {parcel.recipient}, {parcel.town}, {parcel.countryName}
            </p>
          )}
        </div>
        {parcel && (
          <Button className="print:hidden" onClick={() => window.print()}>
            Print
          </Button>
        )}
      </header>
      {error && (
        <OrdersFailure
          error={error}
          what={parcel ? "Where the parcel stands now could not be fetched" : "The parcel could not be fetched"}
          onRetry={() => void refetch()}
        />
      )}
      {!parcel && !error && (
        <div role="status" className="grid gap-6">
          <span className="sr-only">Fetching the parcel</span>
          <Skeleton className="h-28 w-full" />
          <LineSkeletons />
        </div>
      )}
      {parcel && (
        <>
          <NextStep parcel={parcel} />
          <ParcelLines parcel={parcel} />
          <ParcelDetails parcel={parcel} />
        </>
      )}
    </div>
  );
}
