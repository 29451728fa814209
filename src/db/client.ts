import { drizzle, type NodePgDatabase } from 'drizzle-orm/node-postgres';
import pg from 'pg';
import * as schema from './schema.ts';

/** The database, or a transaction in it. */
export type Database = NodePgDatabase<typeof schema>;

/** Opens a pool as the application's role. Queries that take longer than ten seconds are given up, and waits for a connection after five. */
export const openDatabase = (connectionString: string): { db: Database; pool: pg.Pool } => {
  const pool = new pg.Pool({
    connectionString,
    max: 10,
    statement_timeout: 10_000,
    connectionTimeoutMillis: 5_000,
  });
  // A connection that breaks while idle is replaced by the pool; without a listener it would end the process.
  pool.on('error', () => {});
  return { db: drizzle(pool, { schema }), pool };
};
