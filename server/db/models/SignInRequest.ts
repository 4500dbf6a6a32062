import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from "sequelize";

export class SignInRequest extends Model<InferAttributes<SignInRequest>, InferCreationAttributes<SignInRequest>> {
  declare id: CreationOptional<string>;
  declare tokenHash: Buffer;
  declare codeHash: Buffer;
  declare email: string;
  declare nextPath: string;
  declare tries: CreationOptional<number>;
  declare createdAt: Date;
  declare expiresAt: Date;
  declare usedAt: CreationOptional<Date | null>;
}

export const initSignInRequest = (sequelize: Sequelize) =>
  SignInRequest.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, allowNull: false, defaultValue: DataTypes.UUIDV4 },
      tokenHash: { type: DataTypes.BLOB, allowNull: false },
      codeHash: { type: DataTypes.BLOB, allowNull: false },
      email: { type: DataTypes.TEXT, allowNull: false },
      nextPath: { type: DataTypes.TEXT, allowNull: false },
      tries: { type: DataTypes.SMALLINT, allowNull: false, defaultValue: 0 },
      createdAt: { type: DataTypes.DATE(3), allowNull: false },
      expiresAt: { type: DataTypes.DATE(3), allowNull: false },
      usedAt: { type: DataTypes.DATE(3) },
    },
    { sequelize, tableName: "sign_in_request" },
  );
