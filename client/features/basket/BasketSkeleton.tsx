import { Skeleton } from "../../ui/Skeleton";

/** The shape of a basket that is being fetched: one parcel of two lines and its sums. */
export function BasketSkeleton() {
  return (
    <div role="status" className="grid gap-4">
      <span className="sr-only">Fetching the basket</span>
      <Skeleton className="h-7 w-full max-w-xl" />
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
          <Skeleton className="h-10 w-32" />
          <Skeleton className="h-6 w-20 justify-self-end" />
        </div>
      ))}
      <Skeleton className="h-16 w-full" />
    </div>
  );
}
