import { describe, expect, it } from 'vitest'
import { chainBreakingN, ropeBreakingN } from '#shared/rode/breaking'
import { strengthOf } from '#shared/rode/strength'
import { LBF_N } from '#shared/units/constants'

const tensions = { tensionJoinN: 5000, tensionBowN: 5100 }

describe('strengthOf', () => {
  it('judges each part at the greatest tension in it and names the weakest', () => {
    const { parts, weakest } = strengthOf({
      chain: { lengthM: 20, diameterMm: 8, grade: 'G30' },
      rope: { lengthM: 30, diameterMm: 14, construction: 'nylon3Strand' },
      snubber: { lengthM: 6, diameterMm: 12, construction: 'nylon3Strand' },
      shackles: [{ sizeMm: 10 }, { sizeIn: '3/8' }],
    }, tensions)
    expect(parts.map(({ part, loadN, ok }) => [part, loadN, ok])).toEqual([
      ['chain', 5000, true], ['rope', 5100, true], ['snubber', 5100, true], ['shackle 1', 5100, true], ['shackle 2', 5100, true],
    ])
    expect(parts[2]?.allowedN).toBeCloseTo(29_400 * 0.85 * 0.9 / 3, 6)
    expect(weakest).toBe('snubber')
  })

  it('takes the published working load where it is the smaller, by inch size only', () => {
    const byInch = strengthOf({ chain: { lengthM: 20, sizeIn: '5/16', grade: 'G30' } }, tensions).parts[0]
    expect(byInch?.allowedN).toBeCloseTo(1900 * LBF_N, 6)
    const byMm = strengthOf({ chain: { lengthM: 20, diameterMm: 7.9375, grade: 'G30' } }, tensions).parts[0]
    expect(byMm?.allowedN).toBeCloseTo(471.2 * 7.9375 ** 2 / 3, 6)
  })

  it('never calls an unknown strength ok, nor the weakest', () => {
    const { parts, weakest } = strengthOf({
      chain: { lengthM: 20, diameterMm: 8 },
      rope: { lengthM: 30, diameterMm: 14, construction: 'nylonDoubleBraid' },
      shackles: [{ sizeMm: 9 }],
    }, tensions)
    expect(parts.map(({ part, breakingN, allowedN, ok }) => [part, breakingN, allowedN, ok])).toEqual([
      ['chain', null, null, null], ['rope', null, null, null], ['shackle', null, null, null],
    ])
    expect(weakest).toBeNull()
  })

  it('says when the load is too much', () => {
    const { parts, weakest } = strengthOf({ chain: { lengthM: 20, breakingN: 12_000 } }, tensions)
    expect(parts).toEqual([{ part: 'chain', breakingN: 12_000, allowedN: 4000, loadN: 5000, ok: false }])
    expect(weakest).toBe('chain')
  })

  it('leaves out chain and lines of no length', () => {
    expect(strengthOf({ chain: { lengthM: 0 }, rope: { lengthM: 9, breakingN: 30_000 }, snubber: { lengthM: 0 } }, tensions).parts.map(({ part }) => part)).toEqual(['rope'])
  })
})

describe('breaking strengths', () => {
  it('come from the reader before any list', () => {
    expect(chainBreakingN({ grade: 'G40', diameterMm: 10, breakingN: 50_000 })).toBe(50_000)
    expect(ropeBreakingN({ construction: 'nylon3Strand', diameterMm: 12, breakingN: 25_000 }, 'rope')).toBe(25_000)
  })

  it('are unknown without a grade, a construction or a listed size', () => {
    expect(chainBreakingN({ diameterMm: 10 })).toBeNull()
    expect(chainBreakingN({ grade: 'G40' })).toBeNull()
    expect(ropeBreakingN({ diameterMm: 12 }, 'rope')).toBeNull()
    expect(ropeBreakingN({ diameterMm: 13, construction: 'nylon3Strand' }, 'rope')).toBeNull()
    expect(ropeBreakingN({ sizeIn: '1', construction: 'nylon3Strand' }, 'rope')).toBeNull()
  })

  it.each([0, -1, Number.NaN, Number.POSITIVE_INFINITY])('refuse %s N, naming the field', (breakingN) => {
    expect(() => chainBreakingN({ breakingN })).toThrow(/chain.breakingN must be from 1/)
    expect(() => ropeBreakingN({ breakingN }, 'snubber')).toThrow(/snubber.breakingN must be from 1/)
    expect(() => strengthOf({ chain: { lengthM: 1, diameterMm: 8 }, shackles: [{ breakingN }] }, tensions)).toThrow(/shackles.0.breakingN/)
  })
})
