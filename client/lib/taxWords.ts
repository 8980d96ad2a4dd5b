import { formatMoney } from "#shared/domain/money";

/** The tax inside an amount of one parcel, in words: prices contain it where the workshop is registered for it. */
export function taxWords({ taxRatePercent, taxMinor }: { taxRatePercent: number; taxMinor: number }, currency: string) {
  if (taxRatePercent === 0) return "no tax collected; import tax may be asked on arrival";
  return `of which ${taxRatePercent} % tax, ${formatMoney(taxMinor, currency)}`;
}

/** The same for several parcels together, where rates may differ. */
export function allTaxWords(
  parcels: readonly { taxRatePercent: number; taxMinor: number }[],
  taxMinor: number,
  currency: string,
): string {
  const rates = new Set(parcels.map(({ taxRatePercent }) => taxRatePercent));
  const [only] = rates;
  if (rates.size === 1 && only !== undefined) return taxWords({ taxRatePercent: only, taxMinor }, currency);
  const untaxed = rates.has(0) ? "; import tax may be asked for what carries none" : "";
  return `of which tax, ${formatMoney(taxMinor, currency)}${untaxed}`;
}
