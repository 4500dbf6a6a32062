import { createHash } from "node:crypto";
import type { Request } from "express";
import { QueryTypes, type Sequelize, type Transaction } from "sequelize";
import { AppError } from "../../shared/errors.ts";

type Once = { db: Sequelize; tx: Transaction; now: Date; scope: string; req: Request; input: unknown };
type Row = { request_hash: Buffer; answer: unknown };

/**
 * Does the work once for a request's Idempotency-Key, within the open transaction: the same request again gets the kept
 * answer, another request under the same key is refused, and a failed one takes its key back with it.
 */
export async function onlyOnce<T>({ db, tx, now, scope, req, input }: Once, work: () => Promise<T>): Promise<T> {
  const key = req.get("idempotency-key") ?? "";
  if (!/^[\w-]{8,100}$/.test(key)) throw new AppError("idempotency_missing");
  const hash = createHash("sha256")
    .update(`${req.method} ${req.path}\n${JSON.stringify(input)}`)
    .digest();
  const select = { transaction: tx, type: QueryTypes.SELECT } as const;
  const taken = await db.query<{ key: string }>(
    "INSERT INTO idempotency_key (scope, key, request_hash, created_at) VALUES ($1, $2, $3, $4) ON CONFLICT DO NOTHING RETURNING key",
    { bind: [scope, key, hash, now], ...select },
  );
  if (taken.length === 0) {
    const sql = "SELECT request_hash, answer FROM idempotency_key WHERE scope = $1 AND key = $2";
    const [row] = await db.query<Row>(sql, { bind: [scope, key], ...select });
    if (!row?.request_hash.equals(hash)) throw new AppError("idempotency_reused");
    return row.answer as T;
  }
  const answer = await work();
  await db.query("UPDATE idempotency_key SET answer = $3 WHERE scope = $1 AND key = $2", {
    bind: [scope, key, JSON.stringify(answer)],
    transaction: tx,
  });
  return answer;
}
