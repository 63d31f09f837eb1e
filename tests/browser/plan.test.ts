import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import type { Browser, Page } from 'playwright-core'
import { startApp, type TestApp } from '../api/harness'
import { choose, launch, open, retype, tabTo, watch } from './browser'

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

const caption = (page: Page) => page.locator('figcaption p').first()
/** The ranking as read: places, names and chances. */
const ranking = async (page: Page) => (await page.locator('.ranking .main').allInnerTexts()).join('\n')
const verdict = (page: Page) => page.locator('#own-verdict')

/** Waits until the ranking on the page is the answer to the words on the page. */
const settled = (page: Page) => expect.poll(() => page.locator('[aria-busy=true]').count(), soon).toBe(0)

/** Waits for the page to say something else than before: the ranking follows from the server. */
async function changed(read: () => Promise<string>, before: string): Promise<string> {
  await expect.poll(read, soon).not.toBe(before)
  return read()
}

describe('a plan by keyboard', () => {
  it('leads from the first page to a verdict, and the address carries it all', async () => {
    const { page, context, said, close } = await watch(browser)
    await open(page, `${app.baseUrl}/`)
    await retype(page, 'plan-length', '35 ft')
    await page.keyboard.press('Enter')
    await page.waitForURL(/\/plan\?.*length=35/)
    await page.waitForLoadState('networkidle')
    expect(await page.inputValue('#plan-length')).toBe('35 ft')
    expect(await page.getByText('10.668 m').or(page.getByText('10.67 m')).count()).toBeGreaterThan(0)

    await retype(page, 'plan-wind', '12 kn')
    await expect.poll(() => caption(page).innerText(), soon).toMatch(/lies on the bottom: the pull on the anchor is flat/)
    const calm = await ranking(page)
    await retype(page, 'plan-wind', '42 kn')
    await expect.poll(() => caption(page).innerText(), soon).toMatch(/rode pulls the shank up|lifts the shank/)
    const storm = await changed(() => ranking(page), calm)

    await retype(page, 'plan-chain', '90 m')
    await expect.poll(() => caption(page).innerText(), soon).toMatch(/lies on the bottom|just lifts/)
    const longer = await changed(() => ranking(page), storm)

    await choose(page, 'plan-bed-more', 'weed over s')
    await expect.poll(() => page.locator('#plan-bed2').inputValue(), soon).toBe('weed-over-sand')
    expect(await page.inputValue('#plan-share2')).toBe('33 %')
    await changed(() => ranking(page), longer)

    await tabTo(page, 'plan-own')
    await page.keyboard.press('ArrowDown')
    await retype(page, 'plan-ownmass', '16 kg')
    await verdict(page).waitFor()
    await settled(page)
    const judged = await verdict(page).innerText()
    expect(judged).toMatch(/of 16 kg (holds|is marginal|does not hold|has not been tested enough)/)

    await expect.poll(() => page.url(), soon).toMatch(/ownmass=16/)
    const before = await ranking(page)
    await page.reload({ waitUntil: 'networkidle' })
    expect(await verdict(page).innerText()).toBe(judged)
    expect(await ranking(page)).toBe(before)

    const other = await watch(browser)
    await open(other.page, page.url())
    expect(await verdict(other.page).innerText()).toBe(judged)
    expect(await ranking(other.page)).toBe(before)
    expect([...said, ...other.said]).toEqual([])
    expect(await context.cookies()).toEqual([])
    await other.close()
    await close()
  })

  it('draws the rode from the same figures that it prints', async () => {
    const { page, said, close } = await watch(browser)
    await open(page, `${app.baseUrl}/plan?wind=42+kn`)
    const chain = () => page.locator('svg.drawing').first().locator('path.moves').first().getAttribute('d')
    const lifted = await chain()
    await retype(page, 'plan-wind', '10 kn')
    await expect.poll(chain, soon).not.toBe(lifted)
    const [angle] = await page.getByRole('row', { name: 'Angle at the shank' }).getByRole('cell').allInnerTexts()
    expect(angle).toBe('0°')
    expect(said).toEqual([])
    await close()
  })

  it('follows an address that is opened from elsewhere, and the way back', async () => {
    const { page, said, close } = await watch(browser)
    await open(page, `${app.baseUrl}/plan?length=9+m`)
    await page.getByRole('link', { name: 'Method', exact: true }).click()
    await page.getByRole('heading', { name: 'The method' }).waitFor()
    await page.goBack()
    await expect.poll(() => page.inputValue('#plan-length'), soon).toBe('9 m')
    expect(said).toEqual([])
    await close()
  })
})

