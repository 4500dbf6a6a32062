import fc from "fast-check";
import { expect, test } from "vitest";
import { distanceM, formatDistance } from "../../shared/domain/distance.ts";

const point = fc.record({
  lat: fc.double({ min: -90, max: 90, noNaN: true }),
  lng: fc.double({ min: -180, max: 180, noNaN: true }),
});

test("it is as far there as back, and nowhere is further than half way round", () => {
  fc.assert(
    fc.property(point, point, (a, b) => {
      expect(distanceM(a, b)).toBeCloseTo(distanceM(b, a), 3);
      expect(distanceM(a, b)).toBeLessThanOrEqual(Math.PI * 6_371_008.8 + 1e-6);
      expect(distanceM(a, a)).toBe(0);
    }),
  );
});
test("two markets on either side of the date line are near each other", () => {
  expect(distanceM({ lat: 0, lng: 179.9 }, { lat: 0, lng: -179.9 })).toBeLessThan(22_300);
});
test("distances are written with one decimal while that says something", () => {
  expect(formatDistance(3_862, "mi")).toBe("2.4 mi");
  expect(formatDistance(3_862, "km")).toBe("3.9 km");
  expect(formatDistance(22_531, "mi")).toBe("14 mi");
  expect(formatDistance(9_960, "km")).toBe("10 km");
  expect(formatDistance(0, "mi")).toBe("0.0 mi");
});
