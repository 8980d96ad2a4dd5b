import type { z } from "zod";
import type { FamilyPage, FamilySummary } from "#shared/schemas/catalogue";
import type { Family } from "../models/Family";
import type { ServicePoint } from "../models/ServicePoint";
import type { FamilyRegister } from "../search/familyRegister";

export const presentFamily = (family: Family, servicePointCount: number): FamilySummary => ({
  slug: family.slug,
  name: family.name,
  maker: family.maker,
  kind: family.kind,
  servicePointCount,
  models: family.models,
});

/** A family with its service points in their order, the sizes of the register, and how many parts fit each. */
export function presentFamilyPage(
  family: Family,
  points: readonly ServicePoint[],
  register: FamilyRegister,
  partCounts: ReadonlyMap<string, number>,
): z.input<typeof FamilyPage> {
  const sizesOf = new Map(register.points.map(({ id, sizes }) => [id, sizes]));
  return {
    ...presentFamily(family, points.length),
    about: family.about,
    driveTrain: family.driveTrain,
    driveMap: family.driveMap,
    servicePoints: points.map(({ id, number, name, partKind, note, xUm, yUm }) => ({
      id,
      number,
      name,
      partKind,
      note,
      xMm: xUm / 1000,
      yMm: yUm / 1000,
      sizes: sizesOf.get(id) ?? {},
      partCount: partCounts.get(id) ?? 0,
    })),
  };
}
