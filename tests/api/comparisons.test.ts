import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { comparisonAnswer } from '#shared/schemas/answers/comparison'
import type { ComparisonAnswer } from '#shared/types/comparison'
import type { RankingAnswer } from '#shared/types/ranking'
import { rankingRequestExample } from '../factories/requests'
import { expectProblem, post, unlimited } from './client'
import { startApp, type TestApp } from './harness'

let app: TestApp
beforeAll(async () => {
  app = await startApp(unlimited)
})
afterAll(() => app.stop())

const send = (body: unknown) => post(`${app.baseUrl}/api/comparisons`, body)
const compare = async (body: unknown) => {
  const { status, body: answer } = await send(body)
  expect(status, JSON.stringify(answer)).toBe(200)
  return answer as unknown as ComparisonAnswer
}
const two = [{ design: 'fennigar', massKg: 20 }, { design: 'ulvesk', massKg: 20 }]

describe('POST /api/comparisons', () => {
  it('without a plan compares flat pulls wherever any was pulled, as the description says', async () => {
    const answer = await compare({ anchors: two })
    expect(comparisonAnswer.safeParse(answer).error).toBeUndefined()
    expect(answer.seabeds.length).toBeGreaterThanOrEqual(8)
    expect(answer.summary).toHaveLength(1)
    expect(answer.anchors[0]).toMatchObject({ design: 'fennigar', massKg: 20, size: { massKg: 20, price: { currency: 'EUR' } }, worst: null })
    for (const { holdings, pairs } of answer.seabeds) {
      expect(holdings).toHaveLength(2)
      expect(pairs).toHaveLength(1)
      for (const holding of holdings) {
        if (!holding?.ends) continue
        const { pulls, ...counts } = holding.ends
        // Every pull has one end, or never set, or was fouled.
        expect(Object.values(counts).reduce((sum, count) => sum + count, 0)).toBe(pulls)
      }
    }
  })

  it('with a plan says of each anchor what the ranking says', async () => {
    const plan = rankingRequestExample()
    const answer = await compare({ anchors: [{ design: 'fennigar' }, { design: 'ulvesk' }, { design: 'quennick', massKg: 27 }], plan })
    expect(comparisonAnswer.safeParse(answer).error).toBeUndefined()
    const ranking = (await post(`${app.baseUrl}/api/rankings`, plan)).body as unknown as RankingAnswer
    expect(answer.massKg).toBe(plan.massKg)
    expect(answer.loadN).toBe(ranking.load.survey.totalN)
    expect(answer.seabeds.map(({ seabed }) => seabed)).toEqual(['firm-mud', 'loose-sand'])
    const row = ranking.rows.find(({ design }) => design === 'fennigar')
    expect(answer.anchors[0]?.worst).toEqual(row?.worst)
    expect(answer.seabeds[0]?.pairs.map(({ first, second }) => [first, second])).toEqual([[0, 1], [0, 2], [1, 2]])
    expect(answer.cautions).toEqual(ranking.cautions)
  })

  it('turned round says the same the other way', async () => {
    const [forth, back] = [await compare({ anchors: two }), await compare({ anchors: [...two].reverse() })]
    forth.seabeds.forEach(({ seabed, pairs }, i) => {
      expect(back.seabeds[i]?.seabed).toBe(seabed)
      expect((pairs[0]?.chance ?? 0) + (back.seabeds[i]?.pairs[0]?.chance ?? 0)).toBeCloseTo(1, 10)
    })
  })

  it('is stored nowhere, and may depend on who asks', async () => {
    const { headers } = await send({ anchors: two })
    expect(headers.get('cache-control')).toBe('private, no-store')
    expect(headers.get('vary')).toContain('Cookie')
  })

  it.each([
    ['one anchor', { anchors: two.slice(0, 1) }, 'anchors'],
    ['five anchors', { anchors: [...two, ...two, ...two] }, 'anchors'],
    ['no anchors', {}, 'anchors'],
    ['an unknown design', { anchors: [...two, { design: 'no-such' }] }, 'anchors.2.design'],
    ['a name that is none', { anchors: [{ design: '\' or 1=1' }, ...two] }, 'anchors.0.design'],
    ['the same anchor twice', { anchors: [...two, two[0]] }, 'anchors.2.design'],
    ['a mass past the range', { anchors: [{ design: 'fennigar', massKg: 1e9 }, { design: 'ulvesk' }] }, 'anchors.0.massKg'],
    ['a common mass of nothing', { anchors: two, massKg: 0 }, 'massKg'],
    ['an unknown key', { anchors: two, worth: 1 }, 'worth'],
    ['a plan without a boat', { anchors: two, plan: { ...rankingRequestExample(), boat: undefined } }, 'plan.boat'],
    ['a plan whose shares do not add up', { anchors: two, plan: { ...rankingRequestExample(), seabeds: [{ seabed: 'firm-mud', share: 0.2 }] } }, 'plan.seabeds'],
  ])('refuses %s, by the field', async (_name, body, field) => {
    const answer = await send(body)
    expectProblem(answer, 422)
    expect(Object.keys(answer.body.fields as object)).toContain(field)
  })

  it('refuses a rode that is too short', async () => {
    const answer = await send({ anchors: two, plan: { ...rankingRequestExample(), depthM: 200 } })
    expectProblem(answer, 422)
    expect(answer.body.fields).toEqual({ 'plan.rode.chain.lengthM': expect.stringMatching(/too short to reach the bottom/) as string })
  })
})
