// PostgreSQL's own client programs. Passwords travel in the environment: a command line is for all to read.
import fs from "node:fs";
import path from "node:path";
import { must, run } from "./processes.mjs";

const debian = "/usr/lib/postgresql";

/**
 * The folder that has all these PostgreSQL programs: PG_BIN, else Debian's newest version, else one on the PATH.
 * @param {string[]} names
 * @param {string} [major] only this major version, such as "15"
 * @returns {string | undefined}
 */
export function findPrograms(names, major) {
  const found = fs.existsSync(debian) ? fs.readdirSync(debian).filter((name) => /^\d+$/.test(name)) : [];
  const versions = found.filter((name) => !major || name === major).sort((a, b) => Number(b) - Number(a));
  const folders = [process.env.PG_BIN, ...versions.map((name) => path.join(debian, name, "bin"))];
  if (!major) folders.push(...(process.env.PATH ?? "").split(":"));
  return folders.find((dir) => dir && names.every((name) => fs.existsSync(path.join(dir, name))));
}

/**
 * Runs one of PostgreSQL's client programs against a database.
 * @param {string} name such as "pg_dump"
 * @param {{ url: string, args: string[], input?: string }} options
 */
export async function runClient(name, { url, args, input }) {
  const programs = findPrograms([name]);
  if (!programs) throw new Error(`${name} is missing: apt-get install -y postgresql-client`);
  const target = new URL(url);
  const env = { ...process.env, PGPASSWORD: decodeURIComponent(target.password) };
  target.password = "";
  const options = { env, ...(input !== undefined && { input }) };
  return must(name, run(path.join(programs, name), ["-d", target.href, ...args], options));
}

/**
 * Runs SQL, stopping at the first error.
 * @param {string} url
 * @param {string} sql may use :'name' and :"name" for the variables, quoted as text and as identifiers
 * @param {Record<string, string>} [variables]
 * @returns {Promise<string>} what it answered, unaligned
 */
export async function psql(url, sql, variables = {}) {
  const settings = Object.entries({ ...variables, ON_ERROR_STOP: "1" }).flatMap(([key, value]) => [
    "-v",
    `${key}=${value}`,
  ]);
  const { stdout } = await runClient("psql", { url, args: ["-XAtq", ...settings, "-f", "-"], input: `${sql}\n` });
  return stdout.trim();
}

/**
 * Makes a database unless it is there.
 * @param {string} url of any other database of the same server
 * @param {string} name
 */
export async function createDatabase(url, name) {
  const sql = `SELECT format('CREATE DATABASE %I', :'name')
    WHERE NOT EXISTS (SELECT FROM pg_database WHERE datname = :'name') \\gexec`;
  await psql(url, sql, { name });
}
