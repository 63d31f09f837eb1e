import { readFileSync } from 'node:fs'
import { describe, expect, it } from 'vitest'
import { chainBreakingN, ropeBreakingN } from '#shared/rode/breaking'
import { heightToBow, lengthForScope, scopeOf, swingRadiusM } from '#shared/rode/height'
import { allowedN, ropeAllowedN, strengthOf } from '#shared/rode/strength'
import { upliftFactor } from '#shared/rode/uplift'
import { chainMassKgPerM, nylonMassKgPerM } from '#shared/rode/weights'
import { chainWorkingLoadN, shackleStrength } from '#shared/rode/workingLoad'
import { DEG_RAD, FT_M, G, LBF_N } from '#shared/units/constants'
import type { ChainGrade } from '#shared/types/words'

interface Listed { source: string, rows: [number, number][] }
interface ListedIn { source: string, rows: [string, number][] }
interface Published {
  chainBreakingForce: { kNPerMm2: Record<ChainGrade, number> }
  chainWorkingLoadLbf: { sizesIn: string[], G30: number[], G43: number[] }
  chainMassKgPerM: Listed
  nylonThreeStrand: { rows: [inch: string, mmNominal: number, lbf: number, kN: number, kgPerM: number][] }
  nylonThreeStrandMetric: Listed
  shackleUltimateLbf: ListedIn
  shackleWorkingLoadTonnes: Listed
  safetyFactors: { chain: number, chainRoundBends: number, synthetic: number, wetNylonLoss: number }
  uplift: Listed
}

const published = JSON.parse(readFileSync(new URL('./published.json', import.meta.url), 'utf8')) as Published

describe('chain', () => {
  // Source: ASTM A413 clause 1.4.1, F[kN] = grade x 0.005 pi d^2.
  it.each(Object.entries(published.chainBreakingForce.kNPerMm2))('%s breaks at %s kN/mm2', (grade, kNPerMm2) => {
    const breakingN = chainBreakingN({ grade: grade as ChainGrade, diameterMm: 10 })
    expect(breakingN).toBeCloseTo(kNPerMm2 * 100 * 1000, 6)
    expect(kNPerMm2).toBeCloseTo(Number(grade.slice(1)) * 0.005 * Math.PI, 4)
  })

  it('breaks at the worked values of ASTM A413: 10 mm G40 62.8 kN, 8 mm G30 30.2 kN', () => {
    expect((chainBreakingN({ grade: 'G40', diameterMm: 10 }) ?? 0) / 1000).toBeCloseTo(62.8, 1)
    expect((chainBreakingN({ grade: 'G30', diameterMm: 8 }) ?? 0) / 1000).toBeCloseTo(30.2, 1)
  })

  // Source: 49 CFR 393.108.
  it.each(published.chainWorkingLoadLbf.sizesIn.map((size, index) => [size, index] as const))('%s in has its published working load', (sizeIn, index) => {
    for (const grade of ['G30', 'G43'] as const) {
      expect((chainWorkingLoadN({ lengthM: 1, sizeIn, grade }) ?? 0) / LBF_N).toBeCloseTo(published.chainWorkingLoadLbf[grade][index] ?? 0, 9)
    }
    expect(chainWorkingLoadN({ lengthM: 1, sizeIn, grade: 'G70' })).toBeNull()
  })

  it('has no published working load by a diameter in mm, though it be the same', () => {
    expect(chainWorkingLoadN({ lengthM: 1, diameterMm: 12.7, grade: 'G43' })).toBeNull()
  })

  // Source: DIN 766, memory.
  it.each(published.chainMassKgPerM.rows)('%s mm weighs %s kg/m', (mm, kgPerM) => {
    expect(chainMassKgPerM(mm)).toBe(kgPerM)
    expect(Math.abs(0.0219 * mm * mm / kgPerM - 1)).toBeLessThan(0.03)
  })
})

