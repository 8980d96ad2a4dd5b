import { verdictThresholds } from "#shared/domain/verdict";
import type { SearchEngine } from "../adapters/SearchEngine";
import { select } from "../db/select";
import { assessRow } from "./assessRow";
import type { FamilyRegister } from "./familyRegister";
import { targetAt } from "./familyTargets";
import { loadItems } from "./loadRows";
import { soughtBy } from "./sizeWindows";
import { dimensionsIn } from "./Target";

const mostCandidates = 100_000;

const claimedSql = `
  SELECT c.service_point_id AS point, c.part_id AS part
  FROM fit_claims c JOIN parts p ON p.id = c.part_id AND p.state = 'published'
    JOIN workshops w ON w.id = p.workshop_id AND w.state = 'admitted'
  WHERE c.service_point_id = ANY($points::uuid[])`;

/** How many parts on offer fit each service point of a family: by their sizes, or because a workshop says so. */
export async function servicePointCounts(engine: SearchEngine, family: FamilyRegister): Promise<Map<string, number>> {
  const targets = family.points
    .map((point) => targetAt(point, [], family.name))
    .filter(({ dimensions }) => dimensions.length > 0);
  const sought = targets.map((target) => soughtBy(target, verdictThresholds.chancy));
  const [claimed, candidates] = await Promise.all([
    select<{ point: string; part: string }>(claimedSql, { points: family.points.map(({ id }) => id) }),
    sought.length > 0 ? engine.candidates({ sought, words: null, limit: mostCandidates }) : null,
  ]);
  // Postage plays no part in counting.
  const asked = { dimensions: dimensionsIn(targets), shipTo: "" };
  const rows = candidates ? await loadItems([candidates.select], asked) : [];
  const parts = new Map(family.points.map(({ id }) => [id, new Set<string>()]));
  for (const { point, part } of claimed) parts.get(point)?.add(part);
  for (const target of targets) {
    for (const row of rows) {
      const assessed = assessRow(row, [target]);
      if (assessed && assessed.fit.chance >= verdictThresholds.chancy) parts.get(target.point!.id)?.add(row.partId);
    }
  }
  return new Map([...parts].map(([id, ids]) => [id, ids.size]));
}
