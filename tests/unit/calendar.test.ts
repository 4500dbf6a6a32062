import fc from "fast-check";
import { expect, test } from "vitest";
import {
  addDays,
  daysBetween,
  daysOfWeek,
  formatDay,
  formatMoment,
  formatMomentShort,
  formatTime,
  instantOf,
  isPlainDate,
  isTimeZone,
  plainDate,
  wallOf,
  wallTime,
  weekStartOf,
} from "../../shared/domain/calendar.ts";

const timeZone = "America/Los_Angeles";
const anyDate = fc.integer({ min: -9_000, max: 9_000 }).map((days) => addDays("2026-06-06", days));

test("a harvest week runs from Monday to Sunday", () => {
  expect(weekStartOf("2026-06-07")).toBe("2026-06-01");
  expect(weekStartOf("2026-06-08")).toBe("2026-06-08");
  expect(daysOfWeek("2026-06-29")).toEqual([
    "2026-06-29",
    "2026-06-30",
    "2026-07-01",
    "2026-07-02",
    "2026-07-03",
    "2026-07-04",
    "2026-07-05",
  ]);
});
test("every date lies in the week that starts on its Monday", () => {
  fc.assert(
    fc.property(anyDate, (on) => {
      const monday = weekStartOf(on);
      expect(formatDay(monday, "weekday")).toBe("Monday");
      expect(daysOfWeek(monday)).toContain(on);
    }),
  );
});
test("days between two dates are counted over months and over a change of the clocks", () => {
  expect(daysBetween("2026-03-07", "2026-03-09")).toBe(2);
  expect(daysBetween("2026-07-04", "2026-02-28")).toBe(-126);
  fc.assert(
    fc.property(anyDate, fc.integer({ min: -800, max: 800 }), (on, days) => {
      expect(daysBetween(on, addDays(on, days))).toBe(days);
    }),
  );
});
test("a date or a time that does not exist is refused", () => {
  const wrongDates = ["2026-02-30", "2026-2-3", "20260203", "+012026-01-01", "2026-06-06T08:00", "", "today"];
  for (const wrong of wrongDates) expect([wrong, isPlainDate(wrong)]).toEqual([wrong, false]);
  expect(plainDate.safeParse("2028-02-29").success).toBe(true);
  for (const wrong of ["24:00", "8:00", "08:60", "08:00:00"]) expect(wallTime.safeParse(wrong).success).toBe(false);
  expect(wallTime.safeParse("23:59").success).toBe(true);
});
test("a time zone is one of the world's, by name", () => {
  expect(["America/Los_Angeles", "UTC"].map(isTimeZone)).toEqual([true, true]);
  expect(["America/Springfield", "+02:00", ""].map(isTimeZone)).toEqual([false, false, false]);
});
test("the hour that is skipped in spring is read an hour on, the hour that comes twice in autumn as the first", () => {
  const at = (on: string, time: string) => instantOf({ on, time, timeZone }).toISOString();
  expect(at("2026-03-08", "02:30")).toBe("2026-03-08T10:30:00.000Z");
  expect(at("2026-11-01", "01:30")).toBe("2026-11-01T08:30:00.000Z");
});
test("the wall clock read back from an instant is the one that was set", () => {
  fc.assert(
    fc.property(anyDate, fc.integer({ min: 4, max: 23 }), fc.integer({ min: 10, max: 59 }), (on, hour, minute) => {
      const time = `${String(hour).padStart(2, "0")}:${minute}`;
      expect(wallOf(instantOf({ on, time, timeZone }), timeZone)).toEqual({ on, time });
    }),
  );
});
test("days, times and moments are written as people say them", () => {
  expect(formatDay("2026-06-06", "long")).toBe("Saturday 6 June");
  expect(formatDay("2026-06-06", "short")).toBe("Sat 6 Jun");
  expect(["08:00", "18:00", "00:30"].map(formatTime)).toEqual(["8:00", "18:00", "0:30"]);
  const close = new Date("2026-06-06T01:00:00Z");
  expect(formatMoment(close, timeZone)).toBe("Friday 5 June 18:00");
  expect(formatMomentShort(close, timeZone)).toBe("Fri 18:00");
});
