import type { Basket } from "#shared/schemas/basket";
import type { PartSummary } from "#shared/schemas/part";
import { marketCurrency } from "../basket/marketCurrency";
import type { ReadBasket } from "../basket/readBasket";
import { presentParts } from "./presentParts";
import { presentWorkshop } from "./presentWorkshop";

type Parcel = ReadBasket["parcels"][number];

function presentParcel(parcel: Parcel, parts: Map<string, PartSummary>) {
  const { workshop, lines, taxRateBasisPoints, commissionMinor: _, ...amounts } = parcel;
  return {
    ...amounts,
    workshop: presentWorkshop(workshop),
    taxRatePercent: taxRateBasisPoints / 100,
    lines: lines.flatMap(({ part, problem, taxMinor: _, ...line }) => {
      const summary = parts.get(part.id);
      return summary ? [{ ...line, part: summary, madeToSize: part.madeToSize, problem: problem?.words ?? null }] : [];
    }),
  };
}

/** A basket as it is shown; null is one with nothing in it yet. */
export async function presentBasket(basket: ReadBasket | null, shipTo: string): Promise<Basket> {
  const parcels = basket?.parcels ?? [];
  const lines = parcels.flatMap((parcel) => parcel.lines);
  const parts = await presentParts(lines.map(({ part }) => part.id));
  const fine = parcels.every(({ problem }) => !problem) && lines.every(({ problem }) => !problem);
  return {
    shipTo,
    count: lines.reduce((count, { quantity }) => count + quantity, 0),
    parcels: parcels.map((parcel) => presentParcel(parcel, parts)),
    partsMinor: basket?.partsMinor ?? 0,
    shippingMinor: basket?.shippingMinor ?? 0,
    taxMinor: basket?.taxMinor ?? 0,
    totalMinor: basket?.totalMinor ?? 0,
    currency: marketCurrency,
    canCheckOut: lines.length > 0 && fine,
  };
}
