// The long-running programs of `npm start`: started, watched and stopped together.
import { spawn } from "node:child_process";
import fs from "node:fs";
import path from "node:path";
import { keepDir, rootDir } from "./folders.mjs";
import { endProcess, isAlive, until } from "./processes.mjs";

const graceMs = 10_000;

/** @typedef {{ name: string, pid: number, logFile: string | undefined }} Service */

/**
 * Keeps the services of one run.
 * @param {(reason: string) => void} onDeath called when one ends that nobody asked to
 */
export function createServices(onDeath) {
  /** @type {Service[]} */
  const services = [];
  let isStopping = false;

  /**
   * Starts one in its own process group, so that Ctrl-C reaches it only through stop.
   * @param {string} name
   * @param {string[]} nodeArgs
   * @param {{ env: NodeJS.ProcessEnv, isLoud?: boolean }} options loud: it talks to the terminal, not to its log
   */
  function start(name, nodeArgs, { env, isLoud = false }) {
    const logFile = isLoud ? undefined : path.join(keepDir, `${name}.log`);
    const log = logFile ? fs.openSync(logFile, "w", 0o600) : "inherit";
    const child = spawn(process.execPath, nodeArgs, { cwd: rootDir, env, detached: true, stdio: ["ignore", log, log] });
    if (typeof log === "number") fs.closeSync(log);
    services.push({ name, pid: child.pid ?? 0, logFile });
    child.once("exit", (code, signal) => {
      if (!isStopping) onDeath(`The ${name} ended by itself (${signal ?? `exit ${code}`}).${tailOf(logFile)}`);
    });
  }

  /** Asks all to end, the last started first, and insists after ten seconds. */
  async function stop() {
    isStopping = true;
    for (const { pid } of services.toReversed()) endProcess(pid);
    const isQuiet = () => services.every(({ pid }) => !isAlive(pid));
    if (await until(isQuiet, graceMs)) return;
    for (const { pid } of services) endProcess(pid, { isGroup: true, signal: "SIGKILL" });
  }

  return { start, stop, pids: () => services.map(({ pid }) => pid) };
}

/** @param {string | undefined} logFile */
function tailOf(logFile) {
  if (!logFile) return "";
  const lines = fs.readFileSync(logFile, "utf8").trimEnd().split("\n").slice(-15);
  return `\nThe end of ${logFile}:\n${lines.join("\n")}`;
}
