import { z } from "zod";
import { plainDate, wallTime } from "../domain/calendar.ts";
import { limits } from "../limits.ts";
import { type Contract, idInput, instant, noInput, required, text, versionNumber } from "./contract.ts";
import { MarketDayDto } from "./markets.ts";
import { ifMissing } from "./people.ts";

const basketLine = z.object({
  offerId: z.uuid(),
  units: z.int().min(1, "At least one.").max(limits.unitsPerLineMax, `At most ${limits.unitsPerLineMax} of one thing.`),
});
const basketLines = z
  .array(basketLine)
  .min(1, "The basket is empty.")
  .max(limits.linesPerOrderMax)
  .refine((lines) => new Set(lines.map((l) => l.offerId)).size === lines.length, "Each product may stand here once.");

const details = {
  name: required(limits.nameMax, "Whose name shall we look for?"),
  phone: text(limits.phoneMax),
  collector: text(limits.nameMax),
  ifMissing,
  note: text(limits.noteMax),
};

export const OrderLineDto = z.object({
  offerId: z.uuid(),
  productName: z.string(),
  unit: z.string(),
  units: z.int(),
  priceMinor: z.int(),
  totalMinor: z.int(),
  collectedUnits: z.int().nullable(),
});
export const pickupStates = ["expected", "packed", "collected", "part", "missed", "cancelled"] as const;
export const OrderDto = z.object({
  id: z.uuid(),
  state: z.enum(["placed", "cancelled"]),
  pickupState: z.enum(pickupStates),
  code: z.string(),
  passKey: z.string(),
  passUrl: z.string(),
  day: MarketDayDto,
  stall: z.string(),
  street: z.string(),
  name: z.string(),
  phone: z.string(),
  collector: z.string(),
  ifMissing,
  note: z.string(),
  lines: z.array(OrderLineDto),
  subtotalMinor: z.int(),
  taxMinor: z.int(),
  totalMinor: z.int(),
  taxRatePpm: z.int(),
  pricesIncludeTax: z.boolean(),
  placedAt: instant,
  changedAt: instant.nullable(),
  cancelledAt: instant.nullable(),
  collectedAt: instant.nullable(),
  version: versionNumber,
  can: z.object({ change: z.boolean(), cancel: z.boolean(), reorder: z.boolean(), sayCannotCome: z.boolean() }),
});
export type OrderDto = z.infer<typeof OrderDto>;

export const QuoteDto = z.object({
  subtotalMinor: z.int(),
  taxMinor: z.int(),
  totalMinor: z.int(),
  taxRatePpm: z.int(),
  pricesIncludeTax: z.boolean(),
  minimumOrderMinor: z.int(),
});

export const quoteOrder = {
  method: "POST",
  path: "/api/orders/quote",
  summary: "What a basket would cost on a market day, with its tax",
  isPublic: true,
  input: z.object({ marketDayId: z.uuid(), lines: basketLines }),
  output: QuoteDto,
} as const satisfies Contract;

export const placeOrder = {
  method: "POST",
  path: "/api/orders",
  summary: "Preorder for a market day, to pay at the stall",
  makes: true,
  input: z.object({ marketDayId: z.uuid(), lines: basketLines, expectedTotalMinor: z.int().min(0), ...details }),
  output: OrderDto,
} as const satisfies Contract;

export const listOrders = {
  method: "GET",
  path: "/api/orders",
  summary: "My orders, the next market day first",
  input: noInput,
  output: z.array(OrderDto),
} as const satisfies Contract;

export const getOrder = {
  method: "GET",
  path: "/api/orders/:id",
  summary: "One of my orders",
  input: idInput,
  output: OrderDto,
} as const satisfies Contract;

export const changeOrder = {
  method: "PUT",
  path: "/api/orders/:id",
  summary: "Change an order until orders close",
  input: idInput.extend({ version: versionNumber, lines: basketLines, expectedTotalMinor: z.int().min(0), ...details }),
  output: OrderDto,
} as const satisfies Contract;

export const cancelOrder = {
  method: "POST",
  path: "/api/orders/:id/cancel",
  summary: "Cancel an order until orders close",
  input: idInput.extend({ reason: text(limits.noteMax).default("") }),
  output: OrderDto,
} as const satisfies Contract;

export const sayCannotCome = {
  method: "POST",
  path: "/api/orders/:id/cannot-come",
  summary: "After the close: tell the stall that nobody will collect",
  input: idInput.extend({ reason: text(limits.noteMax).default("") }),
  output: OrderDto,
} as const satisfies Contract;

/** The unguessable part of a pass's link. */
export const passKey = z
  .string()
  .min(22)
  .max(64)
  .regex(/^[\w-]+$/);

/** What a person carries to the stall; shown to whoever holds the link, so it names no e-mail, phone or money but what is due. */
export const PassDto = z.object({
  code: z.string(),
  pickupState: z.enum(pickupStates),
  name: z.string(),
  collector: z.string(),
  day: MarketDayDto,
  stall: z.string(),
  street: z.string(),
  startTime: wallTime,
  endTime: wallTime,
  onDay: plainDate,
  lines: z.array(z.object({ productName: z.string(), unit: z.string(), units: z.int() })),
  dueMinor: z.int(),
});
export type PassDto = z.infer<typeof PassDto>;
export const getPass = {
  method: "GET",
  path: "/api/pass/:passKey",
  summary: "The pickup pass behind its link",
  isPublic: true,
  input: z.object({
    passKey,
  }),
  output: PassDto,
} as const satisfies Contract;
