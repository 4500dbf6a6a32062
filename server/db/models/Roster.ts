import { DataTypes, type InferAttributes, type InferCreationAttributes, Model, type Sequelize } from "sequelize";

export class Roster extends Model<InferAttributes<Roster>, InferCreationAttributes<Roster>> {
  declare marketDayId: string;
  declare personId: string;
}

export const initRoster = (sequelize: Sequelize) =>
  Roster.init(
    {
      marketDayId: { type: DataTypes.UUID, primaryKey: true, allowNull: false },
      personId: { type: DataTypes.UUID, primaryKey: true, allowNull: false },
    },
    { sequelize, tableName: "roster" },
  );
