import { countryName } from "#shared/domain/countries";
import { countryCodes } from "#shared/schemas/countryCodes";

/** These countries in the order of their English names. */
export const byCountryName = (codes: readonly string[]): string[] =>
  [...codes].sort((a, b) => countryName(a).localeCompare(countryName(b), "en"));

/** Every country, in that order. */
export const countriesByName: readonly string[] = byCountryName(countryCodes);
