import type { Transaction } from "sequelize";
import type { WorkshopSettings } from "#shared/schemas/workshopSettings";
import { ShippingCountry } from "../models/ShippingCountry";
import { ShippingRate } from "../models/ShippingRate";
import { TaxRegistration } from "../models/TaxRegistration";
import type { Workshop } from "../models/Workshop";

/**
 * What a workshop has set, zones by price and the rest by country. The workshop was read before what is read here, so that
 * a change in between makes its version stale rather than unseen.
 */
export async function presentWorkshopSettings(
  workshop: Workshop,
  transaction: Transaction | null = null,
): Promise<WorkshopSettings> {
  const where = { workshopId: workshop.id };
  const rates = await ShippingRate.findAll({ where, order: ["baseMinor", "zone"], transaction });
  const countries = await ShippingCountry.findAll({ where, order: ["country"], transaction });
  const registrations = await TaxRegistration.findAll({ where, order: ["country"], transaction });
  return {
    about: workshop.about,
    dispatchDays: workshop.dispatchDays,
    returnsTerms: workshop.returnsTerms,
    zones: rates.map(({ id, zone, baseMinor, perItemMinor, freeOverMinor }) => ({
      zone,
      countries: countries.filter(({ rateId }) => rateId === id).map(({ country }) => country),
      baseMinor,
      perItemMinor,
      freeOverMinor,
    })),
    taxRegistrations: registrations.map(({ country, number, rateBasisPoints }) => ({
      country,
      number,
      ratePercent: rateBasisPoints / 100,
    })),
    version: workshop.updatedAt.toISOString(),
  };
}
