// `npm run prove`: the randomised and kill-point runs, long. `npm test` runs a small seeded sample of each.
import { spawn } from "node:child_process";
import { once } from "node:events";
import { rootDir } from "./lib/folders.mjs";
import { checkNode, installPackages, installPostgres } from "./lib/install.mjs";
import { fail } from "./lib/progress.mjs";
import { cleanStaleTestClusters } from "./postgres.mjs";

const manyRuns = "2000";

try {
  checkNode();
  await installPackages();
  await installPostgres();
  await cleanStaleTestClusters();
  const args = ["exec", "--no", "--", "vitest", "run", "tests/prove", ...process.argv.slice(2)];
  const env = { PROVE_RUNS: manyRuns, ...process.env };
  const [code] = await once(spawn("npm", args, { cwd: rootDir, env, stdio: "inherit" }), "exit");
  process.exitCode = code ?? 1;
} catch (error) {
  fail(error);
}
