import { Skeleton } from "./Skeleton";

/** Two lines of parts that are being fetched: drawing, words, quantity, amount. */
export function LineSkeletons() {
  return [0, 1].map((row) => (
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
  ));
}
