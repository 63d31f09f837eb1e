import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { modificationAnswer, modificationsAnswer, modificationWorthAnswer } from '#shared/schemas/answers/modification'
import type { ModificationAnswer, ModificationsAnswer, ModificationWorthAnswer } from '#shared/types/modification'
import { rankingRequestExample } from '../factories/requests'
import { expectProblem, get, post, unlimited } from './client'
import { startApp, type TestApp } from './harness'

let app: TestApp
beforeAll(async () => {
  app = await startApp(unlimited)
})
afterAll(() => app.stop())

const read = async <T>(path: string) => {
  const { status, body } = await get(app.baseUrl + path)
  expect(status, JSON.stringify(body)).toBe(200)
  return body as unknown as T
}

describe('GET /api/modifications', () => {
  it('lists every modification with what the pulls say, as the description says', async () => {
    const answer = await read<ModificationsAnswer>('/api/modifications')
    expect(modificationsAnswer.safeParse(answer).error).toBeUndefined()
    expect(answer.modifications.map(({ slug }) => slug).sort()).toEqual(['flukes-painted', 'hinge-locked', 'roll-bar-removed', 'shank-edge-blunted'])
    for (const { ratios, price, addedMassKg, designs } of answer.modifications) {
      expect(ratios).toHaveLength(4)
      expect(designs).toHaveLength(1)
      expect(price?.currency).toBe('EUR')
      expect(addedMassKg).toEqual(expect.any(Number))
      for (const { ratio: { low90, median, high90 }, pairs, verdict } of ratios) {
        expect(low90 < median && median < high90).toBe(true)
        expect(verdict === null).toBe(pairs === 0)
      }
    }
  })
})

describe('GET /api/modifications/{slug}', () => {
  it('gives ratios, the pairs behind them and the worth for the reference plan, as the description says', async () => {
    const answer = await read<ModificationAnswer>('/api/modifications/shank-edge-blunted')
    expect(modificationAnswer.safeParse(answer).error).toBeUndefined()
    expect(answer.pairs.length).toBe(answer.pairsInAll)
    // Newest first; both sides of every pair are there.
    expect(answer.pairs.map(({ day }) => day)).toEqual(answer.pairs.map(({ day }) => day).toSorted().reverse())
    for (const { modified, unmodified, design } of answer.pairs) {
      expect([modified.length, unmodified.length, design]).toEqual([1, 1, 'fennigar'])
    }
    // Pairs that enter the fit are among those listed: a fouled or unset side keeps one out.
    const entering = answer.pairs.filter(({ modified, unmodified }) => [...modified, ...unmodified].every(({ setting }) => setting === 'set' || setting === 'setAfterDragging'))
    expect(entering.length).toBe(answer.modification.ratios.reduce((sum, { pairs }) => sum + pairs, 0))
    expect(answer.worth).toMatchObject({ massKg: 20, upliftFactor: 1 })
    expect(answer.worth.seabeds.map(({ seabed }) => seabed)).toEqual(answer.modification.ratios.map(({ seabed }) => seabed))
    expect(answer.sizes.every(({ design, price }) => design === 'fennigar' && price !== null)).toBe(true)
  })

  it('finds the blunted edge worse in firm mud, as the demo world has it', async () => {
    const { modification } = await read<ModificationAnswer>('/api/modifications/shank-edge-blunted')
    expect(modification.ratios.find(({ seabed }) => seabed === 'firm-mud')?.verdict).toBe('worse')
  })

  it.each(['no-such', '%27', '__proto__', 'Shank', '%00', '..%2f', 'a'.repeat(300)])('has nothing at %s', async (slug) => {
    expectProblem(await get(`${app.baseUrl}/api/modifications/${slug}`), 404)
  })

  it.each(['/api/modifications?x=1', '/api/modifications/shank-edge-blunted?x=1'])('refuses %s', async (path) => {
    expectProblem(await get(app.baseUrl + path), 422)
  })
})

describe('POST /api/modification-worths', () => {
  const send = (body: unknown) => post(`${app.baseUrl}/api/modification-worths`, body)

  it('gives the worth for a plan, as the description says', async () => {
    const { status, body } = await send({ modification: 'hinge-locked', plan: rankingRequestExample() })
    expect(status).toBe(200)
    expect(modificationWorthAnswer.safeParse(body).error).toBeUndefined()
    const { worth } = body as unknown as ModificationWorthAnswer
    expect(worth.massKg).toBe(15)
    for (const { changeN, changeMs, sameAsKg } of worth.seabeds) {
      // All three say the same of the ratio: which side of nothing it lies on.
      expect(Math.sign(changeN.median)).toBe(Math.sign(changeMs?.gust.median ?? 0))
      expect(Math.sign(changeN.median)).toBe(Math.sign(sameAsKg.median - 15))
    }
  })

  it('is at the reference plan what the page of the modification says', async () => {
    const { reference, worth } = await read<ModificationAnswer>('/api/modifications/hinge-locked')
    const { body } = await send({ modification: 'hinge-locked', plan: reference })
    expect((body as unknown as ModificationWorthAnswer).worth).toEqual(worth)
  })

  it('refuses a bad request by the field, and an unknown modification', async () => {
    expectProblem(await send({ modification: 'no-such', plan: rankingRequestExample() }), 404)
    const answer = await send({ modification: 'hinge-locked', plan: { ...rankingRequestExample(), depthM: -1 } })
    expectProblem(answer, 422)
    expect(Object.keys(answer.body.fields as object)).toContain('plan.depthM')
    expectProblem(await send({ modification: 'hinge-locked' }), 422)
    expectProblem(await send({ modification: 'hinge-locked', plan: { ...rankingRequestExample(), depthM: 200 } }), 422)
  })
})
