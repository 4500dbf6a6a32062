import { DataTypes, type InferAttributes, type InferCreationAttributes, Model, type Sequelize } from "sequelize";

export class PostVariety extends Model<InferAttributes<PostVariety>, InferCreationAttributes<PostVariety>> {
  declare postId: string;
  declare varietyId: string;
}

export const initPostVariety = (sequelize: Sequelize) =>
  PostVariety.init(
    {
      postId: { type: DataTypes.UUID, primaryKey: true, allowNull: false },
      varietyId: { type: DataTypes.UUID, primaryKey: true, allowNull: false },
    },
    { sequelize, tableName: "post_variety" },
  );
