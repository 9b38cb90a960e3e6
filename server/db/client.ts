import { drizzle, type NodePgDatabase } from 'drizzle-orm/node-postgres';
import pg from 'pg';

export type Db = NodePgDatabase;

export interface Database {
  db: Db;
  pool: pg.Pool;
  close: () => Promise<void>;
}

export interface DatabaseOptions {
  url: string;
  /** Connections kept at most. */
  connections: number;
  /** Told of a connection lost while idle; without a listener such a loss would end the process. */
  onIdleError: (error: Error) => void;
}

/** Opens the pool; nothing is connected until the first query. */
export function openDatabase({ url, connections, onIdleError }: DatabaseOptions): Database {
  const pool = new pg.Pool({
    connectionString: url,
    max: connections,
    connectionTimeoutMillis: 5_000,
    statement_timeout: 15_000,
    idle_in_transaction_session_timeout: 15_000,
    application_name: 'tankmark',
    // Every prepared statement looks rows up by full keys: planning it anew for each set of values gains nothing.
    options: '-c plan_cache_mode=force_generic_plan',
  });
  pool.on('error', onIdleError);
  return { db: drizzle(pool), pool, close: () => pool.end() };
}
