import type { Transaction } from "sequelize";
import { database } from "../db/inTransaction";

/** What each job is told. Its name is the key of its task in `tasks.ts`. */
export type Jobs = {
  sendMail: { mailId: string };
  indexParts: { partIds: string[] };
  expireOrder: { orderId: string };
  applyPaymentEvent: { eventId: string };
  refundOrder: { orderId: string; reason: string };
};

/**
 * Queues a job in the caller's transaction, so that it happens exactly if the change did.
 *
 * `runAt` postpones it; `key` keeps one job of that key, the later call replacing the earlier.
 */
export async function addJob<Name extends keyof Jobs>(
  name: Name,
  payload: Jobs[Name],
  transaction: Transaction,
  { runAt, key }: { runAt?: Date; key?: string } = {},
): Promise<void> {
  await database().query(
    "SELECT graphile_worker.add_job($name, $payload::json, run_at => $runAt::timestamptz, job_key => $key, max_attempts => 12)",
    {
      bind: { name, payload: JSON.stringify(payload), runAt: runAt?.toISOString() ?? null, key: key ?? null },
      transaction,
    },
  );
}
