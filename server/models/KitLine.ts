import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from "sequelize";
import type { PartKind } from "#shared/domain/partKinds";

/** One line of a rebuild kit: a part with sizes, or a plain item without a kind. */
export class KitLine extends Model<InferAttributes<KitLine>, InferCreationAttributes<KitLine>> {
  declare id: CreationOptional<string>;
  declare partId: string;
  declare position: number;
  declare kind: PartKind | null;
  declare title: string;
  declare quantity: number;
  declare servicePointId: CreationOptional<string | null>;
}

export function initKitLine(sequelize: Sequelize): void {
  KitLine.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
      partId: DataTypes.UUID,
      position: DataTypes.INTEGER,
      kind: DataTypes.TEXT,
      title: DataTypes.TEXT,
      quantity: DataTypes.INTEGER,
      servicePointId: DataTypes.UUID,
    },
    { sequelize, tableName: "kit_lines", timestamps: false },
  );
}
