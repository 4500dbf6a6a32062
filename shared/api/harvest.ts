import { z } from "zod";
import { plainDate } from "../domain/calendar.ts";
import { plantDrawingSchema } from "../domain/look/plantDrawing.ts";
import { limits } from "../limits.ts";
import { type Contract, instant, noInput, text, versionNumber } from "./contract.ts";
import { MarketDayDto } from "./markets.ts";
import { forms, grades, kinds, units } from "./varieties.ts";

/** A product on sale in one week. `left` is by market day id: how many can still be promised for that day. */
export const OfferDto = z.object({
  id: z.uuid(),
  weekStartsOn: plainDate,
  slug: z.string(),
  name: z.string(),
  unit: z.enum(units),
  blurb: z.string(),
  kind: z.enum(kinds),
  priceMinor: z.int(),
  plants: z.array(z.object({ slug: z.string(), name: z.string(), drawing: plantDrawingSchema })),
  sownFrom: plainDate.nullable(),
  sownTo: plainDate.nullable(),
  left: z.record(z.uuid(), z.int()),
});
export type OfferDto = z.infer<typeof OfferDto>;

export const HarvestDto = z.object({
  days: z.array(MarketDayDto),
  weeks: z.array(z.object({ startsOn: plainDate, note: z.string(), isPosted: z.boolean() })),
  offers: z.array(OfferDto),
});
export type HarvestDto = z.infer<typeof HarvestDto>;

export const getHarvest = {
  method: "GET",
  path: "/api/harvest",
  summary: "This week's and next week's market days and what is left for each",
  isPublic: true,
  sharedForMs: 300,
  input: noInput,
  output: HarvestDto,
} as const satisfies Contract;

const weekKey = z.object({ startsOn: plainDate });
const count = z.int("Whole units only.").min(0, "Not below zero.").max(limits.supplyMax);

export const WeekLineDto = z.object({
  lineId: z.uuid().nullable(),
  varietyId: z.uuid(),
  varietyName: z.string(),
  form: z.enum(forms),
  grade: z.enum(grades),
  sownFrom: plainDate.nullable(),
  sownTo: plainDate.nullable(),
  /** Seven entries, Monday first, cumulative. */
  days: z.array(z.object({ onDay: plainDate, promised: z.int(), claimed: z.int(), broken: z.int() })),
});
export const WeekOfferDto = z.object({
  offerId: z.uuid().nullable(),
  productId: z.uuid(),
  productName: z.string(),
  unit: z.enum(units),
  priceMinor: z.int(),
  isOffered: z.boolean(),
  parts: z.array(z.object({ varietyId: z.uuid(), form: z.enum(forms), grade: z.enum(grades), units: z.int() })),
  days: z.array(z.object({ marketDayId: z.uuid(), maxUnits: z.int().nullable(), taken: z.int(), left: z.int() })),
});
/** A promise that a recorded shortage breaks, the earliest day first; whom to call or write to. */
export const BrokenPromiseDto = z.object({
  varietyName: z.string(),
  form: z.enum(forms),
  grade: z.enum(grades),
  onDay: plainDate,
  missingUnits: z.int(),
  orders: z.array(
    z.object({
      preorderId: z.uuid(),
      code: z.string(),
      name: z.string(),
      phone: z.string(),
      email: z.string(),
      marketName: z.string(),
      onDay: plainDate,
      units: z.int(),
      ifMissing: z.string(),
      placedAt: instant,
    }),
  ),
});
export const WeekDto = z.object({
  startsOn: plainDate,
  note: z.string(),
  postedAt: instant.nullable(),
  version: z.int().min(0),
  marketDays: z.array(MarketDayDto),
  lines: z.array(WeekLineDto),
  offers: z.array(WeekOfferDto),
  broken: z.array(BrokenPromiseDto),
  can: z.object({ post: z.boolean(), unpost: z.boolean() }),
});
export type WeekDto = z.infer<typeof WeekDto>;

export const getWeek = {
  method: "GET",
  path: "/api/office/weeks/:startsOn",
  summary: "One week as the owner edits it",
  input: weekKey,
  output: WeekDto,
} as const satisfies Contract;

export const saveWeek = {
  method: "PUT",
  path: "/api/office/weeks/:startsOn",
  summary: "Save supply, offers, prices and limits of a week; lowering below claims records a shortage",
  input: weekKey.extend({
    version: z.int().min(0),
    note: text(limits.noteMax),
    lines: z
      .array(
        z
          .object({
            varietyId: z.uuid(),
            form: z.enum(forms),
            grade: z.enum(grades),
            sownFrom: plainDate.nullable(),
            sownTo: plainDate.nullable(),
            promised: z.array(count).length(7),
          })
          .refine(
            (l) =>
              (l.sownFrom === null) === (l.sownTo === null) &&
              (l.sownFrom === null || l.sownTo === null || l.sownFrom <= l.sownTo),
            { path: ["sownTo"], message: "Give both dates, the earlier first." },
          ),
      )
      .max(limits.rowsPerWeekMax),
    offers: z
      .array(
        z.object({
          productId: z.uuid(),
          priceMinor: z.int().min(0).max(limits.priceMaxMinor),
          isOffered: z.boolean(),
          limits: z.array(z.object({ marketDayId: z.uuid(), maxUnits: count.nullable() })).max(40),
        }),
      )
      .max(limits.rowsPerWeekMax),
  }),
  output: WeekDto,
} as const satisfies Contract;

export const copyLastWeek = {
  method: "POST",
  path: "/api/office/weeks/:startsOn/copy-last",
  summary: "Fill a week that is not posted with the week before it",
  makes: true,
  input: weekKey,
  output: WeekDto,
} as const satisfies Contract;
export const postWeek = {
  method: "POST",
  path: "/api/office/weeks/:startsOn/post",
  summary: "Make the week public",
  makes: true,
  input: weekKey.extend({ version: versionNumber }),
  output: WeekDto,
} as const satisfies Contract;
export const unpostWeek = {
  method: "POST",
  path: "/api/office/weeks/:startsOn/unpost",
  summary: "Take the week back while nobody has ordered from it",
  makes: true,
  input: weekKey.extend({ version: versionNumber }),
  output: WeekDto,
} as const satisfies Contract;
