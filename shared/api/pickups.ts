import { z } from "zod";
import { limits } from "../limits.ts";
import { type Contract, idInput, instant, noInput, text } from "./contract.ts";
import { WorkDayDto } from "./markets.ts";
import { passKey, pickupStates } from "./orders.ts";
import { ifMissing } from "./people.ts";

export const paymentKinds = ["cash", "card_reader", "token", "benefit_card"] as const;
export type PaymentKind = (typeof paymentKinds)[number];

export const StallPaymentDto = z.object({
  id: z.uuid(),
  kind: z.enum(paymentKinds),
  amountMinor: z.int(),
  tenderedMinor: z.int().nullable(),
  changeMinor: z.int(),
  at: instant,
  byName: z.string(),
  isUndone: z.boolean(),
});
export const PickupDto = z.object({
  id: z.uuid(),
  code: z.string(),
  state: z.enum(pickupStates),
  name: z.string(),
  collector: z.string(),
  phoneEnd: z.string(),
  note: z.string(),
  ifMissing,
  orders: z.array(
    z.object({
      preorderId: z.uuid(),
      lines: z.array(
        z.object({
          offerId: z.uuid(),
          productName: z.string(),
          unit: z.string(),
          units: z.int(),
          collectedUnits: z.int().nullable(),
        }),
      ),
      totalMinor: z.int(),
    }),
  ),
  items: z.int(),
  packedAt: instant.nullable(),
  collectedAt: instant.nullable(),
  checkOffNote: z.string(),
  /** Money is null for whoever may see the work but not what is due. */
  money: z
    .object({ totalMinor: z.int(), paidMinor: z.int(), dueMinor: z.int(), payments: z.array(StallPaymentDto) })
    .nullable(),
  can: z.object({
    pack: z.boolean(),
    unpack: z.boolean(),
    checkOff: z.boolean(),
    undo: z.boolean(),
    takePayment: z.boolean(),
  }),
});
export type PickupDto = z.infer<typeof PickupDto>;

export const DaySheetDto = z.object({
  day: WorkDayDto,
  stall: z.string(),
  street: z.string(),
  pickups: z.array(PickupDto),
  totals: z.array(z.object({ productName: z.string(), unit: z.string(), units: z.int(), packedUnits: z.int() })),
  plants: z.array(z.object({ varietyName: z.string(), form: z.string(), grade: z.string(), units: z.int() })),
});
export type DaySheetDto = z.infer<typeof DaySheetDto>;

export const getDaySheet = {
  method: "GET",
  path: "/api/work/days/:id/pickups",
  summary: "Every pickup of a market day, with totals",
  input: idInput,
  output: DaySheetDto,
} as const satisfies Contract;

export const findPickup = {
  method: "GET",
  path: "/api/work/pickups/by-pass/:passKey",
  summary: "The pickup behind a scanned pass",
  input: z.object({
    passKey,
  }),
  output: z.object({ marketDayId: z.uuid(), pickup: PickupDto }),
} as const satisfies Contract;

export const packPickup = {
  method: "POST",
  path: "/api/work/pickups/:id/pack",
  summary: "Packed",
  input: idInput,
  output: PickupDto,
} as const satisfies Contract;
export const unpackPickup = {
  method: "POST",
  path: "/api/work/pickups/:id/unpack",
  summary: "Not packed after all",
  input: idInput,
  output: PickupDto,
} as const satisfies Contract;

export const checkOff = {
  method: "POST",
  path: "/api/work/pickups/:id/check-off",
  summary: "Collected, or part of it: then `lines` say how many of each were handed over",
  makes: true,
  input: idInput.extend({
    note: text(limits.noteMax).default(""),
    lines: z
      .array(z.object({ preorderId: z.uuid(), offerId: z.uuid(), units: z.int().min(0).max(limits.unitsPerLineMax) }))
      .max(200)
      .optional(),
  }),
  output: PickupDto,
} as const satisfies Contract;
export const undoCheckOff = {
  method: "POST",
  path: "/api/work/pickups/:id/undo",
  summary: "Take the check-off back",
  input: idInput,
  output: PickupDto,
} as const satisfies Contract;

export const takePayment = {
  method: "POST",
  path: "/api/work/pickups/:id/payments",
  summary: "Record a payment at the stall; for cash, what was tendered gives the change",
  makes: true,
  input: idInput.extend({
    kind: z.enum(paymentKinds),
    amountMinor: z.int().min(1, "More than nothing.").max(limits.paymentMaxMinor),
    tenderedMinor: z.int().min(1).max(limits.paymentMaxMinor).optional(),
  }),
  output: PickupDto,
} as const satisfies Contract;
export const undoPayment = {
  method: "POST",
  path: "/api/work/pickups/:id/payments/:paymentId/undo",
  summary: "Take a recorded payment back",
  input: idInput.extend({ paymentId: z.uuid() }),
  output: PickupDto,
} as const satisfies Contract;

export const pullTotals = {
  method: "GET",
  path: "/api/work/pull",
  summary: "What to pull for the coming market days",
  input: noInput,
  output: z.array(z.object({ day: WorkDayDto, plants: DaySheetDto.shape.plants })),
} as const satisfies Contract;