describe('a page that is slow to come alive', () => {
  it('keeps what was typed and opened before', async () => {
    const { page, said, close } = await watch(browser)
    // While the page is still being read, before any script of it runs.
    await page.addInitScript(() => {
      const reader = new MutationObserver(() => {
        const length = document.querySelector<HTMLInputElement>('#plan-length')
        if (length) length.value = '9 m'
        for (const details of document.querySelectorAll('details')) details.open = true
      })
      reader.observe(document, { childList: true, subtree: true })
      document.addEventListener('DOMContentLoaded', () => reader.disconnect())
    })
    await open(page, `${app.baseUrl}/plan`)
    await expect.poll(() => page.url(), soon).toMatch(/length=9/)
    expect(await page.inputValue('#plan-length')).toBe('9 m')
    expect(await page.locator('details:not([open])').count()).toBe(0)
    expect(said).toEqual([])
    await close()
  })
})

describe('a plan that cannot be worked out', () => {
  it.each([true, false])('says that the rode is too short and keeps what was typed (JavaScript: %s)', async (javaScriptEnabled) => {
    const { page, said, close } = await watch(browser, { javaScriptEnabled })
    expect(await open(page, `${app.baseUrl}/plan?chain=7+m&depth=8+m`)).toBe(200)
    expect(await page.locator('#plan-chain-issue').innerText()).toMatch(/too short to reach the bottom/i)
    expect(await page.inputValue('#plan-chain')).toBe('7 m')
    const summary = page.getByRole('alert')
    expect(await summary.innerText()).toMatch(/Chain length: Too short to reach the bottom/)
    expect(await summary.getByRole('link').getAttribute('href')).toBe('#plan-chain')
    expect(said).toEqual([])
    await close()
  })

  it('leads from the summary to the field, into a closed section if need be', async () => {
    const { page, said, close } = await watch(browser)
    await open(page, `${app.baseUrl}/plan?rise=much&length=lots`)
    expect(await page.getByRole('alert').getByRole('listitem').count()).toBe(2)
    await page.getByRole('alert').getByRole('link', { name: 'Rise of tide to come' }).click()
    expect(await page.evaluate(() => document.activeElement?.id)).toBe('plan-rise')
    expect(await page.inputValue('#plan-rise')).toBe('much')
    expect(said).toEqual([])
    await close()
  })

  it.each([true, false])('marks what only the server can refuse, and keeps load and rode (JavaScript: %s)', async (javaScriptEnabled) => {
    const { page, close } = await watch(browser, { javaScriptEnabled })
    await open(page, `${app.baseUrl}/plan?own=no-such-design&ownmass=15+kg`)
    expect(await page.getByRole('alert').innerText()).toMatch(/My own anchor/)
    expect(await page.locator('#plan-own-issue').count()).toBe(1)
    expect(await page.getByRole('heading', { name: 'Survey load' }).count()).toBe(1)
    await close()
  })

  it('never answers 5xx, whatever stands in the address', async () => {
    const { page, close } = await watch(browser, { javaScriptEnabled: false })
    for (const query of ['length=1e400+m', 'wind=-5+kn', 'chain=0+m', 'chain=0+m&rope=50+m', 'bed=__proto__', 'own=constructor&ownmass=9+kg',
      'current=0.001+m/s', 'length=NaN', 'bed=rock', 'swell=open&snubber=none', 'length=79+m', 'display=__proto__', 'length=%00', 'length=9+m&length=10+m',
      'wind=F8', 'share=90+%25&bed=loose-sand&bed=loose-sand&share=10+%25', 'snubtype=nylonDoubleBraid&swell=open', 'chain=2000+m&depth=300+m']) {
      expect(await open(page, `${app.baseUrl}/plan?${query}`), query).toBe(200)
    }
    await close()
  })
})

describe('without JavaScript', () => {
  it('is a plain form that answers with the whole page', async () => {
    const { page, close } = await watch(browser, { javaScriptEnabled: false })
    await open(page, `${app.baseUrl}/`)
    await page.fill('#plan-length', '9.5 m')
    await page.selectOption('#plan-type', 'motor')
    await page.getByRole('button', { name: 'Work it out' }).click()
    await page.waitForURL(/\/plan\?/)
    expect(await page.inputValue('#plan-length')).toBe('9.5 m')
    const first = await ranking(page)
    expect(first.length).toBeGreaterThan(200)
    const flat = await caption(page).innerText()

    await page.fill('#plan-wind', '50 kn')
    await page.selectOption('#plan-bed-more', 'firm-mud')
    await page.fill('#plan-share0', '')
    await page.fill('#plan-share1', '')
    const [, , , design] = await page.locator('#plan-own option').evaluateAll(options => options.map(option => (option as HTMLOptionElement).value))
    await page.selectOption('#plan-own', design ?? '')
    await page.fill('#plan-ownmass', '12 kg')
    await page.getByRole('button', { name: 'Work it out' }).click()
    await page.waitForURL(/wind=50/)
    expect(await page.inputValue('#plan-bed2')).toBe('firm-mud')
    expect(await caption(page).innerText()).not.toBe(flat)
    expect(await ranking(page)).not.toBe(first)
    expect(await verdict(page).innerText()).toMatch(/of 12 kg/)

    await page.getByRole('button', { name: 'storm, 42 kn' }).click()
    await page.waitForURL(/wind=42/)
    expect(await page.inputValue('#plan-wind')).toBe('42 kn')
    await close()
  })
})
