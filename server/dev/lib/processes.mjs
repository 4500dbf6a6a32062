// Small process helpers shared by the commands. Node built-ins only: they run before node_modules exists.
import { spawn } from "node:child_process";
import fs from "node:fs";

/** @typedef {{ code: number, stdout: string, stderr: string }} RunResult */

/**
 * Runs a program to its end and collects what it says; never throws on a bad exit code.
 * @param {string} program
 * @param {string[]} args
 * @param {import("node:child_process").SpawnOptions & { onOutput?: (text: string) => void }} [options]
 * @returns {Promise<RunResult>} code 127 when the program could not be started
 */
export function run(program, args, { onOutput, ...options } = {}) {
  return new Promise((resolve) => {
    let stdout = "";
    let stderr = "";
    const child = spawn(program, args, { stdio: ["ignore", "pipe", "pipe"], ...options });
    child.stdout?.setEncoding("utf8").on("data", (text) => {
      stdout += text;
      onOutput?.(text);
    });
    child.stderr?.setEncoding("utf8").on("data", (text) => {
      stderr += text;
      onOutput?.(text);
    });
    child.once("error", (error) => resolve({ code: 127, stdout, stderr: `${stderr}${error.message}\n` }));
    child.once("close", (code, signal) => {
      if (signal) stderr += `ended by ${signal}\n`;
      resolve({ code: code ?? 1, stdout, stderr });
    });
  });
}

/**
 * Like run, but throws with everything the program said when it fails.
 * @param {string} what said in the error, such as "initdb"
 * @param {Promise<RunResult>} running
 */
export async function must(what, running) {
  const result = await running;
  if (result.code !== 0) throw new Error(`${what} failed (exit ${result.code}):\n${result.stdout}${result.stderr}`.trim());
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
