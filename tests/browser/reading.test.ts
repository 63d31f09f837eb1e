import pg from 'pg'
import { afterAll, beforeAll, describe, expect, it, vi } from 'vitest'
import type { Browser } from 'playwright-core'
import { createTestDatabase, startApp, type TestApp } from '../api/harness'
import { unlimited } from '../api/client'
import { startServer, type Server } from '../api/server'
import { expectAccessible, launch, open, watch } from './browser'
import { markupFaults } from './markup'
import { modes } from './extent'

/** Servers on worlds of their own: the demo world; one that nobody fitted; one with nothing in it; one whose pulls are gone. */
const worlds = {
  unfitted: 'update fits set stands_from = null',
  empty: 'truncate designs, trials, rigs, seabeds, modifications, fits, releases cascade',
  broken: 'alter table pulls rename to pulls_gone; alter table designs rename to designs_gone; alter table trials rename to trials_gone; alter table seabeds rename to seabeds_gone',
}
type World = keyof typeof worlds | 'demo'

let app: TestApp
let browser: Browser
const others: { world: World, server: Server, drop: () => Promise<void> }[] = []

async function execute(url: string, sql: string) {
  const client = new pg.Client({ connectionString: url })
  await client.connect()
  await client.query(sql)
  await client.end()
}

beforeAll(async () => {
  browser = await launch()
  app = await startApp(unlimited)
  for (const [world, sql] of Object.entries(worlds)) {
    const { url, drop } = await createTestDatabase()
    await execute(url, sql)
    const server = await startServer(url, unlimited, { wait: false })
    others.push({ world: world as World, server, drop })
    await vi.waitFor(async () => expect((await (await fetch(`${server.baseUrl}/api/ready`)).json()).migrated).toBe(true), { timeout: 60_000, interval: 100 })
  }
}, 240_000)
afterAll(async () => {
  await browser?.close()
  for (const { server, drop } of others) {
    await server.stop()
    await drop()
  }
  await app?.stop()
})

const at = (world: World) => world === 'demo' ? app.origin : others.find(other => other.world === world)?.server.origin ?? ''

const states: [string, World, string, number, RegExp][] = [
  ['designs', 'demo', '/designs', 200, /18 designs/],
  ['designs, filtered', 'demo', '/designs?family=claw&seabed=loose-sand&sort=holding&mass=15+kg', 200, /like that/],
  ['designs, filtered to nothing', 'demo', '/designs?search=nothing+is+called+that', 200, /No design is like that/],
  ['designs, past the last page', 'demo', '/designs?page=9', 200, /no page 9/],
  ['designs, with nonsense', 'demo', '/designs?family=x&mass=lots&page=-1', 200, /Ignored/],
  ['designs, none', 'empty', '/designs', 200, /No design has been entered/],
  ['designs, not fitted', 'unfitted', '/designs', 200, /18 designs/],
  ['designs, out of order', 'broken', '/designs', 500, /gave way/],
  ['a design', 'demo', '/designs/fennigar', 200, /How it sets, and how it fails/],
  ['a design at another mass', 'demo', '/designs/quennick?mass=10+kg', 200, /Holding of a 10 kg/],
  ['a design with little evidence', 'demo', '/designs/ebbwick', 200, /Never pulled on/],
  ['a design, not fitted', 'unfitted', '/designs/fennigar', 200, /have not been fitted yet/],
  ['a design that is not there', 'demo', '/designs/no-such', 404, /No page is charted/],
  ['a design, out of order', 'broken', '/designs/fennigar', 500, /gave way/],
  ['seabeds', 'demo', '/seabeds', 200, /Seabeds without a figure/],
  ['seabeds, with a chart read', 'demo', '/seabeds?chart=fS.M.Shq', 200, /Not read/],
  ['seabeds, none', 'empty', '/seabeds', 200, /None has been entered/],
  ['a seabed', 'demo', '/seabeds/loose-sand', 200, /In order of the median/],
  ['a seabed at another mass', 'demo', '/seabeds/weed-over-sand?mass=33+lb&chart=zz', 200, /Too little evidence/],
  ['a seabed that nobody pulled on', 'demo', '/seabeds/silt', 200, /No pulls here/],
  ['a seabed without a number', 'demo', '/seabeds/seagrass', 200, /forbidden in many places/],
  ['a seabed, not fitted', 'unfitted', '/seabeds/loose-sand', 200, /have not been fitted yet/],
  ['a seabed that is not there', 'demo', '/seabeds/lava', 404, /No page is charted/],
  ['trials', 'demo', '/trials', 200, /40 trials/],
  ['trials, filtered to nothing', 'demo', '/trials?seabed=shell', 200, /No trial is like that/],
  ['trials, none', 'empty', '/trials', 200, /No trial has been published/],
  ['trials, out of order', 'broken', '/trials', 500, /gave way/],
  ['a trial with pairs', 'demo', '/trials/tarrack-bight-2024-09-04', 200, /Back to back/],
  ['a trial in weed', 'demo', '/trials/dulse-garth-2024-07-10', 200, /never set/],
  ['a trial, not fitted', 'unfitted', '/trials/dulse-garth-2024-07-10', 200, /have not been fitted yet/],
  ['a trial that is not there', 'demo', '/trials/no-such', 404, /No page is charted/],
]

