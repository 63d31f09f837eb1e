import pg from 'pg'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import type { Browser } from 'playwright-core'
import { unlimited } from '../api/client'
import { createTestDatabase, startApp, type TestApp } from '../api/harness'
import { startServer, type Server } from '../api/server'
import { expectAccessible, launch, open, watch } from './browser'
import { modes, widths } from './extent'

/** The demo world; one that nobody has fitted; one without modifications. */
let app: TestApp
let browser: Browser
const others: { server: Server, drop: () => Promise<void> }[] = []

async function untilMigrated(url: string) {
  for (let wait = 0; wait < 600; wait++) {
    const ready = await fetch(`${url}/api/ready`).then(async answer => (await answer.json() as { migrated: boolean }).migrated, () => false)
    if (ready) return
    await new Promise(resolve => setTimeout(resolve, 100))
  }
  throw new Error('the server did not come up within a minute')
}

async function worldWith(sql: string): Promise<Server> {
  const { url, drop } = await createTestDatabase()
  const client = new pg.Client({ connectionString: url })
  await client.connect()
  await client.query(sql)
  await client.end()
  const server = await startServer(url, unlimited, { wait: false })
  others.push({ server, drop })
  await untilMigrated(server.baseUrl)
  return server
}

const bases = { demo: '', unfitted: '', empty: '' }
beforeAll(async () => {
  browser = await launch()
  app = await startApp(unlimited)
  bases.demo = app.origin
  bases.unfitted = (await worldWith('update fits set stands_from = null')).origin
  bases.empty = (await worldWith('delete from estimates where modification_id is not null; update pulls set modification_id = null, pair = null; delete from modifications')).origin
}, 240_000)
afterAll(async () => {
  await browser?.close()
  for (const { server, drop } of others) {
    await server.stop()
    await drop()
  }
  await app?.stop()
})

const two = 'd=fennigar:20&d=ulvesk:20'
const states: [string, keyof typeof bases, string, number, RegExp][] = [
  ['nothing chosen', 'demo', '/compare', 200, /Choose at least two/],
  ['two anchors', 'demo', `/compare?${two}`, 200, /Fennigar against Ulvesk/],
  ['four anchors for a plan', 'demo', `/compare?${two}&d=quennick:27&d=hobbrel&wind=35+kn&bed=firm-mud&bed=rock&share=70&share=30`, 200, /your plan/],
  ['nonsense', 'demo', '/compare?d=no-such:9&d=fennigar:lots&d=fennigar:20&d=ulvesk:-3&d=%3Cscript%3E&d=x&d=y', 200, /was left out/],
  ['a plan that cannot be read', 'demo', `/compare?${two}&length=lots`, 200, /plan in the address was left out/],
  ['a rode that is too short', 'demo', `/compare?${two}&chain=5+m`, 200, /cannot be worked out/],
  ['a rode that bounds no load', 'demo', `/compare?${two}&swell=open&snubber=`, 200, /cannot bound the load/],
  ['no fit yet', 'unfitted', `/compare?${two}`, 200, /No estimates have been worked out/],
  ['modifications', 'demo', '/modifications', 200, /Shank edge blunted/],
  ['no modifications', 'empty', '/modifications', 200, /Nobody has tried/],
  ['modifications, no fit yet', 'unfitted', '/modifications', 200, /No estimates have been worked out/],
  ['a modification', 'demo', '/modifications/shank-edge-blunted', 200, /Does it matter, and where/],
  ['a modification for a plan', 'demo', '/modifications/hinge-locked?wind=35+kn&anchor=27+kg', 200, /For your plan/],
  ['a modification, no fit yet', 'unfitted', '/modifications/hinge-locked', 200, /No estimates have been worked out/],
  ['a modification that is not there', 'demo', '/modifications/no-such', 404, /No page is charted/],
]

const preference = (url: string, value: string) => [{ name: 'preference', value, url }]

describe.each(states)('%s', (_, world, path, status, words) => {
  it.each(modes)('answers as it should, with nothing that axe finds, by %s', async (mode) => {
    const { page, context, said, close } = await watch(browser)
    await context.addCookies(preference(bases[world], `${mode}.asAtSea`))
    expect(await open(page, bases[world] + path)).toBe(status)
    expect(await page.locator('main').innerText()).toMatch(words)
    await page.evaluate(() => document.querySelectorAll('details').forEach(details => details.open = true))
    await expectAccessible(page)
    expect(said.filter(line => status !== 404 || !line.includes('404'))).toEqual([])
    await close()
  })

  it.each(widths)('does not scroll sideways at %i px', async (width) => {
    const { page, close } = await watch(browser, { viewport: { width, height: 760 }, hasTouch: width < 700 })
    await open(page, bases[world] + path)
    await page.evaluate(() => document.querySelectorAll('details').forEach(details => details.open = true))
    expect(await page.evaluate(() => document.documentElement.scrollWidth)).toBeLessThanOrEqual(width)
    await close()
  })
})

describe('choosing anchors', () => {
  it.each([true, false])('is a plain form that keeps the plan (JavaScript: %s)', async (javaScriptEnabled) => {
    const { page, said, close } = await watch(browser, { javaScriptEnabled })
    await open(page, `${bases.demo}/compare?wind=35+kn&length=9+m`)
    await page.selectOption('#anchor-0', 'fennigar')
    await page.selectOption('#anchor-1', 'quennick')
    await page.fill('#mass-1', '60 lb')
    await page.getByRole('button', { name: 'Compare' }).click()
    await page.waitForURL(/d=fennigar/)
    expect(page.url()).toMatch(/wind=35.*|length=9/)
    expect(await page.locator('main').innerText()).toMatch(/Quennick, 27.2 kg|Quennick of 27.2 kg/)
    expect(await page.locator('main').innerText()).toMatch(/For your plan/)
    expect(said).toEqual([])
    await close()
  })

  it('says the same on the server and in the browser', async () => {
    const html = await (await fetch(`${bases.demo}/compare?${two}`)).text()
    const { page, said, close } = await watch(browser)
    await open(page, `${bases.demo}/compare?${two}`)
    const verdict = await page.locator('#verdict + p').innerText()
    expect(html).toContain(verdict)
    expect(said).toEqual([])
    await close()
  })
})

describe('the way here', () => {
  it('leads from a plan\'s ranking to its first two designs, and back to the same plan', async () => {
    const { page, said, close } = await watch(browser)
    await open(page, `${bases.demo}/plan?wind=35+kn`)
    const names = await page.locator('.ranking .main .c-design span.font-serif').allInnerTexts()
    await page.getByRole('link', { name: /^Compare / }).click()
    await page.waitForURL(/\/compare\?/)
    await page.getByRole('heading', { name: 'The verdict' }).waitFor()
    const text = await page.locator('main').innerText()
    expect(text).toContain(names[0])
    expect(text).toContain(names[1])
    await page.getByRole('link', { name: 'your plan' }).first().click()
    await page.waitForURL(/\/plan\?.*wind=35/)
    expect(said).toEqual([])
    await close()
  })
})
