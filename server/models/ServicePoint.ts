import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from "sequelize";
import type { PartKind } from "#shared/domain/partKinds";

/** One place in a family where a wear part sits. */
export class ServicePoint extends Model<InferAttributes<ServicePoint>, InferCreationAttributes<ServicePoint>> {
  declare id: CreationOptional<string>;
  declare familyId: string;
  declare number: number;
  declare name: string;
  declare partKind: PartKind;
  declare note: CreationOptional<string>;
  declare xUm: number;
  declare yUm: number;
}

export function initServicePoint(sequelize: Sequelize): void {
  ServicePoint.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
      familyId: DataTypes.UUID,
      number: DataTypes.INTEGER,
      name: DataTypes.TEXT,
      partKind: DataTypes.TEXT,
      note: DataTypes.TEXT,
      xUm: DataTypes.INTEGER,
      yUm: DataTypes.INTEGER,
    },
    { sequelize, tableName: "service_points", timestamps: false },
  );
}
