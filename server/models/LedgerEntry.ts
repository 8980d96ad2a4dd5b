import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from "sequelize";

/** An amount on one account: debit positive, credit negative. */
export class LedgerEntry extends Model<InferAttributes<LedgerEntry>, InferCreationAttributes<LedgerEntry>> {
  declare id: CreationOptional<number>;
  declare transactionId: number;
  declare account: "provider-balance" | "workshop-held" | "commission" | "refunds";
  declare workshopId: CreationOptional<string | null>;
  declare amountMinor: number;
  declare currency: string;
}

export function initLedgerEntry(sequelize: Sequelize): void {
  LedgerEntry.init(
    {
      id: { type: DataTypes.BIGINT, primaryKey: true, autoIncrement: true, autoIncrementIdentity: true },
      transactionId: DataTypes.BIGINT,
      account: DataTypes.TEXT,
      workshopId: DataTypes.UUID,
      amountMinor: DataTypes.BIGINT,
      currency: DataTypes.TEXT,
    },
    { sequelize, tableName: "ledger_entries", timestamps: false },
  );
}
