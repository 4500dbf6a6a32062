import { execFileSync } from "node:child_process";
import { mkdtempSync, rmSync } from "node:fs";
import { createRequire } from "node:module";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { fileURLToPath } from "node:url";

/** The region the map shows, in degrees. */
export const region = { west: -124.3, south: 46.9, east: -121.6, north: 49.05 };

/** Where a map file is written. */
export const mapFile = (name) => fileURLToPath(new URL(`../../../public/map/${name}`, import.meta.url));

/** Fetches a package into a folder of its own, hands `use` a require that finds it, and removes the folder. */
export async function withPackage(spec, use) {
  const folder = mkdtempSync(join(tmpdir(), "loamless-map-"));
  try {
    execFileSync("npm", ["install", "--prefix", folder, "--no-audit", "--no-fund", "--ignore-scripts", spec]);
    return await use(createRequire(join(folder, "package.json")));
  } finally {
    rmSync(folder, { recursive: true });
  }
}
