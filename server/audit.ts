import type { Transaction } from "sequelize";
import { AuditEntry } from "./models/AuditEntry";

/** Writes who changed what, in the transaction that changes it. `actorId` is null for the clock and for services. */
export async function audit(
  entry: {
    actorId: string | null;
    action: string;
    subjectType: string;
    subjectId: string;
    detail?: Record<string, unknown>;
    /** When it happened, where that is not now. */
    at?: Date;
  },
  transaction: Transaction,
): Promise<void> {
  await AuditEntry.create({ at: new Date(), detail: {}, ...entry }, { transaction });
}
