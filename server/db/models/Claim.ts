import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from "sequelize";

export class Claim extends Model<InferAttributes<Claim>, InferCreationAttributes<Claim>> {
  declare id: CreationOptional<string>;
  declare marketDayId: string;
  declare onDay: string;
  declare lineId: string;
  declare kind: "preorder" | "hold" | "box" | "walk_up" | "spent";
  declare ref: string;
  declare units: number;
}

export const initClaim = (sequelize: Sequelize) =>
  Claim.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, allowNull: false, defaultValue: DataTypes.UUIDV4 },
      marketDayId: { type: DataTypes.UUID, allowNull: false },
      onDay: { type: DataTypes.DATEONLY, allowNull: false },
      lineId: { type: DataTypes.UUID, allowNull: false },
      kind: { type: DataTypes.TEXT, allowNull: false },
      ref: { type: DataTypes.UUID, allowNull: false },
      units: { type: DataTypes.INTEGER, allowNull: false },
    },
    { sequelize, tableName: "claim" },
  );
