import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type NonAttribute,
  type Sequelize,
} from "sequelize";
import type { SupplyDay } from "./SupplyDay.ts";
import type { Variety } from "./Variety.ts";

export class SupplyLine extends Model<InferAttributes<SupplyLine>, InferCreationAttributes<SupplyLine>> {
  declare id: CreationOptional<string>;
  declare weekStartsOn: string;
  declare varietyId: string;
  declare form: "head" | "bunch";
  declare grade: "full" | "small";
  declare sownFrom: CreationOptional<string | null>;
  declare sownTo: CreationOptional<string | null>;
  declare days?: NonAttribute<SupplyDay[]>;
  declare variety?: NonAttribute<Variety>;
}

export const initSupplyLine = (sequelize: Sequelize) =>
  SupplyLine.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, allowNull: false, defaultValue: DataTypes.UUIDV4 },
      weekStartsOn: { type: DataTypes.DATEONLY, allowNull: false },
      varietyId: { type: DataTypes.UUID, allowNull: false },
      form: { type: DataTypes.TEXT, allowNull: false },
      grade: { type: DataTypes.TEXT, allowNull: false },
      sownFrom: { type: DataTypes.DATEONLY },
      sownTo: { type: DataTypes.DATEONLY },
    },
    { sequelize, tableName: "supply_line" },
  );
