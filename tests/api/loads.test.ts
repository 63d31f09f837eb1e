import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { loadAnswer } from '#shared/schemas/answers/load'
import type { LoadAnswer } from '#shared/types/load'
import { loadRequestExample } from '../factories/requests'
import { post, unlimited } from './client'
import { startApp, type TestApp } from './harness'

let app: TestApp
beforeAll(async () => {
  app = await startApp(unlimited)
})
afterAll(() => app.stop())

async function loads(request: unknown): Promise<LoadAnswer> {
  const { status, body } = await post(`${app.baseUrl}/api/loads`, request)
  expect(status, JSON.stringify(body)).toBe(200)
  return body as unknown as LoadAnswer
}

const lbfN = 4.4482216152605

describe('POST /api/loads', () => {
  it('answers as the description says', async () => {
    expect(loadAnswer.safeParse(await loads(loadRequestExample())).error).toBeUndefined()
  })

  it('gives Gerr\'s worked table load: a power boat of 32 x 12 ft in 30 kn, 900 lbf (Gerr, Boat Mechanical Systems Handbook)', async () => {
    const { table } = await loads({ boat: { type: 'motor', lengthM: 32 * 0.3048, beamM: 12 * 0.3048 }, wind: { speedMs: 30 * 1852 / 3600, kind: 'gust' } })
    expect(table?.loadN).toBeCloseTo(900 * lbfN, 3)
  })

  it('adds up: totalN = max(sheerN, gustN + surgeN) + currentN, designN the larger with the table', async () => {
    const { survey, table, designN } = await loads(loadRequestExample())
    const totalN = Math.max(survey.sheerN, survey.gustN + (survey.surgeN ?? 0)) + survey.currentN
    expect(survey.totalN).toBeCloseTo(totalN, 6)
    expect(designN).toBeCloseTo(Math.max(totalN, (table?.loadN ?? 0) + survey.currentN), 6)
    expect(survey.parts.reduce((sum, part) => sum + part.loadN, 0)).toBeCloseTo(survey.steadyN, 6)
  })

  it('says null, with a note, where nothing bounds the surge', async () => {
    const request = loadRequestExample()
    const { survey, designN, notes } = await loads({ ...request, swell: 'open', rode: { chain: request.rode?.chain } })
    expect([survey.surgeN, survey.totalN, designN]).toEqual([null, null, null])
    expect(notes.join(' ')).toMatch(/snubber/)
  })

  it('answers any other origin, without credentials', async () => {
    const { headers } = await post(`${app.baseUrl}/api/loads`, loadRequestExample(), { Origin: 'https://chandler.example' })
    expect(headers.get('access-control-allow-origin')).toBe('*')
    expect(headers.has('access-control-allow-credentials')).toBe(false)
    expect(headers.has('set-cookie')).toBe(false)
  })
})
