import { DataTypes, type InferAttributes, type InferCreationAttributes, Model, type Sequelize } from "sequelize";

/** A country whose tax a workshop collects, and its rate. */
export class TaxRegistration extends Model<InferAttributes<TaxRegistration>, InferCreationAttributes<TaxRegistration>> {
  declare workshopId: string;
  declare country: string;
  declare number: string;
  declare rateBasisPoints: number;
}

export function initTaxRegistration(sequelize: Sequelize): void {
  TaxRegistration.init(
    {
      workshopId: { type: DataTypes.UUID, primaryKey: true },
      country: { type: DataTypes.TEXT, primaryKey: true },
      number: DataTypes.TEXT,
      rateBasisPoints: DataTypes.INTEGER,
    },
    { sequelize, tableName: "tax_registrations", timestamps: false },
  );
}
