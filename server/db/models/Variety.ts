import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from "sequelize";
import type { PlantDrawing } from "../../../shared/domain/look/plantDrawing.ts";

export class Variety extends Model<InferAttributes<Variety>, InferCreationAttributes<Variety>> {
  declare id: CreationOptional<string>;
  declare slug: string;
  declare name: string;
  declare kind: "lettuce" | "herb" | "leafy_green" | "allium";
  declare blurb: string;
  declare keeping: string;
  declare drawing: PlantDrawing;
  declare retiredAt: CreationOptional<Date | null>;
  declare version: CreationOptional<number>;
}

export const initVariety = (sequelize: Sequelize) =>
  Variety.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, allowNull: false, defaultValue: DataTypes.UUIDV4 },
      slug: { type: DataTypes.TEXT, allowNull: false },
      name: { type: DataTypes.TEXT, allowNull: false },
      kind: { type: DataTypes.TEXT, allowNull: false },
      blurb: { type: DataTypes.TEXT, allowNull: false },
      keeping: { type: DataTypes.TEXT, allowNull: false },
      drawing: { type: DataTypes.JSONB, allowNull: false },
      retiredAt: { type: DataTypes.DATE(3) },
      version: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 1 },
    },
    { sequelize, tableName: "variety" },
  );
