import { randomUUID } from "node:crypto";
import { inTransaction } from "#server/db/inTransaction";
import { KitLine } from "#server/models/KitLine";
import { MeasuredDimension } from "#server/models/MeasuredDimension";
import { MeasuredItem } from "#server/models/MeasuredItem";
import { Part } from "#server/models/Part";
import { type DimensionName, dimensionsOf, kindFacts, type PartKind } from "#shared/domain/partKinds";
import { partTolerance } from "#shared/domain/partTolerance";
import { toleranceClasses } from "#shared/domain/rubberTolerance";
import { buildWorkshop } from "#tests/support/factories";

/** Numbers from 0 to 1 that are the same in every run. Source: mulberry32, a 32-bit mixing generator (public domain). */
export function dice(seed: number): () => number {
  let state = seed;
  return () => {
    state = (state + 0x6d2b79f5) | 0;
    let mixed = Math.imul(state ^ (state >>> 15), 1 | state);
    mixed = (mixed + Math.imul(mixed ^ (mixed >>> 7), 61 | mixed)) ^ mixed;
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 2 ** 32;
  };
}

export const triedKinds: readonly PartKind[] = ["idler-wheel", "flat-belt", "drive-ring"];
const middles: Partial<Record<DimensionName, number>> = {
  outsideDiameter: 44,
  bore: 4,
  treadWidth: 6,
  overallHeight: 12,
  secondTreadDiameter: 30,
  insideCircumference: 300,
  width: 5,
  thickness: 0.8,
  insideDiameter: 30,
  section: 3,
  height: 3,
};
export const middleOf = (dimension: DimensionName): number => middles[dimension] ?? 10;

type Size = {
  dimension: DimensionName;
  nominalUm: number;
  halfWidthUm: number;
  tolerance: "stated" | "class" | "assumed";
};

/** Sizes around one machine's, some far off, with tolerances from none at all to absurdly wide, and some left out. */
function randomSizes(
  kind: PartKind,
  next: () => number,
): (Size & { toleranceClass: "M1" | "M2" | "M3" | "M4" | null })[] {
  return dimensionsOf(kind).flatMap((dimension) => {
    if (dimension !== kindFacts[kind].primary && next() < 0.25) return [];
    const spread = next() < 0.8 ? 0.06 : 0.6;
    const nominalMm = Number((middleOf(dimension) * (1 + (next() - 0.5) * spread)).toFixed(next() < 0.5 ? 1 : 2));
    const way = next();
    const plusMinusMm = way < 0.1 ? 0 : way < 0.4 ? next() * 0.3 : way < 0.5 ? nominalMm * next() * 0.4 : undefined;
    const toleranceClass = way >= 0.8 ? undefined : toleranceClasses[Math.floor(next() * 4)];
    const inForce = partTolerance(
      plusMinusMm === undefined ? { nominalMm, toleranceClass } : { nominalMm, plusMinusMm },
    );
    return [
      {
        dimension,
        nominalUm: Math.round(nominalMm * 1000),
        halfWidthUm: Math.round(Math.min(inForce.plusMinusMm, nominalMm) * 1000),
        tolerance: inForce.basis,
        toleranceClass: inForce.toleranceClass ?? null,
      },
    ];
  });
}

/**
 * A small market: parts of three kinds and kits, most of them published; the same for the same seed but for their ids.
 * Some are drafts, and one workshop in four is not admitted.
 */
export async function buildRandomParts(count: number, seed: number): Promise<void> {
  const next = dice(seed);
  const pick = <T>(from: readonly T[]): T => from[Math.floor(next() * from.length)]!;
  const workshops = [
    await buildWorkshop({ countries: ["DE", "NO"], dispatchDays: 1 }),
    await buildWorkshop({ countries: ["NO"], dispatchDays: 9 }),
    await buildWorkshop({ countries: ["DE"], dispatchDays: 4 }),
    await buildWorkshop({ state: "suspended" }),
  ];
  const rows = Array.from({ length: count }, (_, n) => {
    const isKit = next() < 0.2;
    const kinds = isKit
      ? Array.from({ length: 1 + Math.floor(next() * 3) }, () => pick(triedKinds))
      : [pick(triedKinds)];
    const offerType = isKit ? ("stocked" as const) : pick(["stocked", "made-to-order"] as const);
    return {
      part: {
        id: randomUUID(),
        workshopId: pick(workshops).id,
        reference: `R-${n}`,
        kind: isKit ? ("rebuild-kit" as const) : kinds[0]!,
        title: `Thing ${n}`,
        material: pick(["NBR", "CR", null] as const),
        offerType,
        priceMinor: 500 + Math.floor(next() * 40) * 100,
        currency: "EUR",
        stockOnHand: offerType === "stocked" ? Math.floor(next() * 5) : null,
        leadDays: offerType === "stocked" ? 0 : 5,
        state: next() < 0.9 ? ("published" as const) : pick(["draft", "hidden", "retired"] as const),
        searchText: next() < 0.5 ? "grey thing" : "black thing",
      },
      items: kinds.map((kind, i) => ({
        id: randomUUID(),
        kitLineId: isKit ? randomUUID() : null,
        position: i + 1,
        kind,
        sizes: randomSizes(kind, next),
      })),
    };
  });
  await inTransaction(async (transaction) => {
    await Part.bulkCreate(
      rows.map(({ part }) => part),
      { transaction },
    );
    const items = rows.flatMap(({ part, items: own }) => own.map((item) => ({ ...item, partId: part.id })));
    await KitLine.bulkCreate(
      items.flatMap(({ kitLineId, partId, position, kind }) =>
        kitLineId ? [{ id: kitLineId, partId, position, kind, title: "line", quantity: 1 }] : [],
      ),
      { transaction },
    );
    await MeasuredItem.bulkCreate(
      items.map(({ id, partId, kitLineId, kind }) => ({
        id,
        partId,
        kitLineId,
        kind,
        primaryDimension: kindFacts[kind].primary,
      })),
      { transaction },
    );
    await MeasuredDimension.bulkCreate(
      items.flatMap(({ id, kind, sizes }) => sizes.map((size) => ({ ...size, itemId: id, kind }))),
      { transaction },
    );
  });
}
