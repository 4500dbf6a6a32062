import type { Request, RequestHandler, Response } from "express";
import { Transaction } from "sequelize";
import { AppError } from "../../shared/errors.ts";
import type { Contract, Output } from "../../shared/api/contract.ts";
import type { z } from "zod";
import { insideTransaction } from "../db/sequelize.ts";
import type { Person } from "../db/models/index.ts";
import type { Ctx, House, SignedInCtx } from "./context.ts";
import { onlyOnce } from "./idempotency.ts";
import { sharedAnswer } from "./sharedAnswer.ts";

type CtxOf<C extends Contract> = C extends { isPublic: true } ? Ctx : SignedInCtx;
type Call<C extends Contract> = CtxOf<C> & { input: z.output<C["input"]> };
/** The request itself, for the few handlers that must reach the session; null when a page is rendered in this process. */
type Http = { req: Request; res: Response } | null;
type Handler<C extends Contract> = (call: Call<C>, http: Http) => Promise<Output<C>>;

/** A contract with the one function that answers it. */
export type Endpoint = {
  contract: Contract;
  /** Answers over HTTP. */
  handle(house: House): RequestHandler;
  /** Answers inside this process, as nobody in particular; only for public reads (server-rendered pages). */
  read(house: House, input: unknown): Promise<unknown>;
};

const MAX_TRIES = 5;
const isRetryable = (error: unknown): boolean => {
  const code = (error as { parent?: { code?: string } } | null)?.parent?.code;
  return code === "40001" || code === "40P01";
};

/**
 * Ties a contract to its handler, which returns data and never touches the response: parse, one transaction, commit, answer.
 * The answer is parsed before the commit, so what the output schema does not name cannot leave and a wrong answer saves
 * nothing. A serialisation failure or deadlock is tried again here and only here.
 */
export function endpoint<C extends Contract>(contract: C, handler: Handler<C>): Endpoint {
  const act = (house: House, person: Person | null, input: z.output<C["input"]>, http: Http) =>
    inOneTransaction(house, contract, async (tx) => {
      const now = await house.clock.now(tx);
      const call = { person, tx, now, jobs: house.jobs, env: house.env, input } as Call<C>;
      const answer = async () => contract.output.parse(await handler(call, http));
      if (!contract.makes || !http || !person) return answer();
      return onlyOnce({ db: house.db, tx, now, scope: person.id, req: http.req, input }, answer);
    });
  return {
    contract,
    handle: (house) => async (req, res) => {
      const person = (req.user as Person | undefined) ?? null;
      if (!contract.isPublic && !person) throw new AppError("not_signed_in");
      const input = parseInput(contract, {
        ...(req.method === "GET" ? req.query : (req.body as object | undefined)),
        ...req.params,
      });
      const { sharedForMs: forMs } = contract;
      const answer = async () =>
        JSON.stringify(await act(house, forMs === undefined ? person : null, input, { req, res }));
      const key = `${contract.path} ${JSON.stringify(input)}`;
      const body = await (forMs === undefined ? answer() : sharedAnswer(house, key, forMs, answer));
      res.set("cache-control", forMs === undefined ? "private, no-store" : "no-cache");
      res.type("json").send(body);
    },
    read: (house, input) => {
      if (!contract.isPublic) throw new AppError("not_signed_in");
      return act(house, null, parseInput(contract, input), null);
    },
  };
}

function parseInput<C extends Contract>(contract: C, raw: unknown): z.output<C["input"]> {
  const parsed = contract.input.safeParse(raw ?? {});
  if (parsed.success) return parsed.data as z.output<C["input"]>;
  // An address with an impossible id is an address of nothing.
  const params = [...contract.path.matchAll(/:(\w+)/g)].map((match) => match[1]);
  if (parsed.error.issues.every((issue) => params.includes(String(issue.path[0])))) throw new AppError("not_found");
  const fieldErrors = parsed.error.issues.map((issue) => ({ field: issue.path.join("."), message: sentenceOf(issue) }));
  throw new AppError("bad_input", { errors: fieldErrors });
}

const sentenceOf = (issue: z.core.$ZodIssue): string => {
  if (issue.code === "invalid_type" && issue.input === undefined) return "Please fill this in.";
  if (issue.code === "unrecognized_keys") return "This is not something we know.";
  return issue.message;
};

async function inOneTransaction<T>(
  house: House,
  contract: Contract,
  work: (tx: Transaction) => Promise<T>,
): Promise<T> {
  const isRead = contract.method === "GET";
  const options = isRead ? { isolationLevel: Transaction.ISOLATION_LEVELS.REPEATABLE_READ, readOnly: true } : {};
  for (let attempt = 1; ; attempt++) {
    try {
      return await house.db.transaction(options, (tx) => insideTransaction(tx, () => work(tx)));
    } catch (error) {
      if (!isRetryable(error) || attempt >= MAX_TRIES) throw error;
      house.log.warn({ path: contract.path, attempt }, "transaction tried again");
    }
  }
}
