// Requests against the built server and against a bare application of the same framework, in turn, in one run.
import { spawn } from 'node:child_process'
import { once } from 'node:events'
import { randomBytes } from 'node:crypto'
import { join } from 'node:path'
import autocannon from 'autocannon'
import { builtServer, root } from '../../seed/host/project.mjs'
import { freePort, pause, run, say } from '../../seed/host/shell.mjs'
import { median, printTable } from './table.mjs'

const seconds = Number(process.env.BENCH_SECONDS ?? 5)
const rounds = Number(process.env.BENCH_ROUNDS ?? 3)
const connections = 10

const plan = {
  boat: { type: 'sailMonohull', lengthM: 11.2, beamM: 3.6 },
  wind: { speedMs: 15.43, kind: 'gust' },
  rode: { chain: { lengthM: 45, diameterMm: 10, grade: 'G40' }, snubber: { lengthM: 8, diameterMm: 14, construction: 'nylon3Strand' } },
  depthM: 8,
  seabeds: [{ seabed: 'soft-mud', share: 0.25 }, { seabed: 'sandy-mud', share: 0.25 }, { seabed: 'loose-sand', share: 0.25 }, { seabed: 'weed-over-sand', share: 0.25 }],
}

async function start(file, env, execArgv = []) {
  const port = await freePort()
  const child = spawn(process.execPath, [...execArgv, file], {
    env: { PATH: process.env.PATH, NODE_ENV: 'production', HOST: '127.0.0.1', PORT: String(port), ...env(port) }, stdio: ['ignore', 'pipe', 'inherit'],
  })
  const printed = []
  child.stdout.on('data', chunk => printed.push(String(chunk)))
  const stop = async () => {
    child.kill('SIGTERM')
    if (child.exitCode === null) await once(child, 'exit')
  }
  return { base: `http://127.0.0.1:${port}`, child, printed, stop, host: `localhost:${port}` }
}

async function until(url) {
  for (let tries = 0; tries < 600; tries++) {
    if ((await fetch(url).catch(() => null))?.ok) return
    await pause(100)
  }
  throw new Error(`${url} did not answer`)
}

const post = (base, path, body, headers = {}) =>
  ({ url: `${base}${path}`, method: 'POST', body: JSON.stringify(body), headers: { 'content-type': 'application/json', ...headers } })

async function load(options) {
  const { requests, latency, non2xx, errors } = await autocannon({ connections, duration: seconds, ...options })
  if (non2xx || errors) throw new Error(`${options.url}: ${non2xx} answers were not 2xx, ${errors} failed`)
  return { rate: requests.average, p99: latency.p99 }
}

/** Both in turn, several rounds; medians and the ratio of the rates, pair by pair. */
async function pair(name, ours, bare) {
  const measured = []
  for (let round = 0; round < rounds; round++) measured.push([await load(ours), await load(bare)])
  const figure = (side, key) => Math.round(median(measured.map(both => both[side][key])) * 10) / 10
  return {
    'what': name, 'requests/s': figure(0, 'rate'), 'bare requests/s': figure(1, 'rate'),
    'ratio': median(measured.map(([a, b]) => a.rate / b.rate)).toFixed(2), 'p99 ms': figure(0, 'p99'), 'bare p99 ms': figure(1, 'p99'),
  }
}

/** Pages of the reading side against the bare page, one after another. */
async function pairsOfPages(base, bareBase, paths) {
  const rows = []
  for (const path of paths) rows.push(await pair(path, { url: `${base}${path}` }, { url: bareBase }))
  return rows
}

