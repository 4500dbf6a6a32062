import {
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type NonAttribute,
  type Sequelize,
} from "sequelize";
import type { File } from "./File.ts";

export class PostPhoto extends Model<InferAttributes<PostPhoto>, InferCreationAttributes<PostPhoto>> {
  declare postId: string;
  declare position: number;
  declare fileId: string;
  declare alt: string;
  declare file?: NonAttribute<File>;
}

export const initPostPhoto = (sequelize: Sequelize) =>
  PostPhoto.init(
    {
      postId: { type: DataTypes.UUID, primaryKey: true, allowNull: false },
      position: { type: DataTypes.SMALLINT, primaryKey: true, allowNull: false },
      fileId: { type: DataTypes.UUID, allowNull: false },
      alt: { type: DataTypes.TEXT, allowNull: false },
    },
    { sequelize, tableName: "post_photo" },
  );
