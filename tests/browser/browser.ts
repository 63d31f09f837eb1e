import AxeBuilder from '@axe-core/playwright'
import { chromium, type Browser, type BrowserContext, type BrowserContextOptions, type Page } from 'playwright-core'
import { expect } from 'vitest'

/** Debian's Chromium, as root and without anything that would reach the network. */
export const launch = (): Promise<Browser> => chromium.launch({
  executablePath: '/usr/bin/chromium',
  args: ['--no-sandbox', '--disable-gpu', '--disable-quic', '--no-first-run', '--disable-background-networking',
    '--disable-component-update', '--disable-sync'],
})

/** A page of its own context, and everything that its console said. */
export interface Watched { page: Page, context: BrowserContext, said: string[], close: () => Promise<void> }

export async function watch(browser: Browser, options: BrowserContextOptions = {}): Promise<Watched> {
  const context = await browser.newContext({ viewport: { width: 1280, height: 900 }, ...options })
  const page = await context.newPage()
  const said: string[] = []
  page.on('console', message => said.push(`${message.type()}: ${message.text()}`))
  page.on('pageerror', error => said.push(`error: ${error.message}`))
  return { page, context, said, close: () => context.close() }
}

/** Goes to an address and waits until the page is alive: a click before hydration would be lost. */
export async function open(page: Page, address: string): Promise<number> {
  const response = await page.goto(address, { waitUntil: 'networkidle' })
  return response?.status() ?? 0
}

/** Presses Tab until a control has the focus, as a reader without a mouse would. */
export async function tabTo(page: Page, id: string): Promise<void> {
  for (let press = 0; press < 120; press++) {
    if (await page.evaluate(() => document.activeElement?.id) === id) return
    await page.keyboard.press('Tab')
  }
  throw new Error(`#${id} could not be reached with the Tab key`)
}

/** Writes over a word by keyboard alone. */
export async function retype(page: Page, id: string, text: string): Promise<void> {
  await tabTo(page, id)
  await page.keyboard.press('Control+A')
  await page.keyboard.type(text)
}

/** Chooses an option by typing the beginning of its name. */
export async function choose(page: Page, id: string, beginning: string): Promise<void> {
  await tabTo(page, id)
  await page.keyboard.type(beginning)
}

/** Fails with what axe found, each finding with the elements it is about. */
export async function expectAccessible(page: Page): Promise<void> {
  const { violations } = await new AxeBuilder({ page }).analyze()
  expect(violations.map(({ id, nodes }) => `${id}: ${nodes.slice(0, 3).map(({ target }) => target.join(' ')).join(', ')}`)).toEqual([])
}

/** Mean relative luminance of what is on the screen, 0 to 1. */
export async function meanLuminance(context: BrowserContext, page: Page): Promise<number> {
  const shot = await page.screenshot({ fullPage: true })
  const canvas = await context.newPage()
  const mean = await canvas.evaluate(async (data) => {
    const image = new Image()
    image.src = `data:image/png;base64,${data}`
    await image.decode()
    const surface = new OffscreenCanvas(image.width, image.height).getContext('2d')
    if (!surface) return Number.NaN
    surface.drawImage(image, 0, 0)
    const { data: pixels } = surface.getImageData(0, 0, image.width, image.height)
    const linear = (byte: number) => byte / 255 <= 0.04045 ? byte / 255 / 12.92 : ((byte / 255 + 0.055) / 1.055) ** 2.4
    let sum = 0
    for (let i = 0; i < pixels.length; i += 4) {
      sum += 0.2126 * linear(pixels[i] ?? 0) + 0.7152 * linear(pixels[i + 1] ?? 0) + 0.0722 * linear(pixels[i + 2] ?? 0)
    }
    return sum / (pixels.length / 4)
  }, shot.toString('base64'))
  await canvas.close()
  return mean
}
