import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from "sequelize";

export class SupplyChange extends Model<InferAttributes<SupplyChange>, InferCreationAttributes<SupplyChange>> {
  declare id: CreationOptional<string>;
  declare lineId: string;
  declare fromDay: string;
  declare delta: number;
  declare reason: "post" | "edit" | "lost" | "late" | "returned";
  declare byPerson: CreationOptional<string | null>;
  declare at: Date;
}

export const initSupplyChange = (sequelize: Sequelize) =>
  SupplyChange.init(
    {
      id: { type: DataTypes.BIGINT, primaryKey: true, allowNull: false, autoIncrement: true },
      lineId: { type: DataTypes.UUID, allowNull: false },
      fromDay: { type: DataTypes.DATEONLY, allowNull: false },
      delta: { type: DataTypes.INTEGER, allowNull: false },
      reason: { type: DataTypes.TEXT, allowNull: false },
      byPerson: { type: DataTypes.UUID },
      at: { type: DataTypes.DATE(3), allowNull: false },
    },
    { sequelize, tableName: "supply_change" },
  );
