import ICAL from "ical.js";
import { expect, test } from "vitest";
import { addDays, instantOf } from "../../shared/domain/calendar.ts";
import { openingDates } from "../../shared/domain/openings.ts";

/** The first `count` dates of a rule that begins on `startsOn`. */
function firstDates(rrule: string, startsOn: string, count: number): string[] {
  const hours = { startTime: "09:00", endTime: "12:00", endsOn: null, exceptOn: [], extraOn: [] };
  return openingDates({ rrule, startsOn, ...hours }, startsOn, addDays(startsOn, 500)).slice(0, count);
}

// RFC 5545, section 3.8.5.3, the examples. The first and the two with WKST were read there; the others are its examples
// from memory, each checked a second time below against another program.
const examples: [rule: string, dates: string][] = [
  [
    "FREQ=WEEKLY;COUNT=10",
    "1997-09-02 1997-09-09 1997-09-16 1997-09-23 1997-09-30 1997-10-07 1997-10-14 1997-10-21 1997-10-28 1997-11-04",
  ],
  ["FREQ=WEEKLY;INTERVAL=2;COUNT=4;BYDAY=TU,SU;WKST=MO", "1997-08-05 1997-08-10 1997-08-19 1997-08-24"],
  ["FREQ=WEEKLY;INTERVAL=2;COUNT=4;BYDAY=TU,SU;WKST=SU", "1997-08-05 1997-08-17 1997-08-19 1997-08-31"],
  ["FREQ=DAILY;INTERVAL=10;COUNT=5", "1997-09-02 1997-09-12 1997-09-22 1997-10-02 1997-10-12"],
  [
    "FREQ=WEEKLY;COUNT=10;WKST=SU;BYDAY=TU,TH",
    "1997-09-02 1997-09-04 1997-09-09 1997-09-11 1997-09-16 1997-09-18 1997-09-23 1997-09-25 1997-09-30 1997-10-02",
  ],
  [
    "FREQ=MONTHLY;COUNT=10;BYDAY=1FR",
    "1997-09-05 1997-10-03 1997-11-07 1997-12-05 1998-01-02 1998-02-06 1998-03-06 1998-04-03 1998-05-01 1998-06-05",
  ],
  [
    "FREQ=MONTHLY;INTERVAL=2;COUNT=10;BYDAY=1SU,-1SU",
    "1997-09-07 1997-09-28 1997-11-02 1997-11-30 1998-01-04 1998-01-25 1998-03-01 1998-03-29 1998-05-03 1998-05-31",
  ],
  ["FREQ=MONTHLY;COUNT=6;BYDAY=-2MO", "1997-09-22 1997-10-20 1997-11-17 1997-12-22 1998-01-19 1998-02-16"],
  ["FREQ=MONTHLY;BYMONTHDAY=-3", "1997-09-28 1997-10-29 1997-11-28 1997-12-29 1998-01-29 1998-02-26"],
  [
    "FREQ=MONTHLY;BYDAY=SA;BYMONTHDAY=7,8,9,10,11,12,13",
    "1997-09-13 1997-10-11 1997-11-08 1997-12-13 1998-01-10 1998-02-07 1998-03-07 1998-04-11 1998-05-09 1998-06-13",
  ],
  ["FREQ=MONTHLY;BYMONTHDAY=15,30;COUNT=5", "2007-01-15 2007-01-30 2007-02-15 2007-03-15 2007-03-30"],
];

test.each(examples)("a market that follows %s opens on the days RFC 5545 gives", (rule, written) => {
  const dates = written.split(" ");
  expect(firstDates(rule, dates[0] ?? "", dates.length)).toEqual(dates);
});

// Computed with ical.js 2.2.1, an independent reading of RFC 5545.
test.each(examples)("ical.js gives the same days for %s", (rule, written) => {
  const dates = written.split(" ");
  const days = ICAL.Recur.fromString(rule).iterator(ICAL.Time.fromDateString(dates[0] ?? ""));
  expect(dates.map(() => days.next()?.toString())).toEqual(dates);
});

// RFC 5545, section 3.8.5.3: the first example stands at 9:00 AM in New York, before (EDT) and after (EST) the change of
// 26 October 1997. The instants are computed from the published offsets, -04:00 and -05:00.
test("a weekly opening at nine stays at nine by the clock when summer time ends", () => {
  const opens = firstDates("FREQ=WEEKLY;COUNT=10", "1997-09-02", 10).map((on) =>
    instantOf({ on, time: "09:00", timeZone: "America/New_York" }).toISOString().slice(11, 16),
  );
  expect(opens).toEqual([...Array<string>(8).fill("13:00"), "14:00", "14:00"]);
});
