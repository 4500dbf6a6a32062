import { expect, test } from "vitest";
import { addDays, instantOf, wallOf, weekNumberOf, weekStartOf } from "../../shared/domain/calendar.ts";
import { closesAt } from "../../shared/domain/closeRule.ts";

// Computed from the published rule of the United States (Energy Policy Act of 2005: second Sunday of March to first
// Sunday of November): New York is five hours behind UTC in winter, four in summer.
test("nine in the morning in New York is another instant on either side of a change of the clocks", () => {
  const nine = (on: string) => instantOf({ on, time: "09:00", timeZone: "America/New_York" }).toISOString();
  expect(["2026-03-07", "2026-03-14", "2026-10-31", "2026-11-07"].map(nine)).toEqual([
    "2026-03-07T14:00:00.000Z",
    "2026-03-14T13:00:00.000Z",
    "2026-10-31T13:00:00.000Z",
    "2026-11-07T14:00:00.000Z",
  ]);
});

// Computed from the same rule: a Saturday morning to a Sunday morning is 23 hours in March and 25 in November.
test.each([
  ["2026-03-08", -1],
  ["2026-11-01", 1],
  ["2026-06-07", 0],
])("24 hours before a market on %s and the same clock time the day before differ by %i hours", (on, hours) => {
  const at = { on, startTime: "09:00", timeZone: "America/New_York" };
  const before = closesAt({ ...at, rule: { kind: "hours_before", hours: 24 } });
  const clock = closesAt({ ...at, rule: { kind: "clock", daysBefore: 1, time: "09:00" } });
  expect((before.getTime() - clock.getTime()) / 3_600_000).toBe(hours);
});

// Computed with the Unicode project's ICU as the JavaScript engine carries it: another reader of the same time zone data.
test.each(["America/Los_Angeles", "America/New_York", "Europe/Berlin", "Australia/Lord_Howe", "Asia/Kathmandu"])(
  "the clock of %s is read as the engine's own calendar reads it, hour by hour around a year",
  (timeZone) => {
    const form = { timeZone, dateStyle: "short", timeStyle: "short", hourCycle: "h23" } as const;
    const engine = new Intl.DateTimeFormat("sv-SE", form);
    const first = Date.UTC(2026, 0, 1, 0, 30);
    const hours = Array.from({ length: 365 * 24 }, (_, hour) => new Date(first + hour * 3_600_000));
    const wrong = hours.filter((instant) => {
      const { on, time } = wallOf(instant, timeZone);
      return `${on} ${time}` !== engine.format(instant);
    });
    expect(wrong).toEqual([]);
  },
);

// ISO 8601 week dates; computed with Python's date.isocalendar().
test.each([
  ["2005-01-01", 2004, 53],
  ["2008-12-29", 2009, 1],
  ["2026-12-31", 2026, 53],
  ["2027-01-01", 2026, 53],
  ["2027-01-04", 2027, 1],
])("%s lies in the ISO week %i-W%i", (on, year, week) => {
  expect(weekNumberOf(on)).toEqual({ year, week });
});

// Computed with Python's date.isocalendar(): the years from 2000 to 2039 that have 53 weeks.
test("the long years are 2004, 2009, 2015, 2020, 2026, 2032 and 2037", () => {
  const years = Array.from({ length: 40 }, (_, i) => 2000 + i);
  const long = years.filter((year) => weekNumberOf(addDays(weekStartOf(`${year + 1}-01-04`), -1)).week === 53);
  expect(long).toEqual([2004, 2009, 2015, 2020, 2026, 2032, 2037]);
});
