import pg from 'pg'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { createTestDatabase } from './harness'
import { unlimited } from './client'
import { listenIn, type Statement } from './proxy'
import { startServer, type Server } from './server'

/** A database of its own: the demo world, 1 000 designs and 100 000 pulls. */
const fill = `
  insert into designs (slug, name, family, description, invented)
    select 'filler-' || i, 'Filler ' || i, (array['claw', 'fisherman', 'stockless', 'plain-scoop'])[1 + i % 4], 'Made to fill a table', true from generate_series(1, 982) i;
  insert into sizes (design_id, mass_kg) select d.id, m.kg from designs d, (values (8), (12), (16), (25), (40)) m (kg) where d.slug like 'filler-%';
  insert into estimates (fit_id, design_id, seabed, ln_mean, ln_sd, pulls, days, at_limit)
    select f.id, d.id, s.slug, 7 + (d.id % 100) / 100.0, 0.2, 1 + d.id % 20, 3, 0 from designs d, seabeds s, (select max(id) id from fits) f where d.slug like 'filler-%' and s.numbered and d.id % 3 > 0;
  insert into trials (slug, rig_id, tester, day, place, depth_m, rode, published_at, invented)
    select 'filler-' || i, (select min(id) from rigs), 'Filler', date '2020-01-01' + i % 1500, 'Filler', 6, '{"chainLengthM":60,"chainDiameterMm":10,"bowHeightM":1.4}', now(), true from generate_series(1, 2000) i;
  with d as (select id, row_number() over (order by id) - 1 as place from designs), t as (select id, row_number() over (order by id) - 1 as place from trials where slug like 'filler-%'),
    b as (select slug, row_number() over (order by slug) - 1 as place from seabeds where numbered), z as (select design_id, min(id) id from sizes group by design_id)
  insert into pulls (trial_id, ordinal, design_id, size_id, seabed, setting, first_try, held_n, moved_n, ended, pair, modification_id)
    select t.id, 1 + i / 2000, d.id, z.id, b.slug, 'set', true, 1000 + i % 1000, 2500, 'dragged',
      case when t.place % 20 = 0 then 'filler-' || i / 4000 end, case when t.place % 20 = 0 and i / 2000 % 2 = 0 then (select min(id) from modifications) end
    from generate_series(0, 99999) i join t on t.place = i % 2000 join d on d.place = (i * 7919::bigint) % 1000 join b on b.place = (i / 3) % 13 join z on z.design_id = d.id;`

let database: Awaited<ReturnType<typeof createTestDatabase>>
let ear: Awaited<ReturnType<typeof listenIn>>
let server: Server
let client: pg.Client
beforeAll(async () => {
  database = await createTestDatabase()
  client = new pg.Client({ connectionString: database.url })
  client.on('error', () => {})
  await client.connect()
  await client.query(fill)
  await client.query('vacuum analyze')
  ear = await listenIn(database.url)
  server = await startServer(ear.url, unlimited)
}, 240_000)
afterAll(async () => {
  await server?.stop()
  await ear?.close()
  await client?.end()
  await database?.drop()
})

interface Plan { 'Node Type': string, 'Relation Name'?: string, 'Plans'?: Plan[] }

const nodes = (plan: Plan): Plan[] => [plan, ...(plan.Plans ?? []).flatMap(nodes)]

async function explain({ sql, params }: Statement): Promise<Plan[]> {
  const { rows } = await client.query<{ 'QUERY PLAN': [{ Plan: Plan }] }>({ text: `explain (format json) ${sql}`, values: params })
  return rows.flatMap(row => row['QUERY PLAN'].flatMap(({ Plan: plan }) => nodes(plan)))
}

const page = async (path: string) => {
  const answer = await fetch(server.origin + path, { headers: { Accept: 'text/html' } })
  expect(answer.status, path).toBe(200)
  return answer.text()
}

const pages = [
  '/designs', '/designs?page=20', '/designs?search=filler&sort=pulls', '/designs?seabed=loose-sand&sort=holding', '/designs?tested=no&mass=16+kg', '/designs/filler-7', '/designs/fennigar',
  '/seabeds', '/seabeds/loose-sand', '/trials', '/trials?page=40', '/trials?seabed=loose-sand', '/trials?design=filler-7', '/trials/filler-12',
  '/compare?d=filler-7:12&d=fennigar:20&d=filler-8', '/compare?d=fennigar:20&d=ulvesk:20&d=quennick&d=hobbrel&wind=35+kn', '/modifications', '/modifications/hinge-locked?wind=35+kn', '/modifications/shank-edge-blunted',
]

describe('at 100 000 pulls', () => {
  it('is as full as it says', async () => {
    const { rows: [row] } = await client.query('select (select count(*)::int from pulls) pulls, (select count(*)::int from designs) designs')
    expect(row.pulls).toBeGreaterThan(100_000)
    expect(row.designs).toBe(1000)
  })

  it('a sequential scan would be seen', async () => {
    const plan = await explain({ sql: 'select count(*) from pulls where note = $1', params: ['x'] })
    expect(plan.some(node => node['Node Type'] === 'Seq Scan' && node['Relation Name'] === 'pulls')).toBe(true)
  })

  it.each(pages)('%s reads no table of pulls from end to end', async (path) => {
    const said = (await ear.quietest(() => page(path))).filter(({ sql }) => /^\s*(select|with)/i.test(sql))
    expect(said.length).toBeGreaterThan(0)
    expect(said.length).toBeLessThanOrEqual(8)
    for (const statement of said) {
      const scans = (await explain(statement)).filter(node => node['Node Type'] === 'Seq Scan' && node['Relation Name'] === 'pulls')
      expect(scans, statement.sql).toEqual([])
    }
  })

  it('a page of the 1 000 designs is quick: beside a page without a list, and in the database', async () => {
    const timed = async (path: string) => {
      const start = performance.now()
      const html = await page(path)
      return { ms: performance.now() - start, html }
    }
    const ratios: number[] = []
    for (let i = 0; i < 11; i++) {
      const list = await timed('/designs?page=7')
      const plain = await timed('/seabeds')
      expect(list.html.match(/href="\/designs\/filler-\d+"/g)?.length).toBe(50)
      ratios.push(list.ms / plain.ms)
    }
    expect(ratios.toSorted((a, b) => a - b)[5]).toBeLessThan(5)
    for (const path of ['/designs?page=7', '/designs?sort=pulls&search=filler', '/designs?seabed=loose-sand&sort=holding&tested=yes']) {
      let totalMs = 0
      for (const { sql, params } of (await ear.quietest(() => page(path))).filter(({ sql }) => /^\s*select/i.test(sql))) {
        const { rows: [row] } = await client.query<{ 'QUERY PLAN': [{ 'Execution Time': number }] }>({ text: `explain (analyze, format json) ${sql}`, values: params })
        totalMs += row?.['QUERY PLAN'][0]['Execution Time'] ?? Infinity
      }
      expect(totalMs, path).toBeLessThan(250)
    }
  })
})
