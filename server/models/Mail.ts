import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from "sequelize";

/** A mail to send once; its id makes the Message-ID. */
export class Mail extends Model<InferAttributes<Mail>, InferCreationAttributes<Mail>> {
  declare id: CreationOptional<string>;
  declare cause: string;
  declare template: string;
  declare recipient: string;
  declare payload: unknown;
  declare state: CreationOptional<"queued" | "sent" | "failed">;
  declare lastError: CreationOptional<string | null>;
  declare sentAt: CreationOptional<Date | null>;
  declare createdAt: CreationOptional<Date>;
}

export function initMail(sequelize: Sequelize): void {
  Mail.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
      cause: DataTypes.TEXT,
      template: DataTypes.TEXT,
      recipient: DataTypes.TEXT,
      payload: DataTypes.JSONB,
      state: DataTypes.TEXT,
      lastError: DataTypes.TEXT,
      sentAt: DataTypes.DATE,
      createdAt: DataTypes.DATE,
    },
    { sequelize, tableName: "mails", updatedAt: false },
  );
}
