import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from "sequelize";

/** One part in a basket. */
export class BasketLine extends Model<InferAttributes<BasketLine>, InferCreationAttributes<BasketLine>> {
  declare basketId: string;
  declare partId: string;
  declare quantity: number;
  declare forNeed: CreationOptional<string | null>;
  declare addedAt: CreationOptional<Date>;
}

export function initBasketLine(sequelize: Sequelize): void {
  BasketLine.init(
    {
      basketId: { type: DataTypes.UUID, primaryKey: true },
      partId: { type: DataTypes.UUID, primaryKey: true },
      quantity: DataTypes.INTEGER,
      forNeed: DataTypes.TEXT,
      addedAt: DataTypes.DATE,
    },
    { sequelize, tableName: "basket_lines", timestamps: false },
  );
}
