import { createHash } from "node:crypto";
import type { Request } from "express";
import { QueryTypes, type Sequelize, type Transaction } from "sequelize";
import { AppError } from "../../shared/errors.ts";

type Before = { db: Sequelize; tx: Transaction; now: Date; scope: string; req: Request; raw: unknown };
type Row = { request_hash: Buffer; answer: unknown };

/**
 * Takes the request's Idempotency-Key within the open transaction. Answers what the same request got before, if anything;
 * another request under the same key is refused. A failed request takes its key back with it.
 */
export async function answeredBefore({ db, tx, now, scope, req, raw }: Before): Promise<{ key: string; answer?: unknown }> {
  const key = req.get("idempotency-key") ?? "";
  if (!/^[\w-]{8,100}$/.test(key)) throw new AppError("idempotency_missing");
  const hash = createHash("sha256").update(`${req.method} ${req.path}\n${JSON.stringify(raw)}`).digest();
  const taken = await db.query<{ key: string }>(
    "INSERT INTO idempotency_key (scope, key, request_hash, created_at) VALUES ($1, $2, $3, $4) ON CONFLICT DO NOTHING RETURNING key",
    { bind: [scope, key, hash, now], transaction: tx, type: QueryTypes.SELECT },
  );
  if (taken.length === 1) return { key };
  const [row] = await db.query<Row>("SELECT request_hash, answer FROM idempotency_key WHERE scope = $1 AND key = $2", {
    bind: [scope, key],
    transaction: tx,
    type: QueryTypes.SELECT,
  });
  if (!row?.request_hash.equals(hash)) throw new AppError("idempotency_reused");
  return { key, answer: row.answer };
}

type Remember = { db: Sequelize; tx: Transaction; scope: string; key: string; answer: unknown };

/** Keeps the answer beside its key, committed together with what was made. */
export async function rememberAnswer({ db, tx, scope, key, answer }: Remember): Promise<void> {
  await db.query("UPDATE idempotency_key SET answer = $3 WHERE scope = $1 AND key = $2", {
    bind: [scope, key, JSON.stringify(answer)],
    transaction: tx,
  });
}
