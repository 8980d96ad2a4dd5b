import type { CreationAttributes, Transaction } from "sequelize";
import { type DimensionName, kindFacts, type PartKind } from "#shared/domain/partKinds";
import { partTolerance } from "#shared/domain/partTolerance";
import type { ToleranceClass } from "#shared/domain/rubberTolerance";
import { MeasuredDimension } from "../models/MeasuredDimension";
import { MeasuredItem } from "../models/MeasuredItem";
import { Part } from "../models/Part";
import { idOf } from "./dice";

export type StatedSizes = Partial<
  Record<DimensionName, { nominalMm: number; plusMinusMm?: number; toleranceClass?: ToleranceClass }>
>;

const um = (mm: number) => Math.round(mm * 1000);

/** Writes the sizes of a part or of a kit line, with the tolerance in force. */
export async function insertSizes(
  of: { partId: string; kitLineId: string | null; kind: PartKind; sizes: StatedSizes },
  transaction: Transaction,
): Promise<void> {
  const itemId = idOf("item", of.kitLineId ?? of.partId);
  await MeasuredItem.create(
    {
      id: itemId,
      partId: of.partId,
      kitLineId: of.kitLineId,
      kind: of.kind,
      primaryDimension: kindFacts[of.kind].primary,
    },
    { transaction },
  );
  await MeasuredDimension.bulkCreate(
    (Object.entries(of.sizes) as [DimensionName, NonNullable<StatedSizes[DimensionName]>][]).map(
      ([dimension, size]) => {
        const inForce = partTolerance(size);
        return {
          itemId,
          kind: of.kind,
          dimension,
          nominalUm: um(size.nominalMm),
          halfWidthUm: um(inForce.plusMinusMm),
          tolerance: inForce.basis,
          toleranceClass: inForce.toleranceClass ?? null,
        };
      },
    ),
    { transaction },
  );
}

export async function insertPart(
  part: Omit<CreationAttributes<Part>, "kind" | "currency" | "state"> & {
    id: string;
    kind: PartKind;
    sizes: StatedSizes;
  },
  transaction: Transaction,
): Promise<void> {
  const { sizes, ...row } = part;
  await Part.create({ ...row, currency: "EUR", state: "published" }, { transaction });
  await insertSizes({ partId: part.id, kitLineId: null, kind: part.kind, sizes }, transaction);
}
