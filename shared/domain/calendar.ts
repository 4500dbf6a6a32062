import { Temporal } from "temporal-polyfill";
import { z } from "zod";

const isDate = (text: string): boolean => {
  try {
    return Temporal.PlainDate.from(text).toString() === text;
  } catch {
    return false;
  }
};

/** A date without a time: YYYY-MM-DD, and one that exists. */
export const plainDate = z.string().refine(isDate, "Give a date that exists, as year-month-day.");

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

/** The date `days` later (earlier when negative). */
export const addDays = (on: string, days: number): string => Temporal.PlainDate.from(on).add({ days }).toString();

/** The Monday of the ISO week in which the date lies. */
export const weekStartOf = (on: string): string => addDays(on, 1 - Temporal.PlainDate.from(on).dayOfWeek);

/** The ISO year and week of a date. */
export function weekNumberOf(on: string): { year: number; week: number } {
  const thursday = Temporal.PlainDate.from(weekStartOf(on)).add({ days: 3 });
  return { year: thursday.year, week: Math.ceil(thursday.dayOfYear / 7) };
}
