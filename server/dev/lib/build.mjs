// The production build, made only when something it is made from has changed.
import { createHash } from "node:crypto";
import fs from "node:fs";
import path from "node:path";
import { rootDir } from "./folders.mjs";
import { run } from "./processes.mjs";

const sources = ["src", "server", "shared", "public", "index.html", "package.json", "package-lock.json"];
const configs = /^(tsconfig.*\.json|(vite|tailwind)\.config\.\w+)$/;
const stamp = path.join(rootDir, ".cache", "build-hash");

/** The server's entry in the build. */
export const builtServer = path.join(rootDir, "dist", "server", "index.js");

/**
 * Builds client and server into dist/ unless they are there from the same sources.
 * @param {{ say: (text: string) => void, signal?: AbortSignal | undefined }} options
 * @returns {Promise<import("./processes.mjs").RunResult>}
 */
export async function build({ say, signal }) {
  const hash = hashSources();
  if (fs.existsSync(builtServer) && fs.existsSync(stamp) && fs.readFileSync(stamp, "utf8") === hash) {
    say("up to date");
    return { code: 0, stdout: "", stderr: "" };
  }
  fs.rmSync(stamp, { force: true });
  const env = { ...process.env, NODE_ENV: "production" };
  const result = await run("npm", ["run", "--silent", "build"], { cwd: rootDir, env, signal, isGroup: true });
  if (result.code !== 0) return result;
  fs.mkdirSync(path.dirname(stamp), { recursive: true });
  fs.writeFileSync(stamp, hash);
  return result;
}

function hashSources() {
  const hash = createHash("sha256").update(process.version);
  const top = fs.readdirSync(rootDir).filter((name) => configs.test(name));
  for (const name of [...sources, ...top.sort()]) addTo(hash, path.join(rootDir, name));
  return hash.digest("hex");
}

/** @param {import("node:crypto").Hash} hash @param {string} file */
function addTo(hash, file) {
  const stat = fs.statSync(file, { throwIfNoEntry: false });
  hash.update(`\0${file}\0`);
  if (stat?.isFile()) hash.update(fs.readFileSync(file));
  if (stat?.isDirectory()) for (const name of fs.readdirSync(file).sort()) addTo(hash, path.join(file, name));
}
