import { beforeAll, describe, expect, it } from 'vitest'
import { lnDifferenceAt } from '#shared/holding/difference'
import { fitHolding } from '#shared/holding/fitHolding'
import { lnDifference } from '#shared/holding/predict'
import { chanceAbove, chanceInOneTry, comparisonVerdict, ratioOf } from '#shared/ranking/compareChance'
import type { HoldingFit, SeabedFit } from '#shared/types/holding'
import { makeWorld, pullRecords } from '../../../seed/world'
import { makeEstimate, makeSeabedFit } from '../../factories/fit'
import { randomNumbers } from '../../factories/randomNumbers'

/** Lower triangle L with L L' = matrix, row-major. A witness of its own: nothing of the product is used. */
function cholesky(matrix: readonly number[], size: number): Float64Array {
  const lower = new Float64Array(size * size)
  for (let i = 0; i < size; i++) {
    for (let j = 0; j <= i; j++) {
      let sum = matrix[i * size + j]!
      for (let k = 0; k < j; k++) sum -= lower[i * size + k]! * lower[j * size + k]!
      lower[i * size + j] = i === j ? Math.sqrt(Math.max(sum, 0)) : lower[j * size + j]! > 0 ? sum / lower[j * size + j]! : 0
    }
  }
  return lower
}

interface Anchor { index: number, massKg: number }

/** Draws all medians and the exponent together from the joint covariance and counts how often the first anchor's is the higher. */
function simulate(fit: SeabedFit, pairs: readonly (readonly [Anchor, Anchor])[], draws: number, extraSd = 0): number[] {
  const size = fit.designs.length + 1
  const lower = cholesky(fit.covariance, size)
  const random = randomNumbers(7)
  const above = pairs.map(() => 0)
  const z = new Float64Array(size)
  const value = new Float64Array(size)
  for (let draw = 0; draw < draws; draw++) {
    for (let i = 0; i < size; i++) z[i] = random.normal()
    for (let i = 0; i < size; i++) {
      let sum = i < size - 1 ? fit.designs[i]!.lnMean15Kg : fit.betaMean
      for (let k = 0; k <= i; k++) sum += lower[i * size + k]! * z[k]!
      value[i] = sum
    }
    const at = ({ index, massKg }: Anchor) => value[index]! + (fit.exponent + value[size - 1]!) * Math.log(massKg / 15) + (extraSd > 0 ? extraSd * random.normal() : 0)
    pairs.forEach(([a, b], i) => {
      if (at(a) > at(b)) above[i]!++
    })
  }
  return above.map(count => count / draws)
}

let fit: HoldingFit
beforeAll(() => {
  fit = fitHolding(pullRecords(makeWorld()))
}, 60_000)

/** Pairs of designs near each other and far apart, at one mass and at two. */
const somePairs = ({ designs }: SeabedFit) => designs.slice(0, 9).flatMap((_, i) => [
  [{ index: i, massKg: 15 }, { index: (i + 5) % designs.length, massKg: 15 }],
  [{ index: i, massKg: 10 }, { index: (i + 3) % designs.length, massKg: 35 }],
  [{ index: i, massKg: 20 }, { index: (i + 1) % designs.length, massKg: 16 }],
] as [Anchor, Anchor][])

