import { DataTypes, type InferAttributes, type InferCreationAttributes, Model, type Sequelize } from "sequelize";

export class CheckOffLine extends Model<InferAttributes<CheckOffLine>, InferCreationAttributes<CheckOffLine>> {
  declare checkOffId: string;
  declare preorderId: string;
  declare offerId: string;
  declare units: number;
}

export const initCheckOffLine = (sequelize: Sequelize) =>
  CheckOffLine.init(
    {
      checkOffId: { type: DataTypes.UUID, primaryKey: true, allowNull: false },
      preorderId: { type: DataTypes.UUID, primaryKey: true, allowNull: false },
      offerId: { type: DataTypes.UUID, primaryKey: true, allowNull: false },
      units: { type: DataTypes.INTEGER, allowNull: false },
    },
    { sequelize, tableName: "check_off_line" },
  );
