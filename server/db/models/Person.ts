import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from "sequelize";

export class Person extends Model<InferAttributes<Person>, InferCreationAttributes<Person>> {
  declare id: CreationOptional<string>;
  declare email: string;
  declare name: CreationOptional<string>;
  declare phone: CreationOptional<string>;
  declare role: "shopper" | "stall" | "grower" | "owner";
  declare ifMissing: CreationOptional<"similar" | "credit" | "money_back">;
  declare invitedAt: CreationOptional<Date | null>;
  declare firstSeenAt: CreationOptional<Date | null>;
  declare createdAt: Date;
}

export const initPerson = (sequelize: Sequelize) =>
  Person.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, allowNull: false, defaultValue: DataTypes.UUIDV4 },
      email: { type: DataTypes.TEXT, allowNull: false },
      name: { type: DataTypes.TEXT, allowNull: false, defaultValue: "" },
      phone: { type: DataTypes.TEXT, allowNull: false, defaultValue: "" },
      role: { type: DataTypes.TEXT, allowNull: false },
      ifMissing: { type: DataTypes.TEXT, allowNull: false, defaultValue: "similar" },
      invitedAt: { type: DataTypes.DATE(3) },
      firstSeenAt: { type: DataTypes.DATE(3) },
      createdAt: { type: DataTypes.DATE(3), allowNull: false },
    },
    { sequelize, tableName: "person" },
  );
