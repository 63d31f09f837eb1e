import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import type { Rode } from '#shared/types/rode'
import { elasticSpan } from '#shared/rode/elasticSpan'
import { energyOn, peakOn } from '#shared/rode/energyPeak'
import { forceCurve } from '#shared/rode/forceCurve'
import { ropeStiffnessN, chainStiffnessN } from '#shared/rode/stiffness'
import { surgePeak, surgeReader } from '#shared/rode/surge'
import { solverInput } from '#shared/rode/weights'

const chain = { lengthM: 40, diameterMm: 10, grade: 'G40' as const }
const snubber = { lengthM: 8, diameterMm: 14, construction: 'nylon3Strand' as const }
const mixed: Rode = { chain: { lengthM: 10, diameterMm: 8, grade: 'G40' }, rope: { lengthM: 40, diameterMm: 16, construction: 'nylon3Strand' } }
const within = (min: number, max: number) => fc.double({ min, max, noNaN: true })
const peakOf = (rode: Rode, steadyN: number, energyJ: number) =>
  surgePeak({ rode, heightM: 8, steadyN, energyJ }).peakN ?? Number.POSITIVE_INFINITY

describe('surgePeak', () => {
  it.each([[200, 300], [1000, 940], [3000, 1500], [5000, 4000]])('balances the energy: from %s N and %s J', (steadyN, energyJ) => {
    const peakN = peakOf({ chain, snubber }, steadyN, energyJ)
    expect(peakN).toBeLessThan(40_200)
    const stretch = { chainN: chainStiffnessN(10), snubber: { lengthM: 8, stiffnessN: ropeStiffnessN(40_200) } }
    const spanAt = (loadN: number) => elasticSpan(solverInput({ chain }, 8, loadN), stretch)
    let takenJ = 0
    const steps = 20_000
    for (let step = 0; step < steps; step += 1) {
      const low = steadyN + (peakN - steadyN) * step / steps
      const high = steadyN + (peakN - steadyN) * (step + 1) / steps
      takenJ += ((low + high) / 2 - steadyN) * (spanAt(high) - spanAt(low))
    }
    expect(Math.abs(takenJ / energyJ - 1)).toBeLessThan(1e-3)
  })

  it('never falls with more load or more energy; no number counts as infinite', () => {
    const rodes = [{ chain, snubber }, mixed, { ...mixed, snubber }, { chain: { lengthM: 0 }, rope: mixed.rope ?? snubber }, { chain }]
    const readers = rodes.map(rode => surgeReader(rode, 8))
    const finite = { numbers: 0 }
    fc.assert(fc.property(fc.constantFrom(...readers), within(0, 20_000), within(0, 20_000), within(0, 5000), within(0, 5000), (read, load, moreLoad, energy, moreEnergy) => {
      const peak = (steadyN: number, energyJ: number) => read(steadyN, energyJ).peakN ?? Number.POSITIVE_INFINITY
      const peakN = peak(load, energy)
      if (Number.isFinite(peakN)) finite.numbers += 1
      expect(peakN).toBeGreaterThanOrEqual(load)
      expect(peak(load + moreLoad, energy)).toBeGreaterThanOrEqual(peakN * (1 - 1e-12))
      expect(peak(load, energy + moreEnergy)).toBeGreaterThanOrEqual(peakN * (1 - 1e-12))
    }), { numRuns: 3000, seed: 40_190 })
    expect(finite.numbers).toBeGreaterThan(1000)
  })

  it('is lower with a snubber, and lower still with a longer one', () => {
    const bare = peakOf(mixed, 2000, 2000)
    const short = peakOf({ ...mixed, snubber: { ...snubber, lengthM: 4 } }, 2000, 2000)
    expect(short).toBeLessThan(bare)
    expect(peakOf({ ...mixed, snubber: { ...snubber, lengthM: 12 } }, 2000, 2000)).toBeLessThan(short)
  })

  it('is the steady load without a surge, whatever the rode', () => {
    expect(surgePeak({ rode: { chain }, heightM: 8, steadyN: 1234, energyJ: 0 })).toEqual({ peakN: 1234 })
  })

  it.each<[string, Rode, RegExp, string | undefined]>([
    ['chain alone', { chain }, /nothing left to stretch: fit a snubber$/, 'snubber'],
    ['double braid of unknown strength', { chain, rope: { lengthM: 20, diameterMm: 14, construction: 'nylonDoubleBraid' } }, /stretch of the rope is unknown/, 'rope.breakingN'],
    ['a snubber of unknown construction', { chain, snubber: { lengthM: 8, diameterMm: 14 } }, /stretch of the snubber is unknown/, 'snubber.breakingN'],
    ['chain of unknown diameter', { chain: { lengthM: 40, submergedWeightNPerM: 12 }, snubber }, /stretch of the chain is unknown/, 'chain.diameterMm'],
    ['a rope that would break', { chain: { ...chain, lengthM: 2 }, rope: { lengthM: 8, diameterMm: 10, construction: 'nylon3Strand' } }, /nothing left to stretch: fit a snubber \(the peak would break the rope\)/, undefined],
    ['a snubber that would break', { chain, snubber: { ...snubber, lengthM: 0.2, diameterMm: 10 } }, /fit a longer or thicker snubber \(the peak would break the snubber\)/, undefined],
    ['chain that would break', { chain: { lengthM: 40, diameterMm: 10, breakingN: 3000 }, snubber }, /the peak would break the chain/, undefined],
  ])('has no number for %s', (_name, rode, why, field) => {
    const peak = surgePeak({ rode, heightM: 8, steadyN: 3000, energyJ: 20_000 })
    expect(peak.peakN).toBeNull()
    expect(peak).toHaveProperty('why', expect.stringMatching(why))
    expect('field' in peak ? peak.field : undefined).toBe(field)
  })

  it('refuses a bad load, energy or rode', () => {
    expect(() => surgePeak({ rode: mixed, heightM: 8, steadyN: -1, energyJ: 1 })).toThrow(/steadyN/)
    expect(() => surgePeak({ rode: mixed, heightM: 8, steadyN: 1, energyJ: Number.NaN })).toThrow(/energyJ/)
    expect(() => surgePeak({ rode: mixed, heightM: 80, steadyN: 1, energyJ: 1 })).toThrow(/too short to reach the bottom/)
  })

  it('reads the same from a reader as on its own', () => {
    expect(surgeReader(mixed, 8)(1500, 700)).toEqual(surgePeak({ rode: mixed, heightM: 8, steadyN: 1500, energyJ: 700 }))
  })
})

describe('force curves', () => {
  it('turn energy into a peak and back', () => {
    const curve = forceCurve(loadN => 10 - 5 / (1 + loadN / 500) + loadN / 20_000, 5, 50_000)
    fc.assert(fc.property(within(0, 30_000), within(1e-3, 5000), (steadyN, energyJ) => {
      const peakN = peakOn(curve, steadyN, energyJ)
      if (peakN === null) return
      expect(energyOn(curve, steadyN, peakN)).toBeCloseTo(energyJ, 4)
    }), { numRuns: 2000, seed: 40_191 })
  })

  it('end at their greatest load', () => {
    const curve = forceCurve(loadN => loadN / 5000, 0, 10_000)
    expect(peakOn(curve, 10_001, 1)).toBeNull()
    expect(peakOn(curve, 0, 10_000 ** 2 / 5000 / 2 - 1e-6)).toBeCloseTo(10_000, 5)
    expect(peakOn(curve, 0, 10_000 ** 2 / 5000 / 2 + 1e-6)).toBeNull()
    expect(() => energyOn(curve, 5000, 4000)).toThrow(/peakN/)
  })
})
