// Writes public/map/land.json: the coast of the region, clipped from OpenStreetMap's land polygons. Run by hand: node server/dev/map/clip-land.mjs
import { writeFileSync } from "node:fs";
import { mapFile, region, withPackage } from "./region.mjs";

const sides = [
  { axis: 0, at: region.west, inward: 1 },
  { axis: 0, at: region.east, inward: -1 },
  { axis: 1, at: region.south, inward: 1 },
  { axis: 1, at: region.north, inward: -1 },
];

/** The part of an open ring inside one side (Sutherland and Hodgman 1974). */
function clipSide(ring, { axis, at, inward }) {
  const isInside = (point) => (point[axis] - at) * inward >= 0;
  return ring.flatMap((a, i) => {
    const b = ring[(i + 1) % ring.length];
    const kept = isInside(a) ? [a] : [];
    if (isInside(a) === isInside(b)) return kept;
    const share = (at - a[axis]) / (b[axis] - a[axis]);
    return [...kept, [a[0] + share * (b[0] - a[0]), a[1] + share * (b[1] - a[1])]];
  });
}

const round = (degrees) => Number(degrees.toFixed(4));

/** A closed ring inside the region at four decimals; empty where nothing is left of it. */
function clipRing(ring) {
  const points = sides.reduce(clipSide, ring.slice(0, -1)).map((point) => point.map(round));
  const distinct = points.filter((point, i) => i === 0 || String(point) !== String(points[i - 1]));
  return distinct.length > 2 ? [...distinct, distinct[0]] : [];
}

/** The area of a closed ring in square degrees (the surveyor's formula). */
const area = (ring) => Math.abs(ring.slice(1).reduce((sum, [x, y], i) => sum + ring[i][0] * y - x * ring[i][1], 0)) / 2;

/** About two square kilometres here: the source cuts smaller lakes into splinters. */
const smallestLake = 2.4e-4;

const isNear = (ring) =>
  ring.some(([lng, lat]) => lng > region.west && lng < region.east && lat > region.south && lat < region.north);

await withPackage("@geo-maps/earth-lands-100m@0.6.0", (require) => {
  const land = require("@geo-maps/earth-lands-100m/map.geo.json");
  const geometries = land.features?.map((feature) => feature.geometry) ?? land.geometries ?? [land];
  const coordinates = geometries
    .flatMap((geometry) => (geometry.type === "Polygon" ? [geometry.coordinates] : geometry.coordinates))
    .filter((polygon) => isNear(polygon[0]))
    .map((polygon) =>
      polygon.map(clipRing).filter((ring, i) => ring.length > 0 && (i === 0 || area(ring) > smallestLake)),
    )
    .filter((polygon) => polygon.length > 0);
  writeFileSync(mapFile("land.json"), JSON.stringify({ type: "MultiPolygon", coordinates }));
});
