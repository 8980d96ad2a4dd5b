import type { Transaction } from "sequelize";
import { FitClaim } from "../models/FitClaim";
import { KitLine } from "../models/KitLine";
import { Part } from "../models/Part";
import { between, idOf, pick } from "./dice";
import { demoFamilies } from "./familyData";
import { insertSizes, type StatedSizes } from "./insertPart";
import { basePrice } from "./listingWords";
import type { SeededPoint } from "./seedFamilies";
import { workshopId } from "./seedPeople";

const wanted = 20;
const kitMakers = ["van-loon-loopwerk", "spindelhof", "pell-wheelworks", "brenner-riemen", "sable-creek"] as const;
const plainItems = [
  "Bearing grease, 2 g",
  "Circlips, set of 6",
  "Spindle felts, pair",
  "Fibre washers, set of 4",
] as const;

const statedSizes = (point: SeededPoint): StatedSizes =>
  Object.fromEntries(
    Object.entries(point.sizes).map(([dimension, nominalMm]) => [
      dimension,
      dimension === "bore"
        ? { nominalMm: Number((nominalMm + 0.01).toFixed(2)), plusMinusMm: 0.02 }
        : { nominalMm, toleranceClass: "M3" as const },
    ]),
  );

async function seedKit(n: number, points: readonly SeededPoint[], transaction: Transaction): Promise<string> {
  const family = demoFamilies[n % demoFamilies.length];
  if (!family) throw new Error("there are families");
  const own = points.filter(({ familySlug }) => familySlug === family.slug);
  const full = n < demoFamilies.length;
  const lines = full ? own : own.slice(0, Math.max(2, own.length - 2));
  const maker = pick(kitMakers, "kit", n, "maker");
  const partsPrice = lines.reduce((sum, { kind }) => sum + basePrice[kind], 0);
  const partId = idOf("kit", n);
  await Part.create(
    {
      id: partId,
      workshopId: workshopId(maker),
      reference: `KIT-${100 + n}`,
      kind: "rebuild-kit",
      title: full ? `Rebuild kit, ${family.maker} ${family.name}` : `Small rebuild kit, ${family.maker} ${family.name}`,
      description: `${full ? "Every wear part" : "The parts that go first"} of the ${family.maker} ${family.name} family, measured and packed by one person, with what is needed beside them.`,
      offerType: "stocked",
      priceMinor: Math.round((partsPrice * 0.82) / 50) * 50,
      currency: "EUR",
      stockOnHand: between(1, 9, 1, "kit", n, "stock"),
      weightG: 120,
      state: "published",
    },
    { transaction },
  );
  for (const [index, point] of lines.entries()) {
    const line = await KitLine.create(
      {
        id: idOf("kit", n, "line", index),
        partId,
        position: index + 1,
        kind: point.kind,
        title: point.name,
        quantity: point.kind === "motor-mount" ? 3 : 1,
        servicePointId: point.id,
      },
      { transaction },
    );
    await insertSizes({ partId, kitLineId: line.id, kind: point.kind, sizes: statedSizes(point) }, transaction);
    await FitClaim.create(
      { id: idOf("kit", n, "claim", index), partId, servicePointId: point.id, evidence: "measured-on-machine" },
      { transaction },
    );
  }
  await KitLine.create(
    {
      id: idOf("kit", n, "plain"),
      partId,
      position: lines.length + 1,
      kind: null,
      title: pick(plainItems, "kit", n),
      quantity: 1,
    },
    { transaction },
  );
  return partId;
}

/** 20 rebuild kits: one for each family, then smaller ones. */
export async function seedKits(points: readonly SeededPoint[], transaction: Transaction): Promise<string[]> {
  const ids: string[] = [];
  for (let n = 0; n < wanted; n++) ids.push(await seedKit(n, points, transaction));
  return ids;
}
