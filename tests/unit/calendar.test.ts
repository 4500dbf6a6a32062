import { expect, test } from "vitest";
import { instantOf, plainDate, weekNumberOf, weekStartOf } from "../../shared/domain/calendar.ts";
import { closesAt } from "../../shared/domain/closeRule.ts";
import { openingDates, ruleProblem } from "../../shared/domain/openings.ts";

const newYork = "America/New_York";
const saturdays = {
  rrule: "FREQ=WEEKLY;BYDAY=SA",
  startsOn: "2026-06-01",
  endsOn: null,
  startTime: "08:00",
  endTime: "13:00",
  exceptOn: ["2026-06-13"],
  extraOn: ["2026-06-10"],
};

test("a market opens on its Saturdays, without the one left out and with the extra day", () => {
  expect(openingDates(saturdays, "2026-06-01", "2026-06-20")).toEqual(["2026-06-06", "2026-06-10", "2026-06-20"]);
});
test("orders for a Sunday market close at 18:00 on the Saturday before the clocks change", () => {
  const rule = { kind: "clock", daysBefore: 1, time: "18:00" } as const;
  expect(closesAt({ on: "2026-03-08", startTime: "09:00", rule, timeZone: newYork }).toISOString()).toBe(
    "2026-03-07T23:00:00.000Z",
  );
});
test("24 hours before and the same clock time the day before differ by an hour when the clocks change", () => {
  const at = { on: "2026-03-08", startTime: "09:00", timeZone: newYork };
  const hours = closesAt({ ...at, rule: { kind: "hours_before", hours: 24 } });
  const clock = closesAt({ ...at, rule: { kind: "clock", daysBefore: 1, time: "09:00" } });
  expect(clock.getTime() - hours.getTime()).toBe(3_600_000);
});
test("nine in the morning in New York is another instant on either side of the change", () => {
  const nine = (on: string) => instantOf({ on, time: "09:00", timeZone: newYork }).toISOString().slice(11, 16);
  expect(["2026-03-07", "2026-03-14", "2026-10-31", "2026-11-07"].map(nine)).toEqual([
    "14:00",
    "13:00",
    "13:00",
    "14:00",
  ]);
});
test("the ISO week of a date, also around New Year", () => {
  expect(["2005-01-01", "2008-12-29", "2026-12-31", "2027-01-01"].map((on) => Object.values(weekNumberOf(on)))).toEqual(
    [
      [2004, 53],
      [2009, 1],
      [2026, 53],
      [2026, 53],
    ],
  );
  expect(weekStartOf("2026-06-07")).toBe("2026-06-01");
});
test("a date that does not exist, an hourly rule and garbage are refused", () => {
  expect(plainDate.safeParse("2026-02-30").success).toBe(false);
  expect(ruleProblem("FREQ=HOURLY")).toMatch(/daily/);
  expect(ruleProblem("every Saturday")).toMatch(/not a recurrence rule/);
  expect(ruleProblem(saturdays.rrule)).toBeNull();
});
