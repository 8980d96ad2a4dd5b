import { createHash } from "node:crypto";
import { DatabaseError } from "sequelize";
import { database } from "./inTransaction";
import type { Statement } from "./Statement";

/** What a connection of node-postgres does with a statement that has a name: plans it once, and runs it by that name. */
type Preparing = { query(config: { name?: string; text: string; values: unknown[] }): Promise<{ rows: unknown[] }> };

/** Each connection keeps the plans it has made, so only so many different statements get a name. */
const mostNames = 200;
const names = new Map<string, string>();

function nameOf(text: string): string | undefined {
  const known = names.get(text);
  if (known || names.size >= mostNames) return known;
  const name = createHash("sha256").update(text).digest("base64url").slice(0, 24);
  names.set(text, name);
  return name;
}

/**
 * Rows of a statement that comes in few shapes and often: planning a search takes as long as running it, so each shape
 * is planned once a connection and kept (PostgreSQL manual, PREPARE). Not for use inside a transaction.
 * Errors: DatabaseError, as from any query of Sequelize.
 */
export async function selectPrepared<Row extends object>(text: string, { values }: Statement): Promise<Row[]> {
  const { connectionManager } = database();
  const connection = await connectionManager.getConnection({ type: "read", useMaster: false });
  try {
    const { rows } = await (connection as unknown as Preparing).query({ name: nameOf(text), text, values });
    return rows as Row[];
  } catch (error) {
    throw error instanceof Error ? new DatabaseError(Object.assign(error, { sql: text })) : error;
  } finally {
    connectionManager.releaseConnection(connection);
  }
}
