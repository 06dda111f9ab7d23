import { AsyncLocalStorage } from 'node:async_hooks';
import type { PgDatabase, PgQueryResultHKT } from 'drizzle-orm/pg-core';
import type * as schema from './schema.ts';

/** What stores query: the database itself or an open transaction, on either driver. */
export type Queries = PgDatabase<PgQueryResultHKT, typeof schema>;

export interface Database {
  /** Queries outside a transaction. Throws inside one: with a single connection it would wait for itself for ever. */
  readonly queries: Queries;
  /** Runs `work` in one transaction; it must query through what it is handed. Throws when nested. */
  transaction<T>(work: (tx: Queries) => Promise<T>): Promise<T>;
  close(): Promise<void>;
}

const inTransaction = new AsyncLocalStorage<true>();

/** Wraps a driver's database so that a query beside an open transaction is an error and not a hang. */
export function guardDatabase(db: Queries, close: () => Promise<void>): Database {
  const outside = (): Queries => {
    if (inTransaction.getStore())
      throw new Error('database used inside its own transaction: query through the transaction');
    return db;
  };
  return {
    get queries() {
      return outside();
    },
    transaction: (work) => outside().transaction((tx) => inTransaction.run(true, () => work(tx))),
    close,
  };
}
