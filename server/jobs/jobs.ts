import PgBoss from "pg-boss";
import { QueryTypes, type Sequelize, type Transaction } from "sequelize";
import type { z } from "zod";
import { wallNow } from "../lib/clock.ts";
import type { Logger } from "../lib/logger.ts";

/** A kind of background work: a constant name, the shape of its data, and how patiently it is tried again. */
export type JobKind<S extends z.ZodType = z.ZodType> = {
  readonly name: string;
  readonly data: S;
  readonly retryLimit: number;
  readonly retryDelayS: number;
};

export type Jobs = {
  /** Queues the work as part of the caller's transaction: rolled back, no job; committed, exactly one. */
  send<S extends z.ZodType>(kind: JobKind<S>, data: z.input<S>, options: { tx: Transaction }): Promise<void>;
};

type Running = Jobs & {
  start(kinds: JobKind[]): Promise<void>;
  /** Runs the handler for each job, one at a time a process; it may run twice. */
  work<S extends z.ZodType>(kind: JobKind<S>, handler: (data: z.output<S>) => Promise<void>): Promise<void>;
  /** Queues a sweep every minute, once among all processes. */
  everyMinute(kind: JobKind): Promise<void>;
  stop(): Promise<void>;
};

type SqlDb = { executeSql(text: string, values: unknown[]): Promise<{ rows: unknown[]; rowCount: number }> };

// pg-boss speaks plain SQL: here it speaks it inside Sequelize's transaction. It leaves some values undefined; the driver wants null.
const inside = (db: Sequelize, tx: Transaction): SqlDb => ({
  async executeSql(sql, values) {
    const rows = await db.query<object>(sql, {
      bind: values.map((v) => v ?? null),
      transaction: tx,
      type: QueryTypes.SELECT,
    });
    return { rows, rowCount: rows.length };
  },
});

/** Background work in the same database (pg-boss): durable, retried, shared by all processes. */
export function createJobs(db: Sequelize, databaseUrl: string, log: Logger): Running {
  const boss = new PgBoss({ connectionString: databaseUrl, max: 4, application_name: "loamless-jobs" });
  boss.on("error", (error) => {
    log.error({ err: error }, "job queue");
  });
  return {
    async start(kinds) {
      await boss.start();
      for (const kind of kinds) await boss.createQueue(kind.name);
    },
    async send(kind, data, { tx }) {
      const options = { retryLimit: kind.retryLimit, retryDelay: kind.retryDelayS };
      await boss.send(kind.name, kind.data.parse(data) as object, { ...options, db: inside(db, tx) });
    },
    async work(kind, handler) {
      await boss.work(kind.name, { pollingIntervalSeconds: 1 }, async (batch: { id: string; data: unknown }[]) => {
        for (const job of batch) {
          const begunAt = wallNow().getTime();
          await handler(kind.data.parse(job.data) as z.output<typeof kind.data>);
          log.info({ job: kind.name, id: job.id, ms: wallNow().getTime() - begunAt }, "job done");
        }
      });
    },
    everyMinute: (kind) => boss.schedule(kind.name, "* * * * *", {}, { retryLimit: kind.retryLimit }),
    stop: () => boss.stop({ graceful: true, timeout: 8_000 }),
  };
}
