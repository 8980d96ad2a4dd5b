import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from "sequelize";

/** A single-use link sent by mail; only its SHA-256 is kept. */
export class UserToken extends Model<InferAttributes<UserToken>, InferCreationAttributes<UserToken>> {
  declare id: CreationOptional<string>;
  declare userId: string;
  declare purpose: "verify-email" | "reset-password";
  declare tokenHash: Buffer;
  declare expiresAt: Date;
  declare usedAt: CreationOptional<Date | null>;
  declare createdAt: CreationOptional<Date>;
}

export function initUserToken(sequelize: Sequelize): void {
  UserToken.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
      userId: DataTypes.UUID,
      purpose: DataTypes.TEXT,
      tokenHash: DataTypes.BLOB,
      expiresAt: DataTypes.DATE,
      usedAt: DataTypes.DATE,
      createdAt: DataTypes.DATE,
    },
    { sequelize, tableName: "user_tokens", updatedAt: false },
  );
}
