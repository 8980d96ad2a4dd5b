import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from "sequelize";

/** A signed message of the payment provider, kept once however often it came. */
export class PaymentEvent extends Model<InferAttributes<PaymentEvent>, InferCreationAttributes<PaymentEvent>> {
  declare id: string;
  declare type: string;
  declare payload: unknown;
  declare occurredAt: Date;
  declare receivedAt: CreationOptional<Date>;
  declare deliveries: CreationOptional<number>;
  declare appliedAt: CreationOptional<Date | null>;
  declare outcome: CreationOptional<string | null>;
}

export function initPaymentEvent(sequelize: Sequelize): void {
  PaymentEvent.init(
    {
      id: { type: DataTypes.TEXT, primaryKey: true },
      type: DataTypes.TEXT,
      payload: DataTypes.JSONB,
      occurredAt: DataTypes.DATE,
      receivedAt: DataTypes.DATE,
      deliveries: DataTypes.INTEGER,
      appliedAt: DataTypes.DATE,
      outcome: DataTypes.TEXT,
    },
    { sequelize, tableName: "payment_events", timestamps: false },
  );
}
