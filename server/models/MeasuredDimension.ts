import { DataTypes, type InferAttributes, type InferCreationAttributes, Model, type Sequelize } from "sequelize";
import type { DimensionName, PartKind } from "#shared/domain/partKinds";

/** One size of a measured item, in micrometres, with the tolerance in force. */
export class MeasuredDimension extends Model<
  InferAttributes<MeasuredDimension>,
  InferCreationAttributes<MeasuredDimension>
> {
  declare itemId: string;
  declare kind: PartKind;
  declare dimension: DimensionName;
  declare nominalUm: number;
  declare halfWidthUm: number;
  declare tolerance: "stated" | "class" | "assumed";
  declare toleranceClass: "M1" | "M2" | "M3" | "M4" | null;
}

export function initMeasuredDimension(sequelize: Sequelize): void {
  MeasuredDimension.init(
    {
      itemId: { type: DataTypes.UUID, primaryKey: true },
      kind: DataTypes.TEXT,
      dimension: { type: DataTypes.TEXT, primaryKey: true },
      nominalUm: DataTypes.INTEGER,
      halfWidthUm: DataTypes.INTEGER,
      tolerance: DataTypes.TEXT,
      toleranceClass: DataTypes.TEXT,
    },
    { sequelize, tableName: "measured_dimensions", timestamps: false },
  );
}
