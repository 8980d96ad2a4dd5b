import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from "sequelize";
import type { ListingKind } from "#shared/domain/partKinds";
import type { Material, OfferType } from "#shared/schemas/part";

/** A listing of a workshop. */
export class Part extends Model<InferAttributes<Part>, InferCreationAttributes<Part>> {
  declare id: CreationOptional<string>;
  declare workshopId: string;
  declare reference: string;
  declare kind: ListingKind;
  declare title: string;
  declare description: CreationOptional<string>;
  declare material: CreationOptional<Material | null>;
  declare hardnessShoreA: CreationOptional<number | null>;
  declare offerType: OfferType;
  declare priceMinor: number;
  declare currency: string;
  declare stockOnHand: CreationOptional<number | null>;
  declare stockReserved: CreationOptional<number>;
  declare leadDays: CreationOptional<number>;
  declare madeToSize: CreationOptional<boolean>;
  declare coreTerms: CreationOptional<string | null>;
  declare weightG: CreationOptional<number>;
  declare state: CreationOptional<"draft" | "published" | "hidden" | "retired">;
  declare searchText: CreationOptional<string>;
  declare createdAt: CreationOptional<Date>;
  declare updatedAt: CreationOptional<Date>;
}

export function initPart(sequelize: Sequelize): void {
  Part.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
      workshopId: DataTypes.UUID,
      reference: DataTypes.TEXT,
      kind: DataTypes.TEXT,
      title: DataTypes.TEXT,
      description: DataTypes.TEXT,
      material: DataTypes.TEXT,
      hardnessShoreA: DataTypes.INTEGER,
      offerType: DataTypes.TEXT,
      priceMinor: DataTypes.BIGINT,
      currency: DataTypes.TEXT,
      stockOnHand: DataTypes.INTEGER,
      stockReserved: DataTypes.INTEGER,
      leadDays: DataTypes.INTEGER,
      madeToSize: DataTypes.BOOLEAN,
      coreTerms: DataTypes.TEXT,
      weightG: DataTypes.INTEGER,
      state: DataTypes.TEXT,
      searchText: DataTypes.TEXT,
      createdAt: DataTypes.DATE,
      updatedAt: DataTypes.DATE,
    },
    { sequelize, tableName: "parts" },
  );
}
