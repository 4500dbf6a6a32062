import { expect, test } from "vitest";
import {
  isPickupCode,
  normaliseCode,
  PICKUP_CODE_LENGTH,
  pickupCodeAt,
  pickupCodeCount,
} from "../../shared/domain/pickupCode.ts";

const all = Array.from({ length: pickupCodeCount }, (_, index) => pickupCodeAt(index));

test("there are thousands of pickup codes, each a different one of three characters", () => {
  expect(pickupCodeCount).toBeGreaterThanOrEqual(4_000);
  expect(new Set(all).size).toBe(pickupCodeCount);
  expect(all.every((code) => code.length === PICKUP_CODE_LENGTH)).toBe(true);
});
test("no code has a vowel or a character that looks like another", () => {
  expect(all.filter((code) => /[^CDFGHJKMNPQRTVWX2589]/.test(code))).toEqual([]);
});
test("nobody is called out by a rude code", () => {
  for (const rude of ["FCK", "FKK", "PHK", "CNT", "DCK", "WNK", "WTF", "88C", "H8R"])
    expect([rude, isPickupCode(rude)]).toEqual([rude, false]);
});
test("there is no code before the first or after the last", () => {
  for (const index of [-1, pickupCodeCount, 0.5]) expect(() => pickupCodeAt(index)).toThrow(RangeError);
});
test("a code is found however it is typed", () => {
  expect(normaliseCode(" k7-r ")).toBe("K7R");
  expect([" c9 x", "c-9-x", "C9X"].map(normaliseCode)).toEqual(["C9X", "C9X", "C9X"]);
  expect(["SZC", "B6U"].map(normaliseCode)).toEqual(["52C", "8GV"]);
  expect(all.every((code) => normaliseCode(code) === code)).toBe(true);
});
test("what is no code is not taken for one", () => {
  for (const wrong of ["", "C9", "C9XX", "c9x", "C9O", "C1X"])
    expect([wrong, isPickupCode(wrong)]).toEqual([wrong, false]);
});
