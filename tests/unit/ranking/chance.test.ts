import { describe, expect, it } from 'vitest'
import { normalCdf } from '#shared/stats/normal'
import { predictLnHolding } from '#shared/holding/predict'
import { anchoringVariance, demandPoint, holdingScore, loadSd, unboundedDemand } from '#shared/ranking/chance'
import { chanceHigher } from '#shared/ranking/order'
import { makeCovariance, makeEstimate, makeFit, makeSeabedFit } from '../../factories/fit'
import { randomNumbers } from '../../factories/randomNumbers'

const deg = Math.PI / 180
const fit = makeFit([])

describe('chance once set', () => {
  it('works out by hand', () => {
    // 4000 N median with sd 0.2 against 2000 N at 5 deg: r 0.75, tau_r 0.10/0.75
    // ln(4000 x 0.75 / 2000) = 0.405465; variance 0.04 + 0.09 + 0.0225 + 0.04 + 0.0625 + 0.017778 = 0.272778
    const variance = anchoringVariance(fit.sigma, fit.sds)
    expect(variance).toBeCloseTo(0.215, 12)
    const z = holdingScore({ mean: Math.log(4000), variance: 0.04 }, demandPoint(2000, 5 * deg), variance)
    expect(z).toBeCloseTo(0.405465 / Math.sqrt(0.272778), 5)
    // Phi(0.77634) = 0.78122, from a table of the normal distribution
    expect(normalCdf(z)).toBeCloseTo(0.7812, 4)
  })

  it('agrees with drawing anchorings one by one', () => {
    const { normal } = randomNumbers(20)
    const seabed = makeSeabedFit('firm-mud', [makeEstimate('alder', 2500)], { covariance: makeCovariance([0.15], 0, 0.1, 0.004) })
    const prediction = predictLnHolding(seabed, 'alder', 30)
    const angle = 7 * deg
    const loadN = 2400
    const expected = normalCdf(holdingScore(prediction, demandPoint(loadN, angle), anchoringVariance(fit.sigma, fit.sds)))
    const n = 400_000
    let held = 0
    // beta = 0.1 k, a = 0.04 k + sqrt(0.15^2 - 0.04^2) l: covariance 0.004
    const rest = Math.sqrt(0.15 ** 2 - 0.04 ** 2)
    const r = 0.75 + (0.6 - 0.75) * 2 / 5
    for (let i = 0; i < n; i++) {
      const k = normal()
      const lnHolding = Math.log(2500) + (0.8 + 0.1 * k) * Math.log(2) + 0.04 * k + rest * normal()
        + fit.sigma * normal() + fit.sds.trial * normal() + fit.sds.anchorDay * normal()
      if (lnHolding + Math.log(r) + 0.1 / r * normal() > Math.log(loadN) + loadSd * normal()) held++
    }
    expect(Math.abs(held / n - expected)).toBeLessThan(4 * Math.sqrt(0.25 / n))
  })

  it('is certain without a load and nil against a load the rode cannot bound', () => {
    const prediction = { mean: 8, variance: 0.1 }
    expect(normalCdf(holdingScore(prediction, demandPoint(0, 0), 0.2))).toBe(1)
    expect(normalCdf(holdingScore(prediction, unboundedDemand, 0.2))).toBe(0)
    expect(() => demandPoint(-1, 0)).toThrow(/load must be 0 N or more, got -1/)
    expect(() => demandPoint(Number.NaN, 0)).toThrow(RangeError)
  })
})

describe('chance that one median is the higher', () => {
  it('agrees with drawing both from their joint posterior', () => {
    const { normal } = randomNumbers(3)
    const designs = [makeEstimate('alder', 2200), makeEstimate('birch', 2000)]
    const seabed = makeSeabedFit('loose-sand', designs, { covariance: makeCovariance([0.1, 0.15], 0.3) })
    const n = 200_000
    let higher = 0
    for (let i = 0; i < n; i++) {
      const both = Math.sqrt(0.3) * normal()
      if (Math.log(2200) + both + 0.1 * normal() > Math.log(2000) + both + 0.15 * normal()) higher++
    }
    const chance = chanceHigher({ seabed: 'loose-sand', share: 1, fit: seabed }, 'alder', 'birch') ?? Number.NaN
    expect(Math.abs(higher / n - chance)).toBeLessThan(4 * Math.sqrt(0.25 / n))
    expect(chanceHigher({ seabed: 'loose-sand', share: 1, fit: seabed }, 'birch', 'alder')).toBeCloseTo(1 - chance, 12)
  })

  it('is known where nothing is uncertain, and unknown without an estimate', () => {
    const designs = [makeEstimate('alder', 2200, { lnSd: 0 }), makeEstimate('birch', 2000, { lnSd: 0 }), makeEstimate('cedar', 2000, { lnSd: 0 })]
    const entry = { seabed: 'loose-sand' as const, share: 1, fit: makeSeabedFit('loose-sand', designs) }
    expect(chanceHigher(entry, 'alder', 'birch')).toBe(1)
    expect(chanceHigher(entry, 'birch', 'alder')).toBe(0)
    expect(chanceHigher(entry, 'birch', 'cedar')).toBe(0.5)
    expect(chanceHigher(entry, 'birch', 'elm')).toBeNull()
    expect(chanceHigher({ seabed: 'rock', share: 1, fit: null }, 'birch', 'cedar')).toBeNull()
  })
})
