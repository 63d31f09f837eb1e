import { drizzle } from 'drizzle-orm/node-postgres'
import type pg from 'pg'
import type { Transaction } from './client'
import * as schema from './schema'

/** Plain SQL on the connection of an open transaction, in the shape that the job queue takes as `db`. */
export interface PlainSql { executeSql: (text: string, values: unknown[]) => Promise<{ rows: unknown[] }> }

/**
 * Runs `work` in one transaction on a connection of its own. `plain` speaks to the same transaction in plain SQL, so that a
 * job sent through it is there if and only if the rows are.
 */
export async function transact<Result>(pool: pg.Pool, work: (tx: Transaction, plain: PlainSql) => Promise<Result>): Promise<Result> {
  const client = await pool.connect()
  try {
    const plain = { executeSql: async (text: string, values: unknown[]) => ({ rows: (await client.query(text, values)).rows }) }
    return await drizzle(client, { schema }).transaction(tx => work(tx, plain))
  }
  finally {
    client.release()
  }
}
