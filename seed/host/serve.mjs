// A cluster, a seeded database and one server in front of it, stopped together.
import { spawn } from 'node:child_process'
import { join } from 'node:path'
import { startCluster } from './cluster.mjs'
import { dataFolder, ensureSeed, root } from './project.mjs'
import { pause, say } from './shell.mjs'

/** The database to serve from: DATABASE_URL where it is given, else this clone's own cluster. */
export async function openDatabase() {
  const given = process.env.DATABASE_URL
  if (given) {
    await ensureSeed(given, {})
    return { url: given, stop: async () => {} }
  }
  const cluster = await startCluster({ root, wanted: join(dataFolder, 'postgres') })
  try {
    if (cluster.fresh) await cluster.createDatabase('kedgewise')
    const url = cluster.url('kedgewise')
    await ensureSeed(url, { known: !cluster.fresh })
    return { url, stop: cluster.stop }
  }
  catch (error) {
    await cluster.stop()
    throw error
  }
}

async function untilReady(origin, child) {
  while (child.exitCode === null && child.signalCode === null) {
    const answer = await fetch(`${origin}/api/ready`).catch(() => null)
    if (answer?.ok) return true
    await pause(250)
  }
  return false
}

/**
 * Starts a server and waits until it has a fit to answer from, then runs until it is told to stop.
 * Ctrl-C and SIGTERM end the server first, then the database. Resolves with the exit code.
 */
export async function serve({ command, args, env, database, banner }) {
  const child = spawn(command, args, { cwd: root, env, stdio: ['ignore', 'inherit', 'inherit'], detached: true })
  const ended = new Promise(resolve => child.on('exit', (code, signal) => resolve(signal ? 0 : code)))
  let asked = false
  const end = () => {
    if (asked) return
    asked = true
    say('\nStopping')
    child.kill('SIGTERM')
    setTimeout(() => child.kill('SIGKILL'), 10_000).unref()
  }
  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.on(signal, end)
  const origin = `http://127.0.0.1:${env.PORT}`
  if (await untilReady(origin, child)) banner()
  const code = await ended
  await database.stop()
  return asked ? 0 : (code ?? 1)
}
