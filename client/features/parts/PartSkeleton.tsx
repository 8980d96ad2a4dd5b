import { Skeleton } from "../../ui/Skeleton";

/** The shape of a part's page. */
export function PartSkeleton() {
  return (
    <div className="page grid gap-4 pt-8" role="status">
      <span className="sr-only">Fetching the part</span>
      <Skeleton className="h-10 w-2/3" />
      <Skeleton className="h-6 w-1/2" />
      <div className="part-columns">
        <div style={{ gridArea: "drawing" }}>
          <Skeleton className="mt-8 aspect-[4/3] w-full" />
        </div>
        <div style={{ gridArea: "decide" }} className="grid content-start gap-4">
          <Skeleton className="mt-8 h-8 w-1/2" />
          <Skeleton className="h-16 w-full" />
          <Skeleton className="h-16 w-full" />
          <Skeleton className="h-12 w-full" />
        </div>
      </div>
    </div>
  );
}
