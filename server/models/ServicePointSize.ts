import { DataTypes, type InferAttributes, type InferCreationAttributes, Model, type Sequelize } from "sequelize";
import type { DimensionName } from "#shared/domain/partKinds";

/** The size that a service point takes, and the band that it accepts, in micrometres. */
export class ServicePointSize extends Model<
  InferAttributes<ServicePointSize>,
  InferCreationAttributes<ServicePointSize>
> {
  declare servicePointId: string;
  declare dimension: DimensionName;
  declare nominalUm: number;
  declare lowerUm: number;
  declare upperUm: number;
}

export function initServicePointSize(sequelize: Sequelize): void {
  ServicePointSize.init(
    {
      servicePointId: { type: DataTypes.UUID, primaryKey: true },
      dimension: { type: DataTypes.TEXT, primaryKey: true },
      nominalUm: DataTypes.INTEGER,
      lowerUm: DataTypes.INTEGER,
      upperUm: DataTypes.INTEGER,
    },
    { sequelize, tableName: "service_point_sizes", timestamps: false },
  );
}
