import { gzipSync } from 'node:zlib'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { startApp, type TestApp } from '../api/harness'

let app: TestApp
beforeAll(async () => {
  app = await startApp()
})
afterAll(() => app.stop())

/** The scripts that a page makes the browser load before it is alive, and those that these import at once. */
async function firstLoadScripts(path: string): Promise<Map<string, Buffer>> {
  const html = await (await fetch(`${app.baseUrl}${path}`)).text()
  const heads = [...html.matchAll(/<(?:script|link)[^>]*>/g)].map(match => match[0])
    .filter(tag => tag.startsWith('<script') || /rel="?(?:modulepreload|preload)"?/.test(tag))
  const wanted = heads.flatMap(tag => /(?:src|href)="?(\/_nuxt\/[^"\s>]+\.js)/.exec(tag)?.[1] ?? [])
  const scripts = new Map<string, Buffer>()
  while (wanted.length) {
    const next = wanted.pop()
    if (!next || scripts.has(next)) continue
    const body = Buffer.from(await (await fetch(`${app.baseUrl}${next}`)).arrayBuffer())
    scripts.set(next, body)
    const imported = [...body.toString().matchAll(/(?:from|import)\s*"\.\/([\w.-]+\.js)"/g)].map(match => `/_nuxt/${match[1]}`)
    wanted.push(...imported)
  }
  return scripts
}

const gzipped = (scripts: Map<string, Buffer>) => [...scripts.values()].reduce((sum, body) => sum + gzipSync(body, { level: 9 }).length, 0)

describe('first-load JavaScript, gzip bytes', () => {
  it.each([['/', 140_000], ['/plan', 140_000], ['/method', 140_000]])('of %s stays under %i', async (path, budget) => {
    const scripts = await firstLoadScripts(path)
    expect(scripts.size).toBeGreaterThan(1)
    const bytes = gzipped(scripts)
    console.info(`${path}: ${bytes} bytes gzip in ${scripts.size} scripts`)
    expect(bytes).toBeGreaterThan(20_000)
    expect(bytes).toBeLessThan(budget)
  })
})

describe('fonts', () => {
  it('ship with the application', async () => {
    const html = await (await fetch(`${app.baseUrl}/`)).text()
    expect(html).not.toMatch(/https?:\/\/(?!localhost|127\.0\.0\.1|www\.w3\.org)[^"'\s<]*\.(?:css|woff2?|js)/)
  })
})
