import { setTimeout as delay } from "node:timers/promises";
import { DatabaseError, type Sequelize, type Transaction } from "sequelize";
import { User } from "../models/User";

const retried = new Set(["40001", "40P01"]);
const tries = 5;

const codeOf = (error: unknown) =>
  error instanceof DatabaseError ? (error.parent as Error & { code?: string }).code : undefined;

/** The connection that the models live on. */
export function database(): Sequelize {
  if (!User.sequelize) throw new Error("the models are not connected");
  return User.sequelize;
}

/**
 * Runs one piece of work whole or not at all. Serialization failures and deadlocks are tried again, up to five
 * times (PostgreSQL manual, 13.5), so the work must do nothing outside the database.
 */
export async function inTransaction<T>(work: (transaction: Transaction) => Promise<T>): Promise<T> {
  for (let attempt = 1; ; attempt++) {
    try {
      return await database().transaction(work);
    } catch (error) {
      if (attempt === tries || !retried.has(codeOf(error) ?? "")) throw error;
      await delay(2 ** attempt * 5);
    }
  }
}
