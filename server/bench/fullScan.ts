import type { SearchQuery } from "#shared/schemas/search";
import type { Candidates } from "../adapters/SearchEngine";
import { loadItems } from "../search/loadRows";
import { leastChance, rankCandidates } from "../search/rankCandidates";
import { readNeed } from "../search/readNeed";
import { dimensionsIn } from "../search/Target";

/** Measured search without an index: every item of the kind is loaded, assessed and ranked. Gives how many fit. */
export async function fullScan(query: SearchQuery): Promise<number> {
  const { targets, kinds } = await readNeed(query);
  const every: Candidates["select"] = (statement) =>
    `SELECT id FROM measured_items WHERE kind = ANY(${statement.param(kinds)}::text[])`;
  const rows = await loadItems([every], { dimensions: dimensionsIn(targets), shipTo: query.shipTo });
  const { fitting } = rankCandidates(rows, targets, query);
  return fitting.filter(({ assessed }) => (assessed?.fit.chance ?? 0) >= leastChance(query)).length;
}
