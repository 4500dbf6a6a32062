import { QueryTypes } from "sequelize";
import { afterAll, beforeAll, expect, test } from "vitest";
import { migrate } from "../../server/db/migrate.ts";
import { openDatabase } from "../support/database.ts";

let farm: Awaited<ReturnType<typeof openDatabase>>;
beforeAll(async () => {
  farm = await openDatabase();
});
afterAll(() => farm.close());

type Column = { table: string; column: string; nullable: boolean };

test("models and database have the same columns, and agree on which may be empty", async () => {
  const inDatabase = await farm.db.query<Column>(
    `SELECT table_name AS table, column_name AS column, is_nullable = 'YES' AS nullable FROM information_schema.columns
     WHERE table_schema = 'public' AND table_name NOT IN ('session', 'demo_clock', 'idempotency_key', 'migration')`,
    { type: QueryTypes.SELECT },
  );
  const inModels = Object.values(farm.db.models).flatMap((model) =>
    Object.values(model.getAttributes()).map((attribute) => ({
      table: String(model.getTableName()),
      column: attribute.field ?? "",
      nullable: attribute.allowNull !== false,
    })),
  );
  const lines = (columns: Column[]) =>
    columns.map((c) => `${c.table}.${c.column} ${c.nullable ? "may be empty" : ""}`).sort();
  expect(inModels.length).toBeGreaterThan(100);
  expect(lines(inModels)).toEqual(lines(inDatabase));
});

test("a migrated database is left as it is, however many processes start at once", async () => {
  const again = await Promise.all([1, 2, 3].map(() => migrate(farm.db, farm.url)));
  expect(again).toEqual([[], [], []]);
});
