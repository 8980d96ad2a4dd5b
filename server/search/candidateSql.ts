import { kindFacts, type PartKind } from "#shared/domain/partKinds";
import type { SizeWindow, Sought } from "../adapters/SearchEngine";
import type { Statement } from "../db/Statement";
import { along, inWindow, letsPass } from "./windowSql";

/**
 * The stretch of an index in which every item of a window lies: no item reaches further than the one with the widest
 * tolerance of all, which an index gives at once.
 */
function stretch(kind: PartKind, window: SizeWindow, statement: Statement): string {
  const reach = `${statement.param(window.reach)}::float8 * coalesce((SELECT max(half_width_um) FROM measured_dimensions
    WHERE kind = ${statement.param(kind)} AND dimension = ${statement.param(window.dimension)}), 0)`;
  return `BETWEEN floor(${statement.param(window.lowerUm)}::float8 - ${reach})::integer
    AND ceil(${statement.param(window.upperUm)}::float8 + ${reach})::integer`;
}

/** The parts of items, where words are searched: only they need the part itself. */
const withWords = (tsquery: string | null) => ({
  join: tsquery ? "JOIN parts p ON p.id = i.part_id" : "",
  where: tsquery ? `AND p.search_words @@ to_tsquery('english', ${tsquery}::text)` : "",
});

function branchesOf({ kind, windows }: Sought, tsquery: string | null, statement: Statement): string[] {
  const words = withWords(tsquery);
  if (windows.length === 0) {
    return [`SELECT i.id FROM measured_items i ${words.join} WHERE i.kind = ${statement.param(kind)} ${words.where}`];
  }
  // Every item states its primary dimension, so where that is asked for one way through the index finds all.
  const primary = windows.find(({ dimension }) => dimension === kindFacts[kind].primary);
  const ways = primary ? [primary] : windows;
  return ways.map((window) => {
    const { from, column, where } = along(kind, window.dimension, statement);
    const others = windows.filter((other) => other !== window).map((other) => `AND ${letsPass(other, statement)}`);
    return `SELECT i.id FROM ${from} ${words.join}
      WHERE ${where} AND ${column} ${stretch(kind, window, statement)} AND ${inWindow(window, statement)}
      ${others.join(" ")} ${words.where}`;
  });
}

/**
 * The SELECT of candidates' ids: of items, or of published parts where words alone are searched.
 * `tsquery` is in PostgreSQL's own grammar for to_tsquery, or null for no words.
 */
export function candidateSql(
  { sought, tsquery, limit }: { sought: readonly Sought[]; tsquery: string | null; limit: number },
  statement: Statement,
): string {
  const words = tsquery === null ? null : statement.param(tsquery);
  const branches =
    sought.length > 0
      ? sought.flatMap((one) => branchesOf(one, words, statement))
      : [`SELECT p.id FROM parts p WHERE p.state = 'published' ${withWords(words).where}`];
  return `${branches.join("\nUNION\n")}\nLIMIT ${statement.param(limit)}::integer`;
}
