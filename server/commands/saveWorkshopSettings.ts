import type { Transaction } from "sequelize";
import type { WorkshopSettings } from "#shared/schemas/workshopSettings";
import { audit } from "../audit";
import { marketCurrency } from "../basket/marketCurrency";
import { inTransaction } from "../db/inTransaction";
import { AppError } from "../errors/AppError";
import { ShippingCountry } from "../models/ShippingCountry";
import { ShippingRate } from "../models/ShippingRate";
import { TaxRegistration } from "../models/TaxRegistration";
import { Workshop } from "../models/Workshop";
import type { Actor } from "../policies/Actor";
import { ownWorkshopId } from "../policies/ownWorkshopId";
import { presentWorkshopSettings } from "../presenters/presentWorkshopSettings";

/** Puts zones and registrations in the place of those there are; orders keep what they were placed with. */
async function replaceTerms(workshopId: string, settings: WorkshopSettings, transaction: Transaction): Promise<void> {
  // Countries go with their rates.
  await ShippingRate.destroy({ where: { workshopId }, transaction });
  await TaxRegistration.destroy({ where: { workshopId }, transaction });
  for (const { countries, ...zone } of settings.zones) {
    const rate = await ShippingRate.create({ workshopId, currency: marketCurrency, ...zone }, { transaction });
    const rows = countries.map((country) => ({ workshopId, country, rateId: rate.id }));
    await ShippingCountry.bulkCreate(rows, { transaction });
  }
  const registrations = settings.taxRegistrations.map(({ country, number, ratePercent }) => ({
    workshopId,
    country,
    number,
    rateBasisPoints: Math.round(ratePercent * 100),
  }));
  await TaxRegistration.bulkCreate(registrations, { transaction });
}

/**
 * Keeps the settings of the actor's own workshop, whole or not at all, and gives it as it then stands.
 * Errors: not-found without a workshop, changed-meanwhile where another version was kept since this one was read.
 */
export async function saveWorkshopSettings(actor: Actor, settings: WorkshopSettings, now: Date): Promise<Workshop> {
  const workshopId = ownWorkshopId(actor);
  return inTransaction(async (transaction) => {
    const workshop = await Workshop.findByPk(workshopId, { lock: transaction.LOCK.UPDATE, transaction });
    if (!workshop) throw new AppError("not-found");
    if (workshop.updatedAt.getTime() !== Date.parse(settings.version)) {
      throw new AppError("changed-meanwhile", "The settings were changed in another place since you opened them");
    }
    const before = await presentWorkshopSettings(workshop, transaction);
    const { about, dispatchDays, returnsTerms } = settings;
    // Later than before even within the same millisecond, since it tells versions apart.
    const updatedAt = new Date(Math.max(now.getTime(), workshop.updatedAt.getTime() + 1));
    // By statement, since an instance of Sequelize keeps its own `updatedAt`.
    const changes = { about, dispatchDays, returnsTerms, updatedAt };
    await Workshop.update(changes, { where: { id: workshopId }, silent: true, transaction });
    await workshop.reload({ transaction });
    await replaceTerms(workshopId, settings, transaction);
    const after = await presentWorkshopSettings(workshop, transaction);
    await audit(
      {
        actorId: actor.id,
        action: "settings-saved",
        subjectType: "workshop",
        subjectId: workshopId,
        detail: { before, after },
        at: now,
      },
      transaction,
    );
    return workshop;
  });
}
