import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from "sequelize";

/** A picture of a part; its file lies in the photo store. */
export class Photo extends Model<InferAttributes<Photo>, InferCreationAttributes<Photo>> {
  declare id: CreationOptional<string>;
  declare partId: string;
  declare position: number;
  declare file: string;
  declare alt: string;
  declare width: number;
  declare height: number;
  declare createdAt: CreationOptional<Date>;
}

export function initPhoto(sequelize: Sequelize): void {
  Photo.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
      partId: DataTypes.UUID,
      position: DataTypes.INTEGER,
      file: DataTypes.TEXT,
      alt: DataTypes.TEXT,
      width: DataTypes.INTEGER,
      height: DataTypes.INTEGER,
      createdAt: DataTypes.DATE,
    },
    { sequelize, tableName: "photos", updatedAt: false },
  );
}
