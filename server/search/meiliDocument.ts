import { type DimensionName, dimensionNames, type PartKind } from "#shared/domain/partKinds";
import { select } from "../db/select";

/** What edges are kept for: a search that reaches no further than this over a tolerance can be told by them. */
export const edgeReach = 2;

type Edges = { [name in `${DimensionName}Low` | `${DimensionName}High`]?: number };

/**
 * One measured item as Meilisearch keeps it, or a part without one of its own. Edges are in micrometres: nominal less and
 * plus `edgeReach` times the half width of its tolerance. `alone` marks the one document of each part that words alone find.
 */
export type MeiliDocument = Edges & {
  id: string;
  part: string;
  item: string | null;
  kind: PartKind | null;
  alone: boolean;
  words: string;
};

export const edgeFields = dimensionNames.flatMap((name) => [`${name}Low`, `${name}High`] as const);

type Row = {
  part: string;
  words: string;
  item: string | null;
  kind: PartKind | null;
  isLine: boolean;
  sizes: Partial<Record<DimensionName, [nominalUm: number, halfWidthUm: number]>> | null;
};

const sql = `
  SELECT p.id AS part, p.search_text AS words, i.id AS item, i.kind, i.kit_line_id IS NOT NULL AS "isLine",
    (SELECT json_object_agg(m.dimension, json_build_array(m.nominal_um, m.half_width_um))
     FROM measured_dimensions m WHERE m.item_id = i.id) AS sizes
  FROM parts p JOIN workshops w ON w.id = p.workshop_id AND w.state = 'admitted'
    LEFT JOIN measured_items i ON i.part_id = p.id
  WHERE p.id = ANY($partIds::uuid[]) AND p.state = 'published'
  ORDER BY p.id`;

function documentOf({ part, words, item, kind, isLine, sizes }: Row): MeiliDocument {
  const document: MeiliDocument = { id: item ?? part, part, item, kind, alone: !isLine, words };
  for (const [dimension, [nominalUm, halfWidthUm]] of Object.entries(sizes ?? {})) {
    document[`${dimension as DimensionName}Low`] = nominalUm - edgeReach * halfWidthUm;
    document[`${dimension as DimensionName}High`] = nominalUm + edgeReach * halfWidthUm;
  }
  return document;
}

/** The documents of those of these parts that are published. */
export async function meiliDocuments(partIds: readonly string[]): Promise<MeiliDocument[]> {
  const rows = await select<Row>(sql, { partIds });
  const documents = rows.map(documentOf);
  const found = new Set(documents.filter(({ alone }) => alone).map(({ part }) => part));
  // A kit whose lines are all measured has no item of its own.
  for (const { part, words } of rows) {
    if (found.has(part)) continue;
    found.add(part);
    documents.push({ id: part, part, item: null, kind: null, alone: true, words });
  }
  return documents;
}