describe.each(states)('%s', (_, world, path, status, words) => {
  it('is served whole: its words, its markup, and that the world is invented', async () => {
    const answer = await fetch(at(world) + path, { headers: { Accept: 'text/html' } })
    const html = await answer.text()
    expect(answer.status).toBe(status)
    expect(html.replace(/<[^>]+>/g, '').replace(/\s+/g, ' ')).toMatch(words)
    expect(markupFaults(html)).toEqual([])
    expect(html).toMatch(/invented/i)
  })

  it.each(modes)('has nothing that axe finds and a clean console, by %s', async (mode) => {
    const { page, context, said, close } = await watch(browser)
    await context.addCookies([{ name: 'preference', value: `${mode}.asAtSea`, url: at(world) }])
    expect(await open(page, at(world) + path)).toBe(status)
    expect(await page.locator('html').getAttribute('data-mode')).toBe(mode)
    await page.evaluate(() => document.querySelectorAll('details').forEach(details => details.open = true))
    await expectAccessible(page)
    expect(said.filter(line => status === 200 || !line.includes(String(status)))).toEqual([])
    await close()
  })

  it('does not scroll sideways at 320 px', async () => {
    const { page, close } = await watch(browser, { viewport: { width: 320, height: 760 }, hasTouch: true })
    await open(page, at(world) + path)
    await page.evaluate(() => document.querySelectorAll('details').forEach(details => details.open = true))
    expect(await page.evaluate(() => document.documentElement.scrollWidth)).toBeLessThanOrEqual(320)
    await close()
  })
})

describe('reading', () => {
  it.each([true, false])('leads from the list to a design and on to a plan with it (JavaScript: %s)', async (javaScriptEnabled) => {
    const { page, said, close } = await watch(browser, { javaScriptEnabled })
    await open(page, `${app.origin}/designs`)
    await page.selectOption('#designs-family', 'fixed-plough')
    await page.getByRole('button', { name: 'Show' }).click()
    await page.waitForURL(/family=fixed-plough/)
    await page.getByRole('link', { name: 'Haskettle' }).click()
    await page.waitForURL(/\/designs\/haskettle$/)
    await page.fill('#at-mass', '16 kg')
    await page.getByRole('button', { name: 'Show' }).click()
    await page.waitForURL(/mass=16/)
    await page.getByRole('link', { name: /^Plan with this/ }).click()
    await page.waitForURL(/\/plan\?/)
    expect(await page.inputValue('#plan-own')).toBe('haskettle')
    expect(await page.inputValue('#plan-ownmass')).toBe('16 kg')
    expect(said).toEqual([])
    await close()
  })

  it.each([true, false])('reads the chart (JavaScript: %s)', async (javaScriptEnabled) => {
    const { page, close } = await watch(browser, { javaScriptEnabled })
    await open(page, `${app.origin}/seabeds`)
    await page.fill('#chart-says', 'S/M')
    await page.getByRole('button', { name: 'Read it' }).click()
    await page.waitForURL(/chart=S/)
    expect(await page.getByText('“S/M” says sand on top and mud beneath').count()).toBe(1)
    await close()
  })

  it('asks about a pull, is told what is wrong, and is thanked', async () => {
    const { page, said, close } = await watch(browser)
    await open(page, `${app.origin}/trials/tarrack-bight-2024-09-04`)
    await page.getByText('Pull 3, Dunnavet of 20 kg').click()
    await page.fill('#ask-3', '          no         ')
    await page.fill('#ask-3-mail', 'reader@example.org')
    const send = page.locator('#question-3').getByRole('button')
    await send.click()
    await page.locator('#ask-3-issue').waitFor()
    expect(await page.locator('#ask-3-issue').innerText()).toMatch(/10 to 2 000 characters/)
    await page.fill('#ask-3', 'It held more than its neighbour, which cannot be.')
    await send.click()
    await page.getByText('Thank you. Your question is kept').waitFor()
    // The browser itself reports the refusal.
    expect(said.filter(line => !line.includes('422'))).toEqual([])
    await close()
  })
})
