import { QueryTypes, type Transaction } from "sequelize";
import { database } from "../db/inTransaction";
import type { LedgerAccount } from "./bookTransaction";

export type Balance = { account: LedgerAccount; workshopId: string | null; currency: string; amountMinor: number };

/** What stands on each account, summed from its entries; debit positive, credit negative. */
export function balances(transaction?: Transaction): Promise<Balance[]> {
  return database().query<Balance>(
    `SELECT account, workshop_id AS "workshopId", currency, sum(amount_minor)::bigint AS "amountMinor"
     FROM ledger_entries GROUP BY account, workshop_id, currency ORDER BY account, workshop_id, currency`,
    { type: QueryTypes.SELECT, transaction },
  );
}
