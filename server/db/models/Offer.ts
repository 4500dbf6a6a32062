import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type NonAttribute,
  type Sequelize,
} from "sequelize";
import type { OfferDay } from "./OfferDay.ts";
import type { OfferPart } from "./OfferPart.ts";
import type { Product } from "./Product.ts";

export class Offer extends Model<InferAttributes<Offer>, InferCreationAttributes<Offer>> {
  declare id: CreationOptional<string>;
  declare weekStartsOn: string;
  declare productId: string;
  declare priceMinor: number;
  declare product?: NonAttribute<Product>;
  declare parts?: NonAttribute<OfferPart[]>;
  declare days?: NonAttribute<OfferDay[]>;
}

export const initOffer = (sequelize: Sequelize) =>
  Offer.init(
    {
      id: { type: DataTypes.UUID, primaryKey: true, allowNull: false, defaultValue: DataTypes.UUIDV4 },
      weekStartsOn: { type: DataTypes.DATEONLY, allowNull: false },
      productId: { type: DataTypes.UUID, allowNull: false },
      priceMinor: { type: DataTypes.INTEGER, allowNull: false },
    },
    { sequelize, tableName: "offer" },
  );
