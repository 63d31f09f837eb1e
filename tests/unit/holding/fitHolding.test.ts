import { describe, expect, it } from 'vitest'
import { fitHolding } from '#shared/holding/fitHolding'
import type { HoldingFit, PullRecord } from '#shared/types/holding'
import { simulateCampaign } from '../../factories/campaign'
import { pull } from '../../factories/pull'
import { randomNumbers } from '../../factories/randomNumbers'

const small = simulateCampaign({
  seed: 7, designs: 5, families: 3, seabeds: ['firm-mud', 'loose-sand'], trialsPerSeabed: 4, designsPerTrial: 3, pullsPerDay: 2,
  modifiedShare: 0.2, neverSetShare: 0.1, massesKg: [10, 20],
}).pulls

const of = (fit: HoldingFit, seabed: string, design: string) =>
  fit.seabeds.find(one => one.seabed === seabed)!.designs.find(one => one.design === design)!

describe('the holding fit', () => {
  const fit = fitHolding(small)

  it('gives the same bytes whatever the order of the pulls', () => {
    const random = randomNumbers(3)
    const shuffled = small.map(one => ({ one, key: random.uniform() })).sort((a, b) => a.key - b.key).map(({ one }) => one)
    expect(JSON.stringify(fitHolding(shuffled))).toBe(JSON.stringify(fit))
  })

  it('scales its estimates by k when all loads are scaled by k', () => {
    const k = 3.7
    const scaled = fitHolding(small.map(one => ({ ...one, heldN: one.heldN * k, movedN: one.movedN === null ? null : one.movedN * k })))
    expect(scaled.sigma).toBeCloseTo(fit.sigma, 8)
    fit.seabeds.forEach((seabed, s) => seabed.designs.forEach((design, d) => {
      const other = scaled.seabeds[s]!.designs[d]!
      expect(other.lnMean15Kg - design.lnMean15Kg).toBeCloseTo(Math.log(k), 8)
      expect(other.lnSd).toBeCloseTo(design.lnSd, 8)
    }))
  })

  it('has every design on every seabed with pulls, wider where nobody pulled it', () => {
    const names = [...new Set(small.map(one => one.design))].sort()
    for (const seabed of fit.seabeds) expect(seabed.designs.map(one => one.design)).toEqual(names)
    const all = fit.seabeds.flatMap(seabed => seabed.designs)
    const extra = fitHolding([...small, pull({ trial: 'elsewhere', design: 'new', family: 'grapnel', seabed: 'loose-sand' })])
    const never = of(extra, 'firm-mud', 'new')
    expect(never).toMatchObject({ pulls: 0, days: 0, atLimit: 0, massRangeKg: null, mostShown15KgN: null, setShare: null })
    expect(never.lnSd).toBeGreaterThan(Math.max(...all.filter(one => one.pulls > 2).map(one => one.lnSd)))
  })

  it('has a covariance that agrees with the sds, symmetric, beta last', () => {
    for (const { designs, covariance } of fit.seabeds) {
      const size = designs.length + 1
      expect(covariance).toHaveLength(size * size)
      designs.forEach((design, i) => {
        expect(Math.sqrt(covariance[i * size + i]!)).toBeCloseTo(design.lnSd, 12)
        designs.forEach((_, j) => expect(covariance[i * size + j]).toBe(covariance[j * size + i]))
      })
      expect(Math.sqrt(covariance[size * size - 1]!)).toBeLessThan(0.11)
    }
  })

  it('gives wider intervals to five pulls on one day than to five days of one pull', () => {
    const loads = [900, 1100, 1300, 1000, 1200]
    const at = (trial: (i: number) => string, design: string): PullRecord[] =>
      loads.map((heldN, i) => pull({ trial: trial(i), design, heldN, movedN: heldN * 1.1 }))
    const both = fitHolding([...small, ...at(() => 'one-day', 'one'), ...at(i => `day-${i}`, 'five')])
    const [one, five] = [of(both, 'loose-sand', 'one'), of(both, 'loose-sand', 'five')]
    expect(one).toMatchObject({ pulls: 5, days: 1 })
    expect(five).toMatchObject({ pulls: 5, days: 5 })
    expect(one.lnSd).toBeGreaterThan(five.lnSd * 1.1)
  })

  it('names its data, model and refuses to say anything of nothing', () => {
    expect(fit.dataHash).toMatch(/^[0-9a-f]{64}$/)
    expect(fit.modelVersion).toBe('holding-1')
    expect(() => fitHolding([])).toThrow(/pulls that set must be at least 1, got 0/)
    expect(() => fitHolding([pull({ set: false })])).toThrow(RangeError)
  })
})

describe('what stands beside an estimate', () => {
  it('counts pulls, days, limits, masses and the most that any pull showed', () => {
    const fit = fitHolding([
      pull({ massKg: 30, heldN: 4000, movedN: null, shankAngleDeg: 5 }), pull({ heldN: 2000, movedN: 2200 }), pull({ trial: 't2', heldN: 500, movedN: 600 }),
      pull({ trial: 't2', heldN: 100, movedN: 200, fresh: false }), pull({ trial: 't2', set: false, heldN: 0 }),
    ])
    const one = of(fit, 'loose-sand', 'd1')
    expect(one).toMatchObject({ pulls: 3, days: 2, atLimit: 1, massRangeKg: [15, 30] })
    // held/r at 5 degrees (0.75), from 30 to 15 kg by the hard-soil exponent 0.80
    expect(one.mostShown15KgN).toBeCloseTo(4000 / 0.75 * 0.5 ** (0.8 + fit.seabeds[0]!.betaMean), 8)
  })

  it('counts the shares that set, reset and kept through a veer', () => {
    const one = of(fitHolding([
      pull({ after: 'reset' }), pull({ after: 'didNotReset', veer: 'stayedBuried' }), pull({ setting: 'setAfterDragging', veer: 'brokeOutAndReset' }),
      pull({ set: false, heldN: 0 }), pull({ setting: 'fouled' }), pull({ fresh: false, after: 'reset', veer: 'brokeOutAndDidNotReset' }),
    ]), 'loose-sand', 'd1')
    expect(one.setShare!.n).toBe(4)
    expect(one.setShare!.mean).toBeCloseTo(0.5, 10)
    expect(one.resetShare!.n).toBe(2)
    expect(one.veerShare!.n).toBe(2)
    expect(one.veerShare!.mean).toBeGreaterThan(0.6)
  })
})
