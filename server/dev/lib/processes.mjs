// Small process helpers shared by the commands. Node built-ins only: they run before node_modules exists.
import { spawn } from "node:child_process";
import fs from "node:fs";

/** @typedef {{ code: number, stdout: string, stderr: string }} RunResult */

/** @typedef {import("node:child_process").SpawnOptions} SpawnOptions */
/** @typedef {{ onOutput?: (text: string) => void, input?: string, isGroup?: boolean, signal?: AbortSignal | undefined }} Extras */

/**
 * Runs a program to its end and collects what it says; never throws on a bad exit code.
 * @param {string} program
 * @param {string[]} args
 * @param {Omit<SpawnOptions, "signal"> & Extras} [options] `isGroup` puts it and its children in a process group of
 *   their own, so that an aborted `signal` ends them all and Ctrl-C reaches only this process
 * @returns {Promise<RunResult>} code 127 when the program could not be started
 */
export function run(program, args, { onOutput, input, isGroup = false, signal, ...options } = {}) {
  return new Promise((resolve) => {
    if (signal?.aborted) return resolve({ code: 1, stdout: "", stderr: "broken off\n" });
    const child = spawn(program, args, {
      ...options,
      detached: isGroup,
      stdio: [input ? "pipe" : "ignore", "pipe", "pipe"],
    });
    const result = { code: 127, stdout: "", stderr: "" };
    for (const name of /** @type {const} */ (["stdout", "stderr"])) {
      child[name]?.setEncoding("utf8").on("data", (text) => {
        result[name] += text;
        onOutput?.(text);
      });
    }
    child.stdin?.on("error", () => undefined).end(input); // it may end without reading all of it
    const abort = () => endProcess(child.pid, { isGroup });
    signal?.addEventListener("abort", abort);
    child.once("error", (error) => resolve({ ...result, stderr: `${error.message}\n` }));
    child.once("close", (code, endedBy) => {
      signal?.removeEventListener("abort", abort);
      if (endedBy) result.stderr += `ended by ${endedBy}\n`;
      resolve({ ...result, code: code ?? 1 });
    });
  });
}

/**
 * Asks a process (or its whole group) to end; one that has ended already is fine.
 * @param {number | undefined} pid
 * @param {{ isGroup?: boolean, signal?: NodeJS.Signals }} [how]
 */
export function endProcess(pid, { isGroup = false, signal = "SIGTERM" } = {}) {
  if (!pid) return;
  try {
    process.kill(isGroup ? -pid : pid, signal);
  } catch {
    // gone
  }
}

/**
 * Like run, but throws with everything the program said when it fails.
 * @param {string} what said in the error, such as "initdb"
 * @param {Promise<RunResult>} running
 */
export async function must(what, running) {
  const result = await running;
  if (result.code !== 0)
    throw new Error(`${what} failed (exit ${result.code}):\n${result.stdout}${result.stderr}`.trim());
  return result;
}

/**
 * Is a process with this id alive (whoever owns it)?
 * @param {number} pid
 */
export function isAlive(pid) {
  try {
    process.kill(pid, 0);
    return true;
  } catch (error) {
    return error instanceof Error && "code" in error && error.code === "EPERM";
  }
}

/**
 * The command line of a live process, or "" where there is none to read; process ids are used again, so look before
 * believing a written one.
 * @param {number} pid
 */
export function commandLine(pid) {
  try {
    return fs.readFileSync(`/proc/${pid}/cmdline`, "utf8").replaceAll("\0", " ").trim();
  } catch {
    return "";
  }
}

/**
 * Waits until a condition holds, asking every 20 ms.
 * @param {() => boolean} holds
 * @param {number} timeoutMs
 * @returns {Promise<boolean>} false when the time ran out
 */
export async function until(holds, timeoutMs) {
  const deadline = performance.now() + timeoutMs;
  while (!holds()) {
    if (performance.now() > deadline) return false;
    await new Promise((resolve) => setTimeout(resolve, 20));
  }
  return true;
}
