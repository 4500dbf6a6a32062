// The demo's settings and data, used by `npm start` and `npm run dev`.
import { randomBytes } from "node:crypto";
import fs from "node:fs";
import path from "node:path";
import { destroyCluster, startCluster } from "../postgres.mjs";
import { keepDir, makeFolder, rootDir } from "./folders.mjs";
import { must, run } from "./processes.mjs";

const clusterDir = path.join(keepDir, "pg");
const secretFile = path.join(keepDir, "secret");
const databaseName = "loamless";

/** Where the demo's mails are kept. */
export const mailDir = path.join(keepDir, "mail");

/** @typedef {{ role: string, name: string, email: string }} DemoPerson */
/** @typedef {{ isWatch: boolean, host: string, shopPort: number, smtpPort: number, origin: string }} DemoOptions */

/** Forgets the demo: its database, its mails and its secret. */
export async function forgetDemo() {
  await destroyCluster(clusterDir);
  fs.rmSync(mailDir, { recursive: true, force: true });
  fs.rmSync(secretFile, { force: true });
}

/**
 * Starts (or joins) the demo's cluster with its database in it.
 * @param {(text: string) => void} [onProgress]
 */
export async function startDemoCluster(onProgress) {
  const cluster = await startCluster({ dataDir: clusterDir, tune: "dev", ...(onProgress && { onProgress }) });
  await cluster.createDatabase(databaseName);
  return { cluster, url: cluster.url(databaseName) };
}

/**
 * Does something with the database of DATABASE_URL, or with the demo's, whose cluster runs meanwhile.
 * @template T
 * @param {(url: string) => Promise<T>} work
 */
export async function withDatabase(work) {
  if (process.env.DATABASE_URL) return work(process.env.DATABASE_URL);
  const { cluster, url } = await startDemoCluster();
  try {
    return await work(url);
  } finally {
    if (!cluster.wasRunning) await cluster.stop();
  }
}

/**
 * The shop's environment in the demo.
 * @param {DemoOptions} options
 * @param {string} databaseUrl
 * @returns {NodeJS.ProcessEnv}
 */
export function demoEnvironment({ isWatch, host, shopPort, smtpPort, origin }, databaseUrl) {
  return {
    ...process.env,
    NODE_ENV: isWatch ? "development" : "production",
    HOST: host,
    PORT: String(shopPort),
    ORIGIN: origin,
    DATABASE_URL: databaseUrl,
    SESSION_SECRET: keptSecret(),
    SMTP_URL: `smtp://127.0.0.1:${smtpPort}`,
    MAIL_FROM: process.env.MAIL_FROM ?? "Plover Spit Greens <greens@ploverspit.example>",
    CLOCK: "demo",
    DEMO: "1",
  };
}

function keptSecret() {
  makeFolder(keepDir);
  if (!fs.existsSync(secretFile)) fs.writeFileSync(secretFile, randomBytes(32).toString("base64url"), { mode: 0o600 });
  return fs.readFileSync(secretFile, "utf8");
}

/**
 * Brings the database to the newest shape.
 * @param {{ env: NodeJS.ProcessEnv, signal?: AbortSignal }} options
 */
export async function migrate({ env, signal }) {
  await must("The migration", runScript("server/dev/migrate.ts", { env, signal }));
}

/**
 * Fills the demo unless it is filled.
 * @param {{ env: NodeJS.ProcessEnv, signal?: AbortSignal }} options
 * @returns {Promise<DemoPerson[]>} somebody to sign in as for every role
 */
export async function fillDemo({ env, signal }) {
  const { stdout } = await must("Filling the demo", runScript("server/dev/demo/fill.ts", { env, signal }));
  const line = stdout.split("\n").findLast((each) => each.startsWith('{"people"'));
  return line ? JSON.parse(line).people : [];
}

/** @param {string} file @param {{ env: NodeJS.ProcessEnv, signal?: AbortSignal | undefined }} options */
function runScript(file, options) {
  return run(process.execPath, ["--import", "tsx", file], { ...options, cwd: rootDir, isGroup: true });
}
