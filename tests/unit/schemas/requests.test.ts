import { describe, expect, it } from 'vitest'
import type * as z from 'zod/mini'
import { fitRequest } from '#shared/schemas/fit'
import { loadRequest } from '#shared/schemas/load'
import { rankingRequest } from '#shared/schemas/ranking'
import { rodeRequest } from '#shared/schemas/rode'
import { ApiError } from '../../../server/utils/errors'
import { validate } from '../../../server/utils/validate'
import { fitRequestExample, loadRequestExample, rankingRequestExample, rodeRequestExample } from '../../factories/requests'
import { faultsOf, gone, spoil } from '../../factories/faults'

/** The fields that a refusal names, with its words; null where nothing was refused. */
function refusal(schema: z.ZodMiniType, value: unknown): Record<string, string> | null {
  try {
    validate(schema, value)
    return null
  }
  catch (error) {
    if (error instanceof ApiError && error.statusCode === 422) return error.more.fields ?? {}
    throw error
  }
}

const smallFit = () => ({ pulls: fitRequestExample().pulls.slice(0, 2) })

const routes: [string, z.ZodMiniType, () => object][] = [
  ['loads', loadRequest, loadRequestExample],
  ['rodes', rodeRequest, rodeRequestExample],
  ['rankings', rankingRequest, rankingRequestExample],
  ['fits', fitRequest, smallFit],
]

describe.each(routes)('what %s takes', (_name, schema, example) => {
  it('is taken as it stands', () => {
    expect(refusal(schema, example())).toBeNull()
  })

  it.each(faultsOf(example()))('refuses $name', ({ path, value, field }) => {
    expect(Object.keys(refusal(schema, spoil(example(), path, value)) ?? {})).toContain(field)
  })

  it.each([undefined, null, [], 'text', 12, true].map(value => [value]))('refuses %j for the whole', (value) => {
    expect(refusal(schema, value)).toHaveProperty('request')
  })

  it('names every missing field at once', () => {
    const required = Object.keys(refusal(schema, {}) ?? {})
    expect(required.length).toBeGreaterThan(0)
    for (const field of required) expect(refusal(schema, spoil(example(), [field], gone))).toHaveProperty(field)
  })
})

describe('words of a refusal', () => {
  it('name the range and the unit', () => {
    expect(refusal(loadRequest, spoil(loadRequestExample(), ['boat', 'lengthM'], 500))).toEqual({ 'boat.lengthM': 'must be a number between 2 and 80 m' })
  })

  it('say what is missing', () => {
    expect(refusal(loadRequest, spoil(loadRequestExample(), ['boat', 'beamM'], gone))).toEqual({ 'boat.beamM': 'is missing: it must be a number between 0.5 and 30 m' })
  })

  it('name all of several faults, lists by position', () => {
    const wrong = spoil(spoil(loadRequestExample(), ['boat', 'windage', 0, 'areaM2'], -1), ['wind', 'kind'], 'squall')
    expect(refusal(loadRequest, wrong)).toEqual({ 'boat.windage.0.areaM2': 'must be a number between 0 and 5 000 m2', 'wind.kind': 'must be one of mean, gust' })
  })

  it('stay short however much is wrong', () => {
    const pulls = Array.from({ length: 200 }, () => ({}))
    const error = (() => {
      try {
        return validate(fitRequest, { pulls })
      }
      catch (thrown) {
        return thrown as ApiError
      }
    })() as ApiError
    expect(Object.keys(error.more.fields ?? {})).toHaveLength(50)
    expect(error.message).toMatch(/\(and \d{4} more\)$/)
  })
})
