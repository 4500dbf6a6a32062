import fc from "fast-check";
import { expect, test } from "vitest";
import { claimOn, lawHolds, roomOn, type SupplyDay } from "../../shared/domain/supply.ts";

const week = ["2026-06-01", "2026-06-02", "2026-06-03", "2026-06-04", "2026-06-05", "2026-06-06", "2026-06-07"];
const supply = (promised: number[]): SupplyDay[] =>
  week.map((onDay, i) => ({ onDay, promised: promised[i] ?? 0, claimed: 0, broken: 0 }));

test("a head promised for Sunday is no longer there for Tuesday when both draw on the same supply", () => {
  const days = claimOn(supply([0, 1, 1, 1, 1, 1, 1]), "2026-06-07", 1);
  expect(days && roomOn(days, "2026-06-02")).toBe(0);
});
test("more than the room is refused, and the days stay as they were", () => {
  expect(claimOn(supply([0, 0, 0, 5, 5, 9, 9]), "2026-06-04", 6)).toBeNull();
});
test("whatever is claimed in whatever order, no head is sold twice", () => {
  const claims = fc.array(fc.tuple(fc.nat({ max: 6 }), fc.integer({ min: 1, max: 9 })), { maxLength: 40 });
  fc.assert(
    fc.property(fc.array(fc.nat({ max: 20 }), { minLength: 7, maxLength: 7 }), claims, (added, wanted) => {
      let sum = 0;
      const days = wanted.reduce(
        (now, [i, units]) => claimOn(now, week[i] ?? "", units) ?? now,
        supply(added.map((n) => (sum += n))),
      );
      expect(lawHolds(days)).toBe(true);
    }),
  );
});
