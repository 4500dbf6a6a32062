import type { Sequelize, Transaction } from "sequelize";
import type { Logger } from "../lib/logger.ts";
import type { Clock } from "../lib/clock.ts";
import type { Env } from "../env.ts";
import type { Jobs } from "../jobs/jobs.ts";
import type { Person } from "../db/models/index.ts";

/** What the whole server shares: made once at start, passed down, never global. */
export type House = { env: Env; db: Sequelize; clock: Clock; jobs: Jobs; log: Logger };

/** What an action gets: who asks (null: nobody signed in), the open transaction, the farm's now, and the house's jobs. */
export type Ctx = { person: Person | null; tx: Transaction; now: Date; jobs: Jobs; env: Env };

/** A context in which somebody is signed in. */
export type SignedInCtx = Ctx & { person: Person };
