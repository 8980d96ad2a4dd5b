import { countryName } from "#shared/domain/countries";
import type { WorkshopSummary } from "#shared/schemas/part";
import { select } from "../db/select";

const sql = "SELECT id, slug, name, town, country FROM workshops WHERE id = ANY($ids::uuid[])";

/** Workshops by id as they stand beside a part. */
export async function workshopSummaries(ids: Iterable<string>): Promise<Map<string, WorkshopSummary>> {
  const rows = await select<Omit<WorkshopSummary, "countryName">>(sql, { ids: [...new Set(ids)] });
  return new Map(rows.map((row) => [row.id, { ...row, countryName: countryName(row.country) }]));
}
