import type { DimensionName, PartKind } from "#shared/domain/partKinds";
import type { SearchQuery } from "#shared/schemas/search";
import { select } from "../db/select";
import { loadItems } from "../search/loadRows";
import { leastChance, rankCandidates } from "../search/rankCandidates";
import { readNeed } from "../search/readNeed";
import { dimensionsIn } from "../search/Target";

/** Measured search without an index: every item of the kind is loaded, assessed and ranked. Gives how many fit. */
export async function fullScan(query: SearchQuery): Promise<number> {
  const { targets, kinds } = await readNeed(query);
  const ids = await select<{ id: string }>("SELECT id FROM measured_items WHERE kind = ANY($kinds::text[])", {
    kinds: kinds as readonly PartKind[],
  });
  const dimensions: DimensionName[] = dimensionsIn(targets);
  const rows = await loadItems(
    ids.map(({ id }) => id),
    { dimensions, shipTo: query.shipTo },
  );
  const { fitting } = rankCandidates(rows, targets, query);
  return fitting.filter(({ assessed }) => (assessed?.fit.chance ?? 0) >= leastChance(query)).length;
}
