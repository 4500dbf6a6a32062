type Point = { lat: number; lng: number };

const earthRadiusM = 6_371_008.8;
const metresIn = { mi: 1_609.344, km: 1_000 };
const radians = (degrees: number): number => (degrees * Math.PI) / 180;

/**
 * The great-circle distance in metres on a sphere of the Earth's mean radius (IUGG: 6371008.8 m), by the haversine
 * formula; within 0.56 % of the distance on the ellipsoid.
 */
export function distanceM(a: Point, b: Point): number {
  const across = Math.sin(radians(b.lat - a.lat) / 2) ** 2;
  const along = Math.sin(radians(b.lng - a.lng) / 2) ** 2;
  const haversine = across + Math.cos(radians(a.lat)) * Math.cos(radians(b.lat)) * along;
  return 2 * earthRadiusM * Math.asin(Math.min(1, Math.sqrt(haversine)));
}

/** Metres in the farm's unit: one decimal below ten ("2.4 mi"), whole above ("14 mi"). */
export function formatDistance(metres: number, unit: "mi" | "km"): string {
  const tenths = Math.round((metres / metresIn[unit]) * 10) / 10;
  return `${tenths < 10 ? tenths.toFixed(1) : Math.round(metres / metresIn[unit])} ${unit}`;
}
