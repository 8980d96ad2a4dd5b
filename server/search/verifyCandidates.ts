import type { CandidateRef, Sought } from "../adapters/SearchEngine";
import { inWindow, publishedItems, Statement } from "./candidateSql";
import { select } from "./select";

function conditionOf({ kind, windows }: Sought, statement: Statement): string {
  const isKind = `i.kind = ${statement.param(kind)}`;
  if (windows.length === 0) return `(${isKind})`;
  const names = statement.param(windows.map(({ dimension }) => dimension));
  const outside = windows
    .map((window) => `(o.dimension = ${statement.param(window.dimension)} AND NOT ${inWindow("o", window, statement)})`)
    .join(" OR ");
  return `(${isKind}
    AND EXISTS (SELECT FROM measured_dimensions o WHERE o.item_id = i.id AND o.dimension = ANY(${names}::text[]))
    AND NOT EXISTS (SELECT FROM measured_dimensions o WHERE o.item_id = i.id AND (${outside})))`;
}

/** Those of these candidates that the database bears out now: published, and in the windows as they stand. */
export async function verifyCandidates(
  sought: readonly Sought[],
  candidates: readonly CandidateRef[],
): Promise<CandidateRef[]> {
  if (candidates.length === 0) return [];
  if (sought.length === 0) {
    const sql = `SELECT p.id AS part FROM parts p JOIN workshops w ON w.id = p.workshop_id AND w.state = 'admitted'
      WHERE p.state = 'published' AND p.id = ANY($partIds::uuid[])`;
    const rows = await select<{ part: string }>(sql, { partIds: candidates.map(({ partId }) => partId) });
    return rows.map(({ part }) => ({ itemId: null, partId: part }));
  }
  const statement = new Statement();
  const itemIds = statement.param(candidates.flatMap(({ itemId }) => itemId ?? []));
  const conditions = sought.map((one) => conditionOf(one, statement)).join(" OR ");
  const rows = await select<{ item: string; part: string }>(
    `SELECT i.id AS item, i.part_id AS part FROM ${publishedItems}
     WHERE i.id = ANY(${itemIds}::uuid[]) AND (${conditions})`,
    statement.bind,
  );
  return rows.map(({ item, part }) => ({ itemId: item, partId: part }));
}
