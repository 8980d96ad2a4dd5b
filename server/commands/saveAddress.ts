import type { Transaction } from "sequelize";
import type { Address } from "#shared/schemas/order";
import { SavedAddress } from "../models/SavedAddress";

const mostAddresses = 50;

/** Keeps an address for the next time, once; null where there are fifty already and this is another. */
export async function saveAddress(
  userId: string,
  address: Address,
  transaction: Transaction,
): Promise<SavedAddress | null> {
  const known = await SavedAddress.findOne({ where: { userId, ...address }, transaction });
  if (known) return known;
  if ((await SavedAddress.count({ where: { userId }, transaction })) >= mostAddresses) return null;
  await SavedAddress.bulkCreate([{ userId, ...address }], { ignoreDuplicates: true, transaction });
  return SavedAddress.findOne({ where: { userId, ...address }, transaction });
}
