import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from "sequelize";

/** An address that a buyer used before. */
export class SavedAddress extends Model<InferAttributes<SavedAddress>, InferCreationAttributes<SavedAddress>> {
  declare id: CreationOptional<string>;
  declare userId: string;
  declare name: string;
  declare line1: string;
  declare line2: CreationOptional<string>;
  declare postcode: string;
  declare town: string;
  declare region: CreationOptional<string>;
  declare country: string;
  declare createdAt: CreationOptional<Date>;
}

export function initSavedAddress(sequelize: Sequelize): void {
  SavedAddress.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
      userId: DataTypes.UUID,
      name: DataTypes.TEXT,
      line1: DataTypes.TEXT,
      line2: DataTypes.TEXT,
      postcode: DataTypes.TEXT,
      town: DataTypes.TEXT,
      region: DataTypes.TEXT,
      country: DataTypes.TEXT,
      createdAt: DataTypes.DATE,
    },
    { sequelize, tableName: "addresses", updatedAt: false },
  );
}
