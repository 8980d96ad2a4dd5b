import type { Transaction } from "sequelize";
import { defaultBand } from "#shared/domain/acceptedBands";
import { type DimensionName, dimensionsOf, kindFacts, type PartKind, partKinds } from "#shared/domain/partKinds";
import { FitClaim } from "../models/FitClaim";
import { between, dice, idOf, pick } from "./dice";
import { insertPart, type StatedSizes } from "./insertPart";
import { basePrice, finishes, hardness, made, titles, weightG } from "./listingWords";
import type { SeededPoint, Sizes } from "./seedFamilies";
import { workshopId } from "./seedPeople";
import { type DemoWorkshop, demoWorkshops } from "./workshopData";

export type SeededPart = {
  id: string;
  kind: PartKind;
  workshop: DemoWorkshop;
  point: SeededPoint;
  sizes: StatedSizes;
  material: string;
};

const wanted = 400;
const claimEvidence = ["measured-on-machine", "fitted-here", "from-drawing", "customer-report"] as const;

/** Where a listing lies against what the point takes, in halves of the band: most near, some off, a few hopeless. */
function offsetOf(...name: (string | number)[]): number {
  const throwOf = dice(...name, "offset");
  if (throwOf < 0.55) return (dice(...name, "near") - 0.5) * 0.8;
  if (throwOf < 0.85) return (dice(...name, "off") - 0.5) * 2.2;
  return (dice(...name, "far") < 0.5 ? -1 : 1) * (1.4 + dice(...name, "how far") * 3);
}

/** On the grid that a workshop would state: 0.01 mm on bores, 0.05 mm on small sizes, whole millimetres on belts. */
function stated(dimension: DimensionName, mm: number): number {
  const step = dimension === "insideCircumference" ? 1 : dimension === "bore" ? 0.01 : mm < 8 ? 0.05 : 0.1;
  return Number((Math.round(mm / step) * step).toFixed(3));
}

function sizesFor(workshop: DemoWorkshop, kind: PartKind, needs: Sizes, name: string): StatedSizes {
  const sizes: StatedSizes = {};
  for (const dimension of dimensionsOf(kind)) {
    const need = needs[dimension];
    if (need === undefined) continue;
    const primary = dimension === kindFacts[kind].primary;
    // Hub lengths and heights are often left unsaid.
    if (!primary && dimension !== "bore" && dice(name, dimension, "left out") < 0.12) continue;
    const band = defaultBand(kind, dimension, need);
    const half = (band.upperMm - band.lowerMm) / 2;
    const middle = (band.upperMm + band.lowerMm) / 2;
    const offset =
      primary || dimension === "bore"
        ? offsetOf(name, dimension) * (primary ? 1 : 0.6)
        : offsetOf(name, dimension) * 0.4;
    const nominalMm = Math.max(stated(dimension, middle + offset * half), 0.3);
    if (dimension === "bore")
      sizes[dimension] = { nominalMm, plusMinusMm: workshop.precision === "ground" ? 0.01 : 0.02 };
    else if (workshop.precision === "unstated") sizes[dimension] = { nominalMm };
    else if (workshop.precision === "ground")
      sizes[dimension] = { nominalMm, plusMinusMm: Number(Math.max(0.05, half * 0.15).toFixed(2)) };
    else sizes[dimension] = { nominalMm, toleranceClass: dice(name, "class") < 0.5 ? "M2" : "M3" };
  }
  return sizes;
}

const capitalised = (text: string) => `${text.charAt(0).toUpperCase()}${text.slice(1)}`;

function titleFor(kind: PartKind, point: SeededPoint, name: string): string {
  return pick(titles[kind], name, "title")
    .replaceAll("{Place}", capitalised(point.name))
    .replaceAll("{place}", point.name);
}

/** Deals listings over kinds and points so that every point has some and the wheel of the documents has the most. */
function* deal(points: readonly SeededPoint[]): Generator<{ workshop: DemoWorkshop; point: SeededPoint; n: number }> {
  let n = 0;
  for (let round = 0; n < wanted; round++) {
    for (const point of points) {
      const makers = demoWorkshops.filter(({ makes }) => makes.includes(point.kind));
      const workshop = makers[(round + Math.floor(dice("start", point.id) * makers.length)) % makers.length];
      const often = point.familySlug === "tavrin-c4" && point.name === "platter idler" ? 3 : 1;
      for (let again = 0; again < often && n < wanted; again++) {
        const maker = again === 0 ? workshop : makers[(round * often + again) % makers.length];
        if (maker) yield { workshop: maker, point, n: n++ };
      }
    }
  }
}

/** 400 listings over every kind, most made for a service point of a family. Search words are filled in afterwards. */
export async function seedListings(points: readonly SeededPoint[], transaction: Transaction): Promise<SeededPart[]> {
  for (const kind of partKinds)
    if (!points.some((point) => point.kind === kind)) throw new Error(`no service point takes a ${kind}`);
  const seeded: SeededPart[] = [];
  for (const { workshop, point, n } of deal(points)) {
    const name = `part/${n}`;
    const { kind } = point;
    const suited = workshop.materials.filter((material) =>
      kind === "clutch-felt"
        ? material === "felt"
        : kind === "brake-pad"
          ? ["felt", "cork"].includes(material)
          : !["felt", "cork"].includes(material),
    );
    const material = pick(suited.length > 0 ? suited : workshop.materials, name, "material");
    const remoulds = workshop.slug === "halden-and-quist" || (kind === "idler-wheel" && dice(name, "remould") < 0.08);
    const offerType = remoulds ? "re-mould" : dice(name, "offer") < 0.15 ? "made-to-order" : "stocked";
    const sizes = sizesFor(workshop, kind, point.sizes, name);
    const id = idOf(name);
    await insertPart(
      {
        id,
        workshopId: workshopId(workshop.slug),
        reference: `${workshop.slug.slice(0, 3).toUpperCase()}-${1000 + n}`,
        kind,
        title: remoulds ? `${capitalised(point.name)}, re-mould of your hub` : titleFor(kind, point, name),
        description: `${made[material]} ${finishes[workshop.precision]} Made for the ${point.name} of the ${point.familyName} family; measure yours before you buy.`,
        material,
        hardnessShoreA: hardness[material] ? pick(hardness[material], name, "hardness") : null,
        offerType,
        priceMinor: Math.round((basePrice[kind] * workshop.priceFactor * (0.85 + dice(name, "price") * 0.4)) / 10) * 10,
        stockOnHand:
          offerType === "stocked" ? between(point.familySlug === "tavrin-c4" ? 6 : 0, 24, 1, name, "stock") : null,
        leadDays: offerType === "stocked" ? 0 : between(5, 21, 1, name, "lead"),
        madeToSize: offerType === "made-to-order",
        coreTerms: remoulds
          ? "Send your old wheel with its hub and bush. A hub that is bent or cracked is sent back, and what you paid with it."
          : null,
        weightG: weightG[kind],
        sizes,
      },
      transaction,
    );
    if (dice(name, "claim") < 0.7) {
      await FitClaim.create(
        {
          id: idOf(name, "claim"),
          partId: id,
          servicePointId: point.id,
          evidence: pick(claimEvidence, name, "evidence"),
        },
        { transaction },
      );
    }
    seeded.push({ id, kind, workshop, point, sizes, material });
  }
  return seeded;
}
