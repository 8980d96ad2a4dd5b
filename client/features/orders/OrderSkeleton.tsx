import { Skeleton } from "../../ui/Skeleton";

/** The shape of an order that is being fetched. */
export function OrderSkeleton() {
  return (
    <div role="status" className="grid gap-6">
      <span className="sr-only">Fetching the order</span>
      <Skeleton className="h-28 w-full" />
      {[0, 1].map((row) => (
        <div
          key={row}
          className="grid grid-cols-[auto_1fr] gap-5 border-b border-rule py-5 md:grid-cols-[auto_1fr_10rem_8.5rem]"
        >
          <Skeleton className="h-[108px] w-[120px]" />
          <div className="grid content-start gap-2">
            <Skeleton className="h-6 w-3/4" />
            <Skeleton className="h-5 w-full max-w-md" />
          </div>
          <Skeleton className="h-6 w-24" />
          <Skeleton className="h-6 w-20 justify-self-end" />
        </div>
      ))}
      <Skeleton className="h-16 w-full" />
    </div>
  );
}
