import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from "sequelize";

/** One event of money; its entries sum to zero. */
export class LedgerTransaction extends Model<
  InferAttributes<LedgerTransaction>,
  InferCreationAttributes<LedgerTransaction>
> {
  declare id: CreationOptional<number>;
  declare cause: string;
  declare orderId: string | null;
  declare at: Date;
}

export function initLedgerTransaction(sequelize: Sequelize): void {
  LedgerTransaction.init(
    {
      id: { type: DataTypes.BIGINT, primaryKey: true, autoIncrement: true, autoIncrementIdentity: true },
      cause: DataTypes.TEXT,
      orderId: DataTypes.UUID,
      at: DataTypes.DATE,
    },
    { sequelize, tableName: "ledger_transactions", timestamps: false },
  );
}
