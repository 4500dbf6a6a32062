import fs from "node:fs";
import os from "node:os";
import path from "node:path";
import pg from "pg";
import { afterAll, beforeAll, expect, test } from "vitest";
import { backupDatabase, restoreDatabase } from "../../server/dev/lib/backups.mjs";
import { startCluster, testDataDir } from "../../server/dev/postgres.mjs";

const dir = fs.mkdtempSync(path.join(os.tmpdir(), "loamless-backup-"));
const cluster = await startCluster({ dataDir: testDataDir("backup"), tune: "test" });
const url = cluster.url("farm's books");
const file = path.join(dir, "books.dump");

beforeAll(async () => {
  await cluster.createDatabase("farm's books");
  await ask("CREATE TABLE harvest (variety text PRIMARY KEY, heads int NOT NULL CHECK (heads >= 0))");
  await ask("INSERT INTO harvest VALUES ('Butterhead', 120), ('Trout Back', 80)");
});

afterAll(async () => {
  await cluster.destroy();
  fs.rmSync(dir, { recursive: true });
});

test("a backup brings back what was there, constraints too, and keeps what it replaced", async () => {
  const backup = await backupDatabase({ url, file });
  expect(backup.bytes).toBeGreaterThan(500);
  expect(fs.statSync(file).mode & 0o077).toBe(0);
  await ask("DELETE FROM harvest");
  const { replaced } = await restoreDatabase({ url, file });
  expect(await heads()).toEqual(["Butterhead 120", "Trout Back 80"]);
  await expect(ask("INSERT INTO harvest VALUES ('Mizuna', -1)")).rejects.toThrow(/check constraint/);
  expect(await heads(cluster.url(String(replaced)))).toEqual([]);
});

test("a database that is in use is restored only when its users may be disconnected", async () => {
  await backupDatabase({ url, file });
  const shop = new pg.Client({ connectionString: url });
  shop.on("error", () => undefined); // being disconnected is what is tried here
  await shop.connect();
  await expect(restoreDatabase({ url, file })).rejects.toThrow(/in use \(open connections: 1\)/);
  await restoreDatabase({ url, file, isForced: true });
  await expect(shop.query("SELECT 1")).rejects.toThrow();
  expect(await heads()).toEqual(["Butterhead 120", "Trout Back 80"]);
});

test("a broken backup leaves the old data as they were", async () => {
  await backupDatabase({ url, file });
  const whole = fs.readFileSync(file);
  const broken = path.join(dir, "broken.dump");
  fs.writeFileSync(broken, whole.subarray(0, whole.length - 40));
  await expect(restoreDatabase({ url, file: broken })).rejects.toThrow(/pg_restore failed/);
  expect(await heads()).toEqual(["Butterhead 120", "Trout Back 80"]);
  const left = await ask("SELECT datname FROM pg_database WHERE datname LIKE '%_restoring'");
  expect(left).toEqual([]);
});

test("a password never stands in an error", async () => {
  const wrong = new URL(url);
  wrong.password = "s3cret-of-the-farm";
  const refused = backupDatabase({ url: wrong.href, file: path.join(dir, "never.dump") });
  await expect(refused).rejects.toThrow(/password authentication failed/);
  await expect(refused).rejects.not.toThrow(/s3cret/);
  expect(fs.readdirSync(dir).filter((name) => name.startsWith("never"))).toEqual([]);
});

async function heads(database = url): Promise<string[]> {
  const rows = await ask("SELECT variety || ' ' || heads AS line FROM harvest ORDER BY variety", database);
  return rows.map((row) => String(row["line"]));
}

async function ask(sql: string, database = url): Promise<Record<string, unknown>[]> {
  const client = new pg.Client({ connectionString: database });
  await client.connect();
  try {
    return (await client.query<Record<string, unknown>>(sql)).rows;
  } finally {
    await client.end();
  }
}
