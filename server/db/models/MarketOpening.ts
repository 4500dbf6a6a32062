import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from "sequelize";

export class MarketOpening extends Model<InferAttributes<MarketOpening>, InferCreationAttributes<MarketOpening>> {
  declare id: CreationOptional<string>;
  declare marketId: string;
  declare rrule: string;
  declare startsOn: string;
  declare endsOn: CreationOptional<string | null>;
  declare startTime: string;
  declare endTime: string;
  declare exceptOn: CreationOptional<string[]>;
  declare extraOn: CreationOptional<string[]>;
}

export const initMarketOpening = (sequelize: Sequelize) =>
  MarketOpening.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, allowNull: false, defaultValue: DataTypes.UUIDV4 },
      marketId: { type: DataTypes.UUID, allowNull: false },
      rrule: { type: DataTypes.TEXT, allowNull: false },
      startsOn: { type: DataTypes.DATEONLY, allowNull: false },
      endsOn: { type: DataTypes.DATEONLY },
      startTime: { type: DataTypes.TEXT, allowNull: false },
      endTime: { type: DataTypes.TEXT, allowNull: false },
      exceptOn: { type: DataTypes.ARRAY(DataTypes.DATEONLY), allowNull: false, defaultValue: [] },
      extraOn: { type: DataTypes.ARRAY(DataTypes.DATEONLY), allowNull: false, defaultValue: [] },
    },
    { sequelize, tableName: "market_opening" },
  );
