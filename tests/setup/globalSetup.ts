import pg from "pg";
import type { TestProject } from "vitest/node";
import { migrate } from "../../server/db/migrate.ts";
import { connect } from "../../server/db/sequelize.ts";
import { cleanStaleTestClusters, startCluster, testDataDir } from "../../server/dev/postgres.mjs";

declare module "vitest" {
  interface ProvidedContext {
    /** A database of the test cluster that may be copied: migrated, empty, with nobody connected. */
    templateUrl: string;
    adminUrl: string;
  }
}

/** One private cluster a run; migrated once into a template. */
export default async function setup(project: TestProject) {
  await cleanStaleTestClusters();
  const cluster = await startCluster({ dataDir: testDataDir(), tune: "test" });
  const admin = new pg.Client({ connectionString: cluster.url("postgres") });
  await admin.connect();
  await admin.query("CREATE DATABASE template_farm");
  await admin.end();
  const db = connect(cluster.url("template_farm"), 2);
  await migrate(db, cluster.url("template_farm"));
  await db.close();
  project.provide("adminUrl", cluster.url("postgres"));
  project.provide("templateUrl", cluster.url("template_farm"));
  return () => cluster.destroy();
}
