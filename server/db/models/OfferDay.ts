import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from "sequelize";

export class OfferDay extends Model<InferAttributes<OfferDay>, InferCreationAttributes<OfferDay>> {
  declare offerId: string;
  declare marketDayId: string;
  declare maxUnits: CreationOptional<number | null>;
  declare taken: CreationOptional<number>;
}

export const initOfferDay = (sequelize: Sequelize) =>
  OfferDay.init(
    {
      offerId: { type: DataTypes.UUID, primaryKey: true, allowNull: false },
      marketDayId: { type: DataTypes.UUID, primaryKey: true, allowNull: false },
      maxUnits: { type: DataTypes.INTEGER },
      taken: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 0 },
    },
    { sequelize, tableName: "offer_day" },
  );
