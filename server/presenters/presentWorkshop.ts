import { countryName } from "#shared/domain/countries";
import type { TraderIdentity } from "#shared/schemas/catalogue";
import type { WorkshopSummary } from "#shared/schemas/part";
import type { Workshop } from "../models/Workshop";

export const presentWorkshop = (workshop: Workshop): WorkshopSummary => ({
  id: workshop.id,
  slug: workshop.slug,
  name: workshop.name,
  town: workshop.town,
  country: workshop.country,
  countryName: countryName(workshop.country),
});

/** Who sells, as the law asks it to be shown beside an offer. */
export const presentTrader = (workshop: Workshop): TraderIdentity => ({
  legalName: workshop.legalName,
  address: [...workshop.legalAddress, countryName(workshop.country)],
  email: workshop.contactEmail,
  phone: workshop.phone,
  registration: workshop.registration,
});
