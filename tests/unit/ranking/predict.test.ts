import { describe, expect, it } from 'vitest'
import { lnDifference, massFactor, predictAt, predictLnHolding } from '#shared/holding/predict'
import { makeCovariance, makeEstimate, makeSeabedFit } from '../../factories/fit'

const designs = [makeEstimate('alder', 3000), makeEstimate('birch', 2000)]
const fit = makeSeabedFit('loose-sand', designs, { covariance: makeCovariance([0.1, 0.2], 0.04, 0.08, 0.003), betaMean: 0.05 })

describe('predictLnHolding', () => {
  it('is the estimate itself at 15 kg', () => {
    const { mean, variance } = predictLnHolding(fit, 'alder', 15)
    expect(mean).toBeCloseTo(Math.log(3000), 12)
    expect(variance).toBeCloseTo(0.04 + 0.01, 12)
  })

  it('scales with mass by b + beta, and carries beta\'s variance and covariance', () => {
    const x = Math.log(2)
    const { mean, variance } = predictLnHolding(fit, 'birch', 30)
    expect(mean).toBeCloseTo(Math.log(2000) + 0.85 * x, 12)
    expect(variance).toBeCloseTo(0.04 + 0.04 + 2 * x * 0.003 + x * x * 0.0064, 12)
  })

  it('doubles the mass to 1.7411 times the holding on hard soils: UFC 4-159-03 eq. 26, b 0.80', () => {
    expect(massFactor(makeSeabedFit('loose-sand', designs), 30)).toBeCloseTo(1.7411, 4)
  })

  it('refuses masses and designs it cannot know', () => {
    expect(() => predictLnHolding(fit, 'alder', 0)).toThrow(/mass must be more than 0 kg, got 0/)
    expect(() => predictLnHolding(fit, 'alder', Number.NaN)).toThrow(RangeError)
    expect(() => predictLnHolding(fit, 'cedar', 15)).toThrow(/got cedar/)
    expect(() => predictAt(fit, 2, 15)).toThrow(RangeError)
    expect(() => predictAt({ ...fit, covariance: [1] }, 1, 15)).toThrow(/covariance of loose-sand must hold 9 numbers, got 1/)
  })
})

describe('lnDifference', () => {
  it('drops what both designs share', () => {
    const { mean, variance } = lnDifference(fit, 0, 1)
    expect(mean).toBeCloseTo(Math.log(1.5), 12)
    expect(variance).toBeCloseTo(0.01 + 0.04, 12)
    expect(() => lnDifference(fit, 0, 5)).toThrow(RangeError)
  })
})
