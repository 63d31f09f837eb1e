import { describe, expect, it } from 'vitest'
import { solveRode } from '#shared/rode/catenary'
import { demandPoint, holdingScore } from '#shared/ranking/chance'
import { areTied } from '#shared/ranking/order'
import { rankDesigns } from '#shared/ranking/rank'
import { judgeOwn } from '#shared/ranking/verdict'
import { normalCdf } from '#shared/stats/normal'
import type { DesignEstimate } from '#shared/types/holding'
import type { RankedRow, RankingAnswer } from '#shared/types/ranking'
import { KN_MS } from '#shared/units/constants'
import { makeCovariance, makeDesign, makeEstimate, makeFit, makeSeabedFit } from '../../factories/fit'
import { makePlan } from '../../factories/plan'

function rank(estimates: DesignEstimate[], sharedVariance = 0): RankingAnswer {
  const seabed = makeSeabedFit('loose-sand', estimates, { covariance: makeCovariance(estimates.map(({ lnSd }) => lnSd), sharedVariance) })
  return rankDesigns(makePlan(), estimates.map(({ design }) => makeDesign(design)), makeFit([seabed]))
}

const shape = ({ rows }: RankingAnswer) => rows.map(({ design, tiedWithNext }) => [design, tiedWithNext])

describe('ties', () => {
  it('bracket rows whose order is a coin-toss by the joint covariance, not by the overlap of their intervals', () => {
    // difference ln(1.03) = 0.0296 with sd 0.1414: Phi(0.209) = 0.583; ln(1.06) = 0.0583: Phi(0.412) = 0.660
    expect(shape(rank([makeEstimate('alder', 3090), makeEstimate('birch', 3000)]))).toEqual([['alder', true], ['birch', false]])
    expect(shape(rank([makeEstimate('alder', 3180), makeEstimate('birch', 3000)]))).toEqual([['alder', false], ['birch', false]])
    // the same difference known better, though each of the two is as unsure as before
    const close = { lnSd: 0.02 }
    expect(shape(rank([makeEstimate('alder', 3090, close), makeEstimate('birch', 3000, close)], 0.0096))).toEqual([['alder', false], ['birch', false]])
  })

  it('are judged on the lower row\'s worst seabed', () => {
    // alder's worst is mud, birch's is sand: on sand the two are a coin-toss, on mud birch is twice as good
    const twoSeabeds = makeFit([
      makeSeabedFit('loose-sand', [makeEstimate('alder', 3090), makeEstimate('birch', 3000)]),
      makeSeabedFit('firm-mud', [makeEstimate('alder', 3050), makeEstimate('birch', 6100)]),
    ])
    const plan = makePlan({ seabeds: [{ seabed: 'loose-sand', share: 0.5 }, { seabed: 'firm-mud', share: 0.5 }] })
    const { rows } = rankDesigns(plan, [makeDesign('alder'), makeDesign('birch')], twoSeabeds)
    expect(rows.map(({ design, worst, tiedWithNext }) => [design, worst?.seabed, tiedWithNext])).toEqual([['alder', 'firm-mud', true], ['birch', 'loose-sand', false]])
  })

  it('bracket rows at the same cap, and not at caps far apart', () => {
    const at = (design: string, median: number, most: number) => makeEstimate(design, median, { mostShown15KgN: most })
    expect(shape(rank([at('alder', 9000, 2000), at('birch', 5000, 2000)]))).toEqual([['alder', true], ['birch', false]])
    expect(shape(rank([at('alder', 9000, 2600), at('birch', 5000, 2000)]))).toEqual([['alder', false], ['birch', false]])
  })

  it('bracket rows that both hold past 64 kn', () => {
    expect(shape(rank([makeEstimate('alder', 90_000), makeEstimate('birch', 60_000)]))).toEqual([['alder', true], ['birch', false]])
  })

  it('run on through neighbours, so that a bracket is one unbroken run of rows', () => {
    const answer = rank([makeEstimate('alder', 3180), makeEstimate('birch', 3090), makeEstimate('cedar', 3000), makeEstimate('elm', 1000)])
    expect(shape(answer)).toEqual([['alder', true], ['birch', true], ['cedar', false], ['elm', false]])
    const [first, , third] = answer.rows
    // the ends of the run need not be tied themselves
    expect(areTied([], first as RankedRow, third as RankedRow)).toBe(false)
    expect(answer.rows[answer.rows.length - 1]?.tiedWithNext).toBe(false)
  })
})

