import { Op, type Transaction } from "sequelize";
import { BasketLine } from "../models/BasketLine";
import { Part } from "../models/Part";
import { ShippingCountry } from "../models/ShippingCountry";
import { ShippingRate } from "../models/ShippingRate";
import { TaxRegistration } from "../models/TaxRegistration";
import { Workshop } from "../models/Workshop";
import { heldBy } from "../orders/stock";
import { priceBasket, type Terms } from "./priceBasket";

/** What each workshop asks for sending to a country. */
async function termsOf(ids: readonly string[], country: string, transaction?: Transaction): Promise<Terms[]> {
  const of = { workshopId: { [Op.in]: [...ids] }, country };
  // One after the other: inside a transaction there is one connection, and it answers one question at a time.
  const workshops = await Workshop.findAll({ where: { id: { [Op.in]: [...ids] } }, transaction });
  const countries = await ShippingCountry.findAll({ where: of, transaction });
  const rates = await ShippingRate.findAll({
    where: { id: { [Op.in]: countries.map(({ rateId }) => rateId) } },
    transaction,
  });
  const taxes = await TaxRegistration.findAll({ where: of, transaction });
  const rateOf = new Map(rates.map((rate) => [rate.workshopId, rate]));
  const taxOf = new Map(taxes.map((tax) => [tax.workshopId, tax.rateBasisPoints]));
  return workshops.map((workshop) => ({
    workshop,
    postage: rateOf.get(workshop.id) ?? null,
    taxRateBasisPoints: taxOf.get(workshop.id) ?? 0,
  }));
}

/**
 * A basket with its prices for one country, parcels in the order in which their first part was added.
 * `buyerId` also says what that buyer's own unpaid orders hold; `lock` also locks the parts, in the order of their ids, as everything that moves stock does.
 */
export async function readBasket(
  basketId: string,
  shipTo: string,
  {
    buyerId = null,
    transaction,
    lock = false,
  }: { buyerId?: string | null; transaction?: Transaction; lock?: boolean } = {},
) {
  const rows = await BasketLine.findAll({
    where: { basketId },
    order: [
      ["addedAt", "ASC"],
      ["partId", "ASC"],
    ],
    transaction,
  });
  const parts = await Part.findAll({
    where: { id: { [Op.in]: rows.map(({ partId }) => partId) } },
    order: [["id", "ASC"]],
    transaction,
    ...(lock && transaction ? { lock: transaction.LOCK.NO_KEY_UPDATE } : {}),
  });
  const partOf = new Map(parts.map((part) => [part.id, part]));
  const held = buyerId ? await heldBy(buyerId, transaction) : new Map<string, number>();
  const lines = rows.flatMap(({ partId, quantity, forNeed }) => {
    const part = partOf.get(partId);
    return part ? [{ part, quantity, forNeed, heldAlready: held.get(partId) ?? 0 }] : [];
  });
  const workshopIds = [...new Set(lines.map(({ part }) => part.workshopId))];
  const terms = await termsOf(workshopIds, shipTo, transaction);
  const wanted = workshopIds.flatMap((id) =>
    terms
      .filter(({ workshop }) => workshop.id === id)
      .map((one) => ({ terms: one, lines: lines.filter(({ part }) => part.workshopId === id) })),
  );
  return priceBasket(wanted, shipTo);
}
export type ReadBasket = Awaited<ReturnType<typeof readBasket>>;
