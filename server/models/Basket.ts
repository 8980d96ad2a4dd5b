import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from "sequelize";

/** What somebody gathers before buying; a visitor has one by their session. */
export class Basket extends Model<InferAttributes<Basket>, InferCreationAttributes<Basket>> {
  declare id: CreationOptional<string>;
  declare userId: CreationOptional<string | null>;
  declare createdAt: CreationOptional<Date>;
  declare updatedAt: CreationOptional<Date>;
}

export function initBasket(sequelize: Sequelize): void {
  Basket.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
      userId: DataTypes.UUID,
      createdAt: DataTypes.DATE,
      updatedAt: DataTypes.DATE,
    },
    { sequelize, tableName: "baskets" },
  );
}
