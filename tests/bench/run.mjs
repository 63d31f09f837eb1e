// `npm run bench`: figures of the production build, compared within one run. Never part of the tests: machines are noisy.
import { rmSync } from 'node:fs'
import { join } from 'node:path'
import { startCluster, sweepClusters } from '../../seed/host/cluster.mjs'
import { ensureNodeModules } from '../../seed/host/packages.mjs'
import { dataFolder, ensureBuild, ensureSeed, root, stamps } from '../../seed/host/project.mjs'
import { run } from '../../seed/host/shell.mjs'
import { benchServed } from './served.mjs'

const wanted = new Set(process.argv.slice(2))
const asked = name => wanted.size === 0 || wanted.has(name)

await ensureNodeModules(root, stamps)
for (const name of ['rode', 'ranking', 'fit']) {
  if (asked(name)) await run(join(root, 'node_modules/.bin/tsx'), [join(root, 'tests/bench', `${name}.ts`)], { cwd: root })
}
if (asked('served')) {
  await ensureBuild()
  const cluster = await startCluster({ root, wanted: join(dataFolder, `bench-${process.pid}`), settings: { fsync: 'off' } })
  try {
    await cluster.createDatabase('kedgewise')
    await ensureSeed(cluster.url('kedgewise'), {})
    await benchServed(cluster.url('kedgewise'))
  }
  finally {
    await cluster.stop()
    rmSync(cluster.folder, { recursive: true, force: true })
    await sweepClusters(dataFolder, 'bench-')
  }
}
