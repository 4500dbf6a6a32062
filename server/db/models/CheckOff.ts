import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type NonAttribute,
  type Sequelize,
} from "sequelize";
import type { CheckOffLine } from "./CheckOffLine.ts";

export class CheckOff extends Model<InferAttributes<CheckOff>, InferCreationAttributes<CheckOff>> {
  declare id: CreationOptional<string>;
  declare pickupId: string;
  declare kind: "collected" | "part";
  declare note: CreationOptional<string>;
  declare byPerson: string;
  declare at: Date;
  declare undoneAt: CreationOptional<Date | null>;
  declare undoneBy: CreationOptional<string | null>;
  declare lines?: NonAttribute<CheckOffLine[]>;
}

export const initCheckOff = (sequelize: Sequelize) =>
  CheckOff.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, allowNull: false, defaultValue: DataTypes.UUIDV4 },
      pickupId: { type: DataTypes.UUID, allowNull: false },
      kind: { type: DataTypes.TEXT, allowNull: false },
      note: { type: DataTypes.TEXT, allowNull: false, defaultValue: "" },
      byPerson: { type: DataTypes.UUID, allowNull: false },
      at: { type: DataTypes.DATE(3), allowNull: false },
      undoneAt: { type: DataTypes.DATE(3) },
      undoneBy: { type: DataTypes.UUID },
    },
    { sequelize, tableName: "check_off" },
  );
