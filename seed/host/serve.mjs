// A cluster, a seeded database and one server in front of it, stopped together.
import { spawn } from 'node:child_process'
import { join } from 'node:path'
import { startCluster } from './cluster.mjs'
import { dataFolder, ensureSeed, root } from './project.mjs'
import { endChild, pause } from './shell.mjs'
import { onStop } from './stops.mjs'

const loopback = ['127.0.0.1', 'localhost', '[::1]']

/** Refuses a DATABASE_URL that is not on loopback before anything is written to it: the demo world never leaves this machine. */
export function loopbackOnly(url) {
  const address = URL.canParse(url) ? new URL(url) : null
  const foreign = !address || !loopback.includes(address.hostname) || ['host', 'hostaddr', 'service'].some(name => address.searchParams.has(name))
  if (foreign) throw new Error('DATABASE_URL: the demo world is written to a loopback database only (postgres://…@127.0.0.1:port/name). Nothing was touched.')
  return url
}

/** The address of the database to serve from: DATABASE_URL where it is given, else this clone's own cluster. */
export async function openDatabase() {
  const given = process.env.DATABASE_URL
  if (given) {
    await ensureSeed(loopbackOnly(given), {})
    return given
  }
  const cluster = await startCluster({ wanted: join(dataFolder, 'postgres') })
  if (cluster.fresh) await cluster.createDatabase('kedgewise')
  const url = cluster.url('kedgewise')
  await ensureSeed(url, { known: !cluster.fresh })
  return url
}

async function untilReady(origin, child) {
  while (child.exitCode === null && child.signalCode === null) {
    const answer = await fetch(`${origin}/api/ready`).catch(() => null)
    if (answer?.ok) return true
    await pause(250)
  }
  return false
}

/** Starts a server, says so when it has a fit to answer from, and resolves with its exit code when it ends. */
export async function serve({ command, args, env, banner }) {
  // In a group of its own, so that Ctrl-C reaches it once: from here, before its database goes.
  const child = spawn(command, args, { cwd: root, env, stdio: ['ignore', 'inherit', 'inherit'], detached: true })
  const ended = new Promise((resolve, reject) => {
    child.on('error', error => reject(new Error(`${command}: ${error.message}`)))
    child.on('exit', code => resolve(code ?? 0))
  })
  const forget = onStop(() => endChild(child))
  try {
    const ready = await Promise.race([untilReady(`http://127.0.0.1:${env.PORT}`, child), ended.then(() => false)])
    if (ready) banner()
    return await ended
  }
  finally {
    forget()
  }
}
