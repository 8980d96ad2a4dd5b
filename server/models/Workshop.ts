import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from "sequelize";

/** A seller: one a restorer account. */
export class Workshop extends Model<InferAttributes<Workshop>, InferCreationAttributes<Workshop>> {
  declare id: CreationOptional<string>;
  declare ownerId: string;
  declare slug: string;
  declare name: string;
  declare state: CreationOptional<"draft" | "applied" | "admitted" | "refused" | "suspended">;
  declare about: CreationOptional<string>;
  declare town: string;
  declare country: string;
  declare legalName: string;
  declare legalAddress: string[];
  declare phone: string;
  declare contactEmail: string;
  declare registration: CreationOptional<string | null>;
  declare dispatchDays: CreationOptional<number>;
  declare returnsTerms: CreationOptional<string>;
  declare commissionBasisPoints: CreationOptional<number>;
  declare createdAt: CreationOptional<Date>;
  declare updatedAt: CreationOptional<Date>;
}

export function initWorkshop(sequelize: Sequelize): void {
  Workshop.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
      ownerId: DataTypes.UUID,
      slug: DataTypes.TEXT,
      name: DataTypes.TEXT,
      state: DataTypes.TEXT,
      about: DataTypes.TEXT,
      town: DataTypes.TEXT,
      country: DataTypes.TEXT,
      legalName: DataTypes.TEXT,
      legalAddress: DataTypes.ARRAY(DataTypes.TEXT),
      phone: DataTypes.TEXT,
      contactEmail: DataTypes.TEXT,
      registration: DataTypes.TEXT,
      dispatchDays: DataTypes.INTEGER,
      returnsTerms: DataTypes.TEXT,
      commissionBasisPoints: DataTypes.INTEGER,
      createdAt: DataTypes.DATE,
      updatedAt: DataTypes.DATE,
    },
    { sequelize, tableName: "workshops" },
  );
}
