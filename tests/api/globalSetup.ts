// One throw-away cluster, one build and one seeded, fitted template database for all tests that talk to a server.
import { join } from 'node:path'
import type { TestProject } from 'vitest/node'
import { dataFolder, ensureBuild, ensureSeed } from '../../seed/host/project.mjs'
import { removeCluster, startCluster } from '../../seed/host/cluster.mjs'
import { startServer } from './server'

declare module 'vitest' {
  interface ProvidedContext { postgres: string }
}

const templateName = 'template_kedgewise'

interface Ground { url: string, stop: () => Promise<void> }

interface Shared { ground: Promise<Ground> | null, users: number }

// Several projects run in one process, each with a copy of this module: the first one lays the ground, the last one clears it.
const key = Symbol.for('kedgewise ground')
const holder = globalThis as typeof globalThis & { [key]?: Shared }
const shared: Shared = holder[key] ??= { ground: null, users: 0 }

async function untilReleased(baseUrl: string) {
  for (let wait = 0; wait < 300; wait++) {
    const { releases } = await (await fetch(`${baseUrl}/api/releases`)).json() as { releases: unknown[] }
    if (releases.length === 3) return
    await new Promise(resolve => setTimeout(resolve, 200))
  }
  throw new Error('the releases of the demo world were not made within a minute')
}

async function lay(): Promise<Ground> {
  await ensureBuild()
  const wanted = join(dataFolder, `tests-${process.pid}`)
  const cluster = await startCluster({
    wanted, settings: { fsync: 'off', synchronous_commit: 'off', full_page_writes: 'off' },
  })
  const stop = async () => {
    await cluster.stop()
    removeCluster(wanted)
  }
  try {
    await cluster.createDatabase(templateName)
    await ensureSeed(cluster.url(templateName), {})
    // The server itself makes the fit and then the releases, as it would for anybody.
    const server = await startServer(cluster.url(templateName))
    await untilReleased(server.baseUrl).finally(server.stop)
    return { url: cluster.url('postgres'), stop }
  }
  catch (error) {
    await stop()
    throw error
  }
}

export default async function setup(project: TestProject) {
  shared.users += 1
  shared.ground ??= lay()
  const { url, stop } = await shared.ground
  project.provide('postgres', url)
  return async () => {
    shared.users -= 1
    if (shared.users === 0) await stop()
  }
}
