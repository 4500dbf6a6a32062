// Where the commands keep their things, and which folders the database's own user can reach.
import { spawnSync } from "node:child_process";
import { createHash } from "node:crypto";
import fs from "node:fs";
import path from "node:path";
import { fileURLToPath } from "node:url";

/** The clone's top folder. */
export const rootDir = path.resolve(path.dirname(fileURLToPath(import.meta.url)), "../../..");
/** Everything the commands keep between runs, ignored by git. */
export const keepDir = path.join(rootDir, ".data");

/** @typedef {{ uid: number, gid: number }} OsUser */

/**
 * The user to run PostgreSQL as: it refuses root, so root lends it Debian's `postgres`, or whoever owns the cluster.
 * @param {string} [dataDir] an existing cluster
 * @returns {OsUser | undefined} undefined for an ordinary user, who runs it directly
 */
export function databaseUser(dataDir) {
  if (process.getuid?.() !== 0) return undefined;
  const owner = dataDir ? fs.statSync(dataDir, { throwIfNoEntry: false }) : undefined;
  if (owner && owner.uid !== 0) return { uid: owner.uid, gid: owner.gid };
  const line = fs
    .readFileSync("/etc/passwd", "utf8")
    .split("\n")
    .find((entry) => entry.startsWith("postgres:"));
  const [, , uid, gid] = line?.split(":") ?? [];
  if (!uid || !gid) throw new Error('PostgreSQL does not run as root, and there is no user "postgres" to run it as');
  return { uid: Number(uid), gid: Number(gid) };
}

/**
 * Makes a folder and its parents. As root new ones can be walked through by others (711) whatever the umask, because
 * the database's user must pass.
 * @param {string} dir
 */
export function makeFolder(dir) {
  if (fs.existsSync(dir)) return;
  makeFolder(path.dirname(dir));
  fs.mkdirSync(dir);
  if (process.getuid?.() === 0) fs.chmodSync(dir, 0o711);
}

/**
 * Where a cluster wanted at `dir` really goes: there, or below /var/tmp when a parent keeps the database's user out
 * (a clone in /root). The fallback survives a reboot and is one per clone.
 * @param {string} dir
 */
export function placeFor(dir) {
  if (fs.existsSync(dir)) return dir;
  const hash = createHash("sha256").update(path.dirname(dir)).digest("hex").slice(0, 12);
  const fallback = path.join("/var/tmp", `loamless-${hash}-${path.basename(dir)}`);
  if (fs.existsSync(fallback)) return refuseStrangers(fallback);
  return isReachable(dir) ? dir : fallback;
}

/** @param {string} dir */
function isReachable(dir) {
  const user = databaseUser();
  if (!user) return true;
  let parent = path.dirname(dir);
  while (!fs.existsSync(parent)) parent = path.dirname(parent);
  return spawnSync("/usr/bin/test", ["-x", parent], { ...user, cwd: "/" }).status === 0;
}

/** @param {string} dir */
function refuseStrangers(dir) {
  const found = fs.lstatSync(dir);
  const isOurs = found.uid === process.getuid?.() || found.uid === databaseUser()?.uid;
  if (!found.isDirectory() || !isOurs) throw new Error(`${dir} belongs to somebody else and is in the way`);
  return dir;
}
