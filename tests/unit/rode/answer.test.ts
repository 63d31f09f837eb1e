import { describe, expect, it } from 'vitest'
import { answerRode } from '#shared/rode/answer'
import type { FieldError } from '#shared/utils/fieldError'
import type { RodeRequest } from '#shared/types/rode'

const request: RodeRequest = {
  heightM: 10, horizontalLoadN: 5000, chain: { lengthM: 40, diameterMm: 8, grade: 'G40', submergedWeightNPerM: 11.9 },
}

describe('answerRode', () => {
  // Source: case C10 of the reference shapes.
  it('answers with the shape of the reference case', () => {
    const answer = answerRode(request)
    expect(answer.regime).toBe('clear')
    expect(answer.shankAngleDeg).toBeCloseTo(11.907676, 6)
    expect(answer.spanM).toBeCloseTo(38.716135, 6)
    expect(answer.tensionBowN).toBeCloseTo(5228.959417, 5)
    expect(answer.verticalAnchorN).toBeCloseTo(1054.364854, 5)
    expect(answer.scope).toBe(4)
    expect(answer.upliftFactor).toBeCloseTo(0.6 - 0.19 * 1.907676 / 5, 6)
    expect(answer.curve[0]).toEqual([0, 0])
    expect(answer.curve.at(-1)).toEqual([answer.spanM, 10])
    expect(answer.strength[0]?.loadN).toBe(answer.tensionBowN)
    expect(answer.weakest).toBe('chain')
  })

  it('gives lengths which, let out, give the angles', () => {
    const { leastLengthZeroAngleM, leastLength8DegM } = answerRode(request)
    const angleWith = (lengthM: number | null) =>
      answerRode({ ...request, chain: { ...request.chain, lengthM: lengthM ?? 0 } }).shankAngleDeg
    expect(angleWith(leastLengthZeroAngleM)).toBeCloseTo(0, 5)
    expect(angleWith(leastLength8DegM)).toBeCloseTo(8, 5)
  })

  it('judges the chain where it meets the rope, and the rope at the bow', () => {
    const answer = answerRode({ ...request, rope: { lengthM: 40, diameterMm: 14, construction: 'nylon3Strand' } })
    expect(answer.strength.map(({ part }) => part)).toEqual(['chain', 'rope'])
    expect(answer.strength[1]?.loadN).toBe(answer.tensionBowN)
    expect(answer.strength[0]?.loadN).toBeLessThan(answer.tensionBowN)
    expect(answer.strength[0]?.loadN).toBeGreaterThan(answer.tensionAnchorN)
  })

  it('lets rope stand alone', () => {
    const answer = answerRode({ ...request, chain: { lengthM: 0 }, rope: { lengthM: 60, diameterMm: 14, construction: 'nylon3Strand' } })
    expect(answer.strength.map(({ part }) => part)).toEqual(['rope'])
    expect(answer.groundedChainM).toBe(0)
  })

  it('has only finite numbers, or null', () => {
    const text = JSON.stringify(answerRode({ ...request, chain: { lengthM: 0 }, rope: { lengthM: 60, submergedWeightNPerM: 0 } }))
    expect(JSON.parse(text)).toMatchObject({ leastLengthZeroAngleM: null, weakest: null })
    expect(answerRode(request).curve.flat().every(Number.isFinite)).toBe(true)
  })

  it.each<[string, RodeRequest]>([
    ['chain.lengthM', { ...request, chain: { ...request.chain, lengthM: 10 } }],
    ['chain.diameterMm', { ...request, chain: { lengthM: 40 } }],
    ['rope.diameterMm', { ...request, rope: { lengthM: 40 } }],
    ['rope.sizeIn', { ...request, rope: { lengthM: 40, sizeIn: 'thick' } }],
    ['snubber.lengthM', { ...request, snubber: { lengthM: -3 } }],
    ['snubber.breakingN', { ...request, snubber: { lengthM: 3, breakingN: 0 } }],
    ['shackles.1.sizeMm', { ...request, shackles: [{ sizeMm: 10 }, { sizeMm: -1 }] }],
    ['horizontalLoadN', { ...request, horizontalLoadN: Number.NaN }],
    ['heightM', { ...request, heightM: -2 }],
  ])('names %s when it refuses it', (field, bad) => {
    expect(() => answerRode(bad)).toThrow(RangeError)
    expect(() => answerRode(bad)).toThrow(expect.objectContaining<Partial<FieldError>>({ field }))
  })
})