describe('three-strand nylon', () => {
  // Source: minimum breaking strength, agrees with CI 1303 from memory.
  it.each(published.nylonThreeStrand.rows)('%s in (called %s mm) breaks at %s lbf, %s kN, and weighs %s kg/m', (sizeIn, _mm, lbf, kN, kgPerM) => {
    const breakingN = ropeBreakingN({ sizeIn, construction: 'nylon3Strand' }, 'rope') ?? 0
    expect(breakingN / LBF_N).toBeCloseTo(lbf, 6)
    expect(Math.abs(breakingN / 1000 - kN)).toBeLessThan(0.06)
    const [over, under] = sizeIn.split('/').map(Number)
    // Our own formula, within 5 % of the list.
    expect(Math.abs(nylonMassKgPerM((over ?? 0) / (under ?? 1) * 25.4) / kgPerM - 1)).toBeLessThan(0.05)
  })

  // Source: ISO 1140, memory.
  it.each(published.nylonThreeStrandMetric.rows)('%s mm breaks at %s kN', (diameterMm, kN) => {
    expect(ropeBreakingN({ diameterMm, construction: 'nylon3Strand' }, 'rope')).toBeCloseTo(kN * 1000, 6)
  })

  it('never reads the inch list by a nominal diameter: 11 mm is off the metric list', () => {
    expect(ropeBreakingN({ diameterMm: 11, construction: 'nylon3Strand' }, 'rope')).toBeNull()
  })
})

describe('shackles', () => {
  // Source: RR-C-271, factor 5; 1/4 to 7/16 in from memory.
  it.each(published.shackleUltimateLbf.rows)('%s in has an ultimate load of %s lbf', (sizeIn, lbf) => {
    const { breakingN, workingN } = shackleStrength({ sizeIn }, 'shackles.0')
    expect((breakingN ?? 0) / LBF_N).toBeCloseTo(lbf, 6)
    expect((workingN ?? 0) / LBF_N).toBeCloseTo(lbf / 5, 6)
  })

  // Source: EN 13889, memory.
  it.each(published.shackleWorkingLoadTonnes.rows)('%s mm has a working load of %s t', (sizeMm, tonnes) => {
    expect(shackleStrength({ sizeMm }, 'shackles.0')).toEqual({ breakingN: null, workingN: tonnes * 1000 * G })
  })
})

// Source: UFC 4-159-03 table 3-7; splice 0.9, common practice.
describe('safety factors', () => {
  const { chain, chainRoundBends, synthetic, wetNylonLoss } = published.safetyFactors
  const tensions = { tensionJoinN: 1000, tensionBowN: 1100 }
  const rode = { chain: { lengthM: 30, breakingN: 60_000 } }

  it('are 3 for chain and 4 for chain round a bend', () => {
    expect(strengthOf(rode, tensions).parts[0]?.allowedN).toBeCloseTo(60_000 / chain, 9)
    expect(strengthOf({ ...rode, overRoller: true }, tensions).parts[0]?.allowedN).toBeCloseTo(60_000 / chainRoundBends, 9)
    expect(allowedN(60_000, chain, 15_000)).toBe(15_000)
  })

  it('are 3 for rope, after what water and a splice take', () => {
    expect(ropeAllowedN(30_000)).toBeCloseTo(30_000 * (1 - wetNylonLoss) * 0.9 / synthetic, 9)
  })
})

// Source: US Sailing, Basic Keelboat, 5th ed., p. 84: depth 10 ft, bow 3 ft, tide 2 ft, scope 7 -> 105 ft.
it('lets out 105 ft for a scope of 7', () => {
  const heightM = heightToBow(10 * FT_M, 2 * FT_M, 0, 3 * FT_M)
  expect(lengthForScope(7, heightM) / FT_M).toBeCloseTo(105, 9)
  expect(scopeOf(105 * FT_M, heightM)).toBeCloseTo(7, 12)
})

// Source: seamanship practice, length overall + sqrt(rode^2 - (depth + freeboard)^2); the triangle 3-4-5 by hand.
it('swings on a straight rode, and never past length overall plus rode', () => {
  expect(swingRadiusM({ depthM: 27, fallM: 0, bowHeightM: 3, rodeM: 50, lengthOverallM: 11 })).toBeCloseTo(51, 12)
  expect(swingRadiusM({ depthM: 5, fallM: 2, bowHeightM: 1, rodeM: 50, lengthOverallM: 11 })).toBeLessThan(61)
})

// Source: see the uplift entry of published.json.
it.each(published.uplift.rows)('keeps the published share of holding at %s deg: %s', (deg, share) => {
  expect(upliftFactor(deg * DEG_RAD)).toBeCloseTo(share, 12)
})
