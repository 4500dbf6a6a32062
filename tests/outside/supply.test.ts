import { expect, test } from "vitest";
import { addDays } from "../../shared/domain/calendar.ts";
import { roomOn } from "../../shared/domain/supply.ts";

// W. J. Stevenson, Operations Management, the chapter on master scheduling: available to promise. From memory, not read
// again. On hand 64; lots of 70 arrive in periods 3, 5, 7 and 8; orders 33 20 10 4 2 0 0 0; the book's answer is
// 11, -, 56, -, 68, -, 70, 70, each counted from one lot to the next. Here the counts are cumulative, so the book's
// figures are the steps between our rooms.
test("what can be promised over eight periods is Stevenson's 11, 56, 68, 70 and 70", () => {
  const arriving = [64, 0, 70, 0, 70, 0, 70, 70];
  const orders = [33, 20, 10, 4, 2, 0, 0, 0];
  const upTo = (all: number[], period: number) => all.slice(0, period + 1).reduce((a, b) => a + b);
  const days = orders.map((_, period) => ({
    onDay: addDays("2026-06-01", period),
    promised: upTo(arriving, period),
    claimed: upTo(orders, period),
    broken: 0,
  }));
  const rooms = days.map((day) => roomOn(days, day.onDay));
  expect(rooms).toEqual([11, 11, 67, 67, 135, 135, 205, 275]);
  expect(rooms.map((room, period) => room - (rooms[period - 1] ?? 0))).toEqual([11, 0, 56, 0, 68, 0, 70, 70]);
});
