import { Button } from "./Button";

type Props = { shown: number; total?: number; what: string; hasMore: boolean; isLoading: boolean; onMore: () => void };

/** The end of a paged list: how much of it is shown, and the rest. */
export function MorePages({ shown, total, what, hasMore, isLoading, onMore }: Props) {
  return (
    <div className="flex flex-wrap items-center gap-4 py-6">
      {hasMore && (
        <Button onClick={onMore} disabled={isLoading}>
          {isLoading ? "Fetching more" : `More ${what}`}
        </Button>
      )}
      <p className="text-soft">{total === undefined ? `${shown} shown` : `${shown} of ${total} ${what} shown`}</p>
    </div>
  );
}
