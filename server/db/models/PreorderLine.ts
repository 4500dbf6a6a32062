import { DataTypes, type InferAttributes, type InferCreationAttributes, Model, type Sequelize } from "sequelize";

export class PreorderLine extends Model<InferAttributes<PreorderLine>, InferCreationAttributes<PreorderLine>> {
  declare preorderId: string;
  declare offerId: string;
  declare productName: string;
  declare unit: string;
  declare units: number;
  declare priceMinor: number;
}

export const initPreorderLine = (sequelize: Sequelize) =>
  PreorderLine.init(
    {
      preorderId: { type: DataTypes.UUID, primaryKey: true, allowNull: false },
      offerId: { type: DataTypes.UUID, primaryKey: true, allowNull: false },
      productName: { type: DataTypes.TEXT, allowNull: false },
      unit: { type: DataTypes.TEXT, allowNull: false },
      units: { type: DataTypes.INTEGER, allowNull: false },
      priceMinor: { type: DataTypes.INTEGER, allowNull: false },
    },
    { sequelize, tableName: "preorder_line" },
  );
