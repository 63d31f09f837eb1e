// Migrates the database at DATABASE_URL, writes the demo world if it is not there, and asks for a refit.
import { createHash } from 'node:crypto'
import { fileURLToPath } from 'node:url'
import { sql } from 'drizzle-orm'
import { connect, type Transaction } from '../server/db/client'
import { applyMigrations } from '../server/db/migrate'
import { designs, facts } from '../server/db/schema'
import { openQueue, queues, startQueue } from '../server/jobs/queue'
import { makeWorld } from './world'
import { shankAngleOf } from './world/shankAngle'
import { writeWorld } from './write'

const fact = 'demo world'
const tables = 'covariances, estimates, fits, pulls, trials, rigs, modifications, sizes, designs, families, seabeds, facts'

/** A pg-boss database on an open transaction, so that the job is there if and only if the rows are. */
const inTransaction = (tx: Transaction) => ({
  executeSql: async (text: string, values: unknown[]) => {
    const parts = text.split(/\$(\d+)/)
    const chunks = parts.map((part, index) => index % 2 ? sql`${values[Number(part) - 1]}` : sql.raw(part))
    return { rows: (await tx.execute(sql.join(chunks))).rows }
  },
})

async function seed(url: string): Promise<string> {
  await applyMigrations(url, fileURLToPath(new URL('../drizzle', import.meta.url)))
  const world = makeWorld()
  const hash = createHash('sha256').update(JSON.stringify(world)).digest('hex')
  const { db, close } = connect(url)
  const boss = openQueue(url, error => console.error(error.message))
  try {
    const [known] = await db.select().from(facts)
    if (known?.name === fact && known.value === hash) return 'the demo world is there already'
    if (!known && (await db.select().from(designs).limit(1)).length) {
      throw new Error('DATABASE_URL holds designs that are not the demo world\'s: nothing was written')
    }
    await startQueue(boss)
    await db.transaction(async (tx) => {
      await tx.execute(sql.raw(`truncate ${tables} restart identity cascade`))
      await writeWorld(tx, world, shankAngleOf(world))
      await tx.insert(facts).values({ name: fact, value: hash })
      await boss.send(queues.refit, {}, { db: inTransaction(tx) })
    })
    return `wrote ${world.designs.length} invented designs, ${world.trials.length} trials and ${world.pulls.length} pulls; a refit is queued`
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
