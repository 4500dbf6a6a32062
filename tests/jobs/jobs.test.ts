import { QueryTypes } from "sequelize";
import { afterAll, beforeAll, expect, test, vi } from "vitest";
import { z } from "zod";
import { createJobs } from "../../server/jobs/jobs.ts";
import { createLogger } from "../../server/lib/logger.ts";
import { openDatabase } from "../support/database.ts";

const orderMail = { name: "test.order-mail", data: z.object({ preorderId: z.uuid() }), retryLimit: 2, retryDelayS: 1 };
const preorderId = "5b7a4a0e-6c1c-4b57-9a55-0d0f2a0b7c11";

let farm: Awaited<ReturnType<typeof openDatabase>>;
let jobs: ReturnType<typeof createJobs>;
beforeAll(async () => {
  farm = await openDatabase();
  jobs = createJobs(farm.db, farm.url, createLogger("silent"));
  await jobs.start([orderMail]);
});
afterAll(async () => {
  await jobs.stop();
  await farm.close();
});

const queued = async () =>
  (
    await farm.db.query("SELECT id FROM pgboss.job WHERE name = $1", {
      bind: [orderMail.name],
      type: QueryTypes.SELECT,
    })
  ).length;

test("a job rides its transaction: rolled back there is none, committed there is one, and it is done", async () => {
  const refused = farm.db.transaction(async (tx) => {
    await jobs.send(orderMail, { preorderId }, { tx });
    throw new Error("the order was refused");
  });
  await expect(refused).rejects.toThrow("refused");
  expect(await queued()).toBe(0);

  await farm.db.transaction((tx) => jobs.send(orderMail, { preorderId }, { tx }));
  expect(await queued()).toBe(1);

  const sent: string[] = [];
  await jobs.work(orderMail, (data) => Promise.resolve(void sent.push(data.preorderId)));
  await vi.waitFor(() => expect(sent).toEqual([preorderId]), { timeout: 10_000 });
});
