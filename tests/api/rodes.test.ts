import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { rodeAnswer } from '#shared/schemas/answers/rode'
import type { RodeAnswer } from '#shared/types/rode'
import { rodeRequestExample } from '../factories/requests'
import { post, unlimited } from './client'
import { startApp, type TestApp } from './harness'

let app: TestApp
beforeAll(async () => {
  app = await startApp(unlimited)
})
afterAll(() => app.stop())

async function rodes(request: unknown): Promise<RodeAnswer> {
  const { status, body } = await post(`${app.baseUrl}/api/rodes`, request)
  expect(status, JSON.stringify(body)).toBe(200)
  return body as unknown as RodeAnswer
}

describe('POST /api/rodes', () => {
  it('answers as the description says', async () => {
    expect(rodeAnswer.safeParse(await rodes(rodeRequestExample())).error).toBeUndefined()
  })

  it('gives the worked mooring of MIT course 2.019: T 1510 kN at the fairlead, w 828 N/m, h 25 m lift 300.93 m', async () => {
    const weightNPerM = 828
    const heightM = 25
    const horizontalLoadN = 1_510_000 - weightNPerM * heightM
    const answer = await rodes({ heightM, horizontalLoadN, chain: { lengthM: 400, submergedWeightNPerM: weightNPerM } })
    expect(answer.regime).toBe('grounded')
    expect(answer.tensionBowN).toBeCloseTo(1_510_000, 3)
    expect(400 - answer.groundedChainM).toBeCloseTo(300.93, 2)
  })

  it('draws the curve from the anchor to the bow', async () => {
    const request = rodeRequestExample()
    const { curve, spanM } = await rodes(request)
    expect(curve[0]).toEqual([0, 0])
    expect(curve.at(-1)?.[0]).toBeCloseTo(spanM, 6)
    expect(curve.at(-1)?.[1]).toBeCloseTo(request.heightM, 6)
  })

  it('names the weakest part, and calls an unknown strength neither ok nor not', async () => {
    const { strength, weakest } = await rodes({ ...rodeRequestExample(), snubber: { lengthM: 8, diameterMm: 15, construction: 'nylonDoubleBraid' } })
    expect(strength.map(({ part }) => part)).toContain(weakest)
    const unknown = strength.filter(({ allowedN }) => allowedN === null)
    expect(unknown.length).toBeGreaterThan(0)
    for (const { ok } of unknown) expect(ok).toBeNull()
  })
})
