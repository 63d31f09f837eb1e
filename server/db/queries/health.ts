import { sql } from 'drizzle-orm'
import type { Database } from '../client'

/** Resolves when the database answers; rejects otherwise. */
export async function ping(db: Database): Promise<void> {
  await db.execute(sql`select 1`)
}

/** Whether the migrations have been applied (the newest table stands). */
export async function hasTables(db: Database): Promise<boolean> {
  const { rows } = await db.execute<{ there: boolean }>(sql`select to_regclass('public.covariances') is not null as there`)
  return rows[0]?.there === true
}
