import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type NonAttribute,
  type Sequelize,
} from "sequelize";
import type { ProductPart } from "./ProductPart.ts";

export class Product extends Model<InferAttributes<Product>, InferCreationAttributes<Product>> {
  declare id: CreationOptional<string>;
  declare slug: string;
  declare name: string;
  declare unit: "head" | "bunch" | "bag";
  declare blurb: string;
  declare priceMinor: number;
  declare retiredAt: CreationOptional<Date | null>;
  declare version: CreationOptional<number>;
  declare parts?: NonAttribute<ProductPart[]>;
}

export const initProduct = (sequelize: Sequelize) =>
  Product.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, allowNull: false, defaultValue: DataTypes.UUIDV4 },
      slug: { type: DataTypes.TEXT, allowNull: false },
      name: { type: DataTypes.TEXT, allowNull: false },
      unit: { type: DataTypes.TEXT, allowNull: false },
      blurb: { type: DataTypes.TEXT, allowNull: false },
      priceMinor: { type: DataTypes.INTEGER, allowNull: false },
      retiredAt: { type: DataTypes.DATE(3) },
      version: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 1 },
    },
    { sequelize, tableName: "product" },
  );
