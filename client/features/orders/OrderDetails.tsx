import type { Order } from "#shared/schemas/order";
import { allTaxWords } from "../../lib/taxWords";
import { AddressLines } from "../../ui/AddressLines";
import { Money } from "../../ui/Money";
import { RuledHeading } from "../../ui/RuledHeading";
import { TitleBlock, type TitleCell } from "../../ui/TitleBlock";
import { formatMoment } from "./formatMoment";

/** What was or is to be paid for all parcels together. */
export function OrderSums({ order }: { order: Order }) {
  const { currency, parcels, refundedMinor } = order;
  const money = (minor: number) => <Money minor={minor} currency={currency} />;
  const back: TitleCell[] = refundedMinor > 0 ? [{ label: "Given back", value: money(refundedMinor) }] : [];
  return (
    <section className="grid gap-4">
      <RuledHeading>All parcels</RuledHeading>
      <TitleBlock
        cells={[
          { label: "Parts", value: money(order.partsMinor) },
          { label: "Postage", value: money(order.shippingMinor) },
          { label: "Tax", value: allTaxWords(parcels, order.taxMinor, currency) },
          ...back,
          { label: "In all", value: money(order.totalMinor), whole: true },
        ]}
      />
    </section>
  );
}

/** Where the parcels go, and who is billed. */
export function OrderAddresses({ order }: { order: Order }) {
  return (
    <section className="grid gap-4">
      <RuledHeading>Addresses</RuledHeading>
      <div className="grid gap-6 sm:grid-cols-2">
        <AddressLines label="Sent to" address={order.shippingAddress} />
        <AddressLines label="Billed to" address={order.billingAddress} />
      </div>
    </section>
  );
}

/** What happened, with times. */
export function OrderHistory({ history }: { history: Order["history"] }) {
  if (history.length === 0) return null;
  return (
    <section className="grid gap-4">
      <RuledHeading>What happened</RuledHeading>
      <ol className="grid gap-2">
        {history.map(({ at, what }) => (
          <li key={at + what} className="grid gap-x-5 sm:grid-cols-[17rem_1fr]">
            <time dateTime={at} className="text-soft">
              {formatMoment(at)}
            </time>
            {what}
          </li>
        ))}
      </ol>
    </section>
  );
}
