import fc from 'fast-check'
import type * as z from 'zod/mini'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { loadAnswer } from '#shared/schemas/answers/load'
import { rankingAnswer } from '#shared/schemas/answers/ranking'
import { rodeAnswer } from '#shared/schemas/answers/rode'
import { numberPaths, spoil } from '../factories/faults'
import { loadRequestExample, rankingRequestExample, rodeRequestExample } from '../factories/requests'
import { expectProblem, post, unlimited } from './client'
import { startApp, type TestApp } from './harness'

let app: TestApp
beforeAll(async () => {
  app = await startApp(unlimited)
})
afterAll(() => app.stop())

/** Numbers that stand at the edges of ranges, or far apart within them. */
const number = fc.oneof(fc.constantFrom(0, 0.001, 0.01, 0.05, 0.1, 0.5, 1, 2, 5, 20, 80, 90, 100, 300, 500, 2000, 5e6), fc.double({ min: 0, max: 3000, noNaN: true }))

function anyNumbers(example: () => object) {
  const paths = numberPaths(example()).filter(path => path.at(-1) !== 'share')
  return fc.array(fc.tuple(fc.constantFrom(...paths), number), { minLength: 1, maxLength: 5 })
    .map(changes => changes.reduce<unknown>((request, [path, value]) => spoil(request, path, value), example()))
}

const routes: [string, () => object, z.ZodMiniType][] = [
  ['/api/loads', loadRequestExample, loadAnswer], ['/api/rodes', rodeRequestExample, rodeAnswer], ['/api/rankings', rankingRequestExample, rankingAnswer],
]

describe.each(routes)('%s with numbers from all over their ranges', (path, example, described) => {
  it('is answered, or refused with the field named, and never fails', async () => {
    await fc.assert(fc.asyncProperty(anyNumbers(example), async (request) => {
      const answer = await post(app.baseUrl + path, request)
      if (answer.status === 200) {
        // NaN and Infinity would arrive as null, where the description has a number.
        expect(described.safeParse(answer.body).error?.issues, JSON.stringify(request)).toBeUndefined()
        return
      }
      expectProblem(answer, 422)
      expect(Object.keys(answer.body.fields as object).length, JSON.stringify(request)).toBeGreaterThan(0)
    }), { numRuns: 300 })
  })
})
