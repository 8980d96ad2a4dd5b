import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from "sequelize";
import type { DriveMap, MechanismKind } from "#shared/schemas/catalogue";

/** Mechanisms that share drive parts under different badges. */
export class Family extends Model<InferAttributes<Family>, InferCreationAttributes<Family>> {
  declare id: CreationOptional<string>;
  declare slug: string;
  declare name: string;
  declare maker: string;
  declare kind: MechanismKind;
  declare models: CreationOptional<string[]>;
  declare about: CreationOptional<string>;
  declare driveTrain: CreationOptional<string>;
  declare driveMap: DriveMap;
  declare createdAt: CreationOptional<Date>;
  declare updatedAt: CreationOptional<Date>;
}

export function initFamily(sequelize: Sequelize): void {
  Family.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
      slug: DataTypes.TEXT,
      name: DataTypes.TEXT,
      maker: DataTypes.TEXT,
      kind: DataTypes.TEXT,
      models: DataTypes.ARRAY(DataTypes.TEXT),
      about: DataTypes.TEXT,
      driveTrain: DataTypes.TEXT,
      driveMap: DataTypes.JSONB,
      createdAt: DataTypes.DATE,
      updatedAt: DataTypes.DATE,
    },
    { sequelize, tableName: "families" },
  );
}
