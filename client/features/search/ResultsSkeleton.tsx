import { Skeleton } from "../../ui/Skeleton";

/** The shape of the results: a rail and rows. */
export function ResultsSkeleton() {
  return (
    <div role="status" className="grid gap-4">
      <span className="sr-only">Looking for parts</span>
      <Skeleton className="mt-3 h-18 w-full md:h-33" />
      <Skeleton className="h-6 w-72 max-w-full" />
      {["one", "two", "three", "four"].map((row) => (
        <div key={row} className="part-row">
          <div style={{ gridArea: "drawing" }}>
            <Skeleton className="h-33 w-full" />
          </div>
          <div style={{ gridArea: "words" }} className="grid content-start gap-2">
            <Skeleton className="h-6 w-4/5" />
            <Skeleton className="h-4 w-3/5" />
            <Skeleton className="h-4 w-full" />
          </div>
          <div style={{ gridArea: "sizes" }} className="grid content-start gap-2">
            <Skeleton className="h-5 w-full" />
            <Skeleton className="h-5 w-full" />
            <Skeleton className="h-5 w-full" />
          </div>
          <div style={{ gridArea: "price" }} className="grid content-start gap-2">
            <Skeleton className="h-7 w-24" />
            <Skeleton className="h-10 w-36" />
          </div>
        </div>
      ))}
    </div>
  );
}
