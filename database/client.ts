import { drizzle } from 'drizzle-orm/node-postgres';
import pg from 'pg';
import * as alias from './schema/alias.ts';
import * as catalogue from './schema/catalogue.ts';
import * as club from './schema/club.ts';
import * as identity from './schema/identity.ts';
import * as intake from './schema/intake.ts';
import * as training from './schema/training.ts';

export const tables = { ...identity, ...club, ...catalogue, ...alias, ...intake, ...training };

/**
 * A pool of connections and the query builder on it. `end()` the pool when done.
 * @param waitMs how long a request may wait for a free connection before it is turned away
 */
export function openDatabase(
  url: string,
  { max = 10, waitMs = 1_000 }: { max?: number; waitMs?: number } = {},
) {
  const pool = new pg.Pool({
    connectionString: url,
    max,
    connectionTimeoutMillis: waitMs,
    statement_timeout: 15_000,
    application_name: 'sixteenfold',
  });
  // A connection that dies while idle is replaced by the pool; without a listener it would end the process.
  pool.on('error', () => {});
  return { pool, db: drizzle(pool, { schema: tables }) };
}

export type Database = ReturnType<typeof openDatabase>['db'];
/** What a transaction's callback is handed. */
export type Transaction = Parameters<Parameters<Database['transaction']>[0]>[0];
