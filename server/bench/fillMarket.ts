import pg from "pg";
import { benchMarket } from "./benchMarket";
import { insertRows } from "./insertRows";

/** Fills an empty, migrated database with the bench's market, in one transaction, and has its statistics gathered. */
export async function fillMarket(databaseUrl: string, parts: number): Promise<void> {
  const client = new pg.Client({ connectionString: databaseUrl });
  await client.connect();
  try {
    await client.query("BEGIN");
    // Every table here comes after those that it refers to.
    for (const [table, rows] of Object.entries(benchMarket(parts))) await insertRows(client, table, rows);
    await client.query("COMMIT");
    await client.query("VACUUM ANALYZE");
  } finally {
    await client.end();
  }
}
