import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { faultsOf, gone, spoil } from '../factories/faults'
import { chunk, rawRequest } from '../factories/rawHttp'
import { fitRequestExample, loadRequestExample, rankingRequestExample, rodeRequestExample } from '../factories/requests'
import { expectProblem, post, unlimited } from './client'
import { startApp, type TestApp } from './harness'

const smallFit = () => ({ pulls: fitRequestExample().pulls.slice(0, 2) })

const routes: [string, () => object, number][] = [
  ['/api/loads', loadRequestExample, 64_000],
  ['/api/rodes', rodeRequestExample, 64_000],
  ['/api/rankings', rankingRequestExample, 64_000],
  ['/api/fits', smallFit, 1_500_000],
]

let app: TestApp
beforeAll(async () => {
  app = await startApp(unlimited)
})
afterAll(() => app.stop())

/** JSON as a client may write it: numbers past the range of a double as 1e400, and NaN as the word. */
function written(value: unknown): string {
  const text = JSON.stringify(value, (_key, part: unknown) => typeof part === 'number' && !Number.isFinite(part) ? `<${part}>` : part)
  return text.replace('"<Infinity>"', '1e400').replace('"<-Infinity>"', '-1e400').replace('"<NaN>"', 'NaN')
}

describe.each(routes)('%s', (path, example, limitBytes) => {
  const send = (body: unknown, headers: Record<string, string> = {}) => post(app.baseUrl + path, body, headers)

  it('answers what is right', async () => {
    expect(await send(example())).toMatchObject({ status: 200 })
  })

  it('names the field in every fault of every number and every unknown key', async () => {
    const faults = faultsOf(example())
    for (const { name, path: place, value, field } of faults) {
      const answer = await send(written(spoil(example(), place, value)))
      if (Number.isNaN(value)) {
        // NaN is no JSON at all.
        expectProblem(answer, 400)
        continue
      }
      expectProblem(answer, 422)
      expect(Object.keys(answer.body.fields as object), name).toContain(field)
      expect(answer.body.message, name).toEqual(expect.stringMatching(/must be|is missing|is not a known field|must not/))
    }
    expect(faults.length).toBeGreaterThan(50)
  })

  it('names every missing field', async () => {
    for (const field of Object.keys(example())) {
      const answer = await send(spoil(example(), [field], gone))
      if (answer.status === 200) continue
      expectProblem(answer, 422)
    }
    const answer = await send({})
    expectProblem(answer, 422)
    expect(Object.values(answer.body.fields as object).join()).toMatch(/is missing/)
  })

  it.each([['an empty body', ''], ['white space', '  '], ['half an object', '{"boat":'], ['a word', 'boat'], ['form data', 'boat=1'], ['NUL', '\0'], ['not UTF-8', new Uint8Array([0x7B, 0xFF])]])('refuses %s with 400', async (_name, body) => {
    expectProblem(await send(body), 400)
  })

  it.each(['[]', 'null', '1', '"x"', 'true', '[[[[]]]]'])('refuses %s with 422', async (body) => {
    expectProblem(await send(body), 422)
  })

  it('refuses deep nesting', async () => {
    expectProblem(await send(`${'['.repeat(20_000)}${']'.repeat(20_000)}`), 422)
    expectProblem(await send(`{"x":${'['.repeat(20_000)}${']'.repeat(20_000)}}`), 422)
  })

  it('refuses another type with 415', async () => {
    expectProblem(await send(example(), { 'Content-Type': 'text/plain' }), 415)
  })

  it('refuses what is too large with 413', async () => {
    expectProblem(await send(`"${'x'.repeat(limitBytes)}"`), 413)
  })

  it('refuses what is too large in chunks with 413', async () => {
    const port = Number(new URL(app.baseUrl).port)
    const head = `POST ${path} HTTP/1.1\r\nHost: localhost:${port}\r\nContent-Type: application/json\r\nTransfer-Encoding: chunked\r\n\r\n`
    const pieces = Array.from({ length: Math.ceil(limitBytes / 16_000) + 1 }, () => chunk('x'.repeat(16_000)))
    const answer = await rawRequest(port, [head, ...pieces, '0\r\n\r\n'])
    expect(answer.status).toBe(413)
    expect(JSON.parse(answer.body)).toMatchObject({ statusCode: 413, code: 'tooLarge' })
  })

  it('is not polluted by __proto__', async () => {
    await send('{"__proto__":{"polluted":true},"constructor":{"prototype":{"polluted":true}}}')
    const answer = await send(example())
    expect(answer.status).toBe(200)
    expect(JSON.stringify(answer.body)).not.toContain('polluted')
  })
})

describe('faults that only the calculation sees', () => {
  it.each([
    ['a rode too short to reach the bottom', '/api/rodes', { ...rodeRequestExample(), heightM: 300 }, /^rope\.lengthM$|^chain\.lengthM$/],
    ['the same in a plan', '/api/rankings', { ...rankingRequestExample(), depthM: 200 }, /^rode\.chain\.lengthM$/],
    ['the same in a load', '/api/loads', { ...loadRequestExample(), heightM: 300 }, /^rode\.chain\.lengthM$/],
    ['an own anchor that is not in the catalogue', '/api/rankings', { ...rankingRequestExample(), own: { design: 'no-such-design', massKg: 15 } }, /^own\.design$/],
    ['a size in inches by nothing', '/api/rodes', { ...rodeRequestExample(), chain: { lengthM: 40, sizeIn: '1/0' } }, /^chain\.sizeIn$/],
  ])('%s', async (_name, path, body, field) => {
    const answer = await post(app.baseUrl + path, body)
    expectProblem(answer, 422)
    expect(Object.keys(answer.body.fields as object).filter(name => field.test(name))).toHaveLength(1)
  })

  it('a boat past the rule table needs a mass', async () => {
    const { massKg: _massKg, ...plan } = rankingRequestExample()
    const answer = await post(`${app.baseUrl}/api/rankings`, { ...plan, boat: { type: 'motor', lengthM: 40, beamM: 9 } })
    expectProblem(answer, 422)
    expect(answer.body.fields).toHaveProperty('massKg')
  })
})
