import { keepPreviousData, useQuery } from "@tanstack/react-query";
import { useMemo, useState } from "react";
import { countryName } from "#shared/domain/countries";
import { formatMoney } from "#shared/domain/money";
import type { Basket } from "#shared/schemas/basket";
import { basketQuery } from "../../lib/basket";
import { useShipTo, useUnit } from "../../lib/preferences";
import { useTitle } from "../../lib/useTitle";
import { comparedScale } from "../../ui/drawing/comparedScale";
import { ScaleBar } from "../../ui/drawing/ScaleBar";
import { FailureNotice } from "../../ui/FailureNotice";
import { BasketSection } from "./BasketSection";
import { BasketSkeleton } from "./BasketSkeleton";
import { BasketTotals } from "./BasketTotals";
import { drawnOf } from "./drawnOf";
import { EmptyBasket } from "./EmptyBasket";
import { PendingOrder } from "./PendingOrder";
import { ShipToSelect } from "./ShipToSelect";
import { useUnsettled } from "./useUnsettled";
import { type RemovedLine, withRemoved } from "./withRemoved";

const count = (n: number, one: string) => `${n} ${one}${n === 1 ? "" : "s"}`;

function Summary({ basket, shipTo, isStale }: { basket: Basket; shipTo: string; isStale: boolean }) {
  return (
    <p className="text-step1 leading-9">
      {count(basket.count, "piece")} in {count(basket.parcels.length, "parcel")}, sent to{" "}
      <ShipToSelect shipTo={shipTo} />:{" "}
      <strong className={isStale ? "font-bold text-soft" : "font-bold"}>
        {formatMoney(basket.totalMinor, basket.currency)}
      </strong>{" "}
      {basket.canCheckOut ? "with postage." : "so far."}
    </p>
  );
}

/** What was gathered, parcel by parcel, and what it costs delivered. */
export function BasketPage() {
  useTitle("Basket");
  const shipTo = useShipTo();
  const unit = useUnit();
  const {
    data: basket,
    error,
    isPlaceholderData,
    refetch,
  } = useQuery({
    ...basketQuery(shipTo),
    placeholderData: keepPreviousData,
  });
  const [removed, setRemoved] = useState<RemovedLine[]>([]);
  const [unsettled, onUnsettled] = useUnsettled();

  const sections = useMemo(() => withRemoved(basket?.parcels ?? [], removed), [basket, removed]);
  const scale = useMemo(
    () => comparedScale(sections.flatMap(({ entries }) => entries.flatMap(({ line }) => drawnOf(line.part) ?? []))),
    [sections],
  );
  const isEmpty = basket?.count === 0;
  return (
    <div className="page grid grid-cols-1 gap-9 py-8">
      <header className="grid gap-3">
        <h1>Basket</h1>
        {basket && !isEmpty && (
          <>
            <Summary basket={basket} shipTo={shipTo} isStale={isPlaceholderData} />
            <div className="flex flex-wrap items-center gap-x-6">
              <ScaleBar pxPerMm={scale.pxPerMm} unit={unit} />
              <p role="status" className="text-small text-soft">
                {isPlaceholderData && `Reckoning postage to ${countryName(shipTo)}`}
              </p>
            </div>
          </>
        )}
      </header>
      <PendingOrder />
      {error && (
        <FailureNotice
          error={error}
          what="The basket could not be fetched"
          kept="What lies in it is kept."
          onRetry={() => void refetch()}
        />
      )}
      {!basket && !error && <BasketSkeleton />}
      {basket &&
        sections.map((section, index) => (
          <BasketSection
            key={section.workshop.id}
            section={section}
            label={`Parcel ${index + 1} of ${basket.parcels.length}`}
            shipTo={shipTo}
            currency={basket.currency}
            scale={scale}
            onUnsettled={onUnsettled}
            onRemove={(line, at) =>
              setRemoved((all) => [
                ...all.filter((one) => one.line.part.id !== line.part.id),
                { line, workshop: section.workshop, index: at },
              ])
            }
          />
        ))}
      {basket && (isEmpty ? <EmptyBasket /> : <BasketTotals basket={basket} unsettled={unsettled} />)}
    </div>
  );
}
