import { randomUUID } from "node:crypto";
import express from "express";
import request from "supertest";
import { afterAll, beforeAll, expect, test } from "vitest";
import { z } from "zod";
import type { Contract } from "../../shared/api/contract.ts";
import { Person } from "../../server/db/models/index.ts";
import { endpoint, type Endpoint } from "../../server/http/endpoint.ts";
import { errorHandler } from "../../server/http/errorHandler.ts";
import { readEnv } from "../../server/env.ts";
import { createJobs } from "../../server/jobs/jobs.ts";
import { realClock } from "../../server/lib/clock.ts";
import { createLogger } from "../../server/lib/logger.ts";
import { openDatabase } from "../support/database.ts";

const helperDto = z.object({ id: z.uuid(), name: z.string() });
const hire = {
  method: "POST",
  path: "/api/helpers",
  summary: "Take on a helper",
  makes: true,
  input: z.object({ email: z.email(), name: z.string().min(1) }),
  output: helperDto,
} as const satisfies Contract;
const look = {
  method: "GET",
  path: "/api/helpers/:id",
  summary: "Look a helper up",
  isPublic: true,
  input: z.object({ id: z.uuid() }),
  output: helperDto,
} as const satisfies Contract;

let farm: Awaited<ReturnType<typeof openDatabase>>;
let owner: Person;
let app: (...endpoints: Endpoint[]) => express.Express;

beforeAll(async () => {
  farm = await openDatabase();
  owner = await Person.create({
    email: "owner@farm.example",
    role: "owner",
    createdAt: new Date("2026-06-04T16:00:00Z"),
  });
  const log = createLogger("silent");
  const env = readEnv({
    NODE_ENV: "test",
    ORIGIN: "http://127.0.0.1",
    DATABASE_URL: farm.url,
    SESSION_SECRET: "x".repeat(32),
    SMTP_URL: "smtp://127.0.0.1:1",
    MAIL_FROM: "farm@farm.example",
  });
  const house = { env, db: farm.db, clock: realClock, jobs: createJobs(farm.db, farm.url, log), log };
  app = (...endpoints) => {
    const shop = express().use(express.json({ limit: 1_000 }));
    shop.use((req, _res, next) => {
      if (req.get("x-test-person")) req.user = owner;
      next();
    });
    for (const one of endpoints)
      shop[one.contract.method === "GET" ? "get" : "post"](one.contract.path, one.handle(house));
    return shop.use(errorHandler(log));
  };
});
afterAll(() => farm.close());

const hiring = endpoint(hire, ({ input, now, tx }) =>
  Person.create({ ...input, role: "stall", createdAt: now }, { transaction: tx }),
);
const looking = endpoint(look, async ({ input, tx }) =>
  Person.findByPk(input.id, { transaction: tx, rejectOnEmpty: true }),
);
const asOwner = (shop: express.Express, key: string = randomUUID()) =>
  request(shop).post("/api/helpers").set("x-test-person", "1").set("idempotency-key", key);
const person = () => ({ email: `${randomUUID()}@farm.example`, name: "Ada" });
const known = (email: string) => Person.count({ where: { email } });

test("only what the contract names leaves the house", async () => {
  const answer = await asOwner(app(hiring)).send(person()).expect(200);
  expect(Object.keys(answer.body as object).sort()).toEqual(["id", "name"]);
});
test("nobody signed in is told so before anything is saved", async () => {
  const helper = person();
  const answer = await request(app(hiring)).post("/api/helpers").send(helper).expect(401);
  expect(answer.body).toMatchObject({ code: "not_signed_in" });
  expect(await known(helper.email)).toBe(0);
});
test("the same request under the same key is done once and answered alike, also twenty times at once", async () => {
  const [shop, key, helper] = [app(hiring), randomUUID(), person()];
  const answers = await Promise.all(Array.from({ length: 20 }, () => asOwner(shop, key).send(helper)));
  expect(new Set(answers.map((a) => `${a.status} ${(a.body as { id: string }).id}`)).size).toBe(1);
  expect(await known(helper.email)).toBe(1);
});
test("another request under a used key is refused, and one without a key too", async () => {
  const [shop, key] = [app(hiring), randomUUID()];
  await asOwner(shop, key).send(person()).expect(200);
  await asOwner(shop, key).send(person()).expect(409);
  await request(shop).post("/api/helpers").set("x-test-person", "1").send(person()).expect(400);
});
test("an answer that breaks its contract saves nothing", async () => {
  const helper = person();
  const wrong = endpoint(hire, async ({ input, now, tx }) => {
    await Person.create({ ...input, role: "stall", createdAt: now }, { transaction: tx });
    return { id: "no id", name: input.name };
  });
  await asOwner(app(wrong)).send(helper).expect(500);
  expect(await known(helper.email)).toBe(0);
});
test("a query that forgets the open transaction fails, and nothing is half-saved", async () => {
  const helper = person();
  const forgetful = endpoint(hire, async ({ input, now, tx }) => {
    const made = await Person.create({ ...input, role: "stall", createdAt: now }, { transaction: tx });
    await Person.findByPk(made.id);
    return made;
  });
  await asOwner(app(forgetful)).send(helper).expect(500);
  expect(await known(helper.email)).toBe(0);
});
test("a deadlock or serialisation failure is tried again, from the start", async () => {
  let tries = 0;
  const contested = endpoint(hire, async ({ input, now, tx }) => {
    const made = await Person.create({ ...input, role: "stall", createdAt: now }, { transaction: tx });
    tries += 1;
    if (tries < 3) await farm.db.query("DO $$ BEGIN RAISE SQLSTATE '40001'; END $$", { transaction: tx });
    return made;
  });
  const helper = person();
  await asOwner(app(contested)).send(helper).expect(200);
  expect([tries, await known(helper.email)]).toEqual([3, 1]);
});
test("bad fields are named one by one; bad JSON, a large body and an impossible id each get their own answer", async () => {
  const shop = app(hiring, looking);
  const answer = await asOwner(shop)
    .send({ email: "no" })
    .expect(422)
    .expect("content-type", /problem\+json/);
  expect((answer.body as { errors: { field: string }[] }).errors.map((e) => e.field)).toEqual(["email", "name"]);
  await asOwner(shop).set("content-type", "application/json").send("{").expect(400);
  await asOwner(shop)
    .send({ name: "x".repeat(2_000) })
    .expect(413);
  await request(shop).get("/api/helpers/7").expect(404);
});
test("a public read is answered without signing in, from its own transaction", async () => {
  await request(app(looking)).get(`/api/helpers/${owner.id}?more=1`).expect(200, { id: owner.id, name: "" });
});
