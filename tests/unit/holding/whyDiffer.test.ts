import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { partsOfDifference, whyDiffer } from '#shared/holding/whyDiffer'
import type { PullRecord } from '#shared/types/holding'

const pull = (heldN: number, movedN: number | null, more: Partial<PullRecord> = {}): PullRecord => ({
  trial: 't', design: 'd', family: 'claw', massKg: 15, seabed: 'loose-sand', set: true, heldN, movedN, shankAngleDeg: 0, ...more,
})
const never = pull(0, null, { set: false, setting: 'neverSet' })

describe('partsOfDifference', () => {
  it('adds up to the whole, whatever the pulls', () => {
    const pulls = fc.array(fc.record({
      heldN: fc.integer({ min: 1, max: 5000 }), stepN: fc.integer({ min: 1, max: 500 }), limit: fc.boolean(), angle: fc.integer({ min: 0, max: 20 }), fresh: fc.boolean(),
    }), { minLength: 1, maxLength: 12 })
    fc.assert(fc.property(pulls, fc.integer({ min: 10, max: 20_000 }), (list, estimateN) => {
      const records = list.map(({ heldN, stepN, limit, angle, fresh }) => pull(heldN, limit ? null : heldN + stepN, { shankAngleDeg: angle, fresh }))
      const parts = partsOfDifference(records, estimateN)
      const alone = records.filter(({ fresh }) => fresh)
      expect(parts === null).toBe(alone.length === 0)
      if (!parts) return
      const mean = list.reduce((sum, { heldN }) => sum + heldN, 0) / list.length
      expect(parts.reduce((sum, { lnRatio }) => sum + lnRatio, 0)).toBeCloseTo(Math.log(estimateN / mean), 9)
    }))
  })

  it('is worked by hand', () => {
    // held 1000 and a failure: plain mean 500; without the failure 1000; the middle of 1000 to 1440 is 1200; flat.
    const parts = Object.fromEntries((partsOfDifference([pull(1000, 1440), never], 1200) ?? []).map(({ cause, lnRatio }) => [cause, lnRatio]))
    expect(parts.failures).toBeCloseTo(Math.log(2), 12)
    expect(parts.steps).toBeCloseTo(Math.log(1.2), 12)
    for (const cause of ['later', 'angle', 'spread', 'others']) expect(parts[cause]).toBeCloseTo(0, 12)
  })

  it('has no way from nothing', () => {
    expect(partsOfDifference([never], 1000)).toBeNull()
    expect(partsOfDifference([pull(0, 200)], 1000)).toBeNull()
    expect(partsOfDifference([], 1000)).toBeNull()
  })
})

describe('whyDiffer', () => {
  const of = (pulls: PullRecord[], estimateN: number | null, fitted = pulls.length) => whyDiffer(pulls, estimateN, fitted)

  it.each([
    ['failures', [pull(1000, 1100), never, never], 1050, /higher.*2 pulls that never set as 0/],
    ['steps', [pull(500, 1000), pull(500, 1000)], 707, /higher.*holding lies between/],
    ['the angle', [pull(1000, 1001, { shankAngleDeg: 10 })], 1667, /higher.*lifted the shank/],
    ['the limit', [pull(4500, null), pull(4500, null), pull(4000, 4500)], 6500, /higher.*2 pulls ended at the rig's limit/],
    ['the spread', [pull(100, 110), pull(4000, 4100)], 650, /lower.*highest pulls/],
    ['pulls after a breakout', [pull(2000, 2100), pull(100, 110, { fresh: false })], 2050, /higher.*one pull made after a breakout/],
    ['few pulls', [pull(1000, 1100)], 2500, /higher.*so few pulls/],
    ['nothing', [pull(1000, 1100), pull(1100, 1200)], 1100, /agree within a tenth/],
    ['no holding at all', [never], 900, /Nothing was held/],
  ])('names %s', (_, pulls, estimateN, words) => {
    const said = of(pulls, estimateN)
    expect(said).toMatch(words)
    expect(said.match(/[.](?:\s|$)/g)).toHaveLength(1)
  })

  it('names other pulls where the fit had them', () => {
    expect(of([pull(1000, 1100)], 2500, 9)).toMatch(/also hears 8 other pulls/)
  })

  it('never blames the limit for a lower estimate', () => {
    expect(of([pull(4500, null), pull(4500, null)], 3000, 12)).toMatch(/lower.*10 other pulls/)
  })

  it('says so where there is no estimate', () => {
    expect(of([pull(1000, 1100)], null)).toBe('There is no estimate to set beside it.')
  })
})
