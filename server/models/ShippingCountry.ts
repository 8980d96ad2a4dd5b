import { DataTypes, type InferAttributes, type InferCreationAttributes, Model, type Sequelize } from "sequelize";

/** Which zone of a workshop a country lies in. */
export class ShippingCountry extends Model<InferAttributes<ShippingCountry>, InferCreationAttributes<ShippingCountry>> {
  declare workshopId: string;
  declare country: string;
  declare rateId: string;
}

export function initShippingCountry(sequelize: Sequelize): void {
  ShippingCountry.init(
    {
      workshopId: { type: DataTypes.UUID, primaryKey: true },
      country: { type: DataTypes.TEXT, primaryKey: true },
      rateId: DataTypes.UUID,
    },
    { sequelize, tableName: "shipping_countries", timestamps: false },
  );
}
