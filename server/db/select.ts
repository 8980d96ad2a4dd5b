import { QueryTypes } from "sequelize";
import { database } from "./inTransaction";

/** Rows of a query written by hand; values only ever go in as bound parameters ($name). */
export async function select<Row extends object>(sql: string, bind: Record<string, unknown> = {}): Promise<Row[]> {
  // Of the raw kind, since for any other every row is copied once more.
  const [rows] = await database().query(sql, { bind, type: QueryTypes.RAW });
  return rows as Row[];
}
