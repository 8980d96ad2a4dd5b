import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from "sequelize";
import type { PartSummary } from "#shared/schemas/part";

/** One part of a parcel, as it was listed when bought. */
export class OrderLine extends Model<InferAttributes<OrderLine>, InferCreationAttributes<OrderLine>> {
  declare id: CreationOptional<string>;
  declare parcelId: string;
  declare partId: string;
  declare title: string;
  declare listing: PartSummary;
  declare forNeed: CreationOptional<string | null>;
  declare quantity: number;
  declare unitMinor: number;
  declare lineMinor: number;
  declare taxMinor: number;
  declare madeToSize: boolean;
  declare holdsStock: boolean;
}

export function initOrderLine(sequelize: Sequelize): void {
  OrderLine.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
      parcelId: DataTypes.UUID,
      partId: DataTypes.UUID,
      title: DataTypes.TEXT,
      listing: DataTypes.JSONB,
      forNeed: DataTypes.TEXT,
      quantity: DataTypes.INTEGER,
      unitMinor: DataTypes.BIGINT,
      lineMinor: DataTypes.BIGINT,
      taxMinor: DataTypes.BIGINT,
      madeToSize: DataTypes.BOOLEAN,
      holdsStock: DataTypes.BOOLEAN,
    },
    { sequelize, tableName: "order_lines", timestamps: false },
  );
}
