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

const searched = (tsquery: string) => `p.search_words @@ to_tsquery('english', ${tsquery}::text)`;

/** One SELECT of items for what is sought, through the window index along `along`. */
function windowBranch(
  { kind, windows }: Sought,
  along: SizeWindow,
  tsquery: string | null,
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
  // Only words need the part itself: what is published is looked up with the part, later, for the few that are left.
  const joined = tsquery ? "JOIN measured_items i ON i.id = d.item_id JOIN parts p ON p.id = i.part_id" : "";
  return `SELECT d.item_id AS id FROM measured_dimensions d ${joined}
    WHERE ${indexStretch(kindName, along, statement)} AND ${inWindow("d", along, statement)} ${ruledOut}
    ${tsquery ? `AND ${searched(tsquery)}` : ""}`;
}

function branchesOf({ kind, windows }: Sought, tsquery: string | null, statement: Statement): string[] {
  if (windows.length === 0) {
    return [
      `SELECT i.id FROM measured_items i JOIN parts p ON p.id = i.part_id
       WHERE i.kind = ${statement.param(kind)} ${tsquery ? `AND ${searched(tsquery)}` : ""}`,
    ];
  }
  // Every item states its primary dimension, so where that is asked for one way through the index finds all.
  const primary = windows.find(({ dimension }) => dimension === kindFacts[kind].primary);
  const ways = primary ? [primary] : windows;
  return ways.map((along) => windowBranch({ kind, windows }, along, tsquery, statement));
}

/**
 * The statement that finds candidates: rows {id} of items, or of published parts where words alone are searched.
 * `tsquery` is in PostgreSQL's own grammar for to_tsquery, or null for no words.
 */
export function candidateSql({
  sought,
  tsquery,
  limit,
}: {
  sought: readonly Sought[];
  tsquery: string | null;
  limit: number;
}): { sql: string; bind: Record<string, unknown> } {
  const statement = new Statement();
  const words = tsquery === null ? null : statement.param(tsquery);
  const branches =
    sought.length > 0
      ? sought.flatMap((one) => branchesOf(one, words, statement))
      : [`SELECT p.id FROM parts p WHERE p.state = 'published' ${words ? `AND ${searched(words)}` : ""}`];
  return { sql: `${branches.join("\nUNION\n")}\nLIMIT ${statement.param(limit)}::integer`, bind: statement.bind };
}
