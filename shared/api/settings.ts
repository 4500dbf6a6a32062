import { z } from "zod";
import { closeRuleSchema } from "../domain/closeRule.ts";
import { limits } from "../limits.ts";
import { type Contract, noInput, required, text, versionNumber } from "./contract.ts";
import { emailText } from "./people.ts";

const farmFields = {
  name: required(limits.nameMax),
  tagline: required(limits.lineMax),
  story: text(limits.storyMax),
  street: required(limits.lineMax),
  town: required(limits.nameMax),
  region: required(limits.nameMax),
  postcode: required(20),
  country: required(limits.nameMax),
  email: emailText,
  phone: text(limits.phoneMax),
  timeZone: required(60),
  currency: z.string().regex(/^[A-Z]{3}$/, "Three capital letters, such as USD."),
  distanceUnit: z.enum(["mi", "km"]),
  closeRule: closeRuleSchema,
  minimumOrderMinor: z.int().min(0).max(limits.priceMaxMinor),
  pricesIncludeTax: z.boolean(),
  cashRoundingMinor: z.int().min(1).max(1_000),
};

/** What every page needs to know of the farm. `currencyDigits` are ISO 4217's, never a browser's guess. */
export const FarmDto = z.object({
  ...farmFields,
  currencyDigits: z.int(),
  version: versionNumber,
  today: z.iso.date(),
  tiles: z.object({ url: z.string(), attribution: z.string() }).nullable(),
});
export type FarmDto = z.infer<typeof FarmDto>;

export const getFarm = {
  method: "GET",
  path: "/api/farm",
  summary: "The farm: name, address, zone, money",
  input: noInput,
  output: FarmDto,
  isPublic: true,
  sharedForMs: 400,
} as const satisfies Contract;

export const updateFarm = {
  method: "PUT",
  path: "/api/office/farm",
  summary: "Change the farm's settings",
  input: z.object({ ...farmFields, version: versionNumber }),
  output: FarmDto,
} as const satisfies Contract;
