import { z } from "zod";
import { plainDate } from "../domain/calendar.ts";
import { plantDrawingSchema } from "../domain/look/plantDrawing.ts";
import { limits } from "../limits.ts";
import { type Contract, idInput, noInput, required, slugText, text, versionNumber } from "./contract.ts";

export const kinds = ["lettuce", "herb", "leafy_green", "allium"] as const;
export type Kind = (typeof kinds)[number];
export const forms = ["head", "bunch"] as const;
export const grades = ["full", "small"] as const;
export const units = ["head", "bunch", "bag"] as const;

export const VarietyDto = z.object({
  id: z.uuid(),
  slug: z.string(),
  name: z.string(),
  kind: z.enum(kinds),
  blurb: z.string(),
  keeping: z.string(),
  drawing: plantDrawingSchema,
});
export type VarietyDto = z.infer<typeof VarietyDto>;

/** Sowings behind a variety, as this week's supply states them. */
export const GrowingDto = z.object({
  variety: VarietyDto,
  sownFrom: plainDate,
  sownTo: plainDate,
  weekStartsOn: plainDate,
});
export type GrowingDto = z.infer<typeof GrowingDto>;

export const listGrowing = {
  method: "GET",
  path: "/api/growing",
  summary: "What is growing: sown dates by variety",
  input: noInput,
  output: z.array(GrowingDto),
  isPublic: true,
  sharedForMs: 400,
} as const satisfies Contract;

export const getVariety = {
  method: "GET",
  path: "/api/varieties/:slug",
  summary: "One variety and what is made of it",
  isPublic: true,
  sharedForMs: 400,
  input: z.object({ slug: slugText }),
  output: VarietyDto.extend({
    products: z.array(z.object({ slug: z.string(), name: z.string(), unit: z.enum(units) })),
    growing: z.array(z.object({ weekStartsOn: plainDate, sownFrom: plainDate, sownTo: plainDate })),
    posts: z.array(z.object({ slug: z.string(), title: z.string(), postedOn: plainDate })),
  }),
} as const satisfies Contract;

const varietyFields = {
  slug: slugText,
  name: required(limits.nameMax),
  kind: z.enum(kinds),
  blurb: text(limits.blurbMax),
  keeping: text(limits.blurbMax),
  drawing: plantDrawingSchema,
};
export const OfficeVarietyDto = z.object({
  id: z.uuid(),
  ...varietyFields,
  isRetired: z.boolean(),
  version: versionNumber,
});
export type OfficeVarietyDto = z.infer<typeof OfficeVarietyDto>;

export const listOfficeVarieties = {
  method: "GET",
  path: "/api/office/varieties",
  summary: "All varieties",
  input: noInput,
  output: z.array(OfficeVarietyDto),
} as const satisfies Contract;
export const createVariety = {
  method: "POST",
  path: "/api/office/varieties",
  summary: "Add a variety",
  makes: true,
  input: z.object(varietyFields),
  output: OfficeVarietyDto,
} as const satisfies Contract;
export const updateVariety = {
  method: "PUT",
  path: "/api/office/varieties/:id",
  summary: "Change a variety",
  input: idInput.extend({ ...varietyFields, isRetired: z.boolean(), version: versionNumber }),
  output: OfficeVarietyDto,
} as const satisfies Contract;

const part = z.object({
  varietyId: z.uuid(),
  form: z.enum(forms),
  grade: z.enum(grades),
  units: z.int().min(1).max(50),
});
const productFields = {
  slug: slugText,
  name: required(limits.nameMax),
  unit: z.enum(units),
  blurb: text(limits.blurbMax),
  priceMinor: z.int().min(0).max(limits.priceMaxMinor),
  parts: z
    .array(part)
    .min(1, "A product is made of at least one variety.")
    .max(limits.partsPerProductMax)
    .refine(
      (parts) => new Set(parts.map((p) => `${p.varietyId} ${p.form} ${p.grade}`)).size === parts.length,
      "Each variety, form and grade may stand here once.",
    ),
};
export const ProductDto = z.object({ id: z.uuid(), ...productFields, isRetired: z.boolean(), version: versionNumber });
export type ProductDto = z.infer<typeof ProductDto>;

export const listProducts = {
  method: "GET",
  path: "/api/office/products",
  summary: "All products",
  input: noInput,
  output: z.array(ProductDto),
} as const satisfies Contract;
export const createProduct = {
  method: "POST",
  path: "/api/office/products",
  summary: "Add a product",
  makes: true,
  input: z.object(productFields),
  output: ProductDto,
} as const satisfies Contract;
export const updateProduct = {
  method: "PUT",
  path: "/api/office/products/:id",
  summary: "Change a product",
  input: idInput.extend({ ...productFields, isRetired: z.boolean(), version: versionNumber }),
  output: ProductDto,
} as const satisfies Contract;
