import { describe, expect, it } from 'vitest'
import { predictAt } from '#shared/holding/predict'
import { anchoringVariance, holdingScore } from '#shared/ranking/chance'
import { modificationWorth } from '#shared/ranking/modificationWorth'
import { planGround } from '#shared/ranking/plan'
import { planDemand } from '#shared/ranking/planDemand'
import { normalCdf } from '#shared/stats/normal'
import type { ModificationEstimate } from '#shared/types/holding'
import type { RankingRequest } from '#shared/types/ranking'
import { KN_MS } from '#shared/units/constants'
import { makeEstimate, makeFit, makeSeabedFit } from '../../factories/fit'
import { makePlan } from '../../factories/plan'

const mud = makeSeabedFit('firm-mud', [makeEstimate('birch', 5000), makeEstimate('alder', 3000)], { exponent: 0.92, betaMean: 0.03 })
const fit = makeFit([mud])

const tried = (ratio: number, lnSd = 0.1): ModificationEstimate =>
  ({ design: 'alder', modification: 'edge', seabed: 'firm-mud', lnRatio: Math.log(ratio), lnSd, pulls: 12, pairs: 9, verdict: 'worse' })
/** So much chain that the pull lies flat at any wind here. */
const flat = (more: Partial<RankingRequest> = {}) => makePlan({ rode: { chain: { lengthM: 200, diameterMm: 10 } }, ...more })
const worth = (ratio: number, plan = flat(), lnSd?: number) => modificationWorth([tried(ratio, lnSd)], plan, fit).seabeds[0]!

describe('what a modification is worth', () => {
  it('in newtons is the ratio, at the unmodified anchor\'s best estimate', () => {
    const { unmodifiedN, changeN } = worth(0.6)
    const medianN = 3000 * (20 / 15) ** 0.95
    expect(unmodifiedN.median).toBeCloseTo(medianN, 6)
    expect(changeN.median).toBeCloseTo(-0.4 * medianN, 6)
    // the ratio's 90 % interval: 0.6 exp(-/+ 1.6449 x 0.1)
    expect(changeN.low90).toBeCloseTo((0.6 * Math.exp(-0.164485) - 1) * medianN, 1)
    expect(changeN.high90).toBeCloseTo((0.6 * Math.exp(0.164485) - 1) * medianN, 1)
  })

  it('in wind is how far the wind moves at which nine of ten hold', () => {
    const plan = flat()
    const demand = planDemand(plan, planGround(plan))!
    const { unmodifiedWind, changeMs } = worth(0.6, plan)
    const before = unmodifiedWind !== null && 'gustMs' in unmodifiedWind ? unmodifiedWind.gustMs : Number.NaN
    const { mean, variance } = predictAt(mud, 1, 20)
    for (const [change, ratio] of [[changeMs!.gust.median, 0.6], [changeMs!.gust.high90, 0.6 * Math.exp(0.16448536)], [0, 1]] as const) {
      const point = demand.surveyByGust.at(before + change)
      const chance = normalCdf(holdingScore({ mean: mean + Math.log(ratio), variance }, point, anchoringVariance(fit.sigma, fit.sds)))
      expect(chance).toBeCloseTo(0.9, 5)
    }
    expect(changeMs!.mean.median).toBeCloseTo(changeMs!.gust.median / demand.gustFactor, 9)
    // on a flat pull without current the load goes with the square of the wind: sqrt(0.6) of it is left
    expect((before + changeMs!.gust.median) / before).toBeCloseTo(Math.sqrt(0.6), 4)
  })

  it('as a mass is the unmodified anchor that would hold as much', () => {
    const { sameAsKg } = worth(1.3)
    expect(predictAt(mud, 1, sameAsKg.median).mean - predictAt(mud, 1, 20).mean).toBeCloseTo(Math.log(1.3), 9)
    expect(worth(0.6).sameAsKg.median).toBeLessThan(20)
  })

  it('is nothing at a ratio of 1, and rises with the ratio in all three', () => {
    const none = worth(1)
    expect(none.changeN.median).toBeCloseTo(0, 9)
    expect(none.changeMs!.gust.median).toBeCloseTo(0, 6)
    expect(none.sameAsKg.median).toBeCloseTo(20, 9)
    const rising = [0.5, 0.8, 1, 1.2, 1.5].map(ratio => worth(ratio))
    rising.slice(1).forEach((entry, i) => {
      expect(entry.changeN.median).toBeGreaterThan(rising[i]!.changeN.median)
      expect(entry.changeMs!.gust.median).toBeGreaterThan(rising[i]!.changeMs!.gust.median)
      expect(entry.sameAsKg.median).toBeGreaterThan(rising[i]!.sameAsKg.median)
    })
    for (const { changeN, changeMs } of rising) {
      expect(changeN.low90 < changeN.median && changeN.median < changeN.high90).toBe(true)
      expect(changeMs!.gust.low90 < changeMs!.gust.median && changeMs!.gust.median < changeMs!.gust.high90).toBe(true)
    }
  })

  it('goes past what the pulls showed where the unmodified anchor\'s own wind is capped there', () => {
    const capped = makeFit([makeSeabedFit('firm-mud', [makeEstimate('alder', 3000, { mostShown15KgN: 800 })])])
    const [entry] = modificationWorth([tried(1.3)], flat(), capped).seabeds
    expect(entry?.unmodifiedWind).toMatchObject({ atLeast: true })
    expect(entry?.changeMs?.gust.median).toBeGreaterThan(1)
  })

  it('counts winds past 64 kn as 64 kn, and says so', () => {
    const strong = makeFit([makeSeabedFit('firm-mud', [makeEstimate('alder', 90_000)])])
    const [entry] = modificationWorth([tried(0.9)], flat(), strong).seabeds
    expect(entry?.unmodifiedWind).toEqual({ reason: 'beyond64kn' })
    expect(entry?.changeMs).toMatchObject({ capped: true, gust: { median: 0 } })
    expect(worth(0.9).changeMs?.capped).toBe(false)
  })

  it('takes what the rode\'s angle leaves', () => {
    const short = makePlan({ rode: { chain: { lengthM: 20, diameterMm: 10 } }, wind: { speedMs: 35 * KN_MS, kind: 'gust' } })
    const lifted = modificationWorth([tried(0.6)], short, fit)
    expect(lifted.upliftFactor).toBeLessThan(0.9)
    expect(lifted.seabeds[0]?.unmodifiedN.median).toBeCloseTo(worth(0.6).unmodifiedN.median * lifted.upliftFactor!, 6)
  })

  it('has no wind where the rode cannot bound the load, and nothing of a design that the fit does not know', () => {
    const bare = flat({ swell: 'open', rode: { chain: { lengthM: 30, diameterMm: 10 } } })
    const answer = modificationWorth([tried(0.6), { ...tried(0.6), design: 'oak' }, { ...tried(0.6), seabed: 'gravel' }], bare, fit)
    expect(answer.loadN).toBeNull()
    expect(answer.seabeds).toHaveLength(1)
    expect(answer.seabeds[0]).toMatchObject({ unmodifiedWind: null, changeMs: null })
  })
})
