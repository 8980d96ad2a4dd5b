import type { DimensionName, PartKind } from "#shared/domain/partKinds";
import { select } from "../db/select";
import { AppError } from "../errors/AppError";

/** What the register knows of a size at a service point, in mm. */
export type RegisterSize = { nominalMm: number; lowerMm: number; upperMm: number };
export type RegisterPoint = {
  id: string;
  name: string;
  kind: PartKind;
  sizes: Partial<Record<DimensionName, RegisterSize>>;
};
export type FamilyRegister = { id: string; slug: string; name: string; points: RegisterPoint[] };

type Row = {
  id: string;
  slug: string;
  name: string;
  point: string | null;
  pointName: string;
  kind: PartKind;
  sizes: Record<string, [nominalUm: number, lowerUm: number, upperUm: number]> | null;
};

const sql = `
  SELECT f.id, f.slug, f.name, s.id AS point, s.name AS "pointName", s.part_kind AS kind,
    (SELECT json_object_agg(z.dimension, json_build_array(z.nominal_um, z.lower_um, z.upper_um))
     FROM service_point_sizes z WHERE z.service_point_id = s.id) AS sizes
  FROM families f LEFT JOIN service_points s ON s.family_id = f.id
  WHERE f.slug = $slug
  ORDER BY s.number`;

/** A family with its service points in their order. Errors: `not-found` in words. */
export async function familyRegister(slug: string): Promise<FamilyRegister> {
  const rows = await select<Row>(sql, { slug });
  const first = rows[0];
  if (!first) throw new AppError("not-found", `No mechanism family is called “${slug}” here`);
  const points = rows.flatMap(({ point, pointName, kind, sizes }): RegisterPoint[] => {
    if (!point) return [];
    const inMm = Object.entries(sizes ?? {}).map(([dimension, [nominal, lower, upper]]) => [
      dimension,
      { nominalMm: nominal / 1000, lowerMm: lower / 1000, upperMm: upper / 1000 },
    ]);
    return [{ id: point, name: pointName, kind, sizes: Object.fromEntries(inMm) }];
  });
  return { id: first.id, slug: first.slug, name: first.name, points };
}
