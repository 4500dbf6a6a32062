import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from "sequelize";

export class SupplyDay extends Model<InferAttributes<SupplyDay>, InferCreationAttributes<SupplyDay>> {
  declare lineId: string;
  declare onDay: string;
  declare promised: number;
  declare claimed: CreationOptional<number>;
  declare broken: CreationOptional<number>;
}

export const initSupplyDay = (sequelize: Sequelize) =>
  SupplyDay.init(
    {
      lineId: { type: DataTypes.UUID, primaryKey: true, allowNull: false },
      onDay: { type: DataTypes.DATEONLY, primaryKey: true, allowNull: false },
      promised: { type: DataTypes.INTEGER, allowNull: false },
      claimed: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 0 },
      broken: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 0 },
    },
    { sequelize, tableName: "supply_day" },
  );
