import PgBoss from 'pg-boss'

export const queues = { refit: 'refit', release: 'release' } as const

// A refit that is asked for while one waits is the same refit, and one runs at a time over all instances;
// releases are told apart by their singleton key.
const policies = { refit: 'stately', release: 'short' } as const

/** A job queue in the database at `url`, not yet started. Errors of its own connections go to `onError`. */
export function openQueue(url: string, onError: (error: Error) => void): PgBoss {
  const boss = new PgBoss({ connectionString: url, max: 3, application_name: 'kedgewise jobs', connectionTimeoutMillis: 2000 } as PgBoss.ConstructorOptions)
  boss.on('error', onError)
  return boss
}

/** Starts the queue and makes sure that every queue of the product exists. */
export async function startQueue(boss: PgBoss): Promise<void> {
  await boss.start()
  for (const name of Object.values(queues)) {
    await boss.createQueue(name, { name, policy: policies[name], retryLimit: 5, retryDelay: 10, retryBackoff: true, expireInSeconds: 900 })
  }
}
