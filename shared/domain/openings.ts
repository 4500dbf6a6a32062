import { RRule } from "rrule";
import { z } from "zod";
import { limits } from "../limits.ts";
import { plainDate, wallTime } from "./calendar.ts";

const daily = new Set<number>([RRule.YEARLY, RRule.MONTHLY, RRule.WEEKLY, RRule.DAILY]);

/** What is wrong with an RFC 5545 recurrence rule, as a sentence; null when a market can follow it. */
export function ruleProblem(text: string): string | null {
  if (!/^FREQ=[A-Z]+(;[A-Z]+=[A-Z0-9,+-]+)*$/.test(text))
    return "This is not a recurrence rule, such as FREQ=WEEKLY;BYDAY=SA.";
  if (/BY(HOUR|MINUTE|SECOND)=/.test(text)) return "A market opens on days; its hours stand beside the rule.";
  try {
    const options = RRule.parseString(text);
    if (options.freq === undefined || !daily.has(options.freq)) return "A market opens daily at the most often.";
    return null;
  } catch {
    return "This is not a recurrence rule, such as FREQ=WEEKLY;BYDAY=SA.";
  }
}

const dates = z.array(plainDate).max(limits.datesPerOpeningMax);

/** One regular opening of a market: its rule, its span, its hours, and the dates left out or added. */
export const openingSchema = z
  .object({
    rrule: z.string().max(200),
    startsOn: plainDate,
    endsOn: plainDate.nullable(),
    startTime: wallTime,
    endTime: wallTime,
    exceptOn: dates,
    extraOn: dates,
  })
  .superRefine((opening, ctx) => {
    const say = (field: string, message: string) => ctx.addIssue({ code: "custom", path: [field], message });
    const problem = ruleProblem(opening.rrule);
    if (problem) say("rrule", problem);
    if (opening.endTime <= opening.startTime) say("endTime", "The market ends after it starts.");
    if (opening.endsOn !== null && opening.endsOn < opening.startsOn)
      say("endsOn", "The last date is not before the first.");
  });
export type Opening = z.infer<typeof openingSchema>;

const utc = (on: string): Date => new Date(`${on}T00:00:00Z`);

/** The dates from `from` to `to`, both included, on which the market opens: sorted, each once. Days are expanded without a zone, so daylight saving never shifts one. */
export function openingDates(opening: Opening, from: string, to: string): string[] {
  const last = opening.endsOn !== null && opening.endsOn < to ? opening.endsOn : to;
  const rule = new RRule({ ...RRule.parseString(opening.rrule), dtstart: utc(opening.startsOn) });
  const regular =
    from > last ? [] : rule.between(utc(from), utc(last), true).map((day) => day.toISOString().slice(0, 10));
  const extra = opening.extraOn.filter((on) => on >= from && on <= to);
  return [...new Set([...regular.filter((on) => !opening.exceptOn.includes(on)), ...extra])].sort();
}
