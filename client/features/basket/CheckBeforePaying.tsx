import { type ReactNode, useMemo } from "react";
import { Link } from "react-router-dom";
import { countryName } from "#shared/domain/countries";
import { formatMoney } from "#shared/domain/money";
import type { Basket } from "#shared/schemas/basket";
import { useUnit } from "../../lib/preferences";
import { allTaxWords } from "../../lib/taxWords";
import { Button } from "../../ui/Button";
import { comparedScale } from "../../ui/drawing/comparedScale";
import { ScaleBar } from "../../ui/drawing/ScaleBar";
import { Money } from "../../ui/Money";
import { RuledHeading } from "../../ui/RuledHeading";
import { TitleBlock } from "../../ui/TitleBlock";
import { madeOf, Withdrawal } from "../../ui/Withdrawal";
import { CheckParcel } from "./CheckParcel";
import { drawnOf } from "./drawnOf";

type Props = {
  basket: Basket;
  /** The prices are still those of another country. */
  isStale: boolean;
  isSending: boolean;
  problem: ReactNode;
};

/** Everything that is about to be bought, and the button that buys it. */
export function CheckBeforePaying({ basket, isStale, isSending, problem }: Props) {
  const unit = useUnit();
  const { parcels, currency } = basket;
  const lines = parcels.flatMap((parcel) => parcel.lines);
  const scale = useMemo(
    () => comparedScale(basket.parcels.flatMap((parcel) => parcel.lines.flatMap(({ part }) => drawnOf(part) ?? []))),
    [basket],
  );
  const isBlocked = !basket.canCheckOut;
  return (
    <div className="grid grid-cols-1 gap-8" aria-busy={isStale}>
      <ScaleBar pxPerMm={scale.pxPerMm} unit={unit} />
      {parcels.map((parcel, index) => (
        <CheckParcel
          key={parcel.workshop.id}
          parcel={parcel}
          label={`Parcel ${index + 1} of ${parcels.length}`}
          currency={currency}
          scale={scale}
        />
      ))}
      <div className="grid gap-3">
        <RuledHeading level={3}>Changing your mind</RuledHeading>
        <Withdrawal made={madeOf(lines)} />
      </div>
      <div className="grid gap-5">
        <RuledHeading level={3}>All parcels, to {countryName(basket.shipTo)}</RuledHeading>
        <TitleBlock
          cells={[
            { label: "Parts", value: <Money minor={basket.partsMinor} currency={currency} /> },
            { label: "Postage", value: <Money minor={basket.shippingMinor} currency={currency} /> },
            { label: "Tax", value: allTaxWords(parcels, basket.taxMinor, currency) },
            { label: "You pay", value: <Money minor={basket.totalMinor} currency={currency} />, whole: true },
          ]}
        />
        {problem}
        {isBlocked && !problem && (
          <p id="order-reason" className="max-w-prose">
            <span className="font-semibold text-outband">This cannot be ordered as it stands.</span> What is marked
            above needs another look: <Link to="/basket">go to the basket</Link>, or choose another country.
          </p>
        )}
        <div className="grid justify-items-start gap-2">
          <Button
            type="submit"
            look="primary"
            className="min-h-12 min-w-64 text-step1"
            disabled={isBlocked || isStale}
            aria-describedby={isBlocked && !problem ? "order-reason" : "order-note"}
          >
            Order and pay {formatMoney(basket.totalMinor, currency)}
          </Button>
          <p id="order-note" className="text-soft">
            You pay on the payment service’s own page; no card details reach Idlewright.
          </p>
          <p role="status" className="min-h-6">
            {isSending && "Making the order and opening the payment page"}
            {isStale && "Reckoning postage anew"}
          </p>
        </div>
      </div>
    </div>
  );
}
