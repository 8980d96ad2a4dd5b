import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from "sequelize";
import type { DimensionName, PartKind } from "#shared/domain/partKinds";

/** A thing that has sizes: a part of its own, or the line of a kit. */
export class MeasuredItem extends Model<InferAttributes<MeasuredItem>, InferCreationAttributes<MeasuredItem>> {
  declare id: CreationOptional<string>;
  declare partId: string;
  declare kitLineId: CreationOptional<string | null>;
  declare kind: PartKind;
  declare primaryDimension: DimensionName;
}

export function initMeasuredItem(sequelize: Sequelize): void {
  MeasuredItem.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
      partId: DataTypes.UUID,
      kitLineId: DataTypes.UUID,
      kind: DataTypes.TEXT,
      primaryDimension: DataTypes.TEXT,
    },
    { sequelize, tableName: "measured_items", timestamps: false },
  );
}
