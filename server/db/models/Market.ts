import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type NonAttribute,
  type Sequelize,
} from "sequelize";
import type { MarketOpening } from "./MarketOpening.ts";
import type { AwningDrawing } from "../../../shared/domain/look/awning.ts";

export class Market extends Model<InferAttributes<Market>, InferCreationAttributes<Market>> {
  declare id: CreationOptional<string>;
  declare slug: string;
  declare name: string;
  declare street: string;
  declare town: string;
  declare region: string;
  declare postcode: string;
  declare lat: number;
  declare lng: number;
  declare stall: string;
  declare directions: string;
  declare awning: AwningDrawing;
  declare taxRatePpm: CreationOptional<number>;
  declare retiredAt: CreationOptional<Date | null>;
  declare version: CreationOptional<number>;
  declare openings?: NonAttribute<MarketOpening[]>;
}

export const initMarket = (sequelize: Sequelize) =>
  Market.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, allowNull: false, defaultValue: DataTypes.UUIDV4 },
      slug: { type: DataTypes.TEXT, allowNull: false },
      name: { type: DataTypes.TEXT, allowNull: false },
      street: { type: DataTypes.TEXT, allowNull: false },
      town: { type: DataTypes.TEXT, allowNull: false },
      region: { type: DataTypes.TEXT, allowNull: false },
      postcode: { type: DataTypes.TEXT, allowNull: false },
      lat: { type: DataTypes.DOUBLE, allowNull: false },
      lng: { type: DataTypes.DOUBLE, allowNull: false },
      stall: { type: DataTypes.TEXT, allowNull: false },
      directions: { type: DataTypes.TEXT, allowNull: false },
      awning: { type: DataTypes.JSONB, allowNull: false },
      taxRatePpm: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 0 },
      retiredAt: { type: DataTypes.DATE(3) },
      version: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 1 },
    },
    { sequelize, tableName: "market" },
  );
