import { DataTypes, type InferAttributes, type InferCreationAttributes, Model, type Sequelize } from "sequelize";

export class OfferPart extends Model<InferAttributes<OfferPart>, InferCreationAttributes<OfferPart>> {
  declare offerId: string;
  declare lineId: string;
  declare units: number;
}

export const initOfferPart = (sequelize: Sequelize) =>
  OfferPart.init(
    {
      offerId: { type: DataTypes.UUID, primaryKey: true, allowNull: false },
      lineId: { type: DataTypes.UUID, primaryKey: true, allowNull: false },
      units: { type: DataTypes.INTEGER, allowNull: false },
    },
    { sequelize, tableName: "offer_part" },
  );
