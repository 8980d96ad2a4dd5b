import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from "sequelize";
import type { OrderState } from "#shared/domain/orderState";
import type { Address } from "#shared/schemas/order";

/** What one buyer pays at once. */
export class Order extends Model<InferAttributes<Order>, InferCreationAttributes<Order>> {
  declare id: CreationOptional<string>;
  declare number: CreationOptional<string>;
  declare buyerId: string;
  declare checkoutKey: string;
  declare state: OrderState;
  declare shippingAddress: Address;
  declare billingAddress: Address;
  declare currency: string;
  declare partsMinor: number;
  declare shippingMinor: number;
  declare taxMinor: number;
  declare totalMinor: number;
  declare refundedMinor: CreationOptional<number>;
  declare holdUntil: CreationOptional<Date | null>;
  declare paidAt: CreationOptional<Date | null>;
  declare createdAt: CreationOptional<Date>;
  declare updatedAt: CreationOptional<Date>;
}

export function initOrder(sequelize: Sequelize): void {
  Order.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
      number: DataTypes.TEXT,
      buyerId: DataTypes.UUID,
      checkoutKey: DataTypes.UUID,
      state: DataTypes.TEXT,
      shippingAddress: DataTypes.JSONB,
      billingAddress: DataTypes.JSONB,
      currency: DataTypes.TEXT,
      partsMinor: DataTypes.BIGINT,
      shippingMinor: DataTypes.BIGINT,
      taxMinor: DataTypes.BIGINT,
      totalMinor: DataTypes.BIGINT,
      refundedMinor: DataTypes.BIGINT,
      holdUntil: DataTypes.DATE,
      paidAt: DataTypes.DATE,
      createdAt: DataTypes.DATE,
      updatedAt: DataTypes.DATE,
    },
    { sequelize, tableName: "orders" },
  );
}
