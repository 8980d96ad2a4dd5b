import type { BasketParcel } from "#shared/schemas/basket";
import { taxWords } from "../../lib/taxWords";
import { Money } from "../../ui/Money";
import { TitleBlock } from "../../ui/TitleBlock";

type Sums = Pick<
  BasketParcel,
  "partsMinor" | "shippingMinor" | "taxMinor" | "taxRatePercent" | "totalMinor" | "problem"
>;

/** What one parcel costs, in a title block. */
export function ParcelSums({ parcel, currency, label }: { parcel: Sums; currency: string; label: string }) {
  return (
    <TitleBlock
      className="mt-5"
      cells={[
        { label: "Parts", value: <Money minor={parcel.partsMinor} currency={currency} /> },
        {
          label: "Postage",
          value: parcel.problem ? "not sent there" : <Money minor={parcel.shippingMinor} currency={currency} />,
        },
        { label: "Tax", value: parcel.problem ? "not known" : taxWords(parcel, currency) },
        { label, value: <Money minor={parcel.totalMinor} currency={currency} />, whole: true },
      ]}
    />
  );
}
