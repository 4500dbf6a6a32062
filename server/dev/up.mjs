// `npm start` and `npm run dev`: from a bare clone to a running demo shop. Node built-ins only.
import path from "node:path";
import { parseArgs } from "node:util";
import { build, builtServer } from "./lib/build.mjs";
import { demoEnvironment, fillDemo, forgetDemo, mailDir, migrate, startDemoCluster } from "./lib/demo.mjs";
import { makeFolder, rootDir } from "./lib/folders.mjs";
import { checkNode, installPackages, installPostgres } from "./lib/install.mjs";
import { takeLock } from "./lib/lock.mjs";
import { portFrom, requirePorts } from "./lib/ports.mjs";
import { must } from "./lib/processes.mjs";
import { print, step } from "./lib/progress.mjs";
import { createServices } from "./lib/services.mjs";

const healthyWithinMs = 60_000;
const databaseCheckMs = 2_000;

const stopping = new AbortController();
const services = createServices((reason) => void finish(1, reason));
/** @type {Awaited<ReturnType<typeof takeLock>> | undefined} */
let lock;
/** @type {ReturnType<typeof startDemoCluster> | undefined} */
let database;

process.on("SIGINT", () => void finish(0, "Stopping."));
process.on("SIGTERM", () => void finish(0, "Stopping."));
process.on("SIGHUP", () => void finish(0, "Stopping."));

try {
  await up(readOptions());
} catch (error) {
  await finish(1, error instanceof Error ? error.message : String(error));
}

/** @typedef {ReturnType<typeof readOptions>} Options */

function readOptions() {
  const { values } = parseArgs({
    options: { watch: { type: "boolean", default: false }, fresh: { type: "boolean", default: false } },
  });
  const host = process.env.HOST ?? "127.0.0.1";
  const shopPort = portFrom("PORT", 3000);
  return {
    isWatch: values.watch,
    isFresh: values.fresh,
    host,
    shopPort,
    mailboxPort: portFrom("MAILBOX_PORT", 1080),
    smtpPort: portFrom("SMTP_PORT", 1025),
    origin: process.env.ORIGIN ?? `http://localhost:${shopPort}`,
  };
}

/** @param {Options} options */
async function up(options) {
  const { signal } = stopping;
  checkNode();
  lock = await takeLock(options.origin);
  await requirePorts([
    { what: "shop", variable: "PORT", port: options.shopPort, host: options.host },
    { what: "mailbox", variable: "MAILBOX_PORT", port: options.mailboxPort, host: "127.0.0.1" },
    { what: "mailbox's SMTP", variable: "SMTP_PORT", port: options.smtpPort, host: "127.0.0.1" },
  ]);
  await Promise.all([installPackages(signal), installPostgres()]);
  if (options.isFresh) await step("forgetting the old demo", forgetDemo);
  const [{ env, people }] = await Promise.all([prepareDatabase(options), options.isWatch || buildShop()]);
  await startServices(options, env);
  announce(options, people);
}

/** @param {Options} options */
async function prepareDatabase(options) {
  const { signal } = stopping;
  const { cluster, url } = await step("database", (say) => (database = startDemoCluster(say)));
  watchDatabase(cluster);
  const env = demoEnvironment(options, url);
  await step("migrations", () => migrate({ env, signal }));
  const people = await step("demo data", () => fillDemo({ env, signal }));
  return { env, people };
}

async function buildShop() {
  await step("build", (say) => must("The build", build({ say, signal: stopping.signal })));
}

/** @param {Options} options @param {NodeJS.ProcessEnv} env */
async function startServices({ isWatch, host, shopPort, smtpPort, mailboxPort }, env) {
  stopping.signal.throwIfAborted();
  makeFolder(mailDir);
  const mailbox = path.join(rootDir, "server", "dev", "maildev.mjs");
  services.start("mailbox", [mailbox, String(smtpPort), String(mailboxPort), mailDir], { env: process.env });
  const source = ["--watch", "--watch-preserve-output", "--import", "tsx", path.join(rootDir, "server", "index.ts")];
  services.start("shop", isWatch ? source : [builtServer], { env, isLoud: isWatch });
  lock?.note(services.pids());
  const reachable = ["0.0.0.0", "::"].includes(host) ? "127.0.0.1" : host;
  await step("mailbox", () => waitUntilHealthy(`http://127.0.0.1:${mailboxPort}/api/healthz`));
  await step("shop", () => waitUntilHealthy(`http://${reachable}:${shopPort}/readyz`));
}

/** @param {string} address */
async function waitUntilHealthy(address) {
  const deadline = performance.now() + healthyWithinMs;
  while (performance.now() < deadline) {
    stopping.signal.throwIfAborted();
    const answer = await fetch(address).catch(() => undefined);
    if (answer?.ok) return;
    await new Promise((resolve) => setTimeout(resolve, 100));
  }
  throw new Error(`${address} did not become healthy within ${healthyWithinMs / 1000} s; see .data/shop.log`);
}

/** The database is no child of ours, so ask. @param {import("./postgres.mjs").Cluster} cluster */
function watchDatabase(cluster) {
  setInterval(() => {
    if (!stopping.signal.aborted && !cluster.isRunning()) {
      void finish(1, `PostgreSQL ended by itself; see ${cluster.dataDir}/server.log`);
    }
  }, databaseCheckMs).unref();
}

/** @param {Options} options @param {import("./lib/demo.mjs").DemoPerson[]} people */
function announce({ origin, mailboxPort }, people) {
  print(
    `\nLoamless is ready.\n\n  Shop      ${origin}\n  Mailbox   http://localhost:${mailboxPort}   every mail the shop sends\n`,
  );
  const widths = { role: 0, name: 0 };
  for (const { role, name } of people) {
    widths.role = Math.max(widths.role, role.length);
    widths.name = Math.max(widths.name, name.length);
  }
  if (people.length > 0) print("  Sign in as (the link and code arrive in the mailbox):");
  for (const { role, name, email } of people) {
    print(`    ${role.padEnd(widths.role)}   ${name.padEnd(widths.name)}   ${email}`);
  }
  print("\nCtrl-C stops everything and keeps the data.");
}

/**
 * Stops all that was started, in reverse order, and ends this process.
 * @param {number} code
 * @param {string} reason
 */
async function finish(code, reason) {
  if (stopping.signal.aborted) return;
  stopping.abort();
  print(`\n${reason}`);
  await services.stop();
  const started = await database?.catch(() => undefined);
  await started?.cluster.stop();
  lock?.release();
  process.exit(code);
}
