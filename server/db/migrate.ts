import { migrate } from 'drizzle-orm/node-postgres/migrator'
import { drizzle } from 'drizzle-orm/node-postgres'
import pg from 'pg'

/** Any constant of our own; every instance asks for the same one. */
const migrationLock = 5_172_021

/**
 * Applies the generated migrations in `folder`, one instance at a time: drizzle's own migrate() takes no lock,
 * so a transaction on a second connection holds an advisory one meanwhile and lets go of it however this ends.
 */
export async function applyMigrations(url: string, folder: string): Promise<void> {
  const settings = { connectionString: url, connectionTimeoutMillis: 2000, application_name: 'kedgewise migrations' }
  const guard = new pg.Client(settings)
  const worker = new pg.Client(settings)
  // A connection that breaks rejects its query as well; the event alone must not end the process.
  for (const client of [guard, worker]) client.on('error', () => {})
  try {
    await guard.connect()
    await worker.connect()
    await guard.query('begin')
    await guard.query('select pg_advisory_xact_lock($1)', [migrationLock])
    await migrate(drizzle(worker), { migrationsFolder: folder })
    await guard.query('commit')
  }
  finally {
    await Promise.allSettled([guard.end(), worker.end()])
  }
}
