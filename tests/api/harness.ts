import { randomBytes } from 'node:crypto'
import pg from 'pg'
import { inject } from 'vitest'
import { startServer, type Server } from './server'

/** The name of the seeded and fitted database that every test's own one is copied from. */
const templateName = 'template_kedgewise'

export interface TestApp extends Server { databaseUrl: string }

async function administer(statement: string) {
  const client = new pg.Client({ connectionString: inject('postgres') })
  await client.connect()
  try {
    await client.query(statement)
  }
  finally {
    await client.end()
  }
}

/** A database of the test's own: a copy of the demo world with its fit, or an empty one. */
export async function createTestDatabase({ empty = false } = {}) {
  const name = `test_${randomBytes(6).toString('hex')}`
  await administer(`create database ${name} template ${empty ? 'template0' : templateName}`)
  const url = new URL(inject('postgres'))
  url.pathname = `/${name}`
  return { url: url.href, drop: () => administer(`drop database ${name} with (force)`) }
}

/** A built server on a database of its own; `stop` ends both. Use one a test file, in beforeAll and afterAll. */
export async function startApp(env: Record<string, string> = {}): Promise<TestApp> {
  const database = await createTestDatabase()
  try {
    const server = await startServer(database.url, env)
    return { ...server, databaseUrl: database.url, stop: async () => {
      await server.stop()
      await database.drop()
    } }
  }
  catch (error) {
    await database.drop()
    throw error
  }
}
