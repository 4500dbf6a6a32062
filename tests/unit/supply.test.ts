import fc from "fast-check";
import { expect, test } from "vitest";
import { daysOfWeek } from "../../shared/domain/calendar.ts";
import {
  brokenUnits,
  claimOn,
  lawHolds,
  releaseOn,
  roomOn,
  type SupplyDay,
  unitsLeft,
  withPromised,
} from "../../shared/domain/supply.ts";

const week = daysOfWeek("2026-06-01");
const [, tuesday = "", , thursday = "", , saturday = "", sunday = ""] = week;
const supply = (promised: readonly number[]): SupplyDay[] =>
  week.map((onDay, i) => ({ onDay, promised: promised[i] ?? 0, claimed: 0, broken: 0 }));
const flat = (units: number) => supply(week.map(() => units));
const claimed = (days: readonly SupplyDay[], onDay: string, units: number): SupplyDay[] => {
  const after = claimOn(days, onDay, units);
  if (!after) throw new Error(`no room for ${units} on ${onDay}`);
  return after;
};

test("a head promised for Sunday is no longer there for Tuesday when both draw on the same supply", () => {
  expect(roomOn(claimed(supply([0, 1, 1, 1, 1, 1, 1]), sunday, 1), tuesday)).toBe(0);
});
test("heads that come ripe on Saturday are not there on Thursday, and Thursday's claims lessen Saturday's room", () => {
  const days = claimed(supply([0, 0, 0, 5, 5, 9, 9]), thursday, 5);
  expect([roomOn(days, thursday), roomOn(days, saturday)]).toEqual([0, 4]);
});
test("more than the room is refused", () => {
  expect(claimOn(supply([0, 0, 0, 5, 5, 9, 9]), thursday, 6)).toBeNull();
});
test("a day after the harvest week has no room", () => {
  expect(roomOn(flat(5), "2026-06-08")).toBe(0);
});
test("what is given back can be claimed again, and a day gives back no more than it has", () => {
  const days = claimed(claimed(flat(5), tuesday, 2), saturday, 3);
  expect(roomOn(days, tuesday)).toBe(0);
  expect(roomOn(releaseOn(days, saturday, 3), tuesday)).toBe(3);
  expect(() => releaseOn(days, saturday, 4)).toThrow(RangeError);
  expect(() => releaseOn(days, thursday, 1)).toThrow(RangeError);
});
test("a bay that bolts breaks the promises above what is left, counted once and not day by day", () => {
  const days = withPromised(claimed(flat(10), thursday, 8), Object.fromEntries(week.map((onDay) => [onDay, 5])));
  expect(days.map((day) => day.broken)).toEqual([0, 0, 0, 3, 3, 3, 3]);
  expect(brokenUnits(days)).toBe(3);
  expect(claimOn(days, thursday, 1)).toBeNull();
  expect(brokenUnits(releaseOn(days, thursday, 2))).toBe(1);
  expect(brokenUnits(withPromised(days, { [thursday]: 8, [saturday]: 8 }))).toBe(3);
  expect(brokenUnits(withPromised(days, Object.fromEntries(week.map((onDay) => [onDay, 8]))))).toBe(0);
});
test("an offer has as many units left as its scarcest part, within the day's limit", () => {
  const parts = [
    { units: 2, days: flat(9) },
    { units: 1, days: flat(7) },
  ];
  const left = (maxUnits: number | null, taken: number) => unitsLeft({ parts, maxUnits, taken, onDay: saturday });
  expect([left(null, 0), left(3, 1), left(3, 3), left(50, 0)]).toEqual([4, 2, 0, 4]);
  expect(unitsLeft({ parts: [], maxUnits: null, taken: 0, onDay: saturday })).toBe(0);
});

type Move = { kind: "claim" | "release" | "promise"; day: number; units: number };
const moves = fc.array(
  fc.record<Move>({
    kind: fc.constantFrom("claim", "release", "promise"),
    day: fc.nat({ max: 6 }),
    units: fc.integer({ min: 1, max: 9 }),
  }),
  { maxLength: 40 },
);
const start = fc.array(fc.nat({ max: 20 }), { minLength: 7, maxLength: 7 }).map((added) => {
  let sum = 0;
  return supply(added.map((units) => (sum += units)));
});
/** The days after a move, and the claims as a plain list beside them: a release or a claim that is refused changes neither. */
function move(days: SupplyDay[], held: number[], { kind, day, units }: Move): SupplyDay[] {
  const onDay = week[day] ?? "";
  if (kind === "promise") return withPromised(days, { [onDay]: units * 3 });
  if (kind === "release") {
    if ((held[day] ?? 0) < units) return days;
    held[day] = (held[day] ?? 0) - units;
    return releaseOn(days, onDay, units);
  }
  const after = claimOn(days, onDay, units);
  if (after) held[day] = (held[day] ?? 0) + units;
  return after ?? days;
}

test("whatever is claimed, given back and edited in whatever order, the law holds and every claim is counted", () => {
  fc.assert(
    fc.property(start, moves, (first, all) => {
      const held = week.map(() => 0);
      const days = all.reduce((now, each) => move(now, held, each), first);
      expect(lawHolds(days)).toBe(true);
      expect(days.map((day) => day.claimed)).toEqual(week.map((_, i) => held.slice(0, i + 1).reduce((a, b) => a + b)));
    }),
  );
});
test("claims alone never break a promise, and no head is sold twice", () => {
  fc.assert(
    fc.property(start, moves, (first, all) => {
      const held = week.map(() => 0);
      const days = all.filter((each) => each.kind === "claim").reduce((now, each) => move(now, held, each), first);
      expect(days.every((day) => day.claimed <= day.promised && day.broken === 0)).toBe(true);
    }),
  );
});
test("exactly the room can be claimed, and one more cannot", () => {
  fc.assert(
    fc.property(start, moves, fc.nat({ max: 6 }), (first, all, day) => {
      const days = all.reduce(
        (now, each) =>
          move(
            now,
            week.map(() => 0),
            each,
          ),
        first,
      );
      const onDay = week[day] ?? "";
      const room = roomOn(days, onDay);
      expect(claimOn(days, onDay, room + 1)).toBeNull();
      expect(lawHolds(claimOn(days, onDay, room) ?? [])).toBe(true);
      if (room > 0) expect(roomOn(claimed(days, onDay, room), onDay)).toBe(0);
    }),
  );
});
