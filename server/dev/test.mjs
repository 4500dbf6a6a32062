// `npm test` and `npm run validate`: sets itself up, runs every check, and ends with "N passed, N failed".
import { parseArgs } from "node:util";
import { build } from "./lib/build.mjs";
import { check, npm, runPlaywright, runVitest, tally } from "./lib/checks.mjs";
import { checkNode, installChromium, installPackages, installPostgres } from "./lib/install.mjs";
import { print } from "./lib/progress.mjs";
import { cleanStaleTestClusters } from "./postgres.mjs";

const stopping = new AbortController();
const { signal } = stopping;
for (const name of ["SIGINT", "SIGTERM", "SIGHUP"]) process.on(name, () => stopping.abort());

try {
  const { values } = parseArgs({ options: { "no-browser": { type: "boolean", default: false } } });
  await setUp(!values["no-browser"]);
  await runAll(!values["no-browser"]);
} catch (error) {
  await check("set up", () => Promise.reject(error));
}
await cleanStaleTestClusters(); // of a run that was broken off just now
const { passed, failed } = tally();
process.exitCode = failed > 0 ? 1 : 0;
print(`${passed} passed, ${failed} failed`);

/** @param {boolean} hasBrowser */
async function setUp(hasBrowser) {
  checkNode();
  await Promise.all([
    installPackages(signal),
    hasBrowser ? installPostgres().then(installChromium) : installPostgres(),
  ]);
  await cleanStaleTestClusters();
}

/** @param {boolean} hasBrowser */
async function runAll(hasBrowser) {
  let isBuilt = false;
  // The long ones first, two at a time: the machine may have no more cores.
  await twoAtOnce([
    () => check("lint", script("lint")),
    () => check("types", script("types")),
    async () => (isBuilt = await check("build", async (say) => ({ result: await build({ say, signal }) }))),
    () => check("dependency rules", script("rules")),
    () => check("unused code", script("unused")),
    () => check("format", async () => ({ result: await npm("exec", ["prettier", "--check", "."], { signal }) })),
  ]);
  await check("unit, API, jobs, interface and outside checks", (say) => runVitest(say, signal));
  if (!hasBrowser) return;
  await check("browser journeys", (say) => {
    if (!isBuilt) throw new Error("not run: there is no build to drive");
    return runPlaywright(say, signal);
  });
}

/** @param {string} name of a script in package.json */
function script(name) {
  return async () => ({ result: await npm("run", [name], { signal }) });
}

/** @param {(() => Promise<unknown>)[]} tasks */
async function twoAtOnce(tasks) {
  const queue = [...tasks];
  const lane = async () => {
    for (let task = queue.shift(); task && !signal.aborted; task = queue.shift()) await task();
  };
  await Promise.all([lane(), lane()]);
}
