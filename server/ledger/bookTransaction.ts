import type { Transaction } from "sequelize";
import { LedgerEntry } from "../models/LedgerEntry";
import { LedgerTransaction } from "../models/LedgerTransaction";

export type LedgerAccount = "provider-balance" | "workshop-held" | "commission" | "refunds";

/** An amount on one account, in minor units: debit positive, credit negative. */
export type Entry = { account: LedgerAccount; amountMinor: number; currency: string; workshopId?: string };

/** Throws unless the entries sum to zero in every currency. */
function requireBalance(cause: string, entries: readonly Entry[]): void {
  const sums = new Map<string, number>();
  for (const { currency, amountMinor } of entries) sums.set(currency, (sums.get(currency) ?? 0) + amountMinor);
  const off = [...sums].filter(([, sum]) => sum !== 0);
  if (entries.length === 0 || off.length > 0) {
    throw new Error(`ledger: ${cause} does not balance: ${off.map(([code, sum]) => `${sum} ${code}`).join(", ")}`);
  }
}

/**
 * Books one event of money, in the caller's transaction. Entries of nothing are left out.
 *
 * `cause` says what is booked, for example `order-paid:<order id>`; booking the same cause again changes nothing and
 * gives false. Errors: throws where the entries do not sum to zero in every currency; the database would refuse them too.
 */
export async function bookTransaction(
  { cause, orderId, at, entries }: { cause: string; orderId: string | null; at: Date; entries: readonly Entry[] },
  transaction: Transaction,
): Promise<boolean> {
  const booked = entries.filter(({ amountMinor }) => amountMinor !== 0);
  requireBalance(cause, booked);
  if (await LedgerTransaction.findOne({ where: { cause }, transaction })) return false;
  const { id } = await LedgerTransaction.create({ cause, orderId, at }, { transaction });
  await LedgerEntry.bulkCreate(
    booked.map((entry) => ({ ...entry, workshopId: entry.workshopId ?? null, transactionId: id })),
    { transaction },
  );
  return true;
}
