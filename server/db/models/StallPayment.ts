import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type NonAttribute,
  type Sequelize,
} from "sequelize";
import type { Person } from "./Person.ts";

export class StallPayment extends Model<InferAttributes<StallPayment>, InferCreationAttributes<StallPayment>> {
  declare id: CreationOptional<string>;
  declare pickupId: string;
  declare kind: "cash" | "card_reader" | "token" | "benefit_card";
  declare amountMinor: number;
  declare tenderedMinor: CreationOptional<number | null>;
  declare changeMinor: CreationOptional<number>;
  declare byPerson: string;
  declare at: Date;
  declare undoneAt: CreationOptional<Date | null>;
  declare undoneBy: CreationOptional<string | null>;
  declare taker?: NonAttribute<Person>;
}

export const initStallPayment = (sequelize: Sequelize) =>
  StallPayment.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, allowNull: false, defaultValue: DataTypes.UUIDV4 },
      pickupId: { type: DataTypes.UUID, allowNull: false },
      kind: { type: DataTypes.TEXT, allowNull: false },
      amountMinor: { type: DataTypes.INTEGER, allowNull: false },
      tenderedMinor: { type: DataTypes.INTEGER },
      changeMinor: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 0 },
      byPerson: { type: DataTypes.UUID, allowNull: false },
      at: { type: DataTypes.DATE(3), allowNull: false },
      undoneAt: { type: DataTypes.DATE(3) },
      undoneBy: { type: DataTypes.UUID },
    },
    { sequelize, tableName: "stall_payment" },
  );
