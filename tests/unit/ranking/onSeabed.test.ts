import { describe, expect, it } from 'vitest'
import { predictLnHolding } from '#shared/holding/predict'
import { tickAt } from '#shared/holding/tick'
import { orderOnSeabed } from '#shared/ranking/onSeabed'
import type { DesignEstimate, SeabedFit } from '#shared/types/holding'

const design = (slug: string, lnMean15Kg: number, pulls = 8, days = 3): DesignEstimate => ({
  design: slug, family: 'claw', lnMean15Kg, lnSd: 0.1, pulls, days, atLimit: 0, massRangeKg: pulls ? [10, 20] : null, mostShown15KgN: null, setShare: null, resetShare: null, veerShare: null,
})

/** Each design's own variance 0.01, all of them sharing 0.009 of it; beta of sd 0.1, unrelated. */
function seabed(designs: DesignEstimate[], shared = 0.009): SeabedFit {
  const n = designs.length
  const covariance = Array.from({ length: (n + 1) ** 2 }, (_, i) => {
    const [row, column] = [Math.floor(i / (n + 1)), i % (n + 1)]
    if (row === n || column === n) return row === column ? 0.01 : 0
    return row === column ? 0.01 : shared
  })
  return { seabed: 'loose-sand', exponent: 0.8, betaMean: 0.02, designs, covariance }
}
const catalogue = ['a', 'b', 'c', 'd', 'e'].map(slug => ({ slug, name: slug.toUpperCase(), family: 'claw' as const, sizesKg: [15] }))

describe('orderOnSeabed', () => {
  it('orders by median, and joins neighbours by their joint covariance, not by two separate intervals', () => {
    // difference 0.05: its sd is sqrt(2 (0.01 - shared)); 0.0447 with 0.009 shared (Pr 0.87), 0.1414 with none (Pr 0.64): normal table
    const list = [design('b', 8.05), design('a', 8)]
    expect(orderOnSeabed(seabed(list), catalogue, 15).ranked.map(({ design: slug, tiedWithNext, rank }) => [slug, tiedWithNext, rank])).toEqual([['b', false, 1], ['a', false, 2]])
    expect(orderOnSeabed(seabed(list, 0), catalogue, 15).ranked.map(({ tiedWithNext }) => tiedWithNext)).toEqual([true, false])
  })

  it('keeps thin and unpulled designs apart', () => {
    const { ranked, thin, neverPulled } = orderOnSeabed(seabed([design('a', 9, 4, 3), design('b', 8), design('c', 9.5, 12, 1), design('d', 9, 0, 0)]), catalogue, 15)
    expect(ranked.map(({ design: slug }) => slug)).toEqual(['b'])
    expect(thin.map(({ design: slug, rank }) => [slug, rank])).toEqual([['c', null], ['a', null]])
    expect(neverPulled).toBe(1)
  })

  it('says holding at the mass asked for, and from where it is scaled', () => {
    const fit = seabed([design('a', 8), design('b', 7)])
    const [row] = orderOnSeabed(fit, catalogue, 60).ranked
    const { mean, variance } = predictLnHolding(fit, 'a', 60)
    expect(row?.holdingN.median).toBeCloseTo(Math.exp(mean), 9)
    // 5 % and 95 % of a normal: 1.6449 sd
    expect(Math.log((row?.holdingN.high90 ?? 0) / (row?.holdingN.median ?? 1))).toBeCloseTo(1.6448536 * Math.sqrt(variance), 6)
    expect(row?.scaledFromKg).toBe(20)
    expect(row?.name).toBe('A')
  })

  it('refuses a mass that is none', () => {
    expect(() => orderOnSeabed(seabed([design('a', 8)]), catalogue, 0)).toThrow(RangeError)
  })
})

describe('tickAt', () => {
  const fit = seabed([design('a', 8)])
  const pull = { set: true, heldN: 1000, movedN: 1440, shankAngleDeg: 0, massKg: 15 }

  it('is the middle of the interval, by mass and by angle', () => {
    expect(tickAt(fit, pull, 15)).toEqual({ loadN: expect.closeTo(1200, 9), atLimit: false })
    expect(tickAt(fit, pull, 30)?.loadN).toBeCloseTo(1200 * 2 ** 0.82, 9)
    // the uplift factor at 5 degrees is 0.75 in the published series
    expect(tickAt(fit, { ...pull, shankAngleDeg: 5 }, 15)?.loadN).toBeCloseTo(1600, 9)
  })

  it('is what was held at the rig\'s limit', () => {
    expect(tickAt(fit, { ...pull, movedN: null }, 15)).toEqual({ loadN: expect.closeTo(1000, 9), atLimit: true })
  })

  it.each([{ set: false, setting: 'neverSet' as const }, { setting: 'fouled' as const }, { fresh: false }])('is none for %o', (more) => {
    expect(tickAt(fit, { ...pull, ...more }, 15)).toBeNull()
  })
})
