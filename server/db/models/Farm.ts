import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from "sequelize";
import type { CloseRule } from "../../../shared/domain/closeRule.ts";

export class Farm extends Model<InferAttributes<Farm>, InferCreationAttributes<Farm>> {
  declare id: CreationOptional<number>;
  declare name: string;
  declare tagline: string;
  declare story: string;
  declare street: string;
  declare town: string;
  declare region: string;
  declare postcode: string;
  declare country: string;
  declare email: string;
  declare phone: string;
  declare timeZone: string;
  declare currency: string;
  declare distanceUnit: "mi" | "km";
  declare closeRule: CloseRule;
  declare minimumOrderMinor: number;
  declare pricesIncludeTax: boolean;
  declare cashRoundingMinor: number;
  declare version: CreationOptional<number>;
}

export const initFarm = (sequelize: Sequelize) =>
  Farm.init(
    {
      id: { type: DataTypes.SMALLINT, primaryKey: true, allowNull: false, defaultValue: 1 },
      name: { type: DataTypes.TEXT, allowNull: false },
      tagline: { type: DataTypes.TEXT, allowNull: false },
      story: { type: DataTypes.TEXT, allowNull: false },
      street: { type: DataTypes.TEXT, allowNull: false },
      town: { type: DataTypes.TEXT, allowNull: false },
      region: { type: DataTypes.TEXT, allowNull: false },
      postcode: { type: DataTypes.TEXT, allowNull: false },
      country: { type: DataTypes.TEXT, allowNull: false },
      email: { type: DataTypes.TEXT, allowNull: false },
      phone: { type: DataTypes.TEXT, allowNull: false },
      timeZone: { type: DataTypes.TEXT, allowNull: false },
      currency: { type: DataTypes.CHAR(3), allowNull: false },
      distanceUnit: { type: DataTypes.TEXT, allowNull: false },
      closeRule: { type: DataTypes.JSONB, allowNull: false },
      minimumOrderMinor: { type: DataTypes.INTEGER, allowNull: false },
      pricesIncludeTax: { type: DataTypes.BOOLEAN, allowNull: false },
      cashRoundingMinor: { type: DataTypes.INTEGER, allowNull: false },
      version: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 1 },
    },
    { sequelize, tableName: "farm" },
  );
