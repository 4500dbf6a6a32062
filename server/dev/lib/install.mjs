// What a fresh machine lacks: packages from the lock file, Debian's PostgreSQL and Chromium.
import fs from "node:fs";
import path from "node:path";
import { findServerPrograms } from "../postgres.mjs";
import { rootDir } from "./folders.mjs";
import { must, run } from "./processes.mjs";
import { step } from "./progress.mjs";

const oldestNode = [20, 19];

const chromiumPath = "/usr/bin/chromium";

/** Stops with a clear line on a Node.js that is too old. */
export function checkNode() {
  const [major = 0, minor = 0] = process.versions.node.split(".").map(Number);
  const isOld = major < oldestNode[0] || (major === oldestNode[0] && minor < oldestNode[1]);
  if (isOld)
    throw new Error(`Loamless needs Node.js ${oldestNode.join(".")} or newer; this is ${process.versions.node}`);
}

/**
 * Brings node_modules to what the lock file says; does nothing when it is so already.
 * @param {AbortSignal} [signal]
 */
export async function installPackages(signal) {
  await step("packages", async (say) => {
    if (isInstalled()) return say("as the lock file says");
    say("installing from the lock file");
    const args = ["ci", "--include=dev", "--no-audit", "--no-fund", "--loglevel=error"];
    await must("npm ci", run("npm", args, { cwd: rootDir, signal, isGroup: true }));
    say("installed");
  });
}

/** npm writes down what it installed as its last act, so a broken-off `npm ci` does not count. */
function isInstalled() {
  const installed = readLock("node_modules/.package-lock.json");
  const wanted = readLock("package-lock.json");
  return Object.entries(wanted).every(([where, entry]) => {
    if (where === "") return true;
    const found = installed[where];
    return found ? found.version === entry.version : entry.optional === true; // built for another kind of machine
  });
}

/** @param {string} file @returns {Record<string, { version?: string, optional?: boolean }>} */
function readLock(file) {
  const full = path.join(rootDir, file);
  return fs.existsSync(full) ? JSON.parse(fs.readFileSync(full, "utf8")).packages : {};
}

/** Installs Debian's PostgreSQL when its server programs are missing. */
export async function installPostgres() {
  await step("PostgreSQL", async (say) => {
    const present = findServerPrograms();
    if (present) return say(present);
    await installFromDebian("postgresql", "PostgreSQL's server", say);
    const programs = findServerPrograms();
    if (!programs) throw new Error("Debian's postgresql is installed, but its programs are not where expected");
    say(programs);
  });
}

/** Installs Debian's Chromium when it is missing. */
export async function installChromium() {
  await step("Chromium", async (say) => {
    if (fs.existsSync(chromiumPath)) return say(chromiumPath);
    await installFromDebian("chromium", "Chromium", say);
    say(chromiumPath);
  });
}

/** @param {string} name Debian's package @param {string} what for people @param {(text: string) => void} say */
async function installFromDebian(name, what, say) {
  const byHand = `${what} is missing. Install it with:  sudo apt-get update && sudo apt-get install -y ${name}`;
  const isRoot = process.getuid?.() === 0;
  if (!isRoot && (await run("sudo", ["-n", "true"])).code !== 0) throw new Error(byHand);
  const [program, ...before] = [...(isRoot ? [] : ["sudo", "-n"]), "env", "DEBIAN_FRONTEND=noninteractive", "apt-get"];
  if ((await run(program, [...before, "--version"])).code !== 0) throw new Error(byHand);
  say("reading Debian's package lists");
  await must("apt-get update", run(program, [...before, "update", "-q"]));
  say(`installing Debian's ${name}`);
  const wait = ["-o", "DPkg::Lock::Timeout=300"]; // another apt-get may be at work
  await must(
    "apt-get install",
    run(program, [...before, "install", "-y", "-q", "--no-install-recommends", ...wait, name]),
  );
}
