import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from "sequelize";

/** Who changed what, when. Never changed itself. */
export class AuditEntry extends Model<InferAttributes<AuditEntry>, InferCreationAttributes<AuditEntry>> {
  declare id: CreationOptional<number>;
  declare at: CreationOptional<Date>;
  declare actorId: string | null;
  declare action: string;
  declare subjectType: string;
  declare subjectId: string;
  declare detail: CreationOptional<Record<string, unknown>>;
}

export function initAuditEntry(sequelize: Sequelize): void {
  AuditEntry.init(
    {
      id: { type: DataTypes.BIGINT, primaryKey: true, autoIncrement: true, autoIncrementIdentity: true },
      at: DataTypes.DATE,
      actorId: DataTypes.UUID,
      action: DataTypes.TEXT,
      subjectType: DataTypes.TEXT,
      subjectId: DataTypes.TEXT,
      detail: DataTypes.JSONB,
    },
    { sequelize, tableName: "audit_log", timestamps: false },
  );
}
