import { sql } from 'drizzle-orm'
import type { Database } from '../client'

/** Resolves when the database answers; rejects otherwise. */
export async function ping(db: Database): Promise<void> {
  await db.execute(sql`select 1`)
}
