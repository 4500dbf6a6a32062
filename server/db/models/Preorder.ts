import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type NonAttribute,
  type Sequelize,
} from "sequelize";
import type { MarketDay } from "./MarketDay.ts";
import type { Pickup } from "./Pickup.ts";
import type { PreorderLine } from "./PreorderLine.ts";

export class Preorder extends Model<InferAttributes<Preorder>, InferCreationAttributes<Preorder>> {
  declare id: CreationOptional<string>;
  declare pickupId: string;
  declare personId: string;
  declare marketDayId: string;
  declare state: "placed" | "cancelled";
  declare name: string;
  declare phone: string;
  declare collector: string;
  declare ifMissing: "similar" | "credit" | "money_back";
  declare note: string;
  declare taxRatePpm: number;
  declare pricesIncludeTax: boolean;
  declare subtotalMinor: number;
  declare taxMinor: number;
  declare totalMinor: number;
  declare currency: string;
  declare placedAt: Date;
  declare changedAt: CreationOptional<Date | null>;
  declare cancelledAt: CreationOptional<Date | null>;
  declare cancelReason: CreationOptional<string>;
  declare version: CreationOptional<number>;
  declare lines?: NonAttribute<PreorderLine[]>;
  declare pickup?: NonAttribute<Pickup>;
  declare marketDay?: NonAttribute<MarketDay>;
}

export const initPreorder = (sequelize: Sequelize) =>
  Preorder.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, allowNull: false, defaultValue: DataTypes.UUIDV4 },
      pickupId: { type: DataTypes.UUID, allowNull: false },
      personId: { type: DataTypes.UUID, allowNull: false },
      marketDayId: { type: DataTypes.UUID, allowNull: false },
      state: { type: DataTypes.TEXT, allowNull: false },
      name: { type: DataTypes.TEXT, allowNull: false },
      phone: { type: DataTypes.TEXT, allowNull: false },
      collector: { type: DataTypes.TEXT, allowNull: false },
      ifMissing: { type: DataTypes.TEXT, allowNull: false },
      note: { type: DataTypes.TEXT, allowNull: false },
      taxRatePpm: { type: DataTypes.INTEGER, allowNull: false },
      pricesIncludeTax: { type: DataTypes.BOOLEAN, allowNull: false },
      subtotalMinor: { type: DataTypes.INTEGER, allowNull: false },
      taxMinor: { type: DataTypes.INTEGER, allowNull: false },
      totalMinor: { type: DataTypes.INTEGER, allowNull: false },
      currency: { type: DataTypes.CHAR(3), allowNull: false },
      placedAt: { type: DataTypes.DATE(3), allowNull: false },
      changedAt: { type: DataTypes.DATE(3) },
      cancelledAt: { type: DataTypes.DATE(3) },
      cancelReason: { type: DataTypes.TEXT, allowNull: false, defaultValue: "" },
      version: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 1 },
    },
    { sequelize, tableName: "preorder" },
  );
