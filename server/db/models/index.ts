import type { Sequelize } from "sequelize";
import { initCheckOff, CheckOff } from "./CheckOff.ts";
import { initCheckOffLine, CheckOffLine } from "./CheckOffLine.ts";
import { initClaim, Claim } from "./Claim.ts";
import { initFarm, Farm } from "./Farm.ts";
import { initFile, File } from "./File.ts";
import { initMarket, Market } from "./Market.ts";
import { initMarketDay, MarketDay } from "./MarketDay.ts";
import { initMarketOpening, MarketOpening } from "./MarketOpening.ts";
import { initOffer, Offer } from "./Offer.ts";
import { initOfferDay, OfferDay } from "./OfferDay.ts";
import { initOfferPart, OfferPart } from "./OfferPart.ts";
import { initPerson, Person } from "./Person.ts";
import { initPickup, Pickup } from "./Pickup.ts";
import { initPost, Post } from "./Post.ts";
import { initPostPhoto, PostPhoto } from "./PostPhoto.ts";
import { initPostVariety, PostVariety } from "./PostVariety.ts";
import { initPreorder, Preorder } from "./Preorder.ts";
import { initPreorderLine, PreorderLine } from "./PreorderLine.ts";
import { initProduct, Product } from "./Product.ts";
import { initProductPart, ProductPart } from "./ProductPart.ts";
import { initRoster, Roster } from "./Roster.ts";
import { initSignInRequest, SignInRequest } from "./SignInRequest.ts";
import { initStallPayment, StallPayment } from "./StallPayment.ts";
import { initSupplyChange, SupplyChange } from "./SupplyChange.ts";
import { initSupplyDay, SupplyDay } from "./SupplyDay.ts";
import { initSupplyLine, SupplyLine } from "./SupplyLine.ts";
import { initVariety, Variety } from "./Variety.ts";
import { initWeek, Week } from "./Week.ts";

/** Readies every model on this connection and ties them together; the only place that knows associations. */
export function initModels(sequelize: Sequelize): void {
  initCheckOff(sequelize);
  initCheckOffLine(sequelize);
  initClaim(sequelize);
  initFarm(sequelize);
  initFile(sequelize);
  initMarket(sequelize);
  initMarketDay(sequelize);
  initMarketOpening(sequelize);
  initOffer(sequelize);
  initOfferDay(sequelize);
  initOfferPart(sequelize);
  initPerson(sequelize);
  initPickup(sequelize);
  initPost(sequelize);
  initPostPhoto(sequelize);
  initPostVariety(sequelize);
  initPreorder(sequelize);
  initPreorderLine(sequelize);
  initProduct(sequelize);
  initProductPart(sequelize);
  initRoster(sequelize);
  initSignInRequest(sequelize);
  initStallPayment(sequelize);
  initSupplyChange(sequelize);
  initSupplyDay(sequelize);
  initSupplyLine(sequelize);
  initVariety(sequelize);
  initWeek(sequelize);
  associateMarkets();
  associateHarvest();
  associateOrders();
  associateNotebook();
}

function associateMarkets(): void {
  Market.hasMany(MarketOpening, { as: "openings", foreignKey: "marketId" });
  MarketDay.belongsTo(Market, { as: "market", foreignKey: "marketId" });
  MarketDay.belongsToMany(Person, { as: "workers", through: Roster, foreignKey: "marketDayId", otherKey: "personId" });
}

function associateHarvest(): void {
  Product.hasMany(ProductPart, { as: "parts", foreignKey: "productId" });
  ProductPart.belongsTo(Variety, { as: "variety", foreignKey: "varietyId" });
  SupplyLine.belongsTo(Variety, { as: "variety", foreignKey: "varietyId" });
  SupplyLine.hasMany(SupplyDay, { as: "days", foreignKey: "lineId" });
  Offer.belongsTo(Product, { as: "product", foreignKey: "productId" });
  Offer.hasMany(OfferPart, { as: "parts", foreignKey: "offerId" });
  Offer.hasMany(OfferDay, { as: "days", foreignKey: "offerId" });
}

function associateOrders(): void {
  Preorder.belongsTo(Pickup, { as: "pickup", foreignKey: "pickupId" });
  Preorder.belongsTo(MarketDay, { as: "marketDay", foreignKey: "marketDayId" });
  Preorder.hasMany(PreorderLine, { as: "lines", foreignKey: "preorderId" });
  Pickup.hasMany(Preorder, { as: "preorders", foreignKey: "pickupId" });
  Pickup.belongsTo(MarketDay, { as: "marketDay", foreignKey: "marketDayId" });
  Pickup.belongsTo(Person, { as: "person", foreignKey: "personId" });
  Pickup.hasMany(CheckOff, { as: "checkOffs", foreignKey: "pickupId" });
  Pickup.hasMany(StallPayment, { as: "payments", foreignKey: "pickupId" });
  CheckOff.hasMany(CheckOffLine, { as: "lines", foreignKey: "checkOffId" });
  StallPayment.belongsTo(Person, { as: "taker", foreignKey: "byPerson" });
}

function associateNotebook(): void {
  Post.belongsToMany(Variety, { as: "varieties", through: PostVariety, foreignKey: "postId", otherKey: "varietyId" });
  Post.hasMany(PostPhoto, { as: "photos", foreignKey: "postId" });
  Post.belongsTo(Person, { as: "author", foreignKey: "authorId" });
  PostPhoto.belongsTo(File, { as: "file", foreignKey: "fileId" });
}

export {
  CheckOff,
  CheckOffLine,
  Claim,
  Farm,
  File,
  Market,
  MarketDay,
  MarketOpening,
  Offer,
  OfferDay,
  OfferPart,
  Person,
  Pickup,
  Post,
  PostPhoto,
  PostVariety,
  Preorder,
  PreorderLine,
  Product,
  ProductPart,
  Roster,
  SignInRequest,
  StallPayment,
  SupplyChange,
  SupplyDay,
  SupplyLine,
  Variety,
  Week,
};
