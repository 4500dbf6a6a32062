import { expect, test } from "vitest";
import { closeRuleSchema, closesAt, describeCloseRule } from "../../shared/domain/closeRule.ts";

const timeZone = "America/New_York";
const dayBefore = { kind: "clock", daysBefore: 1, time: "18:00" } as const;
const closing = (on: string, rule: Parameters<typeof closesAt>[0]["rule"]) =>
  closesAt({ on, startTime: "09:00", rule, timeZone }).toISOString();

test("orders for a Saturday market close at 18:00 on Friday", () => {
  expect(closing("2026-06-06", dayBefore)).toBe("2026-06-05T22:00:00.000Z");
});
test("orders for the Sunday market of a clock change close at 18:00 on the Saturday, by the clock of the Saturday", () => {
  expect(closing("2026-03-08", dayBefore)).toBe("2026-03-07T23:00:00.000Z");
  expect(closing("2026-11-01", dayBefore)).toBe("2026-10-31T22:00:00.000Z");
});
test("24 hours before and the same clock time the day before are one hour apart when the clocks change", () => {
  const day = { kind: "hours_before", hours: 24 } as const;
  const clock = { kind: "clock", daysBefore: 1, time: "09:00" } as const;
  expect(closing("2026-03-08", day)).toBe("2026-03-07T13:00:00.000Z");
  expect(closing("2026-03-08", clock)).toBe("2026-03-07T14:00:00.000Z");
  expect(closing("2026-11-01", day)).toBe("2026-10-31T14:00:00.000Z");
  expect(closing("2026-11-01", clock)).toBe("2026-10-31T13:00:00.000Z");
  expect(closing("2026-06-07", day)).toBe(closing("2026-06-07", clock));
});
test("orders may close on Wednesday at 17:00 for Saturday at 10:00, 65 hours ahead", () => {
  const at = { on: "2026-06-06", startTime: "10:00", timeZone };
  const byClock = closesAt({ ...at, rule: { kind: "clock", daysBefore: 3, time: "17:00" } });
  expect(closesAt({ ...at, rule: { kind: "hours_before", hours: 65 } })).toEqual(byClock);
});
test("a close rule reaches back two weeks at the most and never past the opening", () => {
  const accepts = (rule: unknown) => closeRuleSchema.safeParse(rule).success;
  expect(accepts({ kind: "hours_before", hours: 336 })).toBe(true);
  expect(accepts({ kind: "hours_before", hours: 337 })).toBe(false);
  expect(accepts({ kind: "hours_before", hours: -1 })).toBe(false);
  expect(accepts({ kind: "clock", daysBefore: 15, time: "18:00" })).toBe(false);
  expect(accepts({ kind: "clock", daysBefore: 1, time: "25:00" })).toBe(false);
  expect(accepts({ kind: "whenever" })).toBe(false);
});
test("the rule reads on from 'orders close'", () => {
  expect(describeCloseRule(dayBefore)).toBe("at 18:00 the day before");
  expect(describeCloseRule({ kind: "clock", daysBefore: 3, time: "08:00" })).toBe("at 8:00, 3 days before");
  expect(describeCloseRule({ kind: "clock", daysBefore: 0, time: "06:00" })).toBe("at 6:00 on the day");
  expect(describeCloseRule({ kind: "hours_before", hours: 1 })).toBe("1 hour before the market opens");
  expect(describeCloseRule({ kind: "hours_before", hours: 0 })).toBe("when the market opens");
});
