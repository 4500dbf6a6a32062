import { z } from "zod";
import { addDays, formatTime, instantOf, wallTime } from "./calendar.ts";

/** When orders close: so many hours before the market opens, or at a clock time so many days before. */
export const closeRuleSchema = z.discriminatedUnion("kind", [
  z.object({ kind: z.literal("hours_before"), hours: z.int().min(0).max(336) }),
  z.object({ kind: z.literal("clock"), daysBefore: z.int().min(0).max(14), time: wallTime }),
]);
export type CloseRule = z.infer<typeof closeRuleSchema>;

type MarketDayStart = { on: string; startTime: string; rule: CloseRule; timeZone: string };

/** The instant at which orders for a market day close. Hours are true hours; a clock time keeps the clock, also over a change of daylight saving. */
export function closesAt({ on, startTime, rule, timeZone }: MarketDayStart): Date {
  if (rule.kind === "clock") return instantOf({ on: addDays(on, -rule.daysBefore), time: rule.time, timeZone });
  return new Date(instantOf({ on, time: startTime, timeZone }).getTime() - rule.hours * 3_600_000);
}

/** The rule in words, to stand after "Orders close". */
export function describeCloseRule(rule: CloseRule): string {
  if (rule.kind === "hours_before") {
    if (rule.hours === 0) return "when the market opens";
    return `${rule.hours} ${rule.hours === 1 ? "hour" : "hours"} before the market opens`;
  }
  const at = `at ${formatTime(rule.time)}`;
  if (rule.daysBefore === 0) return `${at} on the day`;
  return rule.daysBefore === 1 ? `${at} the day before` : `${at}, ${rule.daysBefore} days before`;
}
