import { QueryTypes, type Sequelize, type Transaction } from "sequelize";

/** The wall clock: for sessions, rate limits and signatures only. Everything of the trade takes `now` from its context. */
export const wallNow = (): Date => new Date();

export type Clock = { now(transaction: Transaction | null): Promise<Date> };

/** The true time. */
export const realClock: Clock = { now: () => Promise.resolve(wallNow()) };

/** True time plus the offset stored in the database, so that every process agrees when the demo's time is moved. */
export const demoClock = (db: Sequelize): Clock => ({
  async now(transaction) {
    const [row] = await db.query<{ offset_ms: string }>("SELECT offset_ms FROM demo_clock", {
      type: QueryTypes.SELECT,
      transaction,
    });
    return new Date(wallNow().getTime() + Number(row?.offset_ms ?? 0));
  },
});

/** Moves the demo's time so that it is `to` now. */
export async function setDemoNow(db: Sequelize, to: Date, transaction: Transaction | null = null): Promise<void> {
  await db.query(
    "INSERT INTO demo_clock (offset_ms) VALUES ($1) ON CONFLICT (id) DO UPDATE SET offset_ms = EXCLUDED.offset_ms",
    { bind: [to.getTime() - wallNow().getTime()], transaction },
  );
}
