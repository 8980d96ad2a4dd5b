import { QueryTypes } from "sequelize";
import { database } from "./inTransaction";

/** Rows of a query written by hand; values only ever go in as bound parameters ($name). */
export function select<Row extends object>(sql: string, bind: Record<string, unknown> = {}): Promise<Row[]> {
  return database().query<Row>(sql, { bind, type: QueryTypes.SELECT, raw: true });
}
