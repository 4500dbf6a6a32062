import { z } from "zod";
import { plainDate, wallTime } from "../domain/calendar.ts";
import { awningSchema } from "../domain/look/awning.ts";
import { openingSchema } from "../domain/openings.ts";
import { limits } from "../limits.ts";
import { type Contract, idInput, instant, noInput, required, slugText, text, versionNumber } from "./contract.ts";

export const dayStatuses = ["on", "late", "moved", "called_off"] as const;

export const MarketDayDto = z.object({
  id: z.uuid(),
  marketId: z.uuid(),
  marketSlug: z.string(),
  marketName: z.string(),
  town: z.string(),
  awning: awningSchema,
  onDay: plainDate,
  startTime: wallTime,
  endTime: wallTime,
  status: z.enum(dayStatuses),
  statusNote: z.string(),
  closesAt: instant,
  /** Orders can be placed now: the week is posted, the day is not called off, and it has not closed. */
  isOpen: z.boolean(),
  isPosted: z.boolean(),
  isClosed: z.boolean(),
});
export type MarketDayDto = z.infer<typeof MarketDayDto>;

export const MarketDto = z.object({
  id: z.uuid(),
  slug: z.string(),
  name: z.string(),
  street: z.string(),
  town: z.string(),
  region: z.string(),
  postcode: z.string(),
  lat: z.number(),
  lng: z.number(),
  stall: z.string(),
  directions: z.string(),
  awning: awningSchema,
  taxRatePpm: z.int(),
  nextDays: z.array(MarketDayDto),
  hours: z.array(z.string()),
});
export type MarketDto = z.infer<typeof MarketDto>;

export const listMarkets = {
  method: "GET",
  path: "/api/markets",
  summary: "All markets with their next days",
  input: noInput,
  output: z.array(MarketDto),
  isPublic: true,
  sharedForMs: 400,
} as const satisfies Contract;

export const getMarket = {
  method: "GET",
  path: "/api/markets/:slug",
  summary: "One market",
  input: z.object({ slug: slugText }),
  output: MarketDto,
  isPublic: true,
  sharedForMs: 400,
} as const satisfies Contract;

const marketFields = {
  slug: slugText,
  name: required(limits.nameMax),
  street: required(limits.lineMax),
  town: required(limits.nameMax),
  region: required(limits.nameMax),
  postcode: required(20),
  lat: z.number().min(-90).max(90),
  lng: z.number().min(-180).max(180),
  stall: text(limits.lineMax),
  directions: text(limits.blurbMax),
  awning: awningSchema,
  taxRatePpm: z.int().min(0).max(500_000),
  openings: z.array(openingSchema).max(limits.openingsPerMarketMax),
};

export const OfficeMarketDto = z.object({
  id: z.uuid(),
  ...marketFields,
  isRetired: z.boolean(),
  version: versionNumber,
});
export type OfficeMarketDto = z.infer<typeof OfficeMarketDto>;

export const listOfficeMarkets = {
  method: "GET",
  path: "/api/office/markets",
  summary: "Markets with their opening rules",
  input: noInput,
  output: z.array(OfficeMarketDto),
} as const satisfies Contract;

export const createMarket = {
  method: "POST",
  path: "/api/office/markets",
  summary: "Add a market",
  makes: true,
  input: z.object(marketFields),
  output: OfficeMarketDto,
} as const satisfies Contract;

export const updateMarket = {
  method: "PUT",
  path: "/api/office/markets/:id",
  summary: "Change a market; its coming days without orders follow the rules",
  input: idInput.extend({ ...marketFields, isRetired: z.boolean(), version: versionNumber }),
  output: OfficeMarketDto,
} as const satisfies Contract;

export const previewOpenings = {
  method: "POST",
  path: "/api/office/markets/preview",
  summary: "The next dates that opening rules give",
  input: z.object({ openings: z.array(openingSchema).max(limits.openingsPerMarketMax) }),
  output: z.object({ dates: z.array(z.object({ on: plainDate, startTime: wallTime, endTime: wallTime })) }),
} as const satisfies Contract;

/** A market day as the people who work it see it. */
export const WorkDayDto = MarketDayDto.extend({
  version: versionNumber,
  roster: z.array(z.object({ id: z.uuid(), name: z.string() })),
  pickups: z.int(),
  packed: z.int(),
  collected: z.int(),
  isOver: z.boolean(),
  can: z.object({ edit: z.boolean(), pack: z.boolean(), stall: z.boolean() }),
});
export type WorkDayDto = z.infer<typeof WorkDayDto>;

export const listWorkDays = {
  method: "GET",
  path: "/api/work/days",
  summary: "Market days I may work on or look after, from a date",
  input: z.object({ from: plainDate.optional(), to: plainDate.optional() }),
  output: z.array(WorkDayDto),
} as const satisfies Contract;

export const updateMarketDay = {
  method: "PATCH",
  path: "/api/office/days/:id",
  summary: "Change one market day: hours, closing moment, status",
  input: idInput.extend({
    startTime: wallTime,
    endTime: wallTime,
    closesOn: plainDate,
    closesTime: wallTime,
    status: z.enum(dayStatuses),
    statusNote: text(limits.noteMax),
    version: versionNumber,
  }),
  output: WorkDayDto,
} as const satisfies Contract;

export const setRoster = {
  method: "PUT",
  path: "/api/office/days/:id/roster",
  summary: "Who works this market day",
  input: idInput.extend({ people: z.array(z.uuid()).max(20) }),
  output: WorkDayDto,
} as const satisfies Contract;

export const findZip = {
  method: "GET",
  path: "/api/zip/:zip",
  summary: "Where a ZIP code is",
  isPublic: true,
  input: z.object({ zip: z.string().regex(/^\d{5}$/, "A ZIP code has five digits.") }),
  output: z.object({ zip: z.string(), town: z.string(), lat: z.number(), lng: z.number() }),
} as const satisfies Contract;
