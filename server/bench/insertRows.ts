import type pg from "pg";

/** Puts rows in, many to a statement, through JSON; the columns are those of the first row. Names are the program's own. */
export async function insertRows(
  client: pg.Client,
  table: string,
  rows: readonly Record<string, unknown>[],
  batch = 5_000,
): Promise<void> {
  const columns = Object.keys(rows[0] ?? {}).join(", ");
  const sql = `INSERT INTO ${table} (${columns}) SELECT ${columns} FROM json_populate_recordset(NULL::${table}, $1)`;
  for (let start = 0; start < rows.length; start += batch) {
    await client.query(sql, [JSON.stringify(rows.slice(start, start + batch))]);
  }
}
