import type { DimensionName } from "#shared/domain/partKinds";
import type { SearchQuery } from "#shared/schemas/search";
import type { SizeWindow, Sought } from "../adapters/SearchEngine";
import { inWindow, publishedItems, Statement } from "./candidateSql";
import { select } from "./select";
import { wordQuery } from "./wordQuery";

const perSide = 8;
const perDimension = 8;
/** How far beyond a window neighbours are looked for, in widths of the window. */
const widths = 2;

const widthOf = ({ lowerUm, upperUm }: SizeWindow) => upperUm - lowerUm;
const isBounded = (window: SizeWindow) => widthOf(window) < 1_000_000_000;

function outsideAll(windows: readonly SizeWindow[], statement: Statement): string {
  return windows
    .map((window) => `(o.dimension = ${statement.param(window.dimension)} AND NOT ${inWindow("o", window, statement)})`)
    .join(" OR ");
}

/** The nearest items below or above the window along one dimension that all other windows let pass. */
function beyond(
  side: "below" | "above",
  { sought, along, filters }: { sought: Sought; along: SizeWindow; filters: string },
  statement: Statement,
): string {
  const others = sought.windows.filter((window) => window !== along);
  const ruledOut = others.length
    ? `AND NOT EXISTS (SELECT FROM measured_dimensions o WHERE o.item_id = d.item_id AND (${outsideAll(others, statement)}))`
    : "";
  const reach = widths * widthOf(along);
  const [from, to, order] =
    side === "below" ? [along.lowerUm - reach, along.lowerUm, "DESC"] : [along.upperUm, along.upperUm + reach, "ASC"];
  return `(SELECT i.id AS item FROM measured_dimensions d JOIN ${publishedItems} ON i.id = d.item_id
    WHERE d.kind = ${statement.param(sought.kind)} AND d.dimension = ${statement.param(along.dimension)}
      AND d.nominal_um BETWEEN ${statement.param(from)}::integer AND ${statement.param(to)}::integer
      AND NOT ${inWindow("d", along, statement)} ${ruledOut} ${filters}
    ORDER BY d.nominal_um ${order} LIMIT ${perSide})`;
}

/** Items inside the window along one dimension that exactly one of the other windows keeps out, the nearest of each. */
function keptOutByOne(
  { sought, along, filters }: { sought: Sought; along: SizeWindow; filters: string },
  statement: Statement,
): string {
  const others = sought.windows.filter((window) => window !== along);
  const values = others.map(
    ({ dimension, lowerUm, upperUm, reach }) =>
      `(${statement.param(dimension)}::text, ${statement.param(lowerUm)}::float8, ${statement.param(upperUm)}::float8, ${statement.param(reach)}::float8)`,
  );
  return `(SELECT item FROM (
    SELECT i.id AS item, row_number() OVER (PARTITION BY miss.dimension ORDER BY miss.off, i.id) AS place
    FROM measured_dimensions d JOIN ${publishedItems} ON i.id = d.item_id
    CROSS JOIN LATERAL (
      SELECT min(o.dimension) AS dimension, min(greatest(v.lower - o.nominal_um, o.nominal_um - v.upper)) AS off
      FROM measured_dimensions o JOIN (VALUES ${values.join(", ")}) AS v (dimension, lower, upper, reach)
        ON v.dimension = o.dimension
      WHERE o.item_id = d.item_id AND NOT (o.nominal_um + v.reach * o.half_width_um >= v.lower
        AND o.nominal_um - v.reach * o.half_width_um <= v.upper)
      HAVING count(*) = 1
    ) miss
    WHERE d.kind = ${statement.param(sought.kind)} AND d.dimension = ${statement.param(along.dimension)}
      AND d.nominal_um BETWEEN ${statement.param(along.lowerUm)}::integer AND ${statement.param(along.upperUm)}::integer
      ${filters}
  ) nearest WHERE place <= ${perDimension})`;
}

/**
 * Items that only just do not do: on both sides of the window along `dimension`, and inside it but kept out by one other.
 * Their ids, few; whether they miss by one dimension is settled when they are assessed.
 */
export async function neighboursOf(
  sought: Sought,
  dimension: DimensionName,
  { offer, material, words }: Pick<SearchQuery, "offer" | "material"> & { words: string | null },
): Promise<string[]> {
  const along = sought.windows.find((window) => window.dimension === dimension);
  if (!along || !isBounded(along)) return [];
  const tsquery = words === null ? null : (await wordQuery(words)).tsquery;
  const statement = new Statement();
  const filters = [
    offer && `AND p.offer_type = ${statement.param(offer)}`,
    material && `AND p.material = ${statement.param(material)}`,
    tsquery !== null && `AND p.search_words @@ to_tsquery('english', ${statement.param(tsquery)}::text)`,
  ]
    .filter(Boolean)
    .join(" ");
  const asked = { sought, along, filters };
  const branches = [beyond("below", asked, statement), beyond("above", asked, statement)];
  if (sought.windows.length > 1) branches.push(keptOutByOne(asked, statement));
  const rows = await select<{ item: string }>(branches.join(" UNION "), statement.bind);
  return rows.map(({ item }) => item);
}
