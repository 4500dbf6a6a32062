// Backup and restore of the shop's database with PostgreSQL's own pg_dump and pg_restore.
import fs from "node:fs";
import path from "node:path";
import { makeFolder } from "./folders.mjs";
import { psql, runClient } from "./psql.mjs";

/**
 * Writes the whole database into one file, which appears only when it is complete.
 * @param {{ url: string, file: string }} options
 * @returns {Promise<{ file: string, bytes: number }>}
 */
export async function backupDatabase({ url, file }) {
  const unfinished = `${file}.unfinished`;
  makeFolder(path.dirname(path.resolve(file)));
  fs.writeFileSync(unfinished, "", { mode: 0o600 }); // it holds people's names and addresses
  try {
    await runClient("pg_dump", {
      url,
      args: ["--format=custom", "--no-owner", "--no-privileges", "--file", unfinished],
    });
    fs.renameSync(unfinished, file);
  } finally {
    fs.rmSync(unfinished, { force: true });
  }
  return { file, bytes: fs.statSync(file).size };
}

/**
 * Puts a backup in the place of the database. It is restored beside it and swapped in by name when whole, so a failed
 * restore leaves the old data as they were.
 * @param {{ url: string, file: string, isForced?: boolean }} options forced: whoever is connected is disconnected
 * @returns {Promise<{ replaced: string | undefined }>} the database that keeps the old data until the next restore
 * @throws when somebody is connected and it is not forced, or the file is no backup
 */
export async function restoreDatabase({ url, file, isForced = false }) {
  if (!fs.existsSync(file)) throw new Error(`There is no ${file}`);
  const name = decodeURIComponent(new URL(url).pathname.slice(1));
  const names = { name, restoring: `${name}_restoring`, replaced: `${name}_replaced` };
  const server = withDatabase(url, "postgres");
  const users = Number(await psql(server, "SELECT count(*) FROM pg_stat_activity WHERE datname = :'name'", names));
  if (users > 0 && !isForced) {
    throw new Error(
      `The database is in use (open connections: ${users}). Stop the shop first, or add --yes to disconnect it.`,
    );
  }
  const hadData = (await psql(server, "SELECT count(*) FROM pg_database WHERE datname = :'name'", names)) === "1";
  await psql(server, 'DROP DATABASE IF EXISTS :"restoring"; CREATE DATABASE :"restoring" TEMPLATE template0', names);
  try {
    const args = ["--exit-on-error", "--no-owner", "--no-privileges", file];
    await runClient("pg_restore", { url: withDatabase(url, names.restoring), args });
    await psql(server, hadData ? swap : 'ALTER DATABASE :"restoring" RENAME TO :"name"', names);
  } catch (error) {
    await psql(server, `DROP DATABASE IF EXISTS :"restoring"; ${hadData ? reopen : ""}`, names);
    throw error;
  }
  return { replaced: hadData ? names.replaced : undefined };
}

const reopen = 'ALTER DATABASE :"name" ALLOW_CONNECTIONS true;';

// Nobody may come back between the disconnecting and the renaming.
const swap = `
  DROP DATABASE IF EXISTS :"replaced";
  ALTER DATABASE :"name" ALLOW_CONNECTIONS false;
  SELECT count(pg_terminate_backend(pid, 5000)) FROM pg_stat_activity WHERE datname = :'name';
  BEGIN;
  ALTER DATABASE :"name" RENAME TO :"replaced";
  ALTER DATABASE :"restoring" RENAME TO :"name";
  COMMIT;
  ALTER DATABASE :"replaced" ALLOW_CONNECTIONS true;`;

/** @param {string} url @param {string} database */
function withDatabase(url, database) {
  const other = new URL(url);
  other.pathname = `/${encodeURIComponent(database)}`;
  return other.href;
}