describe('holding winds', () => {
  it('put not even in calm last and past 64 kn first', () => {
    const estimates = [makeEstimate('alder', 1), makeEstimate('birch', 90_000), makeEstimate('cedar', 3000)]
    const seabed = makeSeabedFit('loose-sand', estimates)
    const { rows } = rankDesigns(makePlan({ currentMs: 1 }), estimates.map(({ design }) => makeDesign(design)), makeFit([seabed]))
    expect(rows.map(({ design }) => design)).toEqual(['birch', 'cedar', 'alder'])
    expect(rows[0]?.worst?.holdingWind).toEqual({ reason: 'beyond64kn' })
    expect(rows[2]?.worst?.holdingWind).toEqual({ reason: 'doesNotReach' })
    expect(rows[2]?.seabeds[0]?.tableWindMs).toBeNull()
    expect(rows[2]?.reason).toMatch(/chance of less than 1 %/)
  })

  it('are nothing where no pull held anything', () => {
    const { rows } = rank([makeEstimate('alder', 5000, { mostShown15KgN: 0 })])
    expect(rows[0]?.worst?.holdingWind).toEqual({ meanMs: 0, gustMs: 0, atLeast: true })
  })

  it('stop where the rode stops bounding the surge', () => {
    const seabed = makeSeabedFit('loose-sand', [makeEstimate('alder', 500_000)])
    const thin = { chain: { lengthM: 45, diameterMm: 10 }, snubber: { lengthM: 2, diameterMm: 10, construction: 'nylon3Strand' as const } }
    const plan = (speedMs: number) => makePlan({ rode: thin, swell: 'open', wind: { speedMs, kind: 'gust' } })
    const ranked = (speedMs: number) => rankDesigns(plan(speedMs), [makeDesign('alder')], makeFit([seabed]))
    const wind = ranked(5).rows[0]?.worst?.holdingWind
    const gustMs = wind !== undefined && 'gustMs' in wind ? wind.gustMs : Number.NaN
    expect(gustMs).toBeLessThan(64 * KN_MS)
    expect(ranked(gustMs - 0.01).rows[0]?.seabeds[0]?.chance).toBeGreaterThan(0.99)
    expect(ranked(gustMs + 0.01).rows).toEqual([])
  })
})

describe('the chance on a rode hardly longer than the height', () => {
  // 48 m of chain to a height of 40 m, 9 N per square of the wind in m/s: between 5 and 6 m/s the shank goes past 25 degrees
  const seabed = makeSeabedFit('loose-sand', [makeEstimate('alder', Math.exp(6))])
  const chanceAt = (speedMs: number) => rankDesigns(makePlan({
    boat: { type: 'sailMonohull', lengthM: 10, beamM: 3, bowHeightM: 1, windage: [{ part: 'all', areaM2: 9 / 0.6125, dragCoefficient: 1 }] },
    wind: { speedMs, kind: 'gust', sheerDeg: 0 },
    rode: { chain: { lengthM: 48, submergedWeightNPerM: 18 } },
    depthM: 39,
    massKg: 15,
  }), [makeDesign('alder')], makeFit([seabed], { sigma: 0.158 })).rows[0]?.seabeds[0]?.chance ?? Number.NaN

  it('does not rise with the wind, though the formula alone would there', () => {
    const formulaAt = (speedMs: number) => {
      const loadN = 9 * speedMs ** 2
      const { shankAngleRad } = solveRode({ heightM: 40, horizontalLoadN: loadN, chain: { lengthM: 48, weightNPerM: 18 } })
      return normalCdf(holdingScore({ mean: 6, variance: 0.01 }, demandPoint(loadN, shankAngleRad), 0.15))
    }
    const winds = Array.from({ length: 17 }, (_, i) => 4 + i / 4)
    expect(winds.some((wind, i) => i > 0 && formulaAt(wind) > 0.01 && formulaAt(wind) > formulaAt(winds[i - 1] ?? 0))).toBe(true)
    winds.forEach((wind, i) => expect(chanceAt(wind)).toBeLessThanOrEqual(chanceAt(winds[i - 1] ?? wind) + 1e-6))
    expect(chanceAt(4)).toBeCloseTo(formulaAt(4), 4)
  })
})

describe('judgeOwn', () => {
  const context = { target: 0.9, mix: [{ seabed: 'loose-sand' as const, share: 1, fit: makeSeabedFit('loose-sand', []) }] }

  it('turns at the target and at one half', () => {
    const at = (chanceWorst: number | null, ranked = true) => judgeOwn(context, { ranked, chanceWorst })
    expect([at(0.9), at(0.8999), at(0.5), at(0.4999)]).toEqual(['holds', 'marginal', 'marginal', 'doesNotHold'])
    expect([at(0.99, false), at(null)]).toEqual(['notTested', 'notTested'])
  })

  it('is not tested where more than half of the mix has no number', () => {
    const rock = { seabed: 'rock' as const, share: 0.6, fit: null }
    expect(judgeOwn({ target: 0.9, mix: [rock] }, { ranked: true, chanceWorst: 0.99 })).toBe('notTested')
  })
})
