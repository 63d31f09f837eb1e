// `npm test`: installs what is missing, then lint, types and every test; closes with one line of counts.
import { mkdirSync, readFileSync, rmSync } from 'node:fs'
import { join } from 'node:path'
import { sweepClusters } from '../seed/host/cluster.mjs'
import { ensureChromium, ensureNodeModules, ensurePostgres } from '../seed/host/packages.mjs'
import { dataFolder, ensureBuild, root, stamps } from '../seed/host/project.mjs'
import { run, say } from '../seed/host/shell.mjs'
import { isStopping, onStop, runAndStop } from '../seed/host/stops.mjs'

const bin = name => join(root, 'node_modules', '.bin', name)
const long = process.argv.includes('--long')
const tally = { passed: 0, failed: 0, skipped: 0, wrong: [] }

function count(name, passed, failed, skipped = 0) {
  tally.passed += passed
  tally.failed += failed
  tally.skipped += skipped
  if (failed) tally.wrong.push(name)
}

/** One check that either succeeds or not. */
async function check(name, command, args) {
  say(`\n— ${name}`)
  try {
    await run(command, args, { cwd: root })
    count(name, 1, 0)
  }
  catch {
    count(name, 0, 1)
  }
}

/** Vitest projects; counted from the report that vitest writes. */
async function tests(...projects) {
  const name = projects.join(', ')
  say(`\n— tests: ${name}`)
  const report = join(dataFolder, `report-${projects[0]}.json`)
  rmSync(report, { force: true })
  const chosen = projects.flatMap(project => ['--project', project])
  const ok = await run(bin('vitest'), ['run', ...chosen, '--reporter=default', '--reporter=json', `--outputFile.json=${report}`], { cwd: root })
    .then(() => true, () => false)
  try {
    const { numPassedTests, numFailedTests, numPendingTests, numTodoTests } = JSON.parse(readFileSync(report, 'utf8'))
    // A file that fails to load, or a teardown that fails, counts as one failure although no test in it does.
    count(name, numPassedTests, numFailedTests || (ok && numPassedTests > 0 ? 0 : 1), numPendingTests + numTodoTests)
  }
  catch {
    count(name, 0, 1)
  }
}

async function everything() {
  await ensureNodeModules(root, stamps)
  await ensurePostgres()
  await ensureChromium()
  mkdirSync(dataFolder, { recursive: true })
  if (long) {
    // Whole calibration campaigns, and every page in every display mode and at every width.
    process.env.KEDGEWISE_LONG = '1'
    await ensureBuild()
    await tests('long')
    return tests('browser')
  }
  await run(bin('nuxt'), ['prepare'], { cwd: root, stdio: ['ignore', 'ignore', 'inherit'] })
  await check('lint', bin('eslint'), ['.', '--max-warnings', '0'])
  await check('types', bin('nuxt'), ['typecheck'])
  await ensureBuild()
  await tests('unit', 'nuxt', 'reference', 'architecture')
  await tests('api', 'browser')
}

await runAndStop(async () => {
  // Registered first, so done last: whatever a killed test run has left.
  onStop(() => sweepClusters(dataFolder, 'tests-'))
  try {
    await everything()
  }
  catch (error) {
    if (isStopping()) return 1
    console.error(error.message)
    count('set-up', 0, 1)
  }
  if (tally.wrong.length) say(`\nFailed: ${tally.wrong.join('; ')}`)
  return tally.failed ? 1 : 0
})
say(`\n${tally.passed} passed, ${tally.failed} failed${tally.skipped ? `, ${tally.skipped} skipped` : ''}`)
