import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type NonAttribute,
  type Sequelize,
} from "sequelize";
import type { CheckOff } from "./CheckOff.ts";
import type { MarketDay } from "./MarketDay.ts";
import type { Person } from "./Person.ts";
import type { Preorder } from "./Preorder.ts";
import type { StallPayment } from "./StallPayment.ts";

export class Pickup extends Model<InferAttributes<Pickup>, InferCreationAttributes<Pickup>> {
  declare id: CreationOptional<string>;
  declare personId: string;
  declare marketDayId: string;
  declare code: string;
  declare passKey: string;
  declare frozenAt: CreationOptional<Date | null>;
  declare packedAt: CreationOptional<Date | null>;
  declare packedBy: CreationOptional<string | null>;
  declare missedAt: CreationOptional<Date | null>;
  declare preorders?: NonAttribute<Preorder[]>;
  declare marketDay?: NonAttribute<MarketDay>;
  declare person?: NonAttribute<Person>;
  declare checkOffs?: NonAttribute<CheckOff[]>;
  declare payments?: NonAttribute<StallPayment[]>;
}

export const initPickup = (sequelize: Sequelize) =>
  Pickup.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, allowNull: false, defaultValue: DataTypes.UUIDV4 },
      personId: { type: DataTypes.UUID, allowNull: false },
      marketDayId: { type: DataTypes.UUID, allowNull: false },
      code: { type: DataTypes.TEXT, allowNull: false },
      passKey: { type: DataTypes.TEXT, allowNull: false },
      frozenAt: { type: DataTypes.DATE(3) },
      packedAt: { type: DataTypes.DATE(3) },
      packedBy: { type: DataTypes.UUID },
      missedAt: { type: DataTypes.DATE(3) },
    },
    { sequelize, tableName: "pickup" },
  );
