import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from "sequelize";

/** A restorer says whether a part fitted. */
export class FitReport extends Model<InferAttributes<FitReport>, InferCreationAttributes<FitReport>> {
  declare id: CreationOptional<string>;
  declare partId: string;
  declare servicePointId: string | null;
  declare userId: string;
  declare outcome: "fitted" | "fitted-after-work" | "did-not-fit";
  declare note: CreationOptional<string>;
  declare createdAt: CreationOptional<Date>;
}

export function initFitReport(sequelize: Sequelize): void {
  FitReport.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
      partId: DataTypes.UUID,
      servicePointId: DataTypes.UUID,
      userId: DataTypes.UUID,
      outcome: DataTypes.TEXT,
      note: DataTypes.TEXT,
      createdAt: DataTypes.DATE,
    },
    { sequelize, tableName: "fit_reports", updatedAt: false },
  );
}
