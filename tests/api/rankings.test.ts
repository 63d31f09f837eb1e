import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { rankingAnswer } from '#shared/schemas/answers/ranking'
import type { RankingAnswer } from '#shared/types/ranking'
import { rankingRequestExample } from '../factories/requests'
import { post, unlimited } from './client'
import { startApp, type TestApp } from './harness'

let app: TestApp
beforeAll(async () => {
  app = await startApp(unlimited)
})
afterAll(() => app.stop())

async function rankings(request: unknown): Promise<RankingAnswer> {
  const { status, body } = await post(`${app.baseUrl}/api/rankings`, request)
  expect(status, JSON.stringify(body)).toBe(200)
  return body as unknown as RankingAnswer
}

describe('POST /api/rankings', () => {
  it('answers as the description says', async () => {
    expect(rankingAnswer.safeParse(await rankings(rankingRequestExample())).error).toBeUndefined()
  })

  it('ranks every design once, in order, the rest thin, nothing hidden', async () => {
    const { rows, thin, hidden } = await rankings(rankingRequestExample())
    const designs = [...rows, ...thin].map(({ design }) => design)
    expect(rows.map(({ rank }) => rank)).toEqual(rows.map((_, index) => index + 1))
    expect(rows.length).toBeGreaterThan(3)
    expect(new Set(designs).size).toBe(designs.length)
    expect(designs.length).toBeGreaterThanOrEqual(16)
    expect(hidden).toBe(0)
  })

  it('judges the own anchor at its own mass', async () => {
    const [first] = (await rankings(rankingRequestExample())).rows
    const { own } = await rankings({ ...rankingRequestExample(), own: { design: first?.design, massKg: 60 } })
    expect(own?.row.design).toBe(first?.design)
    expect(['holds', 'marginal', 'doesNotHold']).toContain(own?.verdict)
  })

  it('names its fit, and gives the same answer twice', async () => {
    const [once, again] = [await rankings(rankingRequestExample()), await rankings(rankingRequestExample())]
    expect(once.fit.id).toBeGreaterThan(0)
    expect(Number.isNaN(Date.parse(once.fit.at))).toBe(false)
    expect(again).toEqual(once)
  })

  it('gives no ranking where most of the mix has no number, and says so', async () => {
    const { rows, cautions, load } = await rankings({ ...rankingRequestExample(), seabeds: [{ seabed: 'rock', share: 0.7 }, { seabed: 'loose-sand', share: 0.3 }] })
    expect(rows).toEqual([])
    expect(cautions.length).toBeGreaterThan(0)
    expect(load.survey.totalN).toBeGreaterThan(0)
  })

  it('answers a load without bound with cautions and no rows', async () => {
    const request = rankingRequestExample()
    const { rows, load, rode } = await rankings({ ...request, swell: 'open', rode: { chain: request.rode.chain } })
    expect(rows).toEqual([])
    expect(load.survey.totalN).toBeNull()
    expect(rode).toBeNull()
  })

  it('may be kept by nobody', async () => {
    const { headers } = await post(`${app.baseUrl}/api/rankings`, rankingRequestExample(), { Origin: 'https://chandler.example' })
    expect(headers.get('cache-control')).toBe('private, no-store')
    expect(headers.get('vary')).toBe('Cookie, Authorization, Origin')
    expect(headers.get('access-control-allow-origin')).toBe('*')
    expect(headers.has('set-cookie')).toBe(false)
  })
})
