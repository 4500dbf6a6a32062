import {
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type NonAttribute,
  type Sequelize,
} from "sequelize";
import type { Variety } from "./Variety.ts";

export class ProductPart extends Model<InferAttributes<ProductPart>, InferCreationAttributes<ProductPart>> {
  declare productId: string;
  declare varietyId: string;
  declare form: "head" | "bunch";
  declare grade: "full" | "small";
  declare units: number;
  declare variety?: NonAttribute<Variety>;
}

export const initProductPart = (sequelize: Sequelize) =>
  ProductPart.init(
    {
      productId: { type: DataTypes.UUID, primaryKey: true, allowNull: false },
      varietyId: { type: DataTypes.UUID, primaryKey: true, allowNull: false },
      form: { type: DataTypes.TEXT, primaryKey: true, allowNull: false },
      grade: { type: DataTypes.TEXT, primaryKey: true, allowNull: false },
      units: { type: DataTypes.INTEGER, allowNull: false },
    },
    { sequelize, tableName: "product_part" },
  );
