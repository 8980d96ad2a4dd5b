import type { Transaction } from "sequelize";
import { defaultBand } from "#shared/domain/acceptedBands";
import type { DimensionName, PartKind } from "#shared/domain/partKinds";
import { Family } from "../models/Family";
import { ServicePoint } from "../models/ServicePoint";
import { ServicePointSize } from "../models/ServicePointSize";
import { between, idOf } from "./dice";
import { type DemoFamily, demoFamilies } from "./familyData";
import { mechanismPlans } from "./mechanismPlans";

export type Sizes = Partial<Record<DimensionName, number>>;

/** A service point as the listings of the demo data are made for it. */
export type SeededPoint = {
  id: string;
  familySlug: string;
  familyName: string;
  name: string;
  kind: PartKind;
  sizes: Sizes;
};

/** Sizes that are named in documents and tests: the wheel that everything is shown with. */
const known: Record<string, Sizes> = {
  "tavrin-c4/platter idler": { outsideDiameter: 44.15, bore: 4, treadWidth: 6, overallHeight: 12.5 },
  "solvane-r9/capstan belt": { insideCircumference: 412, width: 5, thickness: 0.8 },
};

const um = (mm: number) => Math.round(mm * 1000);

function sizesOf(family: DemoFamily, point: (typeof mechanismPlans)["changer"]["points"][number]): Sizes {
  const given = known[`${family.slug}/${point.name}`];
  if (given) return given;
  return Object.fromEntries(
    Object.entries(point.sizes).map(([dimension, [low, high, step]]) => [
      dimension,
      between(low, high, step, family.slug, point.name, dimension),
    ]),
  );
}

/** Families with their drive maps, service points, register sizes and the bands that each point accepts. */
export async function seedFamilies(transaction: Transaction): Promise<SeededPoint[]> {
  const seeded: SeededPoint[] = [];
  for (const family of demoFamilies) {
    const plan = mechanismPlans[family.plan];
    const familyId = idOf("family", family.slug);
    await Family.create(
      {
        id: familyId,
        slug: family.slug,
        name: `${family.maker} ${family.name}`,
        maker: family.maker,
        kind: family.kind,
        models: [...family.models],
        about: family.about,
        driveTrain: plan.driveTrain,
        driveMap: plan.map,
      },
      { transaction },
    );
    for (const [index, point] of plan.points.entries()) {
      const id = idOf("point", family.slug, point.name);
      const sizes = sizesOf(family, point);
      await ServicePoint.create(
        {
          id,
          familyId,
          number: index + 1,
          name: point.name,
          partKind: point.kind,
          note: point.note,
          xUm: um(point.at[0]),
          yUm: um(point.at[1]),
        },
        { transaction },
      );
      await ServicePointSize.bulkCreate(
        (Object.entries(sizes) as [DimensionName, number][]).map(([dimension, nominalMm]) => {
          const band = defaultBand(point.kind, dimension, nominalMm);
          return {
            servicePointId: id,
            dimension,
            nominalUm: um(nominalMm),
            lowerUm: um(band.lowerMm),
            upperUm: um(band.upperMm),
          };
        }),
        { transaction },
      );
      seeded.push({
        id,
        familySlug: family.slug,
        familyName: `${family.maker} ${family.name}`,
        name: point.name,
        kind: point.kind,
        sizes,
      });
    }
  }
  return seeded;
}
