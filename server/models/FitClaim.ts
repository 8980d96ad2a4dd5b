import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from "sequelize";

/** A workshop says that a part fits a service point, and on what evidence. */
export class FitClaim extends Model<InferAttributes<FitClaim>, InferCreationAttributes<FitClaim>> {
  declare id: CreationOptional<string>;
  declare partId: string;
  declare servicePointId: string;
  declare evidence: "measured-on-machine" | "fitted-here" | "from-drawing" | "customer-report";
}

export function initFitClaim(sequelize: Sequelize): void {
  FitClaim.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
      partId: DataTypes.UUID,
      servicePointId: DataTypes.UUID,
      evidence: DataTypes.TEXT,
    },
    { sequelize, tableName: "fit_claims", timestamps: false },
  );
}
