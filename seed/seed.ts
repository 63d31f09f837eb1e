// Migrates the database at DATABASE_URL, writes the demo world if it is not there, and asks for a refit and for its releases.
import { fileURLToPath } from 'node:url'
import { sql } from 'drizzle-orm'
import { connect, type Database, type Transaction } from '../server/db/client'
import { applyMigrations } from '../server/db/migrate'
import { designs, facts, pulls, trials } from '../server/db/schema'
import { transact } from '../server/db/transact'
import { openQueue, queues, startQueue } from '../server/jobs/queue'
import { root } from './host/project.mjs'
import { loopbackOnly } from './host/serve.mjs'
import { seedSources, sourceHash } from './host/stamps.mjs'
import { makeWorld } from './world'
import { worldReleases } from './world/releases'
import { writeWorld } from './write'

const fact = 'demo world'
const rowsFact = 'demo world rows'
const tables = 'trial_replies, pull_questions, releases, covariances, estimates, fits, pulls, trials, rigs, modifications, sizes, designs, families, seabeds, facts'

/** What is there, so that rows which somebody added are not swept away with an older world. */
async function rowsOf(db: Database | Transaction): Promise<string> {
  return `${await db.$count(designs)} designs, ${await db.$count(trials)} trials, ${await db.$count(pulls)} pulls`
}

async function seed(url: string): Promise<string> {
  await applyMigrations(url, fileURLToPath(new URL('../drizzle', import.meta.url)))
  const world = makeWorld()
  const releases = worldReleases(world)
  const hash = sourceHash(root, seedSources)
  const { db, pool, close } = connect(url)
  const boss = openQueue(url, error => console.error(error.message))
  try {
    const known = new Map((await db.select().from(facts)).map(({ name, value }) => [name, value]))
    if (known.get(fact) === hash) return 'the demo world is there already'
    const there = await rowsOf(db)
    if (there !== (known.get(rowsFact) ?? '0 designs, 0 trials, 0 pulls')) {
      throw new Error(`The database holds ${there}, which are not the demo world's alone: nothing was written`)
    }
    await startQueue(boss)
    await transact(pool, async (tx, plain) => {
      await tx.execute(sql.raw(`truncate ${tables} cascade`))
      await writeWorld(tx, world)
      await tx.insert(facts).values([{ name: fact, value: hash }, { name: rowsFact, value: await rowsOf(tx) }])
      await boss.send(queues.refit, {}, { db: plain })
      for (const release of releases) await boss.send(queues.release, release, { db: plain, singletonKey: release.version })
    })
    return `wrote ${world.designs.length} invented designs, ${world.trials.length} trials and ${world.pulls.length} pulls; a refit and ${releases.length} releases are queued`
  }
  finally {
    await boss.stop({ graceful: false, close: true }).catch(() => {})
    await close()
  }
}

const url = process.env.DATABASE_URL
if (!url) {
  console.error('DATABASE_URL is not set')
  process.exit(1)
}
try {
  console.log(await seed(loopbackOnly(url)))
}
catch (error) {
  console.error((error as Error).message)
  process.exit(1)
}
