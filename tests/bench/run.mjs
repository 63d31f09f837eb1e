// `npm run bench`: figures of the production build, compared within one run. Never part of the tests: machines are noisy.
import { join } from 'node:path'
import { removeCluster, startCluster } from '../../seed/host/cluster.mjs'
import { ensureNodeModules } from '../../seed/host/packages.mjs'
import { dataFolder, ensureBuild, ensureSeed, root, stamps } from '../../seed/host/project.mjs'
import { run } from '../../seed/host/shell.mjs'
import { onStop, runAndStop } from '../../seed/host/stops.mjs'
import { benchServed } from './served.mjs'

const wanted = new Set(process.argv.slice(2))
const asked = name => wanted.size === 0 || wanted.has(name)

await runAndStop(async () => {
  await ensureNodeModules(root, stamps)
  for (const name of ['rode', 'ranking', 'fit']) {
    if (asked(name)) await run(join(root, 'node_modules/.bin/tsx'), [join(root, 'tests/bench', `${name}.ts`)], { cwd: root })
  }
  if (!asked('served')) return
  await ensureBuild()
  const place = join(dataFolder, `bench-${process.pid}`)
  onStop(() => removeCluster(place))
  const cluster = await startCluster({ wanted: place, settings: { fsync: 'off' } })
  await cluster.createDatabase('kedgewise')
  await ensureSeed(cluster.url('kedgewise'), {})
  await benchServed(cluster.url('kedgewise'))
})
