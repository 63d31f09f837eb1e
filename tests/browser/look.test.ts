import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import type { Browser, Page } from 'playwright-core'
import { startApp, type TestApp } from '../api/harness'
import { expectAccessible, launch, meanLuminance, open, watch } from './browser'
import { modes, widths } from './extent'

/** How long the page may take to follow on a busy machine. */
const soon = { timeout: 15_000 }

let app: TestApp
let browser: Browser
beforeAll(async () => {
  app = await startApp()
  browser = await launch()
})
afterAll(async () => {
  await browser?.close()
  await app?.stop()
})

const own = 'own=fennigar&ownmass=16+kg'
const states = [
  ['the first page', '/'],
  ['a plan', '/plan'],
  ['a plan in a storm, with the own anchor', `/plan?wind=42+kn&${own}&swell=moderate&chain=30+m`],
  ['a plan with rope and current', '/plan?chain=20+m&rope=40+m&ropesize=14+mm&current=2+kn&shackle=10+mm&roller=yes'],
  ['a plan without a number', '/plan?bed=seagrass&bed=loose-sand&share=60+%25&share=40+%25'],
  ['a plan with mistakes', '/plan?length=lots&rise=much&chain=2+m'],
  ['the method', '/method'],
  ['a page that is not there', '/nowhere'],
] as const

/** Every section opened, and of the ranking's rows, which are all built alike, the first two. */
const openSections = (page: Page) => page.evaluate(() => {
  const rows = [...document.querySelectorAll<HTMLDetailsElement>('.ranking details')]
  for (const details of document.querySelectorAll('details')) details.open = rows.indexOf(details) < 2
})

const preference = (value: string) => [{ name: 'preference', value, url: app.origin }]

describe.each(states)('%s', (_, path) => {
  it.each(modes)('has nothing that axe finds, by %s', async (mode) => {
    const { page, context, said, close } = await watch(browser)
    await context.addCookies(preference(`${mode}.asAtSea`))
    const status = await open(page, `${app.origin}${path}`)
    await openSections(page)
    await expectAccessible(page)
    // A missing page is reported by the browser itself; nothing else may be.
    expect(said.filter(line => status !== 404 || !line.includes('404'))).toEqual([])
    await close()
  }, 180_000)

  it.each(widths)('does not scroll sideways at %i px', async (width) => {
    const { page, close } = await watch(browser, { viewport: { width, height: 760 }, hasTouch: width < 700 })
    await open(page, `${app.origin}${path}`)
    await openSections(page)
    expect(await page.evaluate(() => document.documentElement.scrollWidth)).toBeLessThanOrEqual(width)
    await close()
  })
})

describe('day, night and sun', () => {
  it('night is dark from the first byte on, and stays under a mean luminance of 0.03', async () => {
    const { page, context, close } = await watch(browser)
    await context.addCookies(preference('night.asAtSea'))
    const html = await (await fetch(`${app.origin}/plan`, { headers: { cookie: 'preference=night.asAtSea' } })).text()
    expect(html).toMatch(/<html[^>]*data-mode="night"/)
    expect(html).toMatch(/<meta name="color-scheme" content="dark"/)
    await open(page, `${app.origin}/plan?${own}`)
    expect(await meanLuminance(context, page)).toBeLessThan(0.03)
    await close()
  })

  it.each([['night', '@media (prefers-color-scheme: dark)', { colorScheme: 'dark' }, 'rgb(11, 7, 6)'],
    ['sun', '@media (prefers-contrast: more)', { contrast: 'more' }, 'rgb(255, 255, 255)'],
    ['day', 'nothing', {}, 'rgb(251, 248, 241)']] as const)('%s follows %s', async (_, __, options, paper) => {
    const { page, close } = await watch(browser, options)
    await open(page, `${app.origin}/`)
    expect(await page.evaluate(() => getComputedStyle(document.documentElement).backgroundColor)).toBe(paper)
    await close()
  })

  it.each([true, false])('the choice is kept in one cookie and never in the address (JavaScript: %s)', async (javaScriptEnabled) => {
    const { page, context, close } = await watch(browser, { javaScriptEnabled })
    await open(page, `${app.origin}/plan?length=9+m`)
    await page.selectOption('select[name=display]', 'night')
    await page.selectOption('select[name=units]', 'imperial')
    if (!javaScriptEnabled) await page.getByRole('button', { name: 'Set' }).click()
    await expect.poll(() => page.locator('html').getAttribute('data-mode'), soon).toBe('night')
    expect(page.url()).toMatch(/\/plan\?.*length=9/)
    expect(page.url()).not.toMatch(/display=|units=/)
    expect((await context.cookies()).map(({ name, value }) => `${name}=${value}`)).toEqual(['preference=night.imperial'])
    await page.reload()
    expect(await page.locator('html').getAttribute('data-mode')).toBe('night')
    expect(await page.getByText('lbf').count()).toBeGreaterThan(0)
    await close()
  })

  it('takes no other value from a cookie or an address', async () => {
    const html = await (await fetch(`${app.origin}/plan?display=%22%3E%3Cscript%3E&units=furlongs`, {
      headers: { cookie: 'preference=%22%3E%3Cscript%3E.x' }, redirect: 'follow' })).text()
    expect(html).not.toMatch(/data-mode|<script>/)
  })

  it.each(['//evil.example', '/\\evil.example', '/%5Cevil.example'])('is not led away to %s', async (path) => {
    const answer = await fetch(`${app.origin}${path}?display=night`, { redirect: 'manual' })
    expect(answer.headers.get('location') ?? '/').toMatch(/^\/(?![/\\])/)
  })
})
