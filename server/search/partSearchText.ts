import { QueryTypes, type Transaction } from "sequelize";
import { kindFacts, type ListingKind } from "#shared/domain/partKinds";
import type { Material } from "#shared/schemas/part";
import { database } from "../db/inTransaction";
import { plainWords } from "./plainWords";

/** What a material is also called. */
const materialWords: Record<Material, string> = {
  NBR: "NBR nitrile rubber",
  CR: "CR chloroprene rubber",
  EPDM: "EPDM rubber",
  silicone: "silicone rubber",
  polyurethane: "polyurethane PU",
  "natural-rubber": "natural rubber",
  cork: "cork",
  felt: "felt",
};

const kindWords = (kind: ListingKind) => (kind === "rebuild-kit" ? "rebuild kit" : kindFacts[kind].name);

export type PartWords = {
  title: string;
  kind: ListingKind;
  material: Material | null;
  workshopName: string;
  /** Title and kind of each line of a kit. */
  lines: readonly { title: string; kind: ListingKind | null }[];
  /** Families that it is claimed to fit. */
  families: readonly { name: string; maker: string; models: readonly string[] }[];
};

/** The text in which words find a part: every word once, plain (see `plainWords`), in the order met. */
export function partSearchText({ title, kind, material, workshopName, lines, families }: PartWords): string {
  const texts = [
    title,
    kindWords(kind),
    material ? materialWords[material] : "",
    workshopName,
    ...lines.flatMap((line) => [line.title, line.kind ? kindWords(line.kind) : ""]),
    ...families.flatMap(({ name, maker, models }) => [maker, name, ...models]),
  ];
  return [...new Set(plainWords(texts.join(" ")))].join(" ");
}

type Row = Omit<PartWords, "lines" | "families"> & {
  id: string;
  lines: PartWords["lines"] | null;
  families: PartWords["families"] | null;
};

/** Writes the searched text of these parts anew; for whoever changes a part, its claims, its kit lines or their names. */
export async function writeSearchTexts(partIds: readonly string[], transaction: Transaction): Promise<void> {
  if (partIds.length === 0) return;
  const rows = await database().query<Row>(
    `SELECT p.id, p.title, p.kind, p.material, w.name AS "workshopName",
       (SELECT json_agg(json_build_object('title', l.title, 'kind', l.kind) ORDER BY l.position)
        FROM kit_lines l WHERE l.part_id = p.id) AS lines,
       (SELECT json_agg(json_build_object('name', f.name, 'maker', f.maker, 'models', f.models) ORDER BY f.slug)
        FROM families f WHERE f.id IN (SELECT s.family_id FROM fit_claims c
          JOIN service_points s ON s.id = c.service_point_id WHERE c.part_id = p.id)) AS families
     FROM parts p JOIN workshops w ON w.id = p.workshop_id WHERE p.id = ANY($partIds::uuid[])`,
    { bind: { partIds }, type: QueryTypes.SELECT, transaction },
  );
  const texts = rows.map((row) => partSearchText({ ...row, lines: row.lines ?? [], families: row.families ?? [] }));
  await database().query(
    `UPDATE parts p SET search_text = t.words
     FROM unnest($ids::uuid[], $texts::text[]) AS t(id, words) WHERE p.id = t.id AND p.search_text <> t.words`,
    { bind: { ids: rows.map(({ id }) => id), texts }, transaction },
  );
}
