// `npm run bench`: measures the built shop against a durable cluster of its own.
import { spawn } from "node:child_process";
import { once } from "node:events";
import path from "node:path";
import { build } from "./lib/build.mjs";
import { keepDir, rootDir } from "./lib/folders.mjs";
import { checkNode, installPackages, installPostgres } from "./lib/install.mjs";
import { must } from "./lib/processes.mjs";
import { fail, step } from "./lib/progress.mjs";
import { destroyCluster, startCluster } from "./postgres.mjs";

const databaseName = "bench";
const dataDir = path.join(keepDir, "bench");

process.on("SIGINT", () => undefined); // the benches get it too; tidy up after them

try {
  checkNode();
  await installPackages();
  await installPostgres();
  await step("build", (say) => must("The build", build({ say })));
  await bench();
} catch (error) {
  fail(error);
}

async function bench() {
  await destroyCluster(dataDir); // left by a broken-off run
  const cluster = await step("database", (say) => startCluster({ dataDir, tune: "dev", onProgress: say }));
  try {
    await cluster.createDatabase(databaseName);
    const env = { ...process.env, NODE_ENV: "production", BENCH_DATABASE_URL: cluster.url(databaseName) };
    const args = ["--import", "tsx", path.join("tests", "bench", "run.ts"), ...process.argv.slice(2)];
    const [code] = await once(spawn(process.execPath, args, { cwd: rootDir, env, stdio: "inherit" }), "exit");
    process.exitCode = code ?? 1;
  } finally {
    await cluster.destroy();
  }
}
