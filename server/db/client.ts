import { drizzle, type NodePgDatabase } from 'drizzle-orm/node-postgres'
import pg from 'pg'
import * as schema from './schema'

export type Database = NodePgDatabase<typeof schema>
export type Transaction = Parameters<Parameters<Database['transaction']>[0]>[0]

export interface Connection { db: Database, pool: pg.Pool, close: () => Promise<void> }

/**
 * Opens a pool on a PostgreSQL address: 2 s to connect, 5 s a statement.
 * A connection lost while idle (a database restart) is reported and replaced, never fatal.
 */
export function connect(url: string, options: { max?: number, onError?: (error: Error) => void } = {}): Connection {
  const pool = new pg.Pool({
    connectionString: url,
    max: options.max ?? 10,
    connectionTimeoutMillis: 2000,
    statement_timeout: 5000,
    application_name: 'kedgewise',
  })
  pool.on('error', error => options.onError?.(error))
  return { db: drizzle(pool, { schema }), pool, close: () => pool.end() }
}
