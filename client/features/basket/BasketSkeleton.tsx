import { LineSkeletons } from "../../ui/LineSkeletons";
import { Skeleton } from "../../ui/Skeleton";

/** The shape of a basket that is being fetched: one parcel of two lines and its sums. */
export function BasketSkeleton() {
  return (
    <div role="status" className="grid gap-4">
      <span className="sr-only">Fetching the basket</span>
      <Skeleton className="h-7 w-full max-w-xl" />
      <LineSkeletons />
      <Skeleton className="h-16 w-full" />
    </div>
  );
}
