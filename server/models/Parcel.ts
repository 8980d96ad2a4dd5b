import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from "sequelize";
import type { ParcelState } from "#shared/domain/parcelState";
import type { TraderIdentity } from "#shared/schemas/catalogue";

/** The part of an order that one workshop ships. */
export class Parcel extends Model<InferAttributes<Parcel>, InferCreationAttributes<Parcel>> {
  declare id: CreationOptional<string>;
  declare orderId: string;
  declare workshopId: string;
  declare state: ParcelState;
  declare trader: TraderIdentity;
  declare partsMinor: number;
  declare shippingMinor: number;
  declare taxMinor: number;
  declare taxRateBasisPoints: number;
  declare totalMinor: number;
  declare commissionMinor: number;
  declare leavesInDays: number;
  declare leavesBy: CreationOptional<Date | null>;
  declare carrier: CreationOptional<string | null>;
  declare trackingNumber: CreationOptional<string | null>;
  declare dispatchedAt: CreationOptional<Date | null>;
  declare createdAt: CreationOptional<Date>;
  declare updatedAt: CreationOptional<Date>;
}

export function initParcel(sequelize: Sequelize): void {
  Parcel.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
      orderId: DataTypes.UUID,
      workshopId: DataTypes.UUID,
      state: DataTypes.TEXT,
      trader: DataTypes.JSONB,
      partsMinor: DataTypes.BIGINT,
      shippingMinor: DataTypes.BIGINT,
      taxMinor: DataTypes.BIGINT,
      taxRateBasisPoints: DataTypes.INTEGER,
      totalMinor: DataTypes.BIGINT,
      commissionMinor: DataTypes.BIGINT,
      leavesInDays: DataTypes.INTEGER,
      leavesBy: DataTypes.DATE,
      carrier: DataTypes.TEXT,
      trackingNumber: DataTypes.TEXT,
      dispatchedAt: DataTypes.DATE,
      createdAt: DataTypes.DATE,
      updatedAt: DataTypes.DATE,
    },
    { sequelize, tableName: "parcels" },
  );
}
