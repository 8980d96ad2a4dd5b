import { countryName } from "#shared/domain/countries";
import { postageOf } from "#shared/domain/postage";
import type { WorkshopSettings } from "#shared/schemas/workshopSettings";

export type PayRow = {
  key: string;
  /** Names of the countries where the same holds, in their order. */
  countries: string[];
  oneMinor: number;
  threeMinor: number;
  freeOverMinor: number | null;
  /** Null where no tax is collected. */
  taxPercent: number | null;
};

/** What buyers pay for the postage of 1 and 3 parts, by country; zones with amounts that cannot be read are left out. */
export function buyersPay({ zones, taxRegistrations }: WorkshopSettings): PayRow[] {
  return zones.flatMap((rate, index) => {
    const amounts = [rate.baseMinor, rate.perItemMinor, rate.freeOverMinor ?? 0];
    if (!amounts.every(Number.isSafeInteger)) return [];
    const byTax = new Map<number | null, string[]>();
    for (const country of rate.countries) {
      const percent = taxRegistrations.find((one) => one.country === country)?.ratePercent ?? null;
      const taxPercent = Number.isNaN(percent) ? null : percent;
      byTax.set(taxPercent, [...(byTax.get(taxPercent) ?? []), countryName(country)]);
    }
    const postage = (pieces: number) => postageOf({ ...rate, freeOverMinor: null }, { pieces, partsMinor: 0 });
    return [...byTax].map(([taxPercent, countries]) => ({
      key: `${index}-${taxPercent}`,
      countries: countries.sort((a, b) => a.localeCompare(b, "en")),
      oneMinor: postage(1),
      threeMinor: postage(3),
      freeOverMinor: rate.freeOverMinor,
      taxPercent,
    }));
  });
}
