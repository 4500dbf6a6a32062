import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from "sequelize";

export class Week extends Model<InferAttributes<Week>, InferCreationAttributes<Week>> {
  declare startsOn: string;
  declare note: CreationOptional<string>;
  declare postedAt: CreationOptional<Date | null>;
  declare version: CreationOptional<number>;
}

export const initWeek = (sequelize: Sequelize) =>
  Week.init(
    {
      startsOn: { type: DataTypes.DATEONLY, primaryKey: true, allowNull: false },
      note: { type: DataTypes.TEXT, allowNull: false, defaultValue: "" },
      postedAt: { type: DataTypes.DATE(3) },
      version: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 1 },
    },
    { sequelize, tableName: "week" },
  );
