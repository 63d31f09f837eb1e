// The project on this machine: where it lies, its secrets, and the steps that demo, dev and tests share.
import { randomBytes } from 'node:crypto'
import { existsSync, mkdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'
import { fileURLToPath } from 'node:url'
import { alive, run, say } from './shell.mjs'
import { onStop } from './stops.mjs'
import { buildSources, openStamps, seedSources, sourceHash } from './stamps.mjs'

export const root = fileURLToPath(new URL('../..', import.meta.url)).replace(/\/$/, '')
/** Where the clone's own cluster, secrets and locks lie; KEDGEWISE_DATA names another folder. */
export const dataFolder = process.env.KEDGEWISE_DATA ?? join(root, '.data')
/** What node_modules and .output were made from: they belong to the clone, whatever data it runs on. */
export const stamps = openStamps(join(root, '.data', 'stamps.json'))
const dataStamps = openStamps(join(dataFolder, 'data.json'))
export const builtServer = join(root, '.output', 'server', 'index.mjs')

const bin = name => join(root, 'node_modules', '.bin', name)

/** A random secret of this clone, made on first use. */
export function secret(name) {
  mkdirSync(dataFolder, { recursive: true })
  const file = join(dataFolder, `${name}.secret`)
  if (!existsSync(file)) writeFileSync(file, randomBytes(32).toString('base64url'), { mode: 0o600 })
  return readFileSync(file, 'utf8')
}

/** Lets one demo (or dev server) at a time use this clone's data, until this process ends. */
export function holdLock(name) {
  mkdirSync(dataFolder, { recursive: true })
  const file = join(dataFolder, `${name}.pid`)
  const other = existsSync(file) ? Number(readFileSync(file, 'utf8')) : 0
  if (other && other !== process.pid && alive(other)) {
    throw new Error(`another ${name} of this clone is running as process ${other}: stop it first (if that is something else, delete ${file})`)
  }
  writeFileSync(file, String(process.pid))
  onStop(() => rmSync(file, { force: true }))
}

/** Builds the application unless it was built from these very sources. */
export async function ensureBuild() {
  const hash = sourceHash(root, buildSources)
  if (existsSync(builtServer) && stamps.get('build') === hash) return
  say('Building the application')
  stamps.set('build', null)
  await run(bin('nuxt'), ['build'], { cwd: root, env: { ...process.env, NODE_ENV: 'production' }, stdio: ['ignore', 'ignore', 'inherit'] })
  stamps.set('build', hash)
}

/**
 * Seeds the database unless this cluster holds this very world.
 * @param {string} url
 * @param {{ known?: boolean }} options known: a cluster of this clone's own, which was there before; left out: somebody else's
 */
export async function ensureSeed(url, { known }) {
  const hash = sourceHash(root, seedSources)
  if (known && dataStamps.get('seed') === hash) return
  say('Writing the demo world')
  await run(bin('tsx'), [join(root, 'seed', 'seed.ts')], { cwd: root, env: { ...process.env, DATABASE_URL: url } })
  if (known !== undefined) dataStamps.set('seed', hash)
}

/** What a demo server finds in its environment. */
export function demoEnvironment({ port, url }) {
  return {
    ...process.env,
    KEDGEWISE_DEMO: '1',
    HOST: '127.0.0.1',
    PORT: String(port),
    DATABASE_URL: url,
    APP_ORIGIN: `http://localhost:${port}`,
    NUXT_SESSION_PASSWORD: secret('session'),
    // Graceful shutdown stays on: any value here would switch it off.
    NITRO_SHUTDOWN_DISABLED: undefined,
  }
}
