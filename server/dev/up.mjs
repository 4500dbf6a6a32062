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
const lookEveryMs = 1_000;

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
  const building = options.isWatch ? undefined : buildShop();
  const [{ env, people }] = await Promise.all([prepareDatabase(options), building, startMailbox(options)]);
  await startShop(options, env);
  announce(options, people);
}

/** @param {Options} options */
async function prepareDatabase(options) {
  const { signal } = stopping;
  const { cluster, url } = await step("database", async (say) => {
    database = startDemoCluster(say);
    const started = await database;
    say(`127.0.0.1:${started.cluster.port}`);
    return started;
  });
  watchDatabase(cluster);
  const env = demoEnvironment(options, url);
  await step("migrations", () => migrate({ env, signal }));
  const people = await step("demo data", () => fillDemo({ env, signal }));
  return { env, people };
}

async function buildShop() {
  await step("build", (say) => must("The build", build({ say, signal: stopping.signal })));
}

/** @param {Options} options */
async function startMailbox({ smtpPort, mailboxPort }) {
  makeFolder(mailDir);
  const program = path.join(rootDir, "server", "dev", "maildev.mjs");
  start("mailbox", [program, String(smtpPort), String(mailboxPort), mailDir], { env: process.env });
  await waitUntilHealthy("mailbox", `http://127.0.0.1:${mailboxPort}/api/healthz`);
}

/** @param {Options} options @param {NodeJS.ProcessEnv} env */
async function startShop({ isWatch, host, shopPort }, env) {
  const source = ["--watch", "--watch-preserve-output", "--import", "tsx", path.join(rootDir, "server", "index.ts")];
  start("shop", isWatch ? source : [builtServer], { env, isLoud: isWatch });
  const reachable = ["0.0.0.0", "::"].includes(host) ? "127.0.0.1" : host;
  await waitUntilHealthy("shop", `http://${reachable}:${shopPort}/readyz`);
}

/** @type {typeof services.start} */
function start(...service) {
  stopping.signal.throwIfAborted();
  services.start(...service);
  lock?.note(services.pids());
}

/** @param {string} name @param {string} address */
async function waitUntilHealthy(name, address) {
  await step(name, async () => {
    const deadline = performance.now() + healthyWithinMs;
    while (performance.now() < deadline) {
      stopping.signal.throwIfAborted();
      const answer = await fetch(address).catch(() => undefined);
      if (answer?.ok) return;
      await new Promise((resolve) => setTimeout(resolve, 100));
    }
    throw new Error(`The ${name} is not healthy after ${healthyWithinMs / 1000} s (${address}); see .data/${name}.log`);
  });
}

/** The database is no child of ours, so look. @param {import("./postgres.mjs").Cluster} cluster */
function watchDatabase(cluster) {
  const look = () =>
    cluster.isRunning() || void finish(1, `PostgreSQL ended by itself; see ${cluster.dataDir}/server.log`);
  setInterval(look, lookEveryMs).unref();
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
