import { z } from "zod";
import { limits } from "../limits.ts";
import { addDays, plainDate, wallTime } from "./calendar.ts";
import { ruleDates, ruleProblem } from "./openingRule.ts";

export { describeRule, ruleProblem } from "./openingRule.ts";

const nextWithinDays = 400;

const dates = z.array(plainDate).max(limits.datesPerOpeningMax, `At most ${limits.datesPerOpeningMax} dates, please.`);

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

/** The dates from `from` to `to`, both included, on which the market opens: sorted, each once. An extra date counts also outside the opening's span. */
export function openingDates(opening: Opening, from: string, to: string): string[] {
  const { rrule: rule, startsOn, endsOn, exceptOn, extraOn } = opening;
  const last = endsOn !== null && endsOn < to ? endsOn : to;
  const regular = ruleDates({ rule, startsOn, from, to: last }).filter((on) => !exceptOn.includes(on));
  const extra = extraOn.filter((on) => on >= from && on <= to);
  return [...new Set([...regular, ...extra])].sort();
}

/** The first `count` dates of several openings from `from` on, with their hours, in order of day and start; it looks 400 days ahead. */
export function nextDates(openings: readonly Opening[], from: string, count: number) {
  const until = addDays(from, nextWithinDays);
  const moment = (day: { on: string; startTime: string }) => `${day.on} ${day.startTime}`;
  return openings
    .flatMap((opening) =>
      openingDates(opening, from, until).map((on) => ({ on, startTime: opening.startTime, endTime: opening.endTime })),
    )
    .sort((a, b) => (moment(a) < moment(b) ? -1 : 1))
    .slice(0, count);
}
