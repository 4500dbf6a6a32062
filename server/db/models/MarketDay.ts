import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type NonAttribute,
  type Sequelize,
} from "sequelize";
import type { Market } from "./Market.ts";
import type { Person } from "./Person.ts";

export class MarketDay extends Model<InferAttributes<MarketDay>, InferCreationAttributes<MarketDay>> {
  declare id: CreationOptional<string>;
  declare marketId: string;
  declare onDay: string;
  declare startTime: string;
  declare endTime: string;
  declare status: CreationOptional<"on" | "late" | "moved" | "called_off">;
  declare statusNote: CreationOptional<string>;
  declare closesAt: Date;
  declare closedAt: CreationOptional<Date | null>;
  declare endedAt: CreationOptional<Date | null>;
  declare remindedAt: CreationOptional<Date | null>;
  declare version: CreationOptional<number>;
  declare market?: NonAttribute<Market>;
  declare workers?: NonAttribute<Person[]>;
}

export const initMarketDay = (sequelize: Sequelize) =>
  MarketDay.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, allowNull: false, defaultValue: DataTypes.UUIDV4 },
      marketId: { type: DataTypes.UUID, allowNull: false },
      onDay: { type: DataTypes.DATEONLY, allowNull: false },
      startTime: { type: DataTypes.TEXT, allowNull: false },
      endTime: { type: DataTypes.TEXT, allowNull: false },
      status: { type: DataTypes.TEXT, allowNull: false, defaultValue: "on" },
      statusNote: { type: DataTypes.TEXT, allowNull: false, defaultValue: "" },
      closesAt: { type: DataTypes.DATE(3), allowNull: false },
      closedAt: { type: DataTypes.DATE(3) },
      endedAt: { type: DataTypes.DATE(3) },
      remindedAt: { type: DataTypes.DATE(3) },
      version: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 1 },
    },
    { sequelize, tableName: "market_day" },
  );
