import pg from 'pg'
import { afterAll, beforeAll, describe, expect, it, vi } from 'vitest'
import type { Browser } from 'playwright-core'
import { startApp, type TestApp } from '../api/harness'
import { startServer, type Server } from '../api/server'
import { expectAccessible, launch, open, watch } from './browser'

// A long page: axe takes its time over it.
vi.setConfig({ testTimeout: 240_000 })

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

describe('the data', () => {
  it('has nothing that axe finds, the releases and a route opened, and its console stays empty', async () => {
    const { page, said, close } = await watch(browser)
    expect(await open(page, `${app.baseUrl}/data`)).toBe(200)
    await page.evaluate(() => document.querySelectorAll<HTMLDetailsElement>('#releases details, #api-loads details').forEach(details => details.open = true))
    await expectAccessible(page)
    expect(said).toEqual([])
    await close()
  })

  it.each([320, 360, 1280])('does not scroll sideways at %i px', async (width) => {
    const { page, close } = await watch(browser, { viewport: { width, height: 760 }, hasTouch: width < 700 })
    await open(page, `${app.baseUrl}/data`)
    await page.evaluate(() => document.querySelectorAll('details').forEach(details => details.open = true))
    expect(await page.evaluate(() => document.documentElement.scrollWidth)).toBeLessThanOrEqual(width)
    await close()
  })

  it('has every release and every route without JavaScript, each link leading somewhere on it', async () => {
    const html = await (await fetch(`${app.baseUrl}/data`)).text()
    for (const version of ['2024', '2025', '2026']) expect(html).toContain(`id="release-${version}"`)
    const { paths } = await (await fetch(`${app.baseUrl}/api/openapi.json`)).json() as { paths: Record<string, Record<string, { operationId: string }>> }
    for (const { operationId } of Object.values(paths).flatMap(methods => Object.values(methods))) expect(html).toContain(`id="api-${operationId}"`)
    const anchors = [...html.matchAll(/href="#([^"]+)"/g)].map(match => match[1])
    expect(anchors.filter(anchor => !html.includes(`id="${anchor}"`))).toEqual([])
    expect(html).toMatch(/Displacement as loaded \(kg\)/)
    expect(html).toContain('Invented for demonstration')
  })

  it('hands over the archive of a release', async () => {
    const { page, close } = await watch(browser)
    await open(page, `${app.baseUrl}/data`)
    const [saved] = await Promise.all([page.waitForEvent('download'), page.getByRole('link', { name: 'Take release 2026' }).click()])
    expect(saved.suggestedFilename()).toBe('kedgewise-2026.tar')
    await close()
  })
})

describe('the data, before any release was made', () => {
  let server: Server
  beforeAll(async () => {
    const client = new pg.Client({ connectionString: app.databaseUrl })
    await client.connect()
    await client.query('delete from releases')
    await client.end()
    server = await startServer(app.databaseUrl)
  })
  afterAll(() => server?.stop())

  it('says so, and has nothing that axe finds', async () => {
    const { page, said, close } = await watch(browser)
    expect(await open(page, `${server.baseUrl}/data`)).toBe(200)
    expect(await page.getByText('No release has been made yet').count()).toBe(1)
    await expectAccessible(page)
    expect(said).toEqual([])
    await close()
  })
})