/** The event loop's delay while a fit of the demo world's size runs in the worker, asked for over the API. */
async function delayDuringFit(server) {
  const ask = async () => {
    const from = server.printed.length
    server.child.kill('SIGUSR2')
    for (;;) {
      const line = server.printed.slice(from).join('').split('\n').find(text => text.startsWith('loop-delay '))
      if (line) return JSON.parse(line.slice(11))
      await pause(20)
    }
  }
  const seabeds = ['soft-mud', 'firm-mud', 'sandy-mud', 'loose-sand']
  const pulls = Array.from({ length: 650 }, (_, index) => {
    const heldN = 800 + 37 * (index * 7919 % 61)
    return { trial: `day-${index % 30}`, design: `design-${index % 16}`, family: 'plain-scoop', massKg: 20, seabed: seabeds[index % 4], heldN, movedN: heldN + 250 }
  })
  await pause(1000)
  await ask()
  await pause(3000)
  const quiet = await ask()
  const began = performance.now()
  const request = post(server.base, '/api/fits', { pulls })
  const answer = await fetch(request.url, request)
  if (!answer.ok) throw new Error(`the fit was refused: ${answer.status} ${await answer.text()}`)
  await answer.json()
  const took = Math.round(performance.now() - began)
  return [{ when: 'quiet, 3 s', ...quiet }, { when: `during a fit of 650 pulls, ${took} ms`, ...await ask() }]
}

/** Both loads, the rule table's mass, and the smallest real size that serves on each seabed, by survey load / by table load. */
async function printReferenceBoats(base) {
  const { boats } = await (await fetch(`${base}/api/reference-boats`)).json()
  const kg = mass => mass === null ? 'none' : `${mass}`
  printTable('Reference boats, 30 kn entered as a gust; smallest serving mass, kg, by survey load / by table load', boats.map(boat => ({
    'boat': `${boat.lengthM} x ${boat.beamM} m`, 'survey kN': (boat.surveyN / 1000).toFixed(2), 'table kN': (boat.tableN / 1000).toFixed(2), 'rule table kg': boat.ruleTableKg,
    ...Object.fromEntries(boat.seabeds.map(({ seabed, survey, table }) => [seabed, `${kg(survey.massKg)} / ${kg(table.massKg)}`])),
  })))
}

export async function benchServed(databaseUrl) {
  await run(join(root, 'node_modules/.bin/nuxt'), ['build', join(root, 'tests/bench/bare')], {
    cwd: root, env: { ...process.env, NODE_ENV: 'production' }, stdio: ['ignore', 'ignore', 'inherit'],
  })
  const server = await start(builtServer, port => ({
    KEDGEWISE_DEMO: '1', DATABASE_URL: databaseUrl, APP_ORIGIN: `http://localhost:${port}`, NUXT_SESSION_PASSWORD: randomBytes(32).toString('base64url'),
    KEDGEWISE_REQUESTS_PER_MINUTE: '10000000', KEDGEWISE_REQUESTS_BURST: '10000000',
  }), ['--import', join(root, 'tests/bench/delay.mjs')])
  try {
    await until(`${server.base}/api/ready`)
    printTable('Event loop delay of the server (ms)', await delayDuringFit(server))
    await printReferenceBoats(server.base)
    const request = post(server.base, '/api/rankings', plan)
    const bytes = Buffer.byteLength(await (await fetch(request.url, request)).text())
    const bare = await start(join(root, 'tests/bench/bare/.output/server/index.mjs'), () => ({ BARE_BYTES: String(bytes) }))
    try {
      await until(bare.base)
      say(`\nOne ranking's answer: ${bytes} bytes; ${connections} connections, ${rounds} rounds of ${seconds} s each, in turn`)
      printTable('Against the bare application', [
        await pair('/api/rankings', request, post(bare.base, '/api/bare', plan)),
        await pair('/plan', { url: `${server.base}/plan` }, { url: bare.base }),
        ...await pairsOfPages(server.base, bare.base, ['/designs', '/trials', '/seabeds', '/designs/fennigar', '/seabeds/loose-sand']),
      ])
    }
    finally {
      await bare.stop()
    }
  }
  finally {
    await server.stop()
  }
}
