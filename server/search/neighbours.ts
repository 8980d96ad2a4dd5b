import type { DimensionName } from "#shared/domain/partKinds";
import type { SearchQuery } from "#shared/schemas/search";
import type { Candidates, SizeWindow, Sought } from "../adapters/SearchEngine";
import type { Statement } from "../db/Statement";
import { along, inWindow, letsPass, nominalOf } from "./windowSql";
import { wordQuery } from "./wordQuery";

/** Items looked at on each side and for each dimension: more than is shown, since some turn out not to be on offer. */
const perSide = 12;
/** How far beyond a window neighbours are looked for, in widths of the window. */
const widths = 2;

const widthOf = ({ lowerUm, upperUm }: SizeWindow) => upperUm - lowerUm;
const isBounded = (window: SizeWindow) => widthOf(window) < 1_000_000_000;

type Asked = { sought: Sought; main: SizeWindow; join: string; filters: string };

/** Items in a stretch along the main dimension that one window keeps out and all others let pass, in an order given. */
function keptOut(
  by: SizeWindow,
  { from, to, order }: { from: number; to: number; order: (column: string) => string },
  { sought, main, join, filters }: Asked,
  statement: Statement,
): string {
  const path = along(sought.kind, main.dimension, statement);
  const others = sought.windows.filter((window) => window !== by).map((window) => `AND ${letsPass(window, statement)}`);
  return `(SELECT i.id FROM ${path.from} ${join}
    WHERE ${path.where}
      AND ${path.column} BETWEEN ${statement.param(from)}::integer AND ${statement.param(to)}::integer
      AND NOT ${inWindow(by, statement)} ${others.join(" ")} ${filters}
    ORDER BY ${order(path.column)} LIMIT ${perSide})`;
}

/**
 * Items that only just do not do: on both sides of the window along `dimension`, and inside it but kept out by one other.
 * A SELECT of their ids, few; whether they are on offer, and miss by one dimension, is settled when they are assessed.
 * Null where there is no such window, or no end to it.
 */
export async function neighboursOf(
  sought: Sought,
  dimension: DimensionName,
  { offer, material, words }: Pick<SearchQuery, "offer" | "material"> & { words: string | null },
): Promise<Candidates["select"] | null> {
  const main = sought.windows.find((window) => window.dimension === dimension);
  if (!main || !isBounded(main)) return null;
  const tsquery = words === null ? null : (await wordQuery(words)).tsquery;
  return (statement) => {
    const filters = [
      offer && `AND p.offer_type = ${statement.param(offer)}`,
      material && `AND p.material = ${statement.param(material)}`,
      tsquery !== null && `AND p.search_words @@ to_tsquery('english', ${statement.param(tsquery)}::text)`,
    ].filter(Boolean);
    const join = filters.length > 0 ? "JOIN parts p ON p.id = i.part_id" : "";
    const asked = { sought, main, join, filters: filters.join(" ") };
    const { lowerUm, upperUm } = main;
    const far = widths * widthOf(main);
    const below = { from: lowerUm - far, to: lowerUm, order: (column: string) => `${column} DESC` };
    const above = { from: upperUm, to: upperUm + far, order: (column: string) => column };
    const inside = sought.windows
      .filter((window) => window !== main)
      .map((window) => {
        const nominal = nominalOf(window.dimension);
        const off = () =>
          `greatest(${statement.param(window.lowerUm)}::integer - ${nominal}, ${nominal} - ${statement.param(window.upperUm)}::integer)`;
        return keptOut(window, { from: lowerUm, to: upperUm, order: off }, asked, statement);
      });
    return [keptOut(main, below, asked, statement), keptOut(main, above, asked, statement), ...inside].join(" UNION ");
  };
}
