import fc from "fast-check";
import { expect, test } from "vitest";
import { addDays, formatDay } from "../../shared/domain/calendar.ts";
import {
  describeRule,
  nextDates,
  type Opening,
  openingDates,
  openingSchema,
  ruleProblem,
} from "../../shared/domain/openings.ts";

const saturdays: Opening = {
  rrule: "FREQ=WEEKLY;BYDAY=SA",
  startsOn: "2026-05-02",
  endsOn: "2026-10-31",
  startTime: "08:00",
  endTime: "13:00",
  exceptOn: [],
  extraOn: [],
};
const wednesdays: Opening = { ...saturdays, rrule: "FREQ=WEEKLY;BYDAY=WE", startTime: "15:00", endTime: "19:00" };

test("a market opens on its Saturdays, without the one left out and with the extra day", () => {
  const opening = { ...saturdays, exceptOn: ["2026-06-13"], extraOn: ["2026-06-10", "2026-06-20"] };
  expect(openingDates(opening, "2026-06-01", "2026-06-20")).toEqual(["2026-06-06", "2026-06-10", "2026-06-20"]);
});
test("the first and the last day of the season are open, the weeks around them are not", () => {
  const season = openingDates(saturdays, "2026-01-01", "2026-12-31");
  expect([season[0], season.at(-1), season.length]).toEqual(["2026-05-02", "2026-10-31", 27]);
});
test("an extra day may lie outside the season", () => {
  const opening = { ...saturdays, extraOn: ["2026-12-19"] };
  expect(openingDates(opening, "2026-12-01", "2026-12-31")).toEqual(["2026-12-19"]);
});
test("asking for a span that ends before it begins gives no dates", () => {
  expect(openingDates(saturdays, "2026-06-20", "2026-06-01")).toEqual([]);
});
test("a Saturday market stays on Saturdays in whatever season, over every change of the clocks", () => {
  fc.assert(
    fc.property(fc.integer({ min: 0, max: 4_000 }), fc.integer({ min: 1, max: 120 }), (start, span) => {
      const from = addDays("2026-05-02", start);
      const dates = openingDates({ ...saturdays, endsOn: null }, from, addDays(from, span));
      expect(new Set(dates.map((on) => formatDay(on, "weekday"))).size).toBeLessThanOrEqual(1);
      expect(dates.every((on) => formatDay(on, "weekday") === "Saturday")).toBe(true);
      expect(dates.length).toBeGreaterThanOrEqual(Math.floor((span + 1) / 7));
    }),
  );
});
test("the next dates of two openings come in order with their own hours", () => {
  expect(nextDates([saturdays, wednesdays], "2026-06-03", 3)).toEqual([
    { on: "2026-06-03", startTime: "15:00", endTime: "19:00" },
    { on: "2026-06-06", startTime: "08:00", endTime: "13:00" },
    { on: "2026-06-10", startTime: "15:00", endTime: "19:00" },
  ]);
  expect(nextDates([], "2026-06-03", 3)).toEqual([]);
});
test("a rule that never comes true gives no dates", () => {
  const never = { ...saturdays, rrule: "FREQ=MONTHLY;BYMONTH=2;BYMONTHDAY=30", endsOn: null };
  expect(ruleProblem(never.rrule)).toBeNull();
  expect(openingDates(never, "2026-01-01", "2030-01-01")).toEqual([]);
});
test.each([
  ["FREQ=HOURLY", /daily at the most/],
  ["FREQ=MINUTELY;BYDAY=SA", /daily at the most/],
  ["FREQ=DAILY;BYHOUR=8,9", /hours stand beside/],
  ["DTSTART:20260606T080000Z\nRRULE:FREQ=WEEKLY", /not a recurrence rule/],
  ["DTSTART=20260606;FREQ=WEEKLY", /first date stands beside/],
  ["RRULE:FREQ=WEEKLY", /not a recurrence rule/],
  ["every Saturday", /not a recurrence rule/],
  ["", /not a recurrence rule/],
  ["BYDAY=SA", /not a recurrence rule/],
  ["FREQ=WEEKLY;FREQ=DAILY", /not a recurrence rule/],
  ["FREQ=WEEKLY;BYDAY=XX", /not possible/],
  ["FREQ=WEEKLY;INTERVAL=0", /not possible/],
  ["FREQ=WEEKLY;INTERVAL=-1", /not possible/],
  ["FREQ=WEEKLY;COUNT=99999", /not possible/],
  ["FREQ=WEEKLY;UNTIL=20260231", /date that exists/],
  ["FREQ=WEEKLY;COUNT=3;UNTIL=20261031", /not both/],
  ["FREQ=WEEKLY;BYDAY=1SA", /without a number/],
  ["FREQ=WEEKLY;BYMONTHDAY=1", /no BYMONTHDAY/],
  ["FREQ=DAILY;INTERVAL=7;BYDAY=MO", /FREQ=WEEKLY with BYDAY/],
  ["FREQ=WEEKLY;BYSETPOS=1", /no BYSETPOS/],
  [`FREQ=WEEKLY;BYDAY=${"SA,".repeat(90)}SA`, /not a recurrence rule/],
])("the rule %j is refused with a sentence", (rule, sentence) => {
  expect(ruleProblem(rule)).toMatch(sentence);
});
test("whatever is typed as a rule is answered, never thrown at", () => {
  fc.assert(fc.property(fc.string(), (text) => ruleProblem(text) !== ""));
});
test("rules are told in words", () => {
  expect(describeRule("FREQ=WEEKLY;BYDAY=SA")).toBe("Every Saturday");
  expect(describeRule("FREQ=WEEKLY;BYDAY=TU,WE,SA")).toBe("Every Tuesday, Wednesday and Saturday");
  expect(describeRule("FREQ=WEEKLY;INTERVAL=2;BYDAY=WE")).toBe("Every 2 weeks on Wednesday");
  expect(describeRule("FREQ=MONTHLY;BYDAY=1SA")).toBe("Every month on the 1st Saturday");
  expect(describeRule("FREQ=WEEKLY;BYDAY=SA,SU;UNTIL=20261031")).toBe(
    "Every Saturday and Sunday until October 31, 2026",
  );
});
test("an opening with hours, span or rule the wrong way round names the field", () => {
  const wrong = { ...saturdays, rrule: "FREQ=HOURLY", endTime: "08:00", endsOn: "2026-05-01" };
  const problems = openingSchema.safeParse(wrong).error?.issues.map((issue) => issue.path[0]);
  expect(problems?.sort()).toEqual(["endTime", "endsOn", "rrule"]);
  expect(openingSchema.safeParse(saturdays).success).toBe(true);
});
test("an opening takes no more single dates than its limit", () => {
  const exceptOn = Array.from({ length: 121 }, (_, i) => addDays("2026-05-02", i));
  expect(openingSchema.safeParse({ ...saturdays, exceptOn }).success).toBe(false);
});
