import { Temporal } from "temporal-polyfill";
import { z } from "zod";

const weekdays = ["Monday", "Tuesday", "Wednesday", "Thursday", "Friday", "Saturday", "Sunday"];
const months = "January February March April May June July August September October November December".split(" ");

/** Whether the text is a date that exists, written YYYY-MM-DD. */
export function isPlainDate(text: string): boolean {
  try {
    return /^\d{4}-/.test(text) && Temporal.PlainDate.from(text).toString() === text;
  } catch {
    return false;
  }
}

/** Whether the text names a time zone of the IANA list, such as America/Los_Angeles. */
export function isTimeZone(text: string): boolean {
  try {
    return /^[A-Za-z]/.test(text) && new Intl.DateTimeFormat("en", { timeZone: text }) instanceof Intl.DateTimeFormat;
  } catch {
    return false;
  }
}

/** A date without a time: YYYY-MM-DD, and one that exists. */
export const plainDate = z.string().refine(isPlainDate, "Give a date that exists, as year-month-day.");

/** A wall time of the farm's day: HH:MM, 00:00 to 23:59. */
export const wallTime = z.string().regex(/^([01]\d|2[0-3]):[0-5]\d$/, "Give a time such as 08:00.");

/**
 * The instant at which the clock in `timeZone` shows `time` on `on`. A time that daylight saving skips is moved forward
 * by the gap; one that comes twice is the first of the two (RFC 5545's reading, Temporal's "compatible").
 */
export function instantOf({ on, time, timeZone }: { on: string; time: string; timeZone: string }): Date {
  const zoned = Temporal.PlainDateTime.from(`${on}T${time}`).toZonedDateTime(timeZone, {
    disambiguation: "compatible",
  });
  return new Date(zoned.epochMilliseconds);
}

/** The date and the wall time, to the minute, that the clock in `timeZone` shows at an instant. */
export function wallOf(instant: Date, timeZone: string): { on: string; time: string } {
  const zoned = Temporal.Instant.fromEpochMilliseconds(instant.getTime()).toZonedDateTimeISO(timeZone);
  return { on: zoned.toPlainDate().toString(), time: zoned.toPlainTime().toString().slice(0, 5) };
}

/** The date `days` later (earlier when negative). */
export const addDays = (on: string, days: number): string => Temporal.PlainDate.from(on).add({ days }).toString();

/** How many days `to` is after `from`; negative when it is before. */
export const daysBetween = (from: string, to: string): number => Temporal.PlainDate.from(from).until(to).days;

/** The Monday of the ISO week in which the date lies. */
export const weekStartOf = (on: string): string => addDays(on, 1 - Temporal.PlainDate.from(on).dayOfWeek);

/** Seven dates in a row, beginning with `startsOn`. */
export const daysOfWeek = (startsOn: string): string[] => weekdays.map((_, day) => addDays(startsOn, day));

/** The ISO 8601 year and week of a date. */
export function weekNumberOf(on: string): { year: number; week: number } {
  const thursday = Temporal.PlainDate.from(weekStartOf(on)).add({ days: 3 });
  return { year: thursday.year, week: Math.ceil(thursday.dayOfYear / 7) };
}

/** A date in words: "Saturday 6 June", "Sat 6 Jun", or only "Saturday". */
export function formatDay(on: string, style: "long" | "short" | "weekday"): string {
  const { dayOfWeek, day, month } = Temporal.PlainDate.from(on);
  const weekday = weekdays[dayOfWeek - 1] ?? "";
  if (style === "weekday") return weekday;
  const name = months[month - 1] ?? "";
  return style === "long" ? `${weekday} ${day} ${name}` : `${weekday.slice(0, 3)} ${day} ${name.slice(0, 3)}`;
}

/** A wall time as people write it on a 24-hour clock: "08:00" is "8:00". */
export const formatTime = (time: string): string => time.replace(/^0(?=\d)/, "");

/** An instant on the clock in `timeZone`: "Friday 5 June 18:00". */
export function formatMoment(instant: Date, timeZone: string): string {
  const { on, time } = wallOf(instant, timeZone);
  return `${formatDay(on, "long")} ${formatTime(time)}`;
}

/** An instant of this week on the clock in `timeZone`: "Fri 18:00". */
export function formatMomentShort(instant: Date, timeZone: string): string {
  const { on, time } = wallOf(instant, timeZone);
  return `${formatDay(on, "weekday").slice(0, 3)} ${formatTime(time)}`;
}
