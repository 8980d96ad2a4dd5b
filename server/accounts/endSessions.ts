import type { Transaction } from "sequelize";
import { database } from "../db/inTransaction";

/** Ends every session of a person, but for the one named; the cookies of the others are dead at once. */
export async function endSessions(
  userId: string,
  { except = null, transaction }: { except?: string | null; transaction?: Transaction } = {},
): Promise<void> {
  await database().query(
    "DELETE FROM sessions WHERE sess #>> '{passport,user}' = $userId AND sid IS DISTINCT FROM $except",
    {
      bind: { userId, except },
      transaction,
    },
  );
}
