import { spawn } from 'node:child_process'
import { randomBytes } from 'node:crypto'
import { builtServer } from '../../seed/host/project.mjs'
import { freePort } from '../../seed/host/shell.mjs'

export interface Server {
  /** http://127.0.0.1:port */
  baseUrl: string
  /** the origin that the server believes it has, http://localhost:port */
  origin: string
  /** everything it has printed so far */
  output: () => string
  stop: () => Promise<void>
}

const readyWithinMs = 60_000

async function untilReady(baseUrl: string, over: () => boolean, output: () => string) {
  const end = Date.now() + readyWithinMs
  while (!over() && Date.now() < end) {
    const answer = await fetch(`${baseUrl}/api/ready`).catch(() => null)
    if (answer?.ok) return
    await new Promise(resolve => setTimeout(resolve, 50))
  }
  throw new Error(`the server did not become ready:\n${output()}`)
}

/** Starts the built server on a free port against a database and waits until it is ready, unless told not to wait. */
export async function startServer(databaseUrl: string, env: Record<string, string> = {}, { wait = true } = {}): Promise<Server> {
  const port = await freePort()
  const child = spawn(process.execPath, [builtServer], {
    env: {
      PATH: process.env.PATH, NODE_ENV: 'production', KEDGEWISE_DEMO: '1', HOST: '127.0.0.1', PORT: String(port), DATABASE_URL: databaseUrl,
      APP_ORIGIN: `http://localhost:${port}`, NUXT_SESSION_PASSWORD: randomBytes(32).toString('base64url'), ...env,
    },
    stdio: ['ignore', 'pipe', 'pipe'],
  })
  let printed = ''
  for (const stream of [child.stdout, child.stderr]) stream.on('data', chunk => printed += String(chunk))
  const ended = new Promise<void>(resolve => child.on('exit', () => resolve()))
  const stop = async () => {
    child.kill('SIGTERM')
    const timer = setTimeout(() => child.kill('SIGKILL'), 5000)
    await ended
    clearTimeout(timer)
  }
  const baseUrl = `http://127.0.0.1:${port}`
  const server = { baseUrl, origin: `http://localhost:${port}`, output: () => printed, stop }
  if (!wait) return server
  try {
    await untilReady(baseUrl, () => child.exitCode !== null, () => printed)
    return server
  }
  catch (error) {
    await stop()
    throw error
  }
}
