// One throw-away cluster, one build and one seeded, fitted template database for all tests that talk to a server.
import { rmSync } from 'node:fs'
import { join } from 'node:path'
import type { TestProject } from 'vitest/node'
import { dataFolder, ensureBuild, ensureSeed, root } from '../../seed/host/project.mjs'
import { startCluster } from '../../seed/host/cluster.mjs'
import { startServer } from './server'

declare module 'vitest' {
  interface ProvidedContext { postgres: string }
}

const templateName = 'template_kedgewise'

interface Ground { url: string, stop: () => Promise<void> }

// Several projects share this module in one process: the first one lays the ground, the last one clears it.
let ground: Promise<Ground> | null = null
let users = 0

async function lay(): Promise<Ground> {
  await ensureBuild()
  const cluster = await startCluster({
    root, wanted: join(dataFolder, `tests-${process.pid}`), settings: { fsync: 'off', synchronous_commit: 'off', full_page_writes: 'off' },
  })
  const stop = async () => {
    await cluster.stop()
    rmSync(cluster.folder, { recursive: true, force: true })
  }
  try {
    await cluster.createDatabase(templateName)
    await ensureSeed(cluster.url(templateName), {})
    // The server itself makes the fit, as it would for anybody.
    const server = await startServer(cluster.url(templateName))
    await server.stop()
    return { url: cluster.url('postgres'), stop }
  }
  catch (error) {
    await stop()
    throw error
  }
}

export default async function setup(project: TestProject) {
  users += 1
  ground ??= lay()
  const { url, stop } = await ground
  project.provide('postgres', url)
  return async () => {
    users -= 1
    if (users === 0) await stop()
  }
}
