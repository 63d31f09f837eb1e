import { afterAll, beforeAll, beforeEach, describe, expect, it, vi } from 'vitest'
import { createError, defineEventHandler } from 'h3'
import { FieldError } from '#shared/utils/fieldError'
import loads from '../../../server/api/loads.post'
import openapi from '../../../server/api/openapi.json.get'
import rankings from '../../../server/api/rankings.post'
import missing from '../../../server/api/[...]'
import { loadRequestExample, rankingRequestExample } from '../../factories/requests'
import { serve, type LocalServer } from './app'

const thrown = (error: unknown) => defineEventHandler(() => {
  throw error
})

let server: LocalServer
beforeAll(async () => {
  server = await serve({
    '/api/loads': loads,
    '/api/rankings': rankings,
    '/api/openapi.json': openapi,
    '/api/broken': thrown(new Error('select password from users')),
    '/api/field': thrown(new FieldError('chain.lengthM', 'chain.lengthM must be longer')),
    '/api/down': thrown(Object.assign(new Error('connect'), { cause: { code: 'ECONNREFUSED' } })),
    '/api/teapot': thrown(createError({ statusCode: 418, message: 'secret' })),
    '/api/**': missing,
  })
})
afterAll(() => server.stop())

const post = (path: string, body: unknown, headers: Record<string, string> = {}) =>
  fetch(server.url + path, { method: 'POST', body: JSON.stringify(body), headers: { 'Content-Type': 'application/json', ...headers } })

describe('other origins', () => {
  it('are answered before they ask, without credentials', async () => {
    const answer = await fetch(`${server.url}/api/loads`, { method: 'OPTIONS', headers: { 'Origin': 'https://chandler.example', 'Access-Control-Request-Method': 'POST' } })
    expect(answer.status).toBe(204)
    expect(Object.fromEntries(answer.headers)).toMatchObject({
      'access-control-allow-origin': '*', 'access-control-allow-methods': 'POST', 'access-control-allow-headers': 'Authorization, Content-Type',
    })
    expect(answer.headers.has('access-control-allow-credentials')).toBe(false)
  })

  it('may read answers and refusals', async () => {
    for (const body of [loadRequestExample(), {}]) {
      expect((await post('/api/loads', body, { Origin: 'https://chandler.example' })).headers.get('access-control-allow-origin')).toBe('*')
    }
  })

  it('may not read what is not a calculation', async () => {
    expect((await fetch(`${server.url}/api/openapi.json`, { headers: { Origin: 'https://chandler.example' } })).headers.has('access-control-allow-origin')).toBe(false)
  })
})

describe('methods', () => {
  it.each([['GET', '/api/loads', 'POST, OPTIONS'], ['PUT', '/api/loads/', 'POST, OPTIONS'], ['POST', '/api/openapi.json', 'GET, HEAD, OPTIONS'], ['POST', '/plan', 'GET, HEAD, OPTIONS']])('%s %s is refused', async (method, path, allow) => {
    const answer = await fetch(server.url + path, { method })
    expect(answer.status).toBe(405)
    expect(answer.headers.get('allow')).toBe(allow)
    expect(await answer.json()).toMatchObject({ statusCode: 405, code: 'methodNotAllowed' })
  })

  it('HEAD is answered where GET is', async () => {
    const answer = await fetch(`${server.url}/api/openapi.json`, { method: 'HEAD' })
    expect(answer.status).toBe(200)
    expect(await answer.text()).toBe('')
  })
})

describe('what goes wrong', () => {
  const printed = vi.spyOn(console, 'error')
  beforeEach(() => {
    printed.mockReset()
    printed.mockImplementation(() => {})
  })
  afterAll(() => printed.mockRestore())

  it('on our side is written in the log under the name that the client was given', async () => {
    const answer = await fetch(`${server.url}/api/broken?token=private`)
    const line = JSON.parse(String(printed.mock.calls[0]?.[0])) as Record<string, unknown>
    expect(answer.status).toBe(500)
    expect(line).toMatchObject({ level: 'error', method: 'GET', path: '/api/broken', status: 500 })
    expect(line.error).toContain('select password from users')
    expect(JSON.stringify(line)).not.toContain('private')
  })

  it.each([
    ['/api/nothing', 404, 'notFound'], ['/api/broken', 500, 'internal'], ['/api/down', 503, 'unavailable'], ['/api/teapot', 418, 'badRequest'], ['/api/field', 422, 'invalid'],
  ])('%s has the one shape and tells nothing', async (path, statusCode, code) => {
    const answer = await fetch(server.url + path)
    const body = await answer.json() as Record<string, unknown>
    expect(answer.status).toBe(statusCode)
    expect(body).toMatchObject({ statusCode, code })
    expect(Object.keys(body).filter(key => !['statusCode', 'code', 'message', 'fields'].includes(key))).toEqual([])
    expect(JSON.stringify(body)).not.toMatch(/select|secret|stack|Error|\.ts/)
  })

  it('a refused field keeps its name', async () => {
    expect(await (await fetch(`${server.url}/api/field`)).json()).toMatchObject({ fields: { 'chain.lengthM': 'must be longer' } })
  })

  it('no fit yet is said so', async () => {
    const answer = await post('/api/rankings', rankingRequestExample())
    expect(answer.status).toBe(503)
    expect(answer.headers.get('retry-after')).toBe('5')
    expect(await answer.json()).toMatchObject({ code: 'noFitYet' })
  })
})

describe('what a ranking may be kept by', () => {
  it('nobody', async () => {
    const { headers } = await post('/api/rankings', rankingRequestExample())
    expect(headers.get('vary')).toBe('Cookie, Authorization, Origin')
    expect(headers.get('cache-control')).toMatch(/no-store/)
  })
})
