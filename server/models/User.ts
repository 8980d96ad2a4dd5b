import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from "sequelize";
import type { Role } from "#shared/schemas/session";

/** A person who signs in. */
export class User extends Model<InferAttributes<User>, InferCreationAttributes<User>> {
  declare id: CreationOptional<string>;
  declare email: string;
  declare emailVerifiedAt: CreationOptional<Date | null>;
  declare passwordHash: string;
  declare displayName: string;
  declare role: CreationOptional<Role>;
  declare disabledAt: CreationOptional<Date | null>;
  declare createdAt: CreationOptional<Date>;
  declare updatedAt: CreationOptional<Date>;
}

export function initUser(sequelize: Sequelize): void {
  User.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
      email: DataTypes.TEXT,
      emailVerifiedAt: DataTypes.DATE,
      passwordHash: DataTypes.TEXT,
      displayName: DataTypes.TEXT,
      role: DataTypes.TEXT,
      disabledAt: DataTypes.DATE,
      createdAt: DataTypes.DATE,
      updatedAt: DataTypes.DATE,
    },
    { sequelize, tableName: "users" },
  );
}
