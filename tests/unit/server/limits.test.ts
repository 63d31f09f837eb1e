import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { createApp, defineEventHandler, toPlainHandler } from 'h3'
import fc from 'fast-check'
import { clientAddress, clientKey } from '../../../server/utils/address'
import { Buckets } from '../../../server/utils/bucket'
import { createLimiter, limitProblems, readLimits } from '../../../server/utils/limits'
import { serve, type LocalServer } from './app'

describe('a token bucket', () => {
  const rates = { perMinute: 60, burst: 3, mostClients: 2 }

  it('lets a burst through, then one a second', () => {
    const buckets = new Buckets(rates)
    expect([0, 0, 0].map(now => buckets.take('a', now).allowed)).toEqual([true, true, true])
    expect(buckets.take('a', 0)).toEqual({ allowed: false, retryAfterS: 1 })
    expect(buckets.take('a', 999).allowed).toBe(false)
    expect(buckets.take('a', 1000).allowed).toBe(true)
    expect(buckets.take('a', 1000).allowed).toBe(false)
  })

  it('never holds more than a burst', () => {
    const buckets = new Buckets(rates)
    buckets.take('a', 0)
    expect([1, 2, 3, 4].map(() => buckets.take('a', 1e9).allowed)).toEqual([true, true, true, false])
  })

  it('counts clients apart and forgets the one seen longest ago', () => {
    const buckets = new Buckets(rates)
    for (let i = 0; i < 3; i++) buckets.take('a', 0)
    expect(buckets.take('b', 0).allowed).toBe(true)
    expect(buckets.take('a', 0).allowed).toBe(false)
    buckets.take('c', 0)
    expect(buckets.size).toBe(2)
    expect(buckets.take('a', 0).allowed).toBe(false)
  })

  it('never grants more than burst plus what has come back, however it is asked', () => {
    fc.assert(fc.property(fc.array(fc.nat(400), { minLength: 1, maxLength: 200 }), (gaps) => {
      const buckets = new Buckets(rates)
      let now = 0
      const granted = gaps.filter((gap) => {
        now += gap
        return buckets.take('a', now).allowed
      }).length
      expect(granted).toBeLessThanOrEqual(3 + now / 1000)
    }))
  })

  it('says when to come back, and keeps its word', () => {
    const buckets = new Buckets({ perMinute: 7, burst: 1, mostClients: 2 })
    buckets.take('a', 0)
    const refused = buckets.take('a', 100)
    expect(refused).toEqual({ allowed: false, retryAfterS: 9 })
    expect(buckets.take('a', 100 + 9000).allowed).toBe(true)
  })
})

describe('who is counted', () => {
  it.each([
    ['203.0.113.9', '203.0.113.9'], ['::ffff:203.0.113.9', '203.0.113.9'], ['::ffff:cb00:7109', '203.0.113.9'], ['2001:db8:1:2:3:4:5:6', '2001:db8:1:2::/64'],
    ['2001:DB8:1:2::1', '2001:db8:1:2::/64'], ['2001:db8::1', '2001:db8:0:0::/64'], ['fe80::1%eth0', 'fe80:0:0:0::/64'], ['[2001:db8::1]', '2001:db8:0:0::/64'],
    ['::1', '0:0:0:0::/64'], ['unknown', null], ['', null], ['203.0.113.9:80', null],
  ])('%j is %j', (address, key) => {
    expect(clientKey(address)).toBe(key)
  })

  it.each([
    ['no proxy trusted: the header is the client\'s own word', '198.51.100.1', '203.0.113.9', 0, '198.51.100.1'],
    ['one proxy: the entry it wrote', '198.51.100.1', '6.6.6.6, 203.0.113.9', 1, '203.0.113.9'],
    ['two proxies', '198.51.100.1', '6.6.6.6, 203.0.113.9, 192.0.2.7', 2, '203.0.113.9'],
    ['one proxy passed by', '198.51.100.1', undefined, 1, '198.51.100.1'],
    ['rubbish in the header', '198.51.100.1', 'rubbish', 1, '198.51.100.1'],
    ['nothing at all', undefined, undefined, 0, 'unknown'],
  ])('%s', (_name, peer, forwarded, proxies, client) => {
    expect(clientAddress(peer, forwarded, proxies)).toBe(client)
  })
})

describe('the configuration', () => {
  it('has defaults', () => {
    expect(readLimits({})).toEqual({ trustedProxies: 0, perMinute: 600, burst: 60 })
  })

  it('is read', () => {
    const env = { KEDGEWISE_TRUSTED_PROXIES: '2', KEDGEWISE_REQUESTS_PER_MINUTE: '30', KEDGEWISE_REQUESTS_BURST: '5' }
    expect(readLimits(env)).toEqual({ trustedProxies: 2, perMinute: 30, burst: 5 })
    expect(limitProblems(env)).toEqual([])
  })

  it.each([
    ['KEDGEWISE_TRUSTED_PROXIES', '-1'], ['KEDGEWISE_TRUSTED_PROXIES', 'yes'], ['KEDGEWISE_TRUSTED_PROXIES', '11'], ['KEDGEWISE_REQUESTS_PER_MINUTE', '0'],
    ['KEDGEWISE_REQUESTS_BURST', '1.5'], ['KEDGEWISE_REQUESTS_BURST', '1e3'],
  ])('refuses %s=%s by name', (name, value) => {
    expect(limitProblems({ [name]: value })).toEqual([expect.stringContaining(name)])
    expect(readLimits({ [name]: value })).toEqual(readLimits({}))
  })
})

describe('over HTTP', () => {
  let server: LocalServer
  const count = createLimiter({ trustedProxies: 0, perMinute: 6, burst: 2 }, () => 0)
  const handler = defineEventHandler((event) => {
    count(event)
    return 'ok'
  })
  beforeAll(async () => {
    server = await serve({ '/': handler }, [])
  })
  afterAll(() => server.stop())

  it('refuses with 429 and Retry-After, whatever X-Forwarded-For says', async () => {
    const answers = [1, 2, 3].map(i => fetch(server.url, { headers: { 'X-Forwarded-For': `203.0.113.${i}` } }))
    const statuses = (await Promise.all(answers)).map(({ status }) => status).sort()
    expect(statuses).toEqual([200, 200, 429])
    const refused = await fetch(server.url)
    expect(refused.headers.get('retry-after')).toBe('10')
    expect(await refused.json()).toEqual({ statusCode: 429, code: 'tooMany', message: 'Too many requests from this address: try again in 10 s' })
  })

  it('tells a browser in a page that costs nothing to make', async () => {
    const refused = await fetch(server.url, { headers: { Accept: 'text/html' } })
    expect(refused.status).toBe(429)
    expect(refused.headers.get('content-type')).toBe('text/html; charset=utf-8')
    expect(await refused.text()).toContain('try again in 10 s')
  })

  it('does not count calls without a socket', async () => {
    const app = createApp()
    app.use(handler)
    const call = toPlainHandler(app)
    for (let i = 0; i < 5; i++) expect((await call({ method: 'GET', path: '/', headers: {} })).status).toBe(200)
  })
})
