import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from "sequelize";

export class File extends Model<InferAttributes<File>, InferCreationAttributes<File>> {
  declare id: CreationOptional<string>;
  declare sha256: string;
  declare mime: string;
  declare bytes: Buffer;
  declare width: number;
  declare height: number;
  declare addedBy: string;
  declare createdAt: Date;
}

export const initFile = (sequelize: Sequelize) =>
  File.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, allowNull: false, defaultValue: DataTypes.UUIDV4 },
      sha256: { type: DataTypes.TEXT, allowNull: false },
      mime: { type: DataTypes.TEXT, allowNull: false },
      bytes: { type: DataTypes.BLOB, allowNull: false },
      width: { type: DataTypes.INTEGER, allowNull: false },
      height: { type: DataTypes.INTEGER, allowNull: false },
      addedBy: { type: DataTypes.UUID, allowNull: false },
      createdAt: { type: DataTypes.DATE(3), allowNull: false },
    },
    { sequelize, tableName: "file" },
  );
