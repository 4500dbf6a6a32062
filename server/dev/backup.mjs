// `npm run backup [-- file]`: the database of DATABASE_URL, or the demo's, into one file.
import path from "node:path";
import { backupDatabase } from "./lib/backups.mjs";
import { withDatabase } from "./lib/demo.mjs";
import { keepDir } from "./lib/folders.mjs";
import { fail, print, step } from "./lib/progress.mjs";

try {
  const stamp = new Date().toISOString().slice(0, 19).replaceAll(":", "-");
  const file = process.argv[2] ?? path.join(keepDir, "backups", `${stamp}.dump`);
  const { bytes } = await withDatabase((url) => step("backup", () => backupDatabase({ url, file })));
  print(`${file} (${(bytes / 1_000_000).toFixed(1)} MB)`);
} catch (error) {
  fail(error);
}
