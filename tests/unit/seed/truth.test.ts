import { describe, expect, it } from 'vitest'
import { designs } from '../../../seed/world/designs'
import { modifications } from '../../../seed/world/truth/modifications'
import { anchorDaySd, pulledSeabeds, pullSd, statedRangeKn, statedRangeLightAlloySoftMudKn } from '../../../seed/world/truth/holding'
import {
  trueFirstTryShare, trueExponent, trueLnMedian, trueModificationRatio, trueNeverSetShare, trueTemper, truth,
} from '../../../seed/world/truth'

// The ranges below are the scenario's (magnitudes are common practice, no source).
describe('true values of the demo world', () => {
  it.each(pulledSeabeds)('has medians at 20 kg inside the stated range on %s', (seabed) => {
    for (const { slug, family } of designs) {
      const ownRange = seabed === 'soft-mud' && family === 'light-alloy-pivoting-fluke'
      const [low, high] = ownRange ? statedRangeLightAlloySoftMudKn : statedRangeKn[seabed]
      const medianKn = Math.exp(trueLnMedian(slug, seabed, 20)) / 1000
      expect(medianKn, slug).toBeGreaterThanOrEqual(low - 1e-9)
      expect(medianKn, slug).toBeLessThanOrEqual(high + 1e-9)
    }
  })

  it('writes down the ranges of the scenario', () => {
    expect(statedRangeKn).toEqual({
      'soft-mud': [0.9, 2.2], 'firm-mud': [2, 6], 'stiff-clay': [3, 9], 'sandy-mud': [1.5, 7], 'loose-sand': [1.1, 8],
      'hard-sand': [4, 12], 'gravel': [0.8, 3], 'cobble-over-sand': [0.6, 1.5], 'weed-over-sand': [0.5, 2.5],
    })
    expect(statedRangeLightAlloySoftMudKn).toEqual([2.5, 5])
  })

  it('has never-set shares of 0.20 to 0.50 on hard sand and 0.40 to 0.70 on weed over sand', () => {
    for (const { slug } of designs) {
      expect(trueNeverSetShare(slug, 'hard-sand')).toBeGreaterThanOrEqual(0.2)
      expect(trueNeverSetShare(slug, 'hard-sand')).toBeLessThanOrEqual(0.5)
      expect(trueNeverSetShare(slug, 'weed-over-sand')).toBeGreaterThanOrEqual(0.4)
      expect(trueNeverSetShare(slug, 'weed-over-sand')).toBeLessThanOrEqual(0.7)
    }
  })

  it('has sds of 0.30 to 0.40 between pulls and 0.2 between anchor-days', () => {
    for (const sd of Object.values(pullSd)) {
      expect(sd).toBeGreaterThanOrEqual(0.3)
      expect(sd).toBeLessThanOrEqual(0.4)
    }
    expect(anchorDaySd).toBe(0.2)
  })

  it('scales mass by an exponent within 0.1 of the published one (UFC 4-159-03 tables 5-3 and 5-4, memory)', () => {
    const published = { 'soft-mud': 0.92, 'firm-mud': 0.92, 'sandy-mud': 0.86 } as Record<string, number>
    for (const seabed of pulledSeabeds) {
      expect(Math.abs(trueExponent(seabed) - (published[seabed] ?? 0.8))).toBeLessThanOrEqual(0.1)
      const doubled = trueLnMedian('ulvesk', seabed, 30) - trueLnMedian('ulvesk', seabed, 15)
      expect(doubled).toBeCloseTo(trueExponent(seabed) * Math.log(2), 12)
      expect(truth.lnMedian15Kg.ulvesk?.[seabed]).toBe(trueLnMedian('ulvesk', seabed, 15))
    }
  })

  it('has a truth for every design on every pulled seabed, pulled there or not', () => {
    expect(Object.keys(truth.lnMedian15Kg).sort()).toEqual(designs.map(d => d.slug).sort())
    for (const row of Object.values(truth.lnMedian15Kg)) expect(Object.values(row).every(Number.isFinite)).toBe(true)
  })

  it('has one modification that makes no difference and one that harms on mud and sand', () => {
    expect(modifications).toHaveLength(4)
    expect(truth.modificationSeabeds.map(s => trueModificationRatio('flukes-painted', s))).toEqual([1, 1, 1, 1])
    expect(trueModificationRatio('shank-edge-blunted', 'firm-mud')).toBeLessThan(0.87)
    expect(trueModificationRatio('shank-edge-blunted', 'gravel')).toBe(1)
  })

  it('keeps every share inside 0 to 1', () => {
    for (const { slug, family } of designs) {
      for (const seabed of pulledSeabeds) {
        const { resetShare, veerStaysShare, veerResetsShare } = trueTemper(family, seabed)
        for (const share of [trueFirstTryShare(slug, seabed), resetShare, veerStaysShare, veerResetsShare]) {
          expect(share).toBeGreaterThan(0)
          expect(share).toBeLessThan(1)
        }
      }
    }
  })

  it('refuses what it does not know', () => {
    expect(() => trueLnMedian('nowhere', 'gravel', 15)).toThrow(/design must be one of/)
    expect(() => trueLnMedian('ulvesk', 'gravel', 0)).toThrow(/massKg must be over 0/)
    expect(() => trueModificationRatio('gilded', 'gravel')).toThrow(RangeError)
    expect(() => trueTemper('grapnel', 'gravel')).toThrow(RangeError)
  })
})
