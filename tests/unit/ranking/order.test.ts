import { describe, expect, it } from 'vitest'
import { areTied } from '#shared/ranking/order'
import { rankDesigns } from '#shared/ranking/rank'
import { judgeOwn } from '#shared/ranking/verdict'
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
