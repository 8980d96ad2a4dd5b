import { kindFacts } from "#shared/domain/partKinds";
import type { SizeWindow, Sought } from "../adapters/SearchEngine";

/** A statement under way: its text comes from this program alone, what was asked for goes in as parameters. */
export class Statement {
  readonly bind: Record<string, unknown> = {};

  /** The name of a new parameter with this value. */
  param(value: unknown): string {
    const name = `p${Object.keys(this.bind).length}`;
    this.bind[name] = value;
    return `$${name}`;
  }
}

/** Items and parts that everybody may see. */
export const publishedItems = `measured_items i
  JOIN parts p ON p.id = i.part_id AND p.state = 'published'
  JOIN workshops w ON w.id = p.workshop_id AND w.state = 'admitted'`;

/** Whether the row `row` of measured_dimensions lies in a window. */
export function inWindow(row: string, { lowerUm, upperUm, reach }: SizeWindow, statement: Statement): string {
  const reachName = `${statement.param(reach)}::float8`;
  return `(${row}.nominal_um + ${reachName} * ${row}.half_width_um >= ${statement.param(lowerUm)}::float8
    AND ${row}.nominal_um - ${reachName} * ${row}.half_width_um <= ${statement.param(upperUm)}::float8)`;
}

/**
 * The stretch of the window index in which every item of a window lies: no item reaches further than the one with the
 * widest tolerance of all, which an index gives at once.
 */
function indexStretch(kindName: string, window: SizeWindow, statement: Statement): string {
  const dimension = statement.param(window.dimension);
  const reach = `${statement.param(window.reach)}::float8 * coalesce(
    (SELECT max(half_width_um) FROM measured_dimensions WHERE kind = ${kindName} AND dimension = ${dimension}), 0)`;
  return `d.kind = ${kindName} AND d.dimension = ${dimension}
    AND d.nominal_um BETWEEN floor(${statement.param(window.lowerUm)}::float8 - ${reach})::integer
      AND ceil(${statement.param(window.upperUm)}::float8 + ${reach})::integer`;
}

/** One SELECT of (item, part) for what is sought, through the window index along each of `along`. */
function windowBranch(
  { kind, windows }: Sought,
  along: SizeWindow,
  wordsCondition: string,
  statement: Statement,
): string {
  const kindName = statement.param(kind);
  const others = windows.filter((window) => window !== along);
  // A window speaks only about items that state its dimension, so the others can only rule out.
  const outside = others.map(
    (window) => `(o.dimension = ${statement.param(window.dimension)} AND NOT ${inWindow("o", window, statement)})`,
  );
  const ruledOut = outside.length
    ? `AND NOT EXISTS (SELECT FROM measured_dimensions o WHERE o.item_id = d.item_id AND (${outside.join(" OR ")}))`
    : "";
  return `SELECT i.id AS item, i.part_id AS part
    FROM measured_dimensions d JOIN ${publishedItems} ON i.id = d.item_id
    WHERE ${indexStretch(kindName, along, statement)} AND ${inWindow("d", along, statement)} ${ruledOut} ${wordsCondition}`;
}

function branchesOf(sought: Sought, wordsCondition: string, statement: Statement): string[] {
  const { kind, windows } = sought;
  if (windows.length === 0) {
    return [
      `SELECT i.id AS item, i.part_id AS part FROM ${publishedItems}
       WHERE i.kind = ${statement.param(kind)} ${wordsCondition}`,
    ];
  }
  // Every item states its primary dimension, so where that is asked for one way through the index finds all.
  const primary = windows.find(({ dimension }) => dimension === kindFacts[kind].primary);
  return (primary ? [primary] : windows).map((along) => windowBranch(sought, along, wordsCondition, statement));
}

/**
 * The statement that finds candidates. `tsquery` is in PostgreSQL's own grammar for to_tsquery, or null for no words.
 *
 * Shape: rows {item, part}; by words alone `item` is null.
 */
export function candidateSql(
  { sought, tsquery, limit }: { sought: readonly Sought[]; tsquery: string | null; limit: number },
  statement = new Statement(),
): { sql: string; bind: Record<string, unknown> } {
  const words =
    tsquery === null ? "" : `AND p.search_words @@ to_tsquery('english', ${statement.param(tsquery)}::text)`;
  const branches =
    sought.length > 0
      ? sought.flatMap((one) => branchesOf(one, words, statement))
      : [
          `SELECT NULL::uuid AS item, p.id AS part FROM parts p
           JOIN workshops w ON w.id = p.workshop_id AND w.state = 'admitted'
           WHERE p.state = 'published' ${words}`,
        ];
  return { sql: `${branches.join("\nUNION\n")}\nLIMIT ${statement.param(limit)}::integer`, bind: statement.bind };
}
