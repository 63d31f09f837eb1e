import { execFile, execFileSync } from 'node:child_process'
import { createHash } from 'node:crypto'
import { mkdtempSync, readFileSync, readdirSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import pg from 'pg'
import { afterAll, beforeAll, describe, expect, it, vi } from 'vitest'
import { releaseAnswer, releasesAnswer } from '#shared/schemas/answers/release'
import type { ReleaseListing, ReleasesAnswer } from '#shared/types/release'
import { readCsv } from '#shared/utils/csv'
import { root } from '../../seed/host/project.mjs'
import { connect, type Connection } from '../../server/db/client'
import { newestFitId, readFit } from '../../server/db/queries/fits'
import { makeRelease } from '../../server/services/makeRelease'
import { rebuildRelease } from '../../server/services/releaseFiles'
import { expectProblem, get, unlimited } from './client'
import { startApp, type TestApp } from './harness'
import { startServer } from './server'

// Whole fits, in processes of their own.
vi.setConfig({ testTimeout: 180_000 })

let app: TestApp
let connection: Connection
let releases: ReleaseListing[]
let folder: string
beforeAll(async () => {
  app = await startApp(unlimited)
  connection = connect(app.databaseUrl)
  releases = (await (await fetch(`${app.baseUrl}/api/releases`)).json() as ReleasesAnswer).releases
  folder = mkdtempSync(join(tmpdir(), 'release-'))
})
afterAll(async () => {
  rmSync(folder, { recursive: true, force: true })
  await connection.close()
  await app.stop()
})

const sha256 = (body: Uint8Array) => createHash('sha256').update(body).digest('hex')
const address = (version: string, name: string) => `${app.baseUrl}/api/releases/${version}/${name}`
const take = async (version: string, name: string) => new Uint8Array(await (await fetch(address(version, name))).arrayBuffer())

async function query(statement: string) {
  const client = new pg.Client({ connectionString: app.databaseUrl })
  await client.connect()
  try {
    return (await client.query(statement)).rows as Record<string, unknown>[]
  }
  finally {
    await client.end()
  }
}

/** Runs the project's own script, as a person would. */
function refit(...args: string[]): Promise<{ failed: boolean, said: string }> {
  return new Promise(resolve => execFile(join(root, 'node_modules', '.bin', 'tsx'), [join(root, 'seed', 'refit.ts'), ...args], { encoding: 'utf8', cwd: root },
    (error, stdout, stderr) => resolve({ failed: error !== null, said: stdout + stderr })))
}

interface Described { fields: { name: string, type: string, unit?: string, description: string, constraints?: Constraints }[], primaryKey: string[], foreignKeys?: { fields: string[], reference: { resource: string, fields: string[] } }[] }
interface Descriptor { licenses: { name: string }[], invented: boolean, description: string, resources: { name: string, path: string, hash: string, bytes: number, schema: Described }[] }

interface Constraints { required?: boolean, minimum?: number, maximum?: number, enum?: string[] }

const forms: Record<string, RegExp> = {
  integer: /^-?\d+$/, number: /^-?\d+(\.\d+)?(e[+-]\d+)?$/, boolean: /^(true|false)$/, date: /^\d{4}-\d\d-\d\d$/, datetime: /^\d{4}-\d\d-\d\dT[\d:.]+Z$/, string: /./s,
}

/** Whether a cell is what Table Schema says of its field. */
function fits(value: string, type: string, { required, minimum = -Infinity, maximum = Infinity, enum: words }: Constraints): boolean {
  if (value === '') return !required
  if (!forms[type]?.test(value) || (words && !words.includes(value))) return false
  return !['number', 'integer'].includes(type) || (Number(value) >= minimum && Number(value) <= maximum)
}

describe('GET /api/releases', () => {
  it('lists one a season, newest first, as the description says', () => {
    expect(releasesAnswer.safeParse({ releases }).error).toBeUndefined()
    expect(releases.map(({ version }) => version)).toEqual(['2026', '2025', '2024'])
    for (const release of releases) {
      expect(release).toMatchObject({ invented: true, licence: { name: 'CC-BY-4.0' } })
      expect(release.citation).toContain('Invented')
    }
  })

  it('opens a release twelve months after its data were cut', () => {
    for (const { cutAt, openFrom, open } of releases) {
      expect(openFrom).toBe(cutAt.replace(/^\d+/, year => String(Number(year) + 1)))
      expect(open).toBe(new Date(openFrom) <= new Date())
    }
  })

  it('counts what changed from one to the next as the database has it', async () => {
    for (const { version, changes } of releases) {
      const [row] = await query(`select count(*)::int as pulls, count(distinct trials.id)::int as trials from pulls join trials on trials.id = trial_id where extract(year from day) = ${version}`)
      expect({ pulls: changes.pulls, trials: changes.trials.length }).toEqual(row)
      expect(changes.since).toBe(version === '2024' ? null : String(Number(version) - 1))
      expect(changes.largest.map(({ ratio }) => Math.abs(Math.log(ratio)))).toEqual(changes.largest.map(({ ratio }) => Math.abs(Math.log(ratio))).toSorted((a, b) => b - a))
    }
    expect(releases[1]?.changes.seabeds).toEqual(['cobble-over-sand'])
  })

  it('gives one of them as it lists it', async () => {
    const { status, body } = await get(`${app.baseUrl}/api/releases/2025`)
    expect(status).toBe(200)
    expect(releaseAnswer.safeParse(body).error).toBeUndefined()
    expect(body).toEqual(releases[1])
  })

  it('has no release of its own become the fit that readers are answered from', async () => {
    const [row] = await query('select count(*)::int as fits, count(stands_from)::int as stood from fits')
    expect(row).toEqual({ fits: 3, stood: 1 })
    const standing = await readFit(connection.db, await newestFitId(connection.db) ?? 0)
    expect(releases[0]?.fit.dataHash).toBe(standing?.dataHash)
  })
})

describe('the files of a release', () => {
  it('have the sizes and hashes that are told, and the description holds them', async () => {
    for (const { version, files, hash } of releases) {
      for (const { name, bytes, sha256: told } of files) {
        const body = await take(version, name)
        expect([body.length, sha256(body)], name).toEqual([bytes, told])
      }
      const description = await take(version, 'datapackage.json')
      expect(sha256(description)).toBe(hash)
      const { resources } = JSON.parse(new TextDecoder().decode(description)) as Descriptor
      for (const { path, hash: described, bytes } of resources) expect(files).toContainEqual(expect.objectContaining({ name: path, bytes, sha256: described.replace('sha256:', '') }))
    }
  })

  it('hold to their own description: keys, references, types, bounds, units in names', async () => {
    const { resources, licenses, invented, description } = JSON.parse(new TextDecoder().decode(await take('2026', 'datapackage.json'))) as Descriptor
    expect(licenses.map(({ name }) => name)).toEqual(['CC-BY-4.0'])
    expect(invented).toBe(true)
    expect(description).toMatch(/^Everything in this release is invented/)
    const tables = new Map<string, string[][]>()
    for (const { name, path } of resources) tables.set(name, readCsv(new TextDecoder('utf-8', { fatal: true }).decode(await take('2026', path))))
    const column = (table: string, name: string) => {
      const [header = [], ...rows] = tables.get(table) ?? []
      return rows.map(row => row[header.indexOf(name)] ?? '')
    }
    const units: Record<string, string> = { 'N': '_n', 'kg': 'kg', 'mm': '_mm', 'm': '_m', 's': '_s', 'deg': '_deg', 'm/s': '_ms', 'm/min': '_m_min' }
    for (const { name, schema: { fields, primaryKey, foreignKeys = [] } } of resources) {
      const [header = [], ...rows] = tables.get(name) ?? []
      expect(header, name).toEqual(fields.map(field => field.name))
      expect(new Set(rows.map(row => primaryKey.map(key => row[header.indexOf(key)]).join('|'))).size, name).toBe(rows.length)
      for (const { fields: [from = ''], reference } of foreignKeys) {
        const known = new Set(column(reference.resource, reference.fields[0] ?? ''))
        expect(column(name, from).filter(value => value !== '' && !known.has(value)), `${name}.${from}`).toEqual([])
      }
      for (const { name: field, type, unit, description: meaning, constraints = {} } of fields) {
        expect(meaning, field).not.toBe('')
        if (unit && unit !== '1') expect(field.endsWith(units[unit] ?? '?'), `${field} in ${unit}`).toBe(true)
        expect(column(name, field).filter(value => !fits(value, type, constraints)), `${name}.${field}`).toEqual([])
      }
    }
  })

  it('are sent to be saved, with their hash as ETag, and may be kept for good once open', async () => {
    for (const { version, open, files } of releases) {
      const answer = await fetch(address(version, 'pulls.csv'))
      expect(answer.headers.get('content-type')).toBe('text/csv; charset=utf-8; header=present')
      expect(answer.headers.get('content-disposition')).toBe('attachment; filename="pulls.csv"')
      expect(answer.headers.get('cache-control')).toBe(open ? 'public, max-age=31536000, immutable' : 'private, no-store')
      const etag = answer.headers.get('etag') ?? ''
      expect(etag).toBe(`"${files.find(({ name }) => name === 'pulls.csv')?.sha256}"`)
      const again = await fetch(address(version, 'pulls.csv'), { headers: { 'If-None-Match': `W/${etag}, "x"` } })
      expect([again.status, await again.text()]).toEqual([304, ''])
      const head = await fetch(address(version, 'pulls.csv'), { method: 'HEAD' })
      expect([head.status, head.headers.get('content-length')]).toEqual([200, answer.headers.get('content-length')])
    }
  })

  it('come as one archive that any tar reads, and from it are fitted again to the same figures', async () => {
    writeFileSync(join(folder, 'release.tar'), await take('2026', 'kedgewise-2026.tar'))
    execFileSync('tar', ['-xf', 'release.tar'], { cwd: folder })
    const unpacked = join(folder, 'kedgewise-2026')
    const names = releases[0]?.files.map(({ name }) => name).filter(name => !name.endsWith('.tar')) ?? []
    expect(readdirSync(unpacked).sort()).toEqual(names.toSorted())
    for (const name of names) expect(readFileSync(join(unpacked, name)).equals(await take('2026', name))).toBe(true)
    const { failed, said } = await refit(unpacked)
    expect(said).toContain('the published estimates are reproduced within 1e-9')
    expect(failed).toBe(false)
    console.info(said.split('\n').find(line => line.includes('greatest difference')))
    writeFileSync(join(unpacked, 'pulls.csv'), readFileSync(join(unpacked, 'pulls.csv'), 'utf8').replace(',800,1000,', ',800,1250,'))
    expect(await refit(unpacked)).toMatchObject({ failed: true, said: expect.stringContaining('pulls.csv is not the file that datapackage.json describes') })
  })

  it('are fitted again from a server; other estimates than the pulls give are found out', async () => {
    expect(await refit(app.baseUrl, '2024')).toMatchObject({ failed: false })
    const forged = mkdtempSync(join(tmpdir(), 'forged-'))
    const description = new TextDecoder().decode(await take('2024', 'datapackage.json'))
    const { resources } = JSON.parse(description) as Descriptor
    for (const { path } of resources) writeFileSync(join(forged, path), await take('2024', path))
    const table = readFileSync(join(forged, 'estimates.csv'), 'utf8')
    const [line = ''] = table.split('\r\n').slice(1)
    const cells = line.split(',')
    cells[3] = String(Number(cells[3]) + 2e-9)
    const changed = table.replace(line, cells.join(','))
    writeFileSync(join(forged, 'estimates.csv'), changed)
    writeFileSync(join(forged, 'datapackage.json'), description.replace(sha256(Buffer.from(table)), sha256(Buffer.from(changed))))
    const { failed, said } = await refit(forged)
    rmSync(forged, { recursive: true })
    expect(said).toContain('NOT reproduced')
    expect(failed).toBe(true)
  })

  it.each([
    ['/api/releases?x=1', 422], ['/api/releases/1999', 404], ['/api/releases/1999/pulls.csv', 404], ['/api/releases/2026/nothing.csv', 404], ['/api/releases/x', 422],
    ['/api/releases/2026%27/pulls.csv', 422], ['/api/releases/2026/..%2F..%2Fetc%2Fpasswd', 422], ['/api/releases/2026/%00', 422], [`/api/releases/${'9'.repeat(21)}`, 422],
    ['/api/releases/99999999999999999999', 404], ['/api/releases/2026/constructor', 404], ['/api/releases/2026/__proto__', 422], ['/api/releases/2026/%E0%A4%A', 422],
  ])('%s is refused with %i', async (path, status) => {
    expectProblem(await get(app.baseUrl + path), status)
  })
})

describe('a release is frozen', () => {
  it('builds again byte for byte: twice, and after newer pulls, a correction and an edited catalogue', async () => {
    const before = await rebuildRelease(connection.db, '2025')
    const started = performance.now()
    const again = await rebuildRelease(connection.db, '2025')
    console.info(`release 2025: ${again?.files.reduce((sum, { bytes }) => sum + bytes, 0)} bytes, rebuilt in ${Math.round(performance.now() - started)} ms`)
    expect(again?.files.map(({ body }) => sha256(body))).toEqual(before?.files.map(({ body }) => sha256(body)))

    await query(`insert into trials (slug, rig_id, tester, day, place, depth_m, rode, published_at)
      select 'somewhere-2027-04-01', rig_id, tester, '2027-04-01', place, depth_m, rode, now() from trials where id = 1`)
    await query(`insert into pulls (trial_id, ordinal, design_id, size_id, seabed, setting, first_try, held_n, moved_n)
      select (select max(id) from trials), 1, design_id, size_id, seabed, 'set', true, 1000, 1250 from pulls where id = 1`)
    // A correction of a pull of the first season, written down now: the old releases keep the pull as it was.
    await query(`insert into pulls (trial_id, ordinal, design_id, size_id, seabed, setting, first_try, held_n, moved_n)
      select trial_id, 900, design_id, size_id, seabed, 'set', true, 1250, 1500 from pulls where id = 1`)
    await query('update pulls set superseded_by_id = (select max(id) from pulls) where id = 1')
    await query('update designs set description = \'told anew\', name = name || \' II\'')
    for (const { version, files } of releases) {
      const rebuilt = await rebuildRelease(connection.db, version)
      expect(rebuilt?.files.map(({ body: _body, ...file }) => file)).toEqual(files)
    }
  })

  it('leaves a pull that was corrected out of the fit, and keeps it beside', async () => {
    const hash = await makeRelease(connection.db, { version: '2027', cutAt: new Date(Date.now() + 1000).toISOString(), notes: '' }, undefined, async (pulls) => {
      const { fitHolding } = await import('#shared/holding/fitHolding')
      return fitHolding(pulls)
    })
    const release = (await get(`${app.baseUrl}/api/releases/2027`)).body as unknown as ReleaseListing
    expect(release.hash).toBe(hash)
    expect(release.changes).toMatchObject({ since: '2026', pulls: 2, corrections: 1, trials: ['somewhere-2027-04-01'], designs: [] })
    expect(release.pulls).toBe((releases[0]?.pulls ?? 0) + 1)
    const [header = [], row = []] = readCsv(new TextDecoder().decode(await take('2027', 'superseded_pulls.csv')))
    const [old] = await query('select trials.slug || \'/\' || ordinal as pull, trials.slug || \'/900\' as successor from pulls join trials on trials.id = trial_id where pulls.id = 1')
    expect([row[header.indexOf('pull')], row[header.indexOf('superseded_by')]]).toEqual([old?.pull, old?.successor])
    expect(await refit(app.baseUrl, '2027')).toMatchObject({ failed: false })
    const [stood] = await query('select count(stands_from)::int as stood from fits')
    expect(stood).toEqual({ stood: 1 })
    expect(await makeRelease(connection.db, { version: '2027', cutAt: '2024-05-01T00:00:00Z', notes: 'again' })).toBe(hash)
  })

  it('is not made before any pull was published', async () => {
    await expect(makeRelease(connection.db, { version: '1', cutAt: '2001-01-01T00:00:00Z', notes: '' })).rejects.toThrow('there are none')
  })

  it('is not served where the database no longer gives what was made, and the log says which', async () => {
    await query('update pulls set held_n = held_n + 1 where id = (select min(id) from pulls where held_n > 0 and moved_n is not null)')
    const server = await startServer(app.databaseUrl)
    try {
      const answer = await get(`${server.baseUrl}/api/releases/2024/estimates.csv`)
      expectProblem(answer, 500)
      expect(server.output()).toContain('release 2024 was made with hash')
      expect((await get(`${server.baseUrl}/api/ready`)).body).toMatchObject({ ready: true })
    }
    finally {
      await server.stop()
    }
  })
})
