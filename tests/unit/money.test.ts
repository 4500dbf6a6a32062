import fc from "fast-check";
import { expect, test } from "vitest";
import {
  changeDue,
  formatMoney,
  lineTotal,
  orderTotals,
  parseMoney,
  roundCash,
  roundHalfEven,
  splitByLargestRemainder,
  taxOf,
} from "../../shared/domain/money.ts";

const dollars = { currency: "USD", digits: 2, locale: "en-US" };
const wholeNumber = fc.integer({ min: -1_000_000_000, max: 1_000_000_000 });

test("rounding is exact where floating point is not, and halves go to the even number", () => {
  fc.assert(
    fc.property(wholeNumber, fc.integer({ min: 1, max: 1_000_000 }), (numerator, denominator) => {
      const off = BigInt(numerator) - BigInt(roundHalfEven(numerator, denominator)) * BigInt(denominator);
      const twice = 2n * (off < 0n ? -off : off);
      expect(twice <= BigInt(denominator)).toBe(true);
      if (twice === BigInt(denominator)) expect(Math.abs(roundHalfEven(numerator, denominator) % 2)).toBe(0);
    }),
  );
  expect(roundHalfEven(9_007_199_254_740_991, 2)).toBe(4_503_599_627_370_496);
});
test("a fraction that is not of whole numbers is refused rather than guessed", () => {
  expect(() => roundHalfEven(1, 0)).toThrow(RangeError);
  expect(() => roundHalfEven(0.5, 1)).toThrow(RangeError);
  expect(() => lineTotal(9_007_199_254_740_991, 2)).toThrow(RangeError);
});
test("tax is added to the amount, or found in it where prices include it", () => {
  expect(taxOf({ amountMinor: 1_000, ratePpm: 101_000, included: false })).toBe(101);
  expect(taxOf({ amountMinor: 1_101, ratePpm: 101_000, included: true })).toBe(101);
  expect(taxOf({ amountMinor: 1_000, ratePpm: 0, included: true })).toBe(0);
  expect(taxOf({ amountMinor: 50, ratePpm: 50_000, included: false })).toBe(2);
  expect(taxOf({ amountMinor: 70, ratePpm: 50_000, included: false })).toBe(4);
});
test("the tax contained in a taxed price is the tax that was added to it, to the nearest unit", () => {
  fc.assert(
    fc.property(fc.nat({ max: 1_000_000 }), fc.nat({ max: 500_000 }), (amountMinor, ratePpm) => {
      const added = taxOf({ amountMinor, ratePpm, included: false });
      expect(Math.abs(taxOf({ amountMinor: amountMinor + added, ratePpm, included: true }) - added)).toBeLessThan(2);
    }),
  );
});
test("an order's tax is computed once, on the sum, not line by line", () => {
  const lines = [
    { priceMinor: 450, units: 2 },
    { priceMinor: 399, units: 1 },
    { priceMinor: 5, units: 3 },
  ];
  const totals = { subtotalMinor: 1_314, taxMinor: 85, totalMinor: 1_399 };
  expect(orderTotals({ lines, ratePpm: 65_000, included: false })).toEqual(totals);
  expect(orderTotals({ lines, ratePpm: 65_000, included: true })).toEqual({
    subtotalMinor: 1_314,
    taxMinor: 80,
    totalMinor: 1_314,
  });
  expect(orderTotals({ lines: [], ratePpm: 65_000, included: false }).totalMinor).toBe(0);
});
test("cash is rounded to the coin and change is what was given too much", () => {
  expect(roundCash(1_399, 5)).toBe(1_400);
  expect(roundCash(1_399, 1)).toBe(1_399);
  expect(changeDue({ dueMinor: 1_400, tenderedMinor: 2_000 })).toBe(600);
  expect(changeDue({ dueMinor: 1_400, tenderedMinor: 1_000 })).toBe(-400);
});
test("amounts are written with the currency's own digits", () => {
  expect(formatMoney(400, dollars)).toBe("$4.00");
  expect(formatMoney(-1_234_56, dollars)).toBe("-$1,234.56");
  expect(formatMoney(400, { currency: "JPY", digits: 0, locale: "en-US" })).toBe("¥400");
  expect(formatMoney(1_500, { currency: "HUF", digits: 2, locale: "en-US" })).toBe("HUF\u00a015.00");
});
test("what is typed as money is read without floating point", () => {
  expect(["4.10", "$1,234.5", "3,50", "0.07", " 12 ", "-0"].map((typed) => parseMoney(typed, 2))).toEqual([
    410, 123_450, 350, 7, 1_200, 0,
  ]);
  expect(parseMoney("12", 0)).toBe(12);
  for (const wrong of ["", "abc", "1.234", "1.2.3", "1e3", "99999999999999999999"])
    expect([wrong, parseMoney(wrong, 2)]).toEqual([wrong, null]);
});
test("an amount written for people is read back as the same amount", () => {
  fc.assert(
    fc.property(fc.nat({ max: 100_000_000 }), fc.constantFrom(0, 2, 3), (minor, digits) => {
      expect(parseMoney(formatMoney(minor, { ...dollars, digits }), digits)).toBe(minor);
    }),
  );
});
test("a total shared out by weight sums to the total, and no part is a whole unit off its share", () => {
  const weights = fc.array(fc.nat({ max: 10_000 }), { minLength: 1, maxLength: 12 }).filter((all) => all.some(Boolean));
  fc.assert(
    fc.property(fc.nat({ max: 1_000_000 }), weights, (total, all) => {
      const parts = splitByLargestRemainder(total, all);
      const sum = all.reduce((a, b) => a + b, 0);
      expect(parts.reduce((a, b) => a + b, 0)).toBe(total);
      parts.forEach((part, i) => expect(Math.abs(part - (total * (all[i] ?? 0)) / sum)).toBeLessThan(1));
    }),
  );
  expect(splitByLargestRemainder(100, [1, 1, 1])).toEqual([34, 33, 33]);
  expect(() => splitByLargestRemainder(100, [0, 0])).toThrow(RangeError);
});
