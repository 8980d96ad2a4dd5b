import { useMemo, useState } from "react";
import { useLocation } from "react-router-dom";
import type { PartKind } from "#shared/domain/partKinds";
import { sharedScale } from "#shared/drawing/sharedScale";
import type { SearchAnswer } from "#shared/schemas/search";
import type { SizeUnit } from "../../lib/formatSize";
import { MorePages } from "../../ui/MorePages";
import { RuledHeading } from "../../ui/RuledHeading";
import { drawnOf, type RowScale, rowDrawing } from "./drawnOf";
import { NoParts } from "./NoParts";
import { PartRow } from "./PartRow";
import { RailSection } from "./RailSection";
import { Narrow, SortChoices, UnitChoices } from "./ResultTools";

type Props = {
  pages: readonly SearchAnswer[];
  unit: SizeUnit;
  needQuery: string;
  needKey: string;
  /** Another need or order is being fetched while this one is shown. */
  isStale: boolean;
  hasMore: boolean;
  isFetchingMore: boolean;
  onMore: () => void;
};

/** One scale for every row of a kind, so that rows can be compared by eye. */
function useScales(items: SearchAnswer["items"]): Map<PartKind, RowScale> {
  return useMemo(() => {
    const drawn = items.map(drawnOf).filter((one) => one !== null);
    const kinds = new Set(drawn.map(({ kind }) => kind));
    return new Map(
      [...kinds].map((kind) => [
        kind,
        sharedScale(
          drawn.filter((one) => one.kind === kind),
          rowDrawing,
        ),
      ]),
    );
  }, [items]);
}

/** What was found: the rail, the rows, and what narrowly misses. */
export function Results({ pages, unit, needQuery, needKey, isStale, hasMore, isFetchingMore, onMore }: Props) {
  const [litId, setLit] = useState<string | null>(null);
  const [first] = pages as readonly [SearchAnswer, ...SearchAnswer[]];
  const items = useMemo(() => pages.flatMap((page) => page.items), [pages]);
  const everything = useMemo(() => [...items, ...first.nearMisses], [items, first]);
  const scales = useScales(everything);
  const { need, nearMisses, total } = first;
  const scaleOf = (item: SearchAnswer["items"][number]) => {
    const kind = drawnOf(item)?.kind;
    return kind ? scales.get(kind) : undefined;
  };
  const { pathname, search } = useLocation();
  const row = { need, needQuery, unit, onLight: setLit, from: { backTo: `${pathname}${search}`, total } };

  return (
    <>
      <RailSection answer={first} unit={unit} needKey={needKey} litId={litId} onLight={setLit} />
      <div className="mt-3 flex flex-wrap items-baseline gap-x-8 gap-y-1">
        <SortChoices />
        <UnitChoices unit={unit} />
        <Narrow />
      </div>
      <section aria-busy={isStale} className={isStale ? "opacity-70" : ""}>
        <RuledHeading className="mt-4">{`Parts${total > 0 ? `: ${total}` : ""}`}</RuledHeading>
        {items.length === 0 ? (
          <div className="py-6">
            <NoParts answer={first} />
          </div>
        ) : (
          <>
            <ol>
              {items.map((item) => (
                <PartRow key={item.part.id} item={item} scale={scaleOf(item)} isLit={litId === item.part.id} {...row} />
              ))}
            </ol>
            <MorePages
              shown={items.length}
              total={total}
              what="parts"
              hasMore={hasMore}
              isLoading={isFetchingMore}
              onMore={onMore}
            />
          </>
        )}
      </section>
      {nearMisses.length > 0 && (
        <section>
          <RuledHeading className="mt-4">Near misses: one size does not fit</RuledHeading>
          <ol>
            {nearMisses.map((item) => (
              <PartRow
                key={item.part.id}
                item={item}
                scale={scaleOf(item)}
                isLit={litId === item.part.id}
                failing={item.failing.reason}
                {...row}
              />
            ))}
          </ol>
        </section>
      )}
    </>
  );
}
