import { code } from "currency-codes";
import { expect, test } from "vitest";
import {
  formatMoney,
  parseMoney,
  roundCash,
  roundHalfEven,
  splitByLargestRemainder,
} from "../../shared/domain/money.ts";

// Java's documentation of RoundingMode.HALF_EVEN, its table of examples; from memory.
test.each([
  [55, 6],
  [25, 2],
  [16, 2],
  [11, 1],
  [10, 1],
  [-10, -1],
  [-11, -1],
  [-16, -2],
  [-25, -2],
  [-55, -6],
])("%i tenths round half-even to %i", (tenths, rounded) => {
  expect(roundHalfEven(tenths, 10)).toBe(rounded);
});

// The published table of cash rounding where the five-cent coin is the smallest: 1 and 2 down to 0, 3, 4, 6 and 7 to 5,
// 8 and 9 up to 10; applied once, to the cash total.
test.each([
  [210, 210],
  [211, 210],
  [212, 210],
  [213, 215],
  [214, 215],
  [215, 215],
  [216, 215],
  [217, 215],
  [218, 220],
  [219, 220],
])("a cash total of %i cents is paid as %i", (totalMinor, paidMinor) => {
  expect(roundCash(totalMinor, 5)).toBe(paidMinor);
});

// ISO 4217's minor units, published by its maintenance agency and read through currency-codes 2.2.0.
test.each([
  ["USD", 2, "12.34"],
  ["JPY", 0, "1,234"],
  ["HUF", 2, "12.34"],
  ["COP", 2, "12.34"],
  ["IQD", 3, "1.234"],
])("%s has %i minor digits, and 1234 of them are written %s", (currency, digits, written) => {
  expect(code(currency)?.digits).toBe(digits);
  expect(formatMoney(1_234, { currency, digits, locale: "en-US" })).toContain(written);
  expect(parseMoney("1234", digits)).toBe(1_234 * 10 ** digits);
});

// The textbook table of the largest remainder method with the Hare quota (100,000 votes, 10 seats); from memory.
test("ten seats go by largest remainder as 5 2 1 1 1 0", () => {
  expect(splitByLargestRemainder(10, [47_000, 16_000, 15_800, 12_000, 6_100, 3_100])).toEqual([5, 2, 1, 1, 1, 0]);
});
