import { describe, expect, it } from 'vitest'
import { ropeStiffnessN } from '#shared/rode/stiffness'
import { shallowNote, snubberAdvice } from '#shared/rode/snubber'
import { solveRode } from '#shared/rode/catenary'
import { solverInput } from '#shared/rode/weights'

const chain = { lengthM: 40, diameterMm: 10, grade: 'G40' as const }
const snubber = { lengthM: 8, diameterMm: 10, construction: 'nylon3Strand' as const }
const base = { rode: { chain, snubber }, heightM: 8, depthM: 6, designN: 6000, steadyN: 2500, energyJ: 940 }

/** Stretch of a snubber at a horizontal load, as a share of its length. */
function stretchAt(loadN: number): number {
  return solveRode(solverInput({ chain }, 8, loadN)).tensionBowN / ropeStiffnessN(20_400)
}

describe('snubberAdvice', () => {
  it('says what it does: stretch at the design load, peak with and without it, its strength', () => {
    const advice = snubberAdvice(base)
    expect(advice.stretchShare).toBeCloseTo(stretchAt(6000), 12)
    expect(advice.stretchM).toBeCloseTo(8 * stretchAt(6000), 12)
    expect(advice.breakingN).toBe(20_400)
    expect(advice.allowedN).toBeCloseTo(20_400 * 0.85 * 0.9 / 3, 9)
    expect(advice.ok).toBe(false)
    expect(advice.peakWithout).toHaveProperty('why')
    expect(advice.peakWith?.peakN).toBeGreaterThan(2500)
    expect(advice.notes).toEqual([])
  })

  it.each([[400, 940], [2500, 940], [2500, 3760], [6000, 940]])('finds the shortest length: from %s N, %s J', (steadyN, energyJ) => {
    const lengthM = snubberAdvice({ ...base, steadyN, energyJ }).shortest?.lengthM ?? Number.NaN
    const peakOf = (metres: number) =>
      snubberAdvice({ ...base, steadyN, energyJ, rode: { chain, snubber: { ...snubber, lengthM: metres } } }).peakWith?.peakN ?? Number.POSITIVE_INFINITY
    expect(stretchAt(peakOf(lengthM))).toBeLessThan(0.15)
    if (lengthM === 0.1) return
    const shorter = peakOf(lengthM - 0.03)
    expect(shorter === Number.POSITIVE_INFINITY || stretchAt(shorter) > 0.15).toBe(true)
  })

  it('asks for a thicker one where the steady load alone stretches it by 15 %', () => {
    const { shortest, notes } = snubberAdvice({ ...base, steadyN: 11_000 })
    expect(stretchAt(11_000)).toBeGreaterThan(0.15)
    expect(shortest?.lengthM).toBeNull()
    expect(notes).toEqual([expect.stringMatching(/use a thicker one/)])
  })

  it('asks for a thicker one where a hundred metres is not enough', () => {
    expect(snubberAdvice({ ...base, energyJ: 1e6 }).shortest?.note).toMatch(/Even 100 m.*use a thicker one/)
  })

  it('says when something else would break first', () => {
    const weak = { chain: { ...chain, breakingN: 2000 }, snubber }
    expect(snubberAdvice({ ...base, rode: weak }).shortest?.note).toMatch(/would break the chain/)
  })

  it('suggests no length without swell', () => {
    const advice = snubberAdvice({ ...base, energyJ: 0 })
    expect(advice.shortest).toEqual({ lengthM: null })
    expect(advice.peakWith).toEqual({ peakN: 2500 })
  })

  it('claims nothing of a rope it does not know', () => {
    const advice = snubberAdvice({ ...base, rode: { chain, snubber: { lengthM: 8, diameterMm: 14, construction: 'nylonDoubleBraid' } } })
    expect([advice.stretchM, advice.breakingN, advice.allowedN, advice.ok]).toEqual([null, null, null, null])
    expect(advice.peakWith).toHaveProperty('field', 'snubber.breakingN')
    expect(advice.shortest?.note).toMatch(/unknown/)
    const ropeUnknown = { chain, rope: { lengthM: 20, diameterMm: 14 }, snubber }
    expect(snubberAdvice({ ...base, rode: ropeUnknown }).shortest?.note).toMatch(/stretch of the rope is unknown/)
  })

  it('knows its strength, but no stretch, without a design load', () => {
    expect(snubberAdvice({ ...base, designN: null })).toMatchObject({ breakingN: 20_400, stretchM: null, ok: null })
  })

  it('speaks of shallow water below 5 m, with or without a snubber', () => {
    expect(snubberAdvice({ ...base, depthM: 4.9 }).notes).toContain(shallowNote)
    const bare = snubberAdvice({ ...base, depthM: 4.9, rode: { chain } })
    expect(bare.notes).toEqual([shallowNote])
    expect(bare.shortest).toBeNull()
    expect(snubberAdvice({ ...base, depthM: 5 }).notes).not.toContain(shallowNote)
  })
})
