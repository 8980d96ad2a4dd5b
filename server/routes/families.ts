import { z } from "zod";
import { FamilyList, FamilyPage, MechanismKind } from "#shared/schemas/catalogue";
import { SlugParams } from "#shared/schemas/common";
import { AppError } from "../errors/AppError";
import { type Endpoint, endpoint } from "../http/endpoint";
import { Family } from "../models/Family";
import { ServicePoint } from "../models/ServicePoint";
import { presentFamily, presentFamilyPage } from "../presenters/presentFamily";
import type { Services } from "../Services";
import { mayStandFor } from "../search/editDistance";
import { familyRegister } from "../search/familyRegister";
import { plainWords } from "../search/plainWords";
import { servicePointCounts } from "../search/servicePointCounts";

const tag = "Catalogue";
const FamilyQuery = z.object({
  kind: MechanismKind.optional(),
  q: z.string().trim().max(120, "Use at most 120 characters").optional(),
});

/** Whether every word typed begins a word of the family's names, or may be a slip for one. */
function answersTo({ maker, name, models }: Family, typed: readonly string[]): boolean {
  const words = plainWords([maker, name, ...models].join(" "));
  return typed.every((word) => words.some((own) => own.startsWith(word) || mayStandFor(word, own)));
}

async function pointCounts(): Promise<Map<string, number>> {
  const rows = await ServicePoint.count({ group: ["familyId"] });
  return new Map(rows.map(({ familyId, count }) => [String(familyId), Number(count)]));
}

export function familyRoutes({ search }: Services): Endpoint[] {
  return [
    endpoint(
      {
        method: "get",
        path: "/families",
        summary: "Mechanism families, by kind and by words of their names.",
        tag,
        access: "anyone",
        query: FamilyQuery,
        answer: FamilyList,
      },
      async ({ query: { kind, q } }) => {
        const where = kind ? { kind } : {};
        const order: [string, string][] = [
          ["maker", "ASC"],
          ["name", "ASC"],
        ];
        const [families, counts] = await Promise.all([Family.findAll({ where, order }), pointCounts()]);
        const typed = plainWords(q ?? "");
        const found = families.filter((family) => answersTo(family, typed));
        return { items: found.map((family) => presentFamily(family, counts.get(family.id) ?? 0)) };
      },
    ),
    endpoint(
      {
        method: "get",
        path: "/families/:slug",
        summary: "A family: its drive, its service points, and how many parts fit each.",
        tag,
        access: "anyone",
        params: SlugParams,
        answer: FamilyPage,
      },
      async ({ params: { slug } }) => {
        const family = await Family.findOne({ where: { slug } });
        if (!family) throw new AppError("not-found", `No mechanism family is called “${slug}” here`);
        const [points, register] = await Promise.all([
          ServicePoint.findAll({ where: { familyId: family.id }, order: [["number", "ASC"]] }),
          familyRegister(slug),
        ]);
        return presentFamilyPage(family, points, register, await servicePointCounts(search, register));
      },
    ),
  ];
}
