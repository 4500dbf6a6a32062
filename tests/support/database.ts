import { randomUUID } from "node:crypto";
import pg from "pg";
import { inject } from "vitest";
import { connect } from "../../server/db/sequelize.ts";

/** A database of its own, copied from the migrated template; `close` leaves nothing behind. */
export async function openDatabase() {
  const name = `farm_${randomUUID().replaceAll("-", "")}`;
  const admin = new pg.Client({ connectionString: inject("adminUrl") });
  await admin.connect();
  await admin.query(`CREATE DATABASE ${name} TEMPLATE template_farm STRATEGY FILE_COPY`);
  const url = inject("templateUrl").replace(/template_farm$/, name);
  const db = connect(url, 8);
  const close = async () => {
    await db.close();
    await admin.query(`DROP DATABASE ${name} WITH (FORCE)`);
    await admin.end();
  };
  return { db, url, close };
}
