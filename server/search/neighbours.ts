import type { DimensionName } from "#shared/domain/partKinds";
import type { SearchQuery } from "#shared/schemas/search";
import type { SizeWindow, Sought } from "../adapters/SearchEngine";
import { select } from "../db/select";
import { inWindow, Statement } from "./candidateSql";
import { wordQuery } from "./wordQuery";

/** Items looked at on each side and for each dimension: twice what is shown, since some turn out not to be on offer. */
const perSide = 16;
/** How far beyond a window neighbours are looked for, in widths of the window. */
const widths = 2;

const widthOf = ({ lowerUm, upperUm }: SizeWindow) => upperUm - lowerUm;
const isBounded = (window: SizeWindow) => widthOf(window) < 1_000_000_000;

type Asked = { sought: Sought; along: SizeWindow; joined: string; filters: string };

const others = ({ sought, along }: Asked) => sought.windows.filter((window) => window !== along);

/** The nearest items below or above the window along one dimension that all other windows let pass. */
function beyond(side: "below" | "above", asked: Asked, statement: Statement): string {
  const { sought, along, joined, filters } = asked;
  const outside = others(asked).map(
    (window) => `(o.dimension = ${statement.param(window.dimension)} AND NOT ${inWindow("o", window, statement)})`,
  );
  const ruledOut = outside.length
    ? `AND NOT EXISTS (SELECT FROM measured_dimensions o WHERE o.item_id = d.item_id AND (${outside.join(" OR ")}))`
    : "";
  const reach = widths * widthOf(along);
  const [from, to, order] =
    side === "below" ? [along.lowerUm - reach, along.lowerUm, "DESC"] : [along.upperUm, along.upperUm + reach, "ASC"];
  return `(SELECT d.item_id AS id FROM measured_dimensions d ${joined}
    WHERE d.kind = ${statement.param(sought.kind)} AND d.dimension = ${statement.param(along.dimension)}
      AND d.nominal_um BETWEEN ${statement.param(from)}::integer AND ${statement.param(to)}::integer
      AND NOT ${inWindow("d", along, statement)} ${ruledOut} ${filters}
    ORDER BY d.nominal_um ${order} LIMIT ${perSide})`;
}

/** Items inside the window along one dimension that exactly one of the other windows keeps out, the nearest of each. */
function keptOutByOne(asked: Asked, statement: Statement): string {
  const { sought, along, joined, filters } = asked;
  const values = others(asked).map(
    ({ dimension, lowerUm, upperUm, reach }) =>
      `(${statement.param(dimension)}::text, ${statement.param(lowerUm)}::float8,
        ${statement.param(upperUm)}::float8, ${statement.param(reach)}::float8)`,
  );
  return `(SELECT id FROM (
    SELECT d.item_id AS id, row_number() OVER (PARTITION BY miss.dimension ORDER BY miss.off, d.item_id) AS place
    FROM measured_dimensions d ${joined}
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
  ) nearest WHERE place <= ${perSide})`;
}

/**
 * Items that only just do not do: on both sides of the window along `dimension`, and inside it but kept out by one other.
 * Their ids, few; whether they are on offer, and miss by one dimension, is settled when they are loaded and assessed.
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
  ].filter(Boolean);
  const joined = filters.length ? "JOIN measured_items i ON i.id = d.item_id JOIN parts p ON p.id = i.part_id" : "";
  const asked = { sought, along, joined, filters: filters.join(" ") };
  const branches = [beyond("below", asked, statement), beyond("above", asked, statement)];
  if (sought.windows.length > 1) branches.push(keptOutByOne(asked, statement));
  const rows = await select<{ id: string }>(branches.join(" UNION "), statement.bind);
  return rows.map(({ id }) => id);
}
