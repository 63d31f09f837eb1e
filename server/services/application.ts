import type PgBoss from 'pg-boss'
import { modelVersion } from '#shared/holding/version'
import { releaseOrder } from '#shared/schemas/release'
import { connect, type Connection } from '../db/client'
import { applyMigrations } from '../db/migrate'
import { standingModel } from '../db/queries/fits'
import { ping } from '../db/queries/health'
import { openQueue, queues, startQueue } from '../jobs/queue'
import { log } from '../utils/log'
import { validate } from '../utils/validate'
import { currentEvidence, startEvidence, stopEvidence } from './evidence'
import { makeRelease } from './makeRelease'
import { refit } from './refit'

interface Application { connection: Connection, boss: PgBoss | null, migrated: boolean, stopping: AbortController }

let application: Application | null = null

/** Errors of PostgreSQL itself carry a five-character SQLSTATE; the rest are connections that failed. */
function isRefusal(error: unknown): boolean {
  const code = (error as { code?: unknown, cause?: { code?: unknown } }).cause?.code ?? (error as { code?: unknown }).code
  return typeof code === 'string' && /^[0-9A-Z]{5}$/.test(code) && !/^(08|57P|53)/.test(code)
}

const pause = (ms: number) => new Promise(resolve => setTimeout(resolve, ms))

async function startJobs(url: string, { connection, stopping }: Application): Promise<PgBoss> {
  const boss = openQueue(url, error => log.warn('the job queue lost its connection', { error: error.message }))
  try {
    await startQueue(boss)
  }
  catch (error) {
    await boss.stop({ graceful: false, close: true, timeout: 2000 }).catch(() => {})
    throw error
  }
  // Pulls that an older model was fitted to are fitted again by this one.
  const model = await standingModel(connection.db)
  if (model !== null && model !== modelVersion) await boss.send(queues.refit, {})
  await boss.work(queues.refit, { batchSize: 1, pollingIntervalSeconds: 1 }, async () => {
    const fit = await refit(connection.db, stopping.signal)
    log.info('refitted', { fit })
  })
  return boss
}

/** Releases are made one at a time, and only once readers have a fit to be answered from: a server that has just started answers first. */
async function startReleases({ connection, boss, stopping }: Application): Promise<void> {
  while (!stopping.signal.aborted && await currentEvidence() === null) await pause(500)
  if (stopping.signal.aborted) return
  await boss?.work(queues.release, { batchSize: 1, pollingIntervalSeconds: 1 }, async ([job]) => {
    const order = validate(releaseOrder, job?.data)
    log.info('made a release', { version: order.version, hash: await makeRelease(connection.db, order, stopping.signal) })
  })
}

/** Migrates, starts the jobs and the evidence; waits for a database that is not there yet. */
async function begin(url: string, migrations: string, app: Application): Promise<void> {
  while (!app.stopping.signal.aborted) {
    try {
      await applyMigrations(url, migrations)
      app.migrated = true
      app.boss = await startJobs(url, app)
      // Told to stop meanwhile: what stopApplication() did not know of yet is stopped here.
      if (app.stopping.signal.aborted) return void await app.boss.stop({ graceful: false, close: true, timeout: 2000 })
      startEvidence(app.connection.db, url)
      startReleases(app).catch(error => log.warn('releases are not being made', { error: (error as Error).message }))
      return
    }
    catch (error) {
      if (isRefusal(error)) throw error
      log.warn('waiting for the database', { error: (error as Error).message })
      await pause(1000)
    }
  }
}

/** Starts what a server needs besides its routes. `failed` is called when the database refuses the migrations. */
export function startApplication(url: string, migrations: string, failed: (error: Error) => void): void {
  const connection = connect(url, { onError: error => log.warn('a database connection was lost', { error: error.message }) })
  application = { connection, boss: null, migrated: false, stopping: new AbortController() }
  begin(url, migrations, application).catch(failed)
}

export async function stopApplication(): Promise<void> {
  if (!application) return
  const { connection, boss, stopping } = application
  application = null
  stopping.abort()
  await stopEvidence()
  await boss?.stop({ graceful: false, close: true, timeout: 2000 })
  await connection.close()
}

/** The database of this server. */
export function database() {
  if (!application) throw new Error('the application has not been started')
  return application.connection.db
}

export interface Readiness { database: boolean, migrated: boolean, fit: boolean }

/** What stands between this server and its answers. */
export async function readiness(): Promise<Readiness> {
  const state = { database: false, migrated: false, fit: false }
  try {
    await ping(database())
    state.database = true
    state.migrated = application?.migrated ?? false
    state.fit = state.migrated && await currentEvidence() !== null
  }
  catch { /* what was not reached stays false */ }
  return state
}
