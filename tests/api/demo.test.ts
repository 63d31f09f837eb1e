// The demo command itself, on a data folder of its own: what it starts, it stops.
import { spawn, type ChildProcess } from 'node:child_process'
import { existsSync, mkdtempSync, readFileSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest'
import { root } from '../../seed/host/project.mjs'
import { endChild, freePort } from '../../seed/host/shell.mjs'

let data: string
const started: ChildProcess[] = []
beforeAll(() => {
  data = mkdtempSync(join(tmpdir(), 'kedgewise-demo-'))
})
afterAll(() => {
  const elsewhere = join(data, 'postgres.elsewhere')
  if (existsSync(elsewhere)) rmSync(readFileSync(elsewhere, 'utf8').trim(), { recursive: true, force: true })
  rmSync(data, { recursive: true, force: true })
})

// A demo that a failed test left behind must not outlive it.
afterEach(async () => {
  for (const child of started.splice(0)) await endChild(child)
})

/** The process that serves the data folder's cluster, or null. */
function postmaster(folder: string): number | null {
  const elsewhere = join(folder, 'postgres.elsewhere')
  const place = existsSync(elsewhere) ? readFileSync(elsewhere, 'utf8').trim() : join(folder, 'postgres')
  const file = join(place, 'data', 'postmaster.pid')
  return existsSync(file) ? Number(readFileSync(file, 'utf8').split('\n')[0]) : null
}

interface Demo { child: ChildProcess, printed: () => string, ended: Promise<number | null> }

function demo(folder: string, port: number, env: Record<string, string> = {}): Demo {
  const { DATABASE_URL: _own, ...inherited } = process.env
  const child = spawn(process.execPath, [join(root, 'seed/demo.mjs')], {
    cwd: root, env: { ...inherited, PORT: String(port), KEDGEWISE_DATA: folder, ...env }, stdio: ['ignore', 'pipe', 'pipe'],
  })
  started.push(child)
  let printed = ''
  for (const stream of [child.stdout, child.stderr]) stream?.on('data', chunk => printed += String(chunk))
  return { child, printed: () => printed, ended: new Promise(resolve => child.on('exit', code => resolve(code))) }
}

describe('npm run demo', () => {
  it('serves the demo world, and Ctrl-C stops the server and its database', async () => {
    const port = await freePort()
    const first = demo(data, port)
    await expect.poll(first.printed, { timeout: 110_000, interval: 200 }).toContain(`open http://localhost:${port}`)
    expect(first.printed()).toContain('Writing the demo world')
    expect((await fetch(`http://127.0.0.1:${port}/api/ready`)).status).toBe(200)
    expect(postmaster(data)).toBeGreaterThan(0)
    first.child.kill('SIGINT')
    expect(await first.ended).toBe(0)
    await expect(fetch(`http://127.0.0.1:${port}/api/health`)).rejects.toThrow()
    expect(postmaster(data)).toBeNull()
  }, 150_000)

  it('skips install, build and seed the second time, and SIGTERM stops it too', async () => {
    const port = await freePort()
    const second = demo(data, port)
    await expect.poll(second.printed, { timeout: 60_000, interval: 100 }).toContain('Kedgewise is ready')
    for (const step of ['Installing', 'Building', 'Writing the demo world']) expect(second.printed()).not.toContain(step)
    second.child.kill('SIGTERM')
    expect(await second.ended).toBe(0)
    expect(postmaster(data)).toBeNull()
  }, 90_000)

  it('stops its database when it is told to stop while it is still setting up', async () => {
    const folder = mkdtempSync(join(tmpdir(), 'kedgewise-demo-'))
    try {
      const early = demo(folder, await freePort())
      await expect.poll(() => postmaster(folder) ?? 0, { timeout: 60_000, interval: 20 }).toBeGreaterThan(0)
      early.child.kill('SIGTERM')
      await early.ended
      expect(postmaster(folder)).toBeNull()
    }
    finally {
      const elsewhere = join(folder, 'postgres.elsewhere')
      if (existsSync(elsewhere)) rmSync(readFileSync(elsewhere, 'utf8').trim(), { recursive: true, force: true })
      rmSync(folder, { recursive: true, force: true })
    }
  }, 90_000)

  it('refuses somebody\'s database elsewhere before it touches it, and a port that is none', async () => {
    const far = demo(data, await freePort(), { DATABASE_URL: 'postgres://app:pw@192.0.2.1/kedgewise' })
    expect(await far.ended).toBe(1)
    expect(far.printed()).toContain('DATABASE_URL')
    const none = demo(data, 0, { PORT: '99999' })
    expect(await none.ended).toBe(1)
    expect(none.printed()).toContain('PORT')
  }, 60_000)
})
