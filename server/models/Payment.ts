import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from "sequelize";

/** The one charge of an order at the payment provider. */
export class Payment extends Model<InferAttributes<Payment>, InferCreationAttributes<Payment>> {
  declare id: CreationOptional<string>;
  declare orderId: string;
  declare idempotencyKey: string;
  declare sessionId: CreationOptional<string | null>;
  declare paymentIntentId: CreationOptional<string | null>;
  declare url: CreationOptional<string | null>;
  declare state: "starting" | "open" | "succeeded" | "expired" | "refunded";
  declare amountMinor: number;
  declare currency: string;
  declare createdAt: CreationOptional<Date>;
  declare updatedAt: CreationOptional<Date>;
}

export function initPayment(sequelize: Sequelize): void {
  Payment.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
      orderId: DataTypes.UUID,
      idempotencyKey: DataTypes.TEXT,
      sessionId: DataTypes.TEXT,
      paymentIntentId: DataTypes.TEXT,
      url: DataTypes.TEXT,
      state: DataTypes.TEXT,
      amountMinor: DataTypes.BIGINT,
      currency: DataTypes.TEXT,
      createdAt: DataTypes.DATE,
      updatedAt: DataTypes.DATE,
    },
    { sequelize, tableName: "payments" },
  );
}
