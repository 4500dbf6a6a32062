import { AsyncLocalStorage } from "node:async_hooks";
import pg from "pg";
import { Sequelize, type Transaction } from "sequelize";
import { initModels } from "./models/index.ts";

const scope = new AsyncLocalStorage<Transaction>();

/** Runs `work` knowing that `tx` is the open transaction, so that a query which forgets it throws. */
export const insideTransaction = <T>(tx: Transaction, work: () => Promise<T>): Promise<T> => scope.run(tx, work);

/** Throws when a transaction is open here: calls over the network belong between two transactions, never inside one. */
export function refuseInsideTransaction(what: string): void {
  if (scope.getStore()) throw new Error(`${what} was called inside a database transaction`);
}

type QueryHook = (name: "beforeQuery", hook: (options: { transaction?: unknown }) => void) => void;

/** Opens the pool and readies the models. A query without `transaction` inside an open one throws; `null` is the spoken exception. */
export function connect(url: string, poolMax: number): Sequelize {
  const db = new Sequelize(url, {
    dialect: "postgres",
    dialectModule: pg,
    logging: false,
    pool: { max: poolMax, acquire: 20_000 },
    define: { underscored: true, timestamps: false, freezeTableName: true },
  });
  // Sequelize runs this hook but leaves it out of its types.
  (db.addHook as QueryHook).call(db, "beforeQuery", (options) => {
    if (scope.getStore() && options.transaction === undefined)
      throw new Error("This query forgot the open transaction. Pass it, or null to say that it stands apart.");
  });
  initModels(db);
  return db;
}
