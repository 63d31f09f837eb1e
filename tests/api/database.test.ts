import pg from 'pg'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { connect, type Connection } from '../../server/db/client'
import { fitIdFor, insertFit, letStand, newestFitId, readFit } from '../../server/db/queries/fits'
import { countRigs, publishedPulls } from '../../server/db/queries/pulls'
import { transact } from '../../server/db/transact'
import { openQueue, queues, startQueue } from '../../server/jobs/queue'
import type { StoredFit } from '../../shared/types/holding'
import { makeWorld, pullRecords } from '../../seed/world'
import { createTestDatabase, startApp } from './harness'

let database: Awaited<ReturnType<typeof createTestDatabase>>
let connection: Connection

beforeAll(async () => {
  database = await createTestDatabase()
  connection = connect(database.url)
})
afterAll(async () => {
  await connection.close()
  await database.drop()
})

const refusal = async (statement: string) => {
  const client = new pg.Client({ connectionString: database.url })
  await client.connect()
  try {
    await client.query('begin')
    await client.query(statement)
    return null
  }
  catch (error) {
    return (error as { constraint?: string }).constraint ?? String(error)
  }
  finally {
    await client.end()
  }
}

describe('the database keeps its own house', () => {
  const pull = (columns: string, values: string) =>
    `insert into pulls (trial_id, ordinal, design_id, size_id, seabed, setting, first_try, held_n${columns}) values (1, 9999, 1, 1, ${values})`

  it.each([
    ['a size of another design', 'pulls_size_of_design', pull(', moved_n', '\'loose-sand\', \'set\', true, 100, 200').replace('1, 9999, 1, 1', '1, 9999, 1, (select max(id) from sizes where design_id <> 1)')],
    ['a seabed without a number', 'pulls_seabed_numbered', pull(', moved_n', '\'rock\', \'set\', true, 100, 200')],
    ['a step that moved at or below the one held', 'pulls_moved_above_held', pull(', moved_n', '\'loose-sand\', \'set\', true, 500, 500')],
    ['a load held without having set', 'pulls_never_set_held_nothing', pull('', '\'loose-sand\', \'neverSet\', false, 500')],
    ['a pull that says nothing', 'pulls_set_has_bracket', pull('', '\'loose-sand\', \'set\', true, 0')],
    ['a load that is not a number', 'pulls_held_range', pull('', '\'loose-sand\', \'set\', true, \'NaN\'')],
    ['an infinite load', 'pulls_held_range', pull('', '\'loose-sand\', \'set\', true, \'Infinity\'')],
    ['a veer without its outcome', 'pulls_veer_whole', pull(', veer_deg', '\'loose-sand\', \'set\', true, 500, 90')],
    ['a word that is not in the list', 'pulls_setting_known', pull('', '\'loose-sand\', \'perhaps\', true, 500')],
    ['a slug with a capital', 'designs_slug_form', 'insert into designs (slug, name, family) values (\'Xyz\', \'x\', \'claw\')'],
    ['an unknown family', 'designs_family_families_slug_fk', 'insert into designs (slug, name, family) values (\'xyz\', \'x\', \'none\')'],
    ['a negative price', 'sizes_price_range', 'insert into sizes (design_id, mass_kg, price_minor, price_currency, price_on) values (1, 1.5, -1, \'EUR\', \'2026-01-01\')'],
    ['a price without its currency', 'sizes_price_whole', 'insert into sizes (design_id, mass_kg, price_minor) values (1, 1.5, 100)'],
    ['a design deleted under its pulls', 'pulls_design_id_designs_id_fk', 'delete from designs where id = (select design_id from pulls limit 1)'],
  ])('refuses %s', async (_what, constraint, statement) => {
    expect(await refusal(statement)).toBe(constraint)
  })
})

describe('what is written comes back', () => {
  it('pulls reach the fit as the demo world made them', async () => {
    expect(await publishedPulls(connection.db)).toEqual(pullRecords(makeWorld()))
    expect(await countRigs(connection.db)).toBe(1)
  })

  it('a fit is stored whole in one transaction and read back equal, and the same data are not fitted twice', async () => {
    const { db } = connection
    const id = await newestFitId(db)
    const fit = await readFit(db, id ?? 0) as StoredFit
    expect(fit.seabeds.length).toBeGreaterThanOrEqual(9)
    for (const { designs, covariance } of fit.seabeds) expect(covariance).toHaveLength((designs.length + 1) ** 2)
    expect(await fitIdFor(db, fit.modelVersion, fit.dataHash)).toBe(id)
    await expect(db.transaction(tx => insertFit(tx, fit))).rejects.toThrow()
    const second = await db.transaction(tx => insertFit(tx, { ...fit, dataHash: 'another' }))
    // A stored fit is not the readers' one until it is let stand, and an older one can stand again.
    expect(await newestFitId(db)).toBe(id)
    await db.transaction(tx => letStand(tx, second))
    expect(await newestFitId(db)).toBe(second)
    await db.transaction(tx => letStand(tx, id ?? 0))
    expect(await newestFitId(db)).toBe(id)
    const { id: _first, at: _at, ...body } = fit
    expect(await readFit(db, second)).toMatchObject({ ...body, dataHash: 'another' })
  })

  it('nothing of a fit remains when its transaction fails', async () => {
    const { db } = connection
    const before = await newestFitId(db)
    const fit = await readFit(db, before ?? 0) as StoredFit
    await expect(db.transaction(async (tx) => {
      await insertFit(tx, { ...fit, dataHash: 'lost' })
      throw new Error('the day is over')
    })).rejects.toThrow('the day is over')
    expect(await newestFitId(db)).toBe(before)
  })
})

describe('the refit job', () => {
  it('runs when pulls change, and a server that is serving answers from the new fit', async () => {
    const app = await startApp()
    const other = connect(app.databaseUrl)
    const boss = openQueue(app.databaseUrl, () => {})
    try {
      const before = await newestFitId(other.db)
      await startQueue(boss)
      await transact(other.pool, async (_tx, plain) => {
        await plain.executeSql('update pulls set superseded_by_id = id where id = (select max(id) from pulls)', [])
        await boss.send(queues.refit, {}, { db: plain })
      })
      await expect.poll(() => newestFitId(other.db), { timeout: 55_000, interval: 250 }).not.toBe(before)
      const served = async () => (await (await fetch(`${app.baseUrl}/api/reference-boats`)).json() as { fit: { id: number } }).fit.id
      await expect.poll(served, { timeout: 5000 }).toBe(await newestFitId(other.db))
    }
    finally {
      await boss.stop({ graceful: false, close: true })
      await other.close()
      await app.stop()
    }
  })
})