describe('the chance that one anchor holds more than another', () => {
  it('is what 100 000 draws from the joint covariance count, within 0.01', () => {
    let far = 0
    for (const seabed of ['firm-mud', 'loose-sand']) {
      const part = fit.seabeds.find(entry => entry.seabed === seabed)!
      const pairs = somePairs(part)
      const counted = simulate(part, pairs, 100_000)
      pairs.forEach(([a, b], i) => {
        const chance = chanceAbove(lnDifferenceAt(part, a, b))
        expect(Math.abs(chance - counted[i]!), `${seabed} ${a.index}/${a.massKg} ${b.index}/${b.massKg}`).toBeLessThan(0.01)
        if (chance > 0.1 && chance < 0.9) far++
      })
    }
    // Not all of them may be foregone: the test would prove nothing.
    expect(far).toBeGreaterThan(10)
  })

  it('is not what two separate intervals say', () => {
    const part = fit.seabeds.find(entry => entry.seabed === 'firm-mud')!
    const apart = part.designs.map((a, i) => part.designs.map((b, j) => {
      if (i >= j) return 0
      const separate = chanceAbove({ mean: a.lnMean15Kg - b.lnMean15Kg, variance: a.lnSd ** 2 + b.lnSd ** 2 })
      return Math.abs(separate - chanceAbove(lnDifference(part, i, j)))
    })).flat()
    expect(Math.max(...apart)).toBeGreaterThan(0.02)
  })

  it('and its opposite add up to 1', () => {
    for (const part of fit.seabeds) {
      for (const [a, b] of somePairs(part)) {
        expect(chanceAbove(lnDifferenceAt(part, a, b)) + chanceAbove(lnDifferenceAt(part, b, a))).toBeCloseTo(1, 12)
      }
    }
  })

  it('at one mass is the ranking\'s own, whatever the mass', () => {
    const part = fit.seabeds[0]!
    const [ranked, here] = [lnDifference(part, 2, 7), lnDifferenceAt(part, { index: 2, massKg: 40 }, { index: 7, massKg: 40 })]
    expect(here.mean).toBeCloseTo(ranked.mean, 12)
    expect(here.variance).toBeCloseTo(ranked.variance, 12)
  })

  it('of a design against itself is one half, and rises with its mass', () => {
    const part = fit.seabeds[0]!
    const at = (massKg: number) => chanceAbove(lnDifferenceAt(part, { index: 0, massKg }, { index: 0, massKg: 20 }))
    expect(at(20)).toBe(0.5)
    // b + beta is 0.8 or more with an sd of at most 0.10: a heavier one of the same design holds more, as good as surely.
    expect(at(25)).toBeGreaterThan(0.99)
    expect(at(16)).toBeLessThan(0.01)
  })

  it('in one try is nearer to one half, as drawn', () => {
    const part = fit.seabeds.find(entry => entry.seabed === 'loose-sand')!
    const pairs = somePairs(part).slice(0, 6)
    const extraSd = Math.sqrt(fit.sigma ** 2 + fit.sds.anchorDay ** 2)
    const counted = simulate(part, pairs, 100_000, extraSd)
    pairs.forEach(([a, b], i) => {
      const difference = lnDifferenceAt(part, a, b)
      const once = chanceInOneTry(difference, fit.sigma, fit.sds)
      expect(Math.abs(once - counted[i]!)).toBeLessThan(0.01)
      expect(Math.abs(once - 0.5)).toBeLessThanOrEqual(Math.abs(chanceAbove(difference) - 0.5))
    })
  })
})

describe('lnDifferenceAt', () => {
  it('is worked by hand: two designs, one exponent', () => {
    // C = [[.04, .01, .002], [.01, .09, -.004], [.002, -.004, .01]], b 0.8, beta 0.1, x = ln 2 and ln 1/2
    const part = makeSeabedFit('loose-sand', [makeEstimate('alder', Math.exp(8)), makeEstimate('birch', Math.exp(7.5))],
      { betaMean: 0.1, covariance: [0.04, 0.01, 0.002, 0.01, 0.09, -0.004, 0.002, -0.004, 0.01] })
    const { mean, variance } = lnDifferenceAt(part, { index: 0, massKg: 30 }, { index: 1, massKg: 7.5 })
    const ln2 = Math.LN2
    expect(mean).toBeCloseTo(0.5 + 0.9 * 2 * ln2, 12)
    // var(a - b + 2 ln2 beta) = .04 + .09 - .02 + 4 ln2^2 .01 + 4 ln2 (.002 + .004)
    expect(variance).toBeCloseTo(0.11 + 0.04 * ln2 ** 2 + 0.024 * ln2, 12)
  })

  it('refuses what is not there', () => {
    const part = makeSeabedFit('loose-sand', [makeEstimate('alder', 3000)])
    expect(() => lnDifferenceAt(part, { index: 0, massKg: 0 }, { index: 0, massKg: 15 })).toThrow(RangeError)
    expect(() => lnDifferenceAt(part, { index: 3, massKg: 15 }, { index: 0, massKg: 15 })).toThrow(RangeError)
  })
})

describe('a verdict', () => {
  const plenty = { pulls: 12, days: 4 }

  it('turns at 0.35, 0.65 and 0.9, the same both ways round', () => {
    const at = (chance: number) => comparisonVerdict(chance, plenty, plenty)
    expect([0.36, 0.5, 0.64].map(at)).toEqual(['cannotTell', 'cannotTell', 'cannotTell'])
    expect([0.65, 0.35, 0.89, 0.11].map(at)).toEqual(['moreLikely', 'moreLikely', 'moreLikely', 'moreLikely'])
    expect([0.9, 0.999, 0.1, 0.001].map(at)).toEqual(['veryLikely', 'veryLikely', 'veryLikely', 'veryLikely'])
  })

  it('needs pulls of both: 5 on 2 days', () => {
    expect(comparisonVerdict(0.99, plenty, { pulls: 4, days: 2 })).toBe('notTested')
    expect(comparisonVerdict(0.99, { pulls: 9, days: 1 }, plenty)).toBe('notTested')
    expect(comparisonVerdict(0.99, plenty, { pulls: 5, days: 2 })).toBe('veryLikely')
  })

  it('goes with a ratio whose interval is 90 %', () => {
    // ln 2 with sd 0.1: exp(0.6931 -/+ 1.6449 x 0.1)
    const { median, low90, high90 } = ratioOf({ mean: Math.LN2, variance: 0.01 })
    expect([median, low90, high90].map(value => value.toFixed(4))).toEqual(['2.0000', '1.6967', '2.3576'])
  })
})
