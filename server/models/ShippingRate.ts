import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from "sequelize";

/** What a workshop asks for a parcel to one of its zones. */
export class ShippingRate extends Model<InferAttributes<ShippingRate>, InferCreationAttributes<ShippingRate>> {
  declare id: CreationOptional<string>;
  declare workshopId: string;
  declare zone: string;
  declare baseMinor: number;
  declare perItemMinor: number;
  declare freeOverMinor: CreationOptional<number | null>;
  declare currency: string;
}

export function initShippingRate(sequelize: Sequelize): void {
  ShippingRate.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
      workshopId: DataTypes.UUID,
      zone: DataTypes.TEXT,
      baseMinor: DataTypes.BIGINT,
      perItemMinor: DataTypes.BIGINT,
      freeOverMinor: DataTypes.BIGINT,
      currency: DataTypes.TEXT,
    },
    { sequelize, tableName: "shipping_rates", timestamps: false },
  );
}
