// One `npm start` per clone.
import fs from "node:fs";
import path from "node:path";
import { keepDir, makeFolder, rootDir } from "./folders.mjs";
import { commandLine, endProcess, until } from "./processes.mjs";

const lockFile = path.join(keepDir, "running.json");

/** @typedef {{ pid: number, address: string, services: number[] }} Lock */

/**
 * Takes the clone's lock, ending what a start that was killed left behind.
 * @param {string} address of the shop, told to whoever comes second
 * @returns {Promise<{ note: (services: number[]) => void, release: () => void }>} `note` writes down what to end
 */
export async function takeLock(address) {
  makeFolder(keepDir);
  const previous = read();
  if (previous && commandLine(previous.pid).includes("up.mjs")) {
    throw new Error(`Loamless is already running in this clone (process ${previous.pid}): ${previous.address}`);
  }
  for (const pid of previous?.services ?? []) await endLeftOver(pid);
  fs.rmSync(lockFile, { force: true });
  /** @param {number[]} services @param {string} [flag] */
  const write = (services, flag = "w") =>
    fs.writeFileSync(lockFile, JSON.stringify({ pid: process.pid, address, services }), { flag, mode: 0o600 });
  write([], "wx");
  return { note: write, release: () => fs.rmSync(lockFile, { force: true }) };
}

/** @returns {Lock | undefined} */
function read() {
  try {
    return JSON.parse(fs.readFileSync(lockFile, "utf8"));
  } catch {
    return undefined; // none, or broken off while being written
  }
}

/** @param {number} pid */
async function endLeftOver(pid) {
  const isOurs = () => commandLine(pid).includes(rootDir);
  if (!isOurs()) return;
  endProcess(pid);
  await until(() => !isOurs(), 5_000);
  if (isOurs()) endProcess(pid, { signal: "SIGKILL" });
}
