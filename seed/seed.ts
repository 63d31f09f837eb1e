// Migrates the database at DATABASE_URL, writes the demo world if it is not there, and asks for a refit and for its releases.
import { createHash } from 'node:crypto'
import { fileURLToPath } from 'node:url'
import { sql } from 'drizzle-orm'
import { connect } from '../server/db/client'
import { applyMigrations } from '../server/db/migrate'
import { designs, facts } from '../server/db/schema'
import { transact } from '../server/db/transact'
import { openQueue, queues, startQueue } from '../server/jobs/queue'
import { makeWorld } from './world'
import { worldReleases } from './world/releases'
import { writeWorld } from './write'

const fact = 'demo world'
const tables = 'trial_replies, pull_questions, releases, covariances, estimates, fits, pulls, trials, rigs, modifications, sizes, designs, families, seabeds, facts'

async function seed(url: string): Promise<string> {
  await applyMigrations(url, fileURLToPath(new URL('../drizzle', import.meta.url)))
  const world = makeWorld()
  const releases = worldReleases(world)
  const hash = createHash('sha256').update(JSON.stringify([world, releases])).digest('hex')
  const { db, pool, close } = connect(url)
  const boss = openQueue(url, error => console.error(error.message))
  try {
    const [known] = await db.select().from(facts)
    if (known?.name === fact && known.value === hash) return 'the demo world is there already'
    if (!known && (await db.select().from(designs).limit(1)).length) {
      throw new Error('DATABASE_URL holds designs that are not the demo world\'s: nothing was written')
    }
    await startQueue(boss)
    await transact(pool, async (tx, plain) => {
      await tx.execute(sql.raw(`truncate ${tables} restart identity cascade`))
      await writeWorld(tx, world)
      await tx.insert(facts).values({ name: fact, value: hash })
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
  console.log(await seed(url))
}
catch (error) {
  console.error((error as Error).message)
  process.exit(1)
}
