import { LineSkeletons } from "../../ui/LineSkeletons";
import { Skeleton } from "../../ui/Skeleton";

/** The shape of an order that is being fetched. */
export function OrderSkeleton() {
  return (
    <div role="status" className="grid gap-6">
      <span className="sr-only">Fetching the order</span>
      <Skeleton className="h-28 w-full" />
      <LineSkeletons />
      <Skeleton className="h-16 w-full" />
    </div>
  );
}
