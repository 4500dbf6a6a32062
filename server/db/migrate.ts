import pg from "pg";
import type { Sequelize } from "sequelize";
import { SequelizeStorage, Umzug } from "umzug";
import * as farm from "./migrations/0001-farm.ts";

// A plain list, not a pattern over files: the same under tsx, in tests and in the bundle.
const migrations = [{ name: "0001-farm", up: farm.up }];

const MIGRATION_LOCK = 7_260_011;

/** Brings the schema up to date. Several processes may call it at once: one works, the others wait. */
export async function migrate(db: Sequelize, databaseUrl: string): Promise<string[]> {
  const lock = new pg.Client({ connectionString: databaseUrl });
  await lock.connect();
  try {
    await lock.query("SELECT pg_advisory_lock($1)", [MIGRATION_LOCK]);
    const umzug = new Umzug({
      migrations,
      context: db.getQueryInterface(),
      storage: new SequelizeStorage({ sequelize: db, tableName: "migration" }),
      logger: undefined,
    });
    return (await umzug.up()).map((m) => m.name);
  } finally {
    await lock.end();
  }
}
