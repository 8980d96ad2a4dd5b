import type { WorkshopParcel } from "#shared/schemas/workshopParcel";
import { formatDeadline } from "../../lib/formatDate";
import { AddressLines } from "../../ui/AddressLines";
import { Money } from "../../ui/Money";
import { RuledHeading } from "../../ui/RuledHeading";
import { TitleBlock } from "../../ui/TitleBlock";

/** Where it goes, what the workshop is owed for it, and what happened with it. */
export function ParcelDetails({ parcel }: { parcel: WorkshopParcel }) {
  const money = (minor: number) => <Money minor={minor} currency={parcel.currency} />;
  return (
    <>
      <section className="grid gap-4">
        <RuledHeading>Where it goes</RuledHeading>
        <AddressLines label="Send to" address={parcel.shippingAddress} />
      </section>
      <section className="grid gap-4">
        <RuledHeading>Your share</RuledHeading>
        <TitleBlock
          cells={[
            { label: "Parts", value: money(parcel.partsMinor) },
            { label: "Postage", value: money(parcel.shippingMinor) },
            { label: "Commission", value: money(-parcel.commissionMinor) },
            { label: "Your share", value: money(parcel.shareMinor), whole: true },
          ]}
        />
        {parcel.taxMinor > 0 && (
          <p className="text-soft">{money(parcel.taxMinor)} of it is tax that you collect, yours to pay on.</p>
        )}
      </section>
      <section className="grid gap-4">
        <RuledHeading>What happened</RuledHeading>
        <ol className="grid gap-2">
          {parcel.history.map(({ at, what }) => (
            <li key={at + what} className="grid gap-x-5 sm:grid-cols-[18rem_1fr]">
              <time dateTime={at} className="text-soft">
                {formatDeadline(at)}
              </time>
              {what}
            </li>
          ))}
        </ol>
      </section>
    </>
  );
}
