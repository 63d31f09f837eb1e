import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { fitAnswer } from '#shared/schemas/answers/fit'
import type { FitAnswer } from '#shared/types/fit'
import { fitPullExample, fitRequestExample } from '../factories/requests'
import { expectProblem, post, unlimited } from './client'
import { startApp, type TestApp } from './harness'

let app: TestApp
beforeAll(async () => {
  app = await startApp(unlimited)
})
afterAll(() => app.stop())

const ask = (request: unknown) => post(`${app.baseUrl}/api/fits`, request)

async function fits(request: unknown): Promise<FitAnswer> {
  const { status, body } = await ask(request)
  expect(status, JSON.stringify(body)).toBe(200)
  return body as unknown as FitAnswer
}

describe('POST /api/fits', () => {
  it('answers as the description says, from a worker thread', async () => {
    const answer = await fits(fitRequestExample())
    expect(fitAnswer.safeParse(answer).error).toBeUndefined()
    expect(answer.estimates.map(({ design }) => design).sort()).toEqual(['north', 'south'])
    expect(answer.dataHash).not.toBe('')
  })

  it('does not care for the order of pulls', async () => {
    const { pulls } = fitRequestExample()
    expect(await fits({ pulls: pulls.toReversed() })).toEqual(await fits({ pulls }))
  })

  it('fits one free mean a design and seabed where nothing is pooled', async () => {
    const answer = await fits({ ...fitRequestExample(), pooled: false })
    expect(answer.estimates.every(({ lnMean15Kg }) => lnMean15Kg !== null && Math.exp(lnMean15Kg) > 1000 && Math.exp(lnMean15Kg) < 4000)).toBe(true)
  })

  it('says why a design that never held has no mean', async () => {
    const pulls = [1, 2, 3].map(day => ({ ...fitPullExample(), trial: `day ${day}`, set: false, heldN: 0, movedN: null }))
    const answer = await ask({ pulls: [...fitRequestExample().pulls, ...pulls.map(pull => ({ ...pull, design: 'never' }))], pooled: false })
    expect(answer.status).toBe(200)
  })

  it('takes 5 000 pulls in one body, and refuses one more', async () => {
    const many = (count: number) => ({ pulls: Array.from({ length: count }, (_, i) => ({ ...fitPullExample(), trial: `day ${i % 10}`, heldN: 1000 + i % 700 })), pooled: false })
    expect(await ask(many(5001))).toMatchObject({ status: 422 })
    expect((await ask(many(5000))).status).toBe(200)
  })

  it('names the field of a pull that says nothing', async () => {
    const answer = await ask({ pulls: [fitPullExample(), { ...fitPullExample(), heldN: 0, movedN: null }] })
    expectProblem(answer, 422)
    expect(Object.keys(answer.body.fields as object)).toEqual(['pulls.1.heldN'])
  })

  it('lets one run and four wait; the next is told to come back', async () => {
    const heavy = { pulls: Array.from({ length: 600 }, (_, i) => ({ ...fitPullExample(), design: `d ${i % 12}`, trial: `day ${i % 25}`, heldN: 1000 + 37 * i % 1500, movedN: 2600 })) }
    const answers = await Promise.all(Array.from({ length: 12 }, () => ask(heavy)))
    const busy = answers.filter(({ status }) => status === 429)
    expect(busy.length).toBeGreaterThan(0)
    for (const answer of busy) {
      expectProblem(answer, 429)
      expect(Number(answer.headers.get('retry-after'))).toBeGreaterThan(0)
    }
    expect(answers.filter(({ status }) => status === 200).length).toBeGreaterThanOrEqual(5)
    expect((await ask(fitRequestExample())).status).toBe(200)
  })

  it('is not open to other origins', async () => {
    expect((await ask(fitRequestExample())).headers.has('access-control-allow-origin')).toBe(false)
  })
})
