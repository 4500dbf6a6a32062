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
import type { PostPhoto } from "./PostPhoto.ts";
import type { Variety } from "./Variety.ts";

export class Post extends Model<InferAttributes<Post>, InferCreationAttributes<Post>> {
  declare id: CreationOptional<string>;
  declare slug: string;
  declare title: string;
  declare topic: "fresh" | "growing";
  declare markdown: string;
  declare authorId: string;
  declare postedAt: CreationOptional<Date | null>;
  declare changedAt: Date;
  declare version: CreationOptional<number>;
  declare varieties?: NonAttribute<Variety[]>;
  declare photos?: NonAttribute<PostPhoto[]>;
  declare author?: NonAttribute<Person>;
}

export const initPost = (sequelize: Sequelize) =>
  Post.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, allowNull: false, defaultValue: DataTypes.UUIDV4 },
      slug: { type: DataTypes.TEXT, allowNull: false },
      title: { type: DataTypes.TEXT, allowNull: false },
      topic: { type: DataTypes.TEXT, allowNull: false },
      markdown: { type: DataTypes.TEXT, allowNull: false },
      authorId: { type: DataTypes.UUID, allowNull: false },
      postedAt: { type: DataTypes.DATE(3) },
      changedAt: { type: DataTypes.DATE(3), allowNull: false },
      version: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 1 },
    },
    { sequelize, tableName: "post" },
  );
