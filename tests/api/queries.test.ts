import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { createTestDatabase } from './harness'
import { unlimited } from './client'
import { listenIn } from './proxy'
import { startServer, type Server } from './server'

/** The most statements that a page may ask of the database while it is rendered. */
const most = 8

let database: Awaited<ReturnType<typeof createTestDatabase>>
let ear: Awaited<ReturnType<typeof listenIn>>
let server: Server
beforeAll(async () => {
  database = await createTestDatabase()
  ear = await listenIn(database.url)
  server = await startServer(ear.url, unlimited)
})
afterAll(async () => {
  await server?.stop()
  await ear?.close()
  await database?.drop()
})

const page = async (path: string) => {
  const answer = await fetch(server.origin + path, { headers: { Accept: 'text/html' } })
  expect(answer.status, path).toBe(200)
  await answer.text()
}

const pages = [
  '/', '/plan', '/designs', '/designs?search=a&family=claw&sort=family', '/designs?seabed=loose-sand&sort=holding&mass=15+kg&tested=yes', '/designs/fennigar', '/designs/fennigar?mass=10+kg',
  '/seabeds', '/seabeds/loose-sand', '/seabeds/rock', '/trials', '/trials?seabed=soft-mud&design=fennigar', '/trials/tarrack-bight-2024-09-04',
  '/compare', '/compare?d=fennigar:20&d=ulvesk:20', '/compare?d=fennigar:20&d=ulvesk:20&d=quennick&d=hobbrel&wind=35+kn', '/modifications', '/modifications/hinge-locked', '/modifications/hinge-locked?wind=35+kn',
]

describe('the ear', () => {
  it('hears the statements with their values', async () => {
    const said = await ear.during(() => page('/designs/fennigar'))
    expect(said.length).toBeGreaterThan(0)
    expect(said.some(({ sql, params }) => /from "designs"/.test(sql) && params.includes('fennigar'))).toBe(true)
  })
})

describe('what a page asks of the database', () => {
  it.each(pages)('%s', async (path) => {
    const said = await ear.quietest(() => page(path))
    expect(said.length, said.map(({ sql }) => sql).join('\n')).toBeLessThanOrEqual(most)
  })
})
