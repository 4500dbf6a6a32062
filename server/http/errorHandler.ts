import type { ErrorRequestHandler } from "express";
import { AppError, type ErrorCode, problemOf } from "../../shared/errors.ts";
import type { Logger } from "../lib/logger.ts";

// What Express's own parsers and the database say, in our words.
const parserCodes: Record<string, ErrorCode> = {
  "entity.parse.failed": "bad_json",
  "entity.too.large": "body_too_large",
  "encoding.unsupported": "wrong_content_type",
  "charset.unsupported": "wrong_content_type",
  "request.aborted": "bad_json",
  LIMIT_FILE_SIZE: "body_too_large",
  LIMIT_UNEXPECTED_FILE: "bad_input",
};

const asAppError = (error: unknown): AppError => {
  if (error instanceof AppError) return error;
  const { type, code, name } = (error ?? {}) as { type?: string; code?: string; name?: string };
  const known = parserCodes[type ?? ""] ?? parserCodes[code ?? ""];
  if (known) return new AppError(known);
  if (name === "URIError") return new AppError("not_found");
  if (name === "SequelizeConnectionRefusedError" || name === "SequelizeConnectionAcquireTimeoutError")
    return new AppError("not_ready");
  return new AppError("internal");
};

/** Every failure leaves as an RFC 9457 problem document; only unforeseen ones are logged with their cause. */
export const errorHandler =
  (log: Logger): ErrorRequestHandler =>
  (error, req, res, next) => {
    if (res.headersSent) {
      next(error);
      return;
    }
    const known = asAppError(error);
    const problem = { ...problemOf(known.code, known.extras), instance: req.path, requestId: String(req.id) };
    if (known.code === "internal") log.error({ err: error as Error, requestId: req.id }, "unforeseen");
    if (known.extras.retryAfterS) res.set("retry-after", String(known.extras.retryAfterS));
    res
      .set("cache-control", "no-store")
      .status(problem.status)
      .type("application/problem+json")
      .send(JSON.stringify(problem));
  };
