// The checks of `npm test`: each runs to its end, shows what failed, and counts.
import fs from "node:fs";
import path from "node:path";
import { rootDir } from "./folders.mjs";
import { run } from "./processes.mjs";
import { print, step } from "./progress.mjs";

/** @typedef {{ passed: number, failed: number }} Count */
/** @typedef {import("./processes.mjs").RunResult} RunResult */

const reportDir = path.join(rootDir, ".cache");
const totals = { passed: 0, failed: 0 };

/** What has passed and failed so far. */
export const tally = () => ({ ...totals });

/**
 * Runs one check, shows its output when it failed, and adds it to the tally.
 * @param {string} title
 * @param {(say: (text: string) => void) => Promise<{ result: RunResult, count?: Count }>} work a check without a count
 *   counts as one
 * @returns {Promise<boolean>} passed
 */
export async function check(title, work) {
  const { result, count } = await step(
    title,
    (say) => settled(work, say),
    ({ count }) => count.failed === 0,
  );
  totals.passed += count.passed;
  totals.failed += count.failed;
  if (count.failed > 0) print(indent(`${result.stdout}${result.stderr}`));
  return count.failed === 0;
}

/** @param {Parameters<typeof check>[1]} work @param {(text: string) => void} say */
async function settled(work, say) {
  try {
    const { result, count = { passed: 0, failed: 0 } } = await work(say);
    const isGood = result.code === 0;
    if (count.passed + count.failed === 0) count[isGood ? "passed" : "failed"] = 1;
    if (!isGood && count.failed === 0) count.failed = 1;
    return { result, count };
  } catch (error) {
    const stderr = error instanceof Error ? error.message : String(error);
    return { result: { code: 1, stdout: "", stderr }, count: { passed: 0, failed: 1 } };
  }
}

/**
 * Runs a script of package.json, or a program of node_modules.
 * @param {"run" | "exec"} how
 * @param {string[]} command
 * @param {{ env?: NodeJS.ProcessEnv, onOutput?: (text: string) => void, signal?: AbortSignal }} options
 */
export function npm(how, command, { env, ...options }) {
  const args = how === "run" ? ["run", "--silent", ...command] : ["exec", "--no", "--", ...command];
  return run("npm", args, {
    ...options,
    cwd: rootDir,
    isGroup: true,
    env: { ...process.env, FORCE_COLOR: undefined, NO_COLOR: "1", ...env },
  });
}

/**
 * Runs vitest and counts its tests.
 * @param {(text: string) => void} say
 * @param {AbortSignal} signal
 */
export async function runVitest(say, signal) {
  const report = freshReport("vitest.json");
  const reporters = ["--reporter=default", "--reporter=json", `--outputFile.json=${report}`];
  const result = await npm("exec", ["vitest", "run", ...reporters], { signal, onOutput: lastLine(say) });
  const found = readReport(report);
  const failedFiles = (found?.testResults ?? []).filter(hasFailedOutsideTests).length;
  // A test that did not run has not passed.
  const failed =
    (found?.numFailedTests ?? 0) + (found?.numPendingTests ?? 0) + (found?.numTodoTests ?? 0) + failedFiles;
  return counted(say, result, { passed: found?.numPassedTests ?? 0, failed });
}

/** @param {{ status: string, assertionResults: { status: string }[] }} file */
function hasFailedOutsideTests({ status, assertionResults }) {
  return status === "failed" && !assertionResults.some((test) => test.status === "failed");
}

/**
 * Runs the browser journeys and counts them.
 * @param {(text: string) => void} say
 * @param {AbortSignal} signal
 */
export async function runPlaywright(say, signal) {
  const report = freshReport("playwright.json");
  const options = { signal, env: { PLAYWRIGHT_JSON_OUTPUT_FILE: report }, onOutput: lastLine(say) };
  const result = await npm("exec", ["playwright", "test", "--reporter=list,json"], options);
  const { expected = 0, unexpected = 0, flaky = 0, skipped = 0 } = readReport(report)?.stats ?? {};
  return counted(say, result, { passed: expected, failed: unexpected + flaky + skipped });
}

/** @param {(text: string) => void} say @param {RunResult} result @param {Count} count */
function counted(say, result, count) {
  say(count.failed > 0 ? `${count.passed} passed, ${count.failed} failed` : `${count.passed} passed`);
  return { result, count };
}

/** @param {string} name */
function freshReport(name) {
  fs.mkdirSync(reportDir, { recursive: true });
  const file = path.join(reportDir, name);
  fs.rmSync(file, { force: true });
  return file;
}

/** @param {string} file */
function readReport(file) {
  return fs.existsSync(file) ? JSON.parse(fs.readFileSync(file, "utf8")) : undefined;
}

/** @param {(text: string) => void} say */
function lastLine(say) {
  return (/** @type {string} */ text) => {
    const line = text.split("\n").findLast((each) => each.trim() !== "");
    if (line) say(line.trim().slice(0, 70));
  };
}

/** @param {string} text */
function indent(text) {
  return text.trimEnd().replace(/^/gm, "    ");
}
