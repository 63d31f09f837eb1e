import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { rankingRequestExample } from '../factories/requests'
import { answerOf, expectProblem, post, unlimited } from './client'
import { startApp, type TestApp } from './harness'

let app: TestApp
beforeAll(async () => {
  app = await startApp(unlimited)
})
afterAll(() => app.stop())

const html = { Accept: 'text/html,application/xhtml+xml,*/*;q=0.8' }
const ask = (path: string, init: RequestInit = {}) => fetch(app.origin + path, { redirect: 'manual', ...init })

/** The first script that the home page loads. */
async function builtFile(): Promise<string> {
  const found = /\/_nuxt\/[\w.-]+\.js/.exec(await (await ask('/', { headers: html })).text())
  return found?.[0] ?? '/no-script-found'
}

const directives = (policy: string) => new Map(policy.split(';').map(part => part.trim().split(/\s+/)).filter(([name]) => name).map(([name, ...sources]) => [name, sources]))

const cases: [string, () => Promise<Response>, number][] = [
  ['the home page', () => ask('/', { headers: html }), 200],
  ['the plan', () => ask('/plan', { headers: html }), 200],
  ['a page that is not there', () => ask('/no-such-page', { headers: html }), 404],
  ['the error page itself, asked for by hand', () => ask('/no-such-page', { headers: { ...html, 'x-nuxt-error': 'true' } }), 404],
  ['JSON', () => ask('/api/health'), 200],
  ['a refusal', () => ask('/api/rankings', { method: 'POST', body: '{}', headers: { 'Content-Type': 'application/json' } }), 422],
  ['a route that is not there', () => ask('/api/no-such-route'), 404],
  ['a route that is not there, for a browser', () => ask('/api/no-such-route', { headers: html }), 404],
  ['a method that is not allowed', () => ask('/api/loads', { method: 'DELETE' }), 405],
  ['a preflight', () => ask('/api/loads', { method: 'OPTIONS' }), 204],
  ['a file', () => ask('/mark.svg'), 200],
  ['a built file', async () => ask(await builtFile()), 200],
  ['a built file that is not there', () => ask('/_nuxt/no-such-file.js', { headers: html }), 404],
  ['a page posted to', () => ask('/plan', { method: 'POST' }), 405],
]

describe('every response is guarded', () => {
  it.each(cases)('%s', async (_name, request, status) => {
    const { headers, status: got } = await request()
    expect(got).toBe(status)
    const policy = directives(headers.get('content-security-policy') ?? '')
    expect(policy.get('frame-ancestors')).toEqual(['\'none\''])
    expect(policy.get('default-src')).toEqual(['\'none\''])
    expect(policy.get('script-src') ?? []).not.toContain('\'unsafe-inline\'')
    expect(policy.get('script-src') ?? []).not.toContain('\'unsafe-eval\'')
    expect(headers.get('strict-transport-security')).toMatch(/max-age=\d{7,}/)
    expect(headers.get('x-content-type-options')).toBe('nosniff')
    expect(headers.get('x-frame-options')).toBe('DENY')
    expect(headers.get('referrer-policy')).toMatch(/^(?:strict-origin-when-cross-origin|no-referrer)$/)
    expect(headers.get('x-request-id')).toMatch(/^[0-9a-f-]{36}$/)
    expect(headers.has('x-powered-by')).toBe(false)
    expect(headers.has('set-cookie')).toBe(false)
  })

  it('pages admit their scripts by a nonce that is never used twice', async () => {
    const nonces = []
    for (let i = 0; i < 2; i++) {
      const page = await ask('/', { headers: html })
      const nonce = /'nonce-([^']+)'/.exec(page.headers.get('content-security-policy') ?? '')?.[1]
      const scripts = (await page.text()).match(/<script\b[^>]*>/g) ?? []
      expect(scripts.length).toBeGreaterThan(0)
      for (const script of scripts) expect(script).toContain(`nonce="${nonce}"`)
      nonces.push(nonce)
    }
    expect(nonces[0]).not.toBe(nonces[1])
  })

  it('each request has its own name', async () => {
    const names = await Promise.all([1, 2, 3].map(async () => (await ask('/api/health')).headers.get('x-request-id')))
    expect(new Set(names).size).toBe(3)
  })
})

describe('errors have the one shape', () => {
  it.each([
    ['/api/no-such-route', 404], ['/api', 404], ['/api/', 404], ['/api/rankings/extra', 404], ['/no-such-page', 404], ['/_nuxt/no-such-file.js', 404],
  ])('GET %s', async (path, status) => {
    expectProblem(await answerOf(await ask(path, { headers: { Accept: 'application/json' } })), status)
  })

  it('also where a browser asks the API', async () => {
    expectProblem(await answerOf(await ask('/api/no-such-route', { headers: html })), 404)
  })

  it.each(['GET', 'PUT', 'PATCH', 'DELETE'])('%s on a calculation', async (method) => {
    const response = await ask('/api/rankings', { method })
    expect(response.headers.get('allow')).toBe('POST, OPTIONS')
    expectProblem(await answerOf(response), 405)
  })

  it('also for an address that cannot be decoded', async () => {
    const response = await ask('/api/%E0%A4%A', { headers: { Accept: 'application/json' } })
    expect(response.status).toBeGreaterThanOrEqual(400)
    expect(response.status).toBeLessThan(500)
  })

  it('a page\'s 404 is a page', async () => {
    const response = await ask('/no-such-page', { headers: html })
    expect(response.headers.get('content-type')).toMatch(/^text\/html/)
    expect(await response.text()).not.toMatch(/node_modules|\bat \w+ \(/)
  })
})

describe('HEAD', () => {
  it.each(['/api/health', '/api/designs', '/plan', '/mark.svg'])('%s', async (path) => {
    const response = await ask(path, { method: 'HEAD' })
    expect(response.status).toBe(200)
    expect(await response.text()).toBe('')
  })
})

describe('the limit on requests', () => {
  it('holds for calculations and pages together, and lets other things through', async () => {
    const limited = await startApp({ KEDGEWISE_REQUESTS_PER_MINUTE: '6', KEDGEWISE_REQUESTS_BURST: '4' })
    try {
      let claimed = 0
      // The header is the client's own word: it buys no second budget.
      const rank = () => post(`${limited.origin}/api/rankings`, rankingRequestExample(), { 'X-Forwarded-For': `203.0.113.${claimed += 1}` })
      const plan = () => fetch(`${limited.origin}/plan`, { headers: html })
      expect((await rank()).status).toBe(200)
      expect((await rank()).status).toBe(200)
      // A page counts once, whatever it asks of the API while it is rendered.
      expect((await plan()).status).toBe(200)
      expect((await plan()).status).toBe(200)
      const refused = await rank()
      expectProblem(refused, 429)
      expect(Number(refused.headers.get('retry-after'))).toBeGreaterThan(0)
      expect(refused.headers.get('access-control-allow-origin')).toBe('*')
      const page = await plan()
      expect(page.status).toBe(429)
      expect(Number(page.headers.get('retry-after'))).toBeGreaterThan(0)
      expect((await fetch(`${limited.origin}/api/health`)).status).toBe(200)
      expect((await fetch(`${limited.origin}/mark.svg`)).status).toBe(200)
    }
    finally {
      await limited.stop()
    }
  })
})
