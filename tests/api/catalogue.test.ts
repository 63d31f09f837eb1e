import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { seabeds as seabedSlugs } from '#shared/types/words'
import { estimatesAnswer, seabedsAnswer } from '#shared/schemas/answers/catalogue'
import { notationAnswer } from '#shared/schemas/answers/notation'
import { designsAnswer } from '#shared/schemas/answers/reading'
import type { EstimatesAnswer, SeabedsAnswer } from '#shared/types/catalogue'
import type { ChartNotationAnswer } from '#shared/types/chart'
import type { DesignsPage } from '#shared/types/reading'
import { expectProblem, get, unlimited } from './client'
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

describe('GET /api/designs', () => {
  it('lists every design with its sizes, lightest first, as the description says', async () => {
    const answer = await read<DesignsPage>('/api/designs')
    expect(designsAnswer.safeParse(answer).error).toBeUndefined()
    expect(answer.designs.length).toBeGreaterThanOrEqual(16)
    for (const { sizes, invented } of answer.designs) {
      const masses = sizes.map(({ massKg }) => massKg)
      expect(masses).toEqual(masses.toSorted((a, b) => a - b))
      expect(masses.length).toBeGreaterThan(0)
      expect(invented).toBe(true)
    }
  })

  it('may be narrowed to a family', async () => {
    const { designs } = await read<DesignsPage>('/api/designs')
    const family = designs[0]?.family
    const narrowed = await read<DesignsPage>(`/api/designs?family=${family}`)
    expect(narrowed.designs).toEqual(designs.filter(design => design.family === family))
  })
})

describe('GET /api/seabeds', () => {
  it('lists every seabed, as the description says', async () => {
    const answer = await read<SeabedsAnswer>('/api/seabeds')
    expect(seabedsAnswer.safeParse(answer).error).toBeUndefined()
    expect(answer.seabeds.map(({ slug }) => slug).sort()).toEqual([...seabedSlugs].sort())
  })
})

describe('GET /api/estimates', () => {
  it('gives figures by design and seabed, as the description says', async () => {
    const answer = await read<EstimatesAnswer>('/api/estimates?seabed=loose-sand')
    expect(estimatesAnswer.safeParse(answer).error).toBeUndefined()
    expect(answer.estimates.length).toBeGreaterThanOrEqual(16)
    for (const { seabed, holding15KgN: { low90, median, high90 } } of answer.estimates) {
      expect(seabed).toBe('loose-sand')
      expect(low90 < median && median < high90).toBe(true)
    }
    const { design } = answer.estimates[0] ?? { design: '' }
    const one = await read<EstimatesAnswer>(`/api/estimates?seabed=loose-sand&design=${design}`)
    expect(one.estimates).toEqual(answer.estimates.filter(estimate => estimate.design === design))
  })
})

describe('GET /api/chart-notation', () => {
  it('reads what the chart prints, as the description says', async () => {
    const answer = await read<ChartNotationAnswer>('/api/chart-notation?text=fS.M.Sh')
    expect(notationAnswer.safeParse(answer).error).toBeUndefined()
    expect(answer.layers).toHaveLength(1)
    // S-57 NATSUR: 4 sand, 1 mud, 17 shells; NATQUA: 1 fine (IHO S-57 appendix A)
    expect(answer.layers[0]?.map(({ natsur }) => natsur)).toEqual([4, 1, 17])
    expect(answer.layers[0]?.[0]).toMatchObject({ noun: 'sand', natqua: [1] })
    expect(answer.seabed).toBe('sandy-mud')
  })

  it('names what it cannot read with its position', async () => {
    const text = 'fS.Qx'
    const { unread, layers } = await read<ChartNotationAnswer>(`/api/chart-notation?text=${text}`)
    expect(layers[0]?.[0]?.noun).toBe('sand')
    expect(unread.length).toBeGreaterThan(0)
    for (const part of unread) expect(text.startsWith(part.text, part.at)).toBe(true)
  })
})

describe('a bad query', () => {
  it.each([
    ['/api/chart-notation', 'text'], ['/api/chart-notation?text=', 'text'], [`/api/chart-notation?text=${'S'.repeat(61)}`, 'text'], ['/api/chart-notation?text=S&text=M', 'text'],
    ['/api/chart-notation?text=%00', 'text'], ['/api/designs?family=no-such', 'family'], ['/api/designs?x=1', 'x'], ['/api/seabeds?x=1', 'x'], ['/api/estimates?seabed=rock', 'seabed'],
    ['/api/estimates?design=%27%20or%201%3D1', 'design'], ['/api/designs?__proto__=1', '__proto__'],
  ])('%s is refused by the field', async (path, field) => {
    const answer = await get(app.baseUrl + path)
    expectProblem(answer, 422)
    expect(Object.keys(answer.body.fields as object)).toContain(field)
  })
})
