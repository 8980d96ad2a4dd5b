import { countryName } from "#shared/domain/countries";
import type { WorkshopPage } from "#shared/schemas/catalogue";
import type { PartSummary } from "#shared/schemas/part";
import type { ShippingCountry } from "../models/ShippingCountry";
import type { ShippingRate } from "../models/ShippingRate";
import type { TaxRegistration } from "../models/TaxRegistration";
import type { Workshop } from "../models/Workshop";
import { presentTrader, presentWorkshop } from "./presentWorkshop";

/** A workshop's page: who it is, what it asks for postage and tax, and the parts given, in their order. */
export function presentWorkshopPage(
  workshop: Workshop,
  {
    rates,
    countries,
    registrations,
    parts,
  }: {
    rates: readonly ShippingRate[];
    countries: readonly ShippingCountry[];
    registrations: readonly TaxRegistration[];
    parts: PartSummary[];
  },
): WorkshopPage {
  return {
    workshop: presentWorkshop(workshop),
    about: workshop.about,
    dispatchDays: workshop.dispatchDays,
    returnsTerms: workshop.returnsTerms,
    trader: presentTrader(workshop),
    shippingRates: rates.map(({ id, zone, baseMinor, perItemMinor, freeOverMinor, currency }) => ({
      zone,
      countries: countries.filter(({ rateId }) => rateId === id).map(({ country }) => country),
      baseMinor,
      perItemMinor,
      freeOverMinor,
      currency,
    })),
    taxRegistrations: registrations.map(({ country, rateBasisPoints }) => ({
      country,
      countryName: countryName(country),
      ratePercent: rateBasisPoints / 100,
    })),
    parts,
  };
}
