// `npm run restore -- file [--yes]`: a backup in the place of the database of DATABASE_URL, or the demo's.
import { parseArgs } from "node:util";
import { restoreDatabase } from "./lib/backups.mjs";
import { withDatabase } from "./lib/demo.mjs";
import { fail, print, step } from "./lib/progress.mjs";

try {
  const options = /** @type {const} */ ({ yes: { type: "boolean", default: false } });
  const { values, positionals } = parseArgs({ allowPositionals: true, options });
  const [file] = positionals;
  if (!file) throw new Error("Say which backup:  npm run restore -- .data/backups/<file>.dump");
  const restore = (/** @type {string} */ url) => restoreDatabase({ url, file, isForced: values.yes });
  const { replaced } = await withDatabase((url) => step("restore", () => restore(url)));
  print(
    replaced ? `Done. What was there before is kept in the database "${replaced}" until the next restore.` : "Done.",
  );
} catch (error) {
  fail(error);
}
