import { Link } from "react-router-dom";
import { formatMoney } from "#shared/domain/money";
import type { OrderLine, OrderParcel } from "#shared/schemas/order";
import { formatDay } from "../../lib/formatDate";
import { taxWords } from "../../lib/taxWords";
import type { ComparedScale, Drawable } from "../../ui/drawing/comparedScale";
import { LineRow } from "../../ui/LineRow";
import { MadeToSize } from "../../ui/MadeToSize";
import { Money } from "../../ui/Money";
import { RuledHeading } from "../../ui/RuledHeading";
import { TitleBlock } from "../../ui/TitleBlock";
import { ParcelRail } from "./ParcelRail";
import { TraderLines } from "./TraderLines";

/** What is drawn of a line: the part as it was bought; null for a kit. */
export const drawnLine = ({ kind, dimensions }: OrderLine): Drawable | null =>
  kind === "rebuild-kit" ? null : { kind, dims: dimensions };

/** "Left on 3 December 2026, carried by Harbour Post, tracking number HP 12". */
function dispatchWords(dispatchedAt: string, { carrier, trackingNumber }: OrderParcel): string {
  return [
    `Left on ${formatDay(dispatchedAt)}`,
    ...(carrier ? [`carried by ${carrier}`] : []),
    ...(trackingNumber ? [`tracking number ${trackingNumber}`] : []),
  ].join(", ");
}

type Props = {
  parcel: OrderParcel;
  label: string;
  currency: string;
  scale: ComparedScale;
  /** Only a paid order's parcels are on their way. */
  isPaid: boolean;
};

/** One workshop's parcel of an order, with everything as it was bought. */
export function OrderParcelSection({ parcel, label, currency, scale, isPaid }: Props) {
  const { workshop, lines, trader, leavesBy, dispatchedAt, state } = parcel;
  // The time of a re-mould is counted from when its core arrives.
  const isCounted = !dispatchedAt && state !== "core-awaited" && state !== "core-refused";
  return (
    <section>
      <RuledHeading>
        {label}
        <span className="sr-only"> from {workshop.name}</span>
      </RuledHeading>
      <p className="mt-2 text-soft">
        <Link to={`/workshops/${workshop.slug}`} className="font-semibold text-ink">
          {workshop.name}
        </Link>
        , {workshop.town}, {workshop.countryName}
        {isPaid && leavesBy && isCounted && `; leaves by ${formatDay(leavesBy)}`}
      </p>
      {isPaid && (
        <div className="mt-4">
          <ParcelRail state={state} />
          {dispatchedAt && <p className="[overflow-wrap:anywhere]">{dispatchWords(dispatchedAt, parcel)}.</p>}
        </div>
      )}
      <ul>
        {lines.map((line) => (
          <LineRow
            key={line.id}
            partId={line.partId}
            title={line.title}
            kind={line.kind}
            dims={line.dimensions}
            drawn={drawnLine(line)}
            forNeed={line.forNeed}
            scale={scale}
            notes={line.madeToSize && <MadeToSize />}
            quantity={
              <p>
                {line.quantity} × {formatMoney(line.unitMinor, currency)}
              </p>
            }
            price={
              <p className="text-step1 font-bold">
                <Money minor={line.lineMinor} currency={currency} />
              </p>
            }
          />
        ))}
      </ul>
      <TitleBlock
        className="mt-5"
        cells={[
          { label: "Parts", value: <Money minor={parcel.partsMinor} currency={currency} /> },
          { label: "Postage", value: <Money minor={parcel.shippingMinor} currency={currency} /> },
          { label: "Tax", value: taxWords(parcel, currency) },
          { label: "This parcel", value: <Money minor={parcel.totalMinor} currency={currency} />, whole: true },
        ]}
      />
      <TraderLines trader={trader} />
    </section>
  );
}
