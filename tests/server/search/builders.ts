import { inTransaction } from "#server/db/inTransaction";
import { Family } from "#server/models/Family";
import { KitLine } from "#server/models/KitLine";
import { MeasuredDimension } from "#server/models/MeasuredDimension";
import { MeasuredItem } from "#server/models/MeasuredItem";
import { Part } from "#server/models/Part";
import { ServicePoint } from "#server/models/ServicePoint";
import { ServicePointSize } from "#server/models/ServicePointSize";
import { type DimensionName, kindFacts, type PartKind } from "#shared/domain/partKinds";
import { buildWorkshop } from "#tests/support/factories";

let count = 0;
const um = (mm: number) => Math.round(mm * 1000);

type Band = [nominalMm: number, lowerMm: number, upperMm: number];
type Point = { name: string; kind?: PartKind; sizes: Partial<Record<DimensionName, Band>> };

/** A family with service points and the sizes of their register. */
export async function buildFamily({ points, ...given }: { slug: string; name?: string; points: readonly Point[] }) {
  const family = await Family.create({
    name: given.name ?? `Family ${++count}`,
    maker: "Testwerk",
    kind: "record-changer",
    models: ["Testwerk One"],
    about: "Made for a test.",
    driveMap: { widthMm: 300, heightMm: 300, wheels: [], belts: [] },
    slug: given.slug,
  });
  const made: ServicePoint[] = [];
  for (const [index, { name, kind = "idler-wheel", sizes }] of points.entries()) {
    const point = await ServicePoint.create({
      familyId: family.id,
      number: index + 1,
      name,
      partKind: kind,
      xUm: 10_000,
      yUm: 20_000,
    });
    for (const [dimension, [nominal, lower, upper]] of Object.entries(sizes) as [DimensionName, Band][]) {
      await ServicePointSize.create({
        servicePointId: point.id,
        dimension,
        nominalUm: um(nominal),
        lowerUm: um(lower),
        upperUm: um(upper),
      });
    }
    made.push(point);
  }
  return { family, points: made };
}

/** A published kit of idler wheels, each with its outside diameter and bore, and a plain item. */
export async function buildKit({
  lines,
  ...given
}: {
  lines: readonly { outsideDiameter: number; bore?: number }[];
  title?: string;
  workshopId?: string;
  priceMinor?: number;
}) {
  const workshopId = given.workshopId ?? (await buildWorkshop()).id;
  const n = ++count;
  return inTransaction(async (transaction) => {
    const title = given.title ?? `Kit ${n}`;
    const part = await Part.create(
      {
        workshopId,
        reference: `K-${n}`,
        kind: "rebuild-kit",
        title,
        offerType: "stocked",
        priceMinor: given.priceMinor ?? 5000,
        currency: "EUR",
        stockOnHand: 3,
        state: "published",
        searchText: title.toLowerCase(),
      },
      { transaction },
    );
    const made: KitLine[] = [];
    for (const [index, { outsideDiameter, bore = 4 }] of lines.entries()) {
      const kind = "idler-wheel" as const;
      const line = await KitLine.create(
        { partId: part.id, position: index + 1, kind, title: `Wheel ${index + 1}`, quantity: 1 },
        { transaction },
      );
      const item = await MeasuredItem.create(
        { partId: part.id, kitLineId: line.id, kind, primaryDimension: kindFacts[kind].primary },
        { transaction },
      );
      await MeasuredDimension.bulkCreate(
        Object.entries({ outsideDiameter, bore }).map(([dimension, nominal]) => ({
          itemId: item.id,
          kind,
          dimension: dimension as DimensionName,
          nominalUm: um(nominal),
          halfWidthUm: 20,
          tolerance: "stated" as const,
          toleranceClass: null,
        })),
        { transaction },
      );
      made.push(line);
    }
    await KitLine.create(
      { partId: part.id, position: lines.length + 1, kind: null, title: "Bearing grease", quantity: 1 },
      { transaction },
    );
    return { part, lines: made };
  });
}
