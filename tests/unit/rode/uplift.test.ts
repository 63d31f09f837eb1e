import { describe, expect, it } from 'vitest'
import { upliftFactor, upliftSd } from '#shared/rode/uplift'

const rad = (deg: number) => deg * Math.PI / 180

describe('uplift factor', () => {
  // 5 deg: a seamanship text's 75 %; 10 and 15 deg: Navy practice (memory) 60 and 41 %, the lower of the two series.
  it.each([[0, 1], [5, 0.75], [10, 0.6], [15, 0.41]])('at %s deg is the lower published share %s', (deg, share) => {
    expect(upliftFactor(rad(deg))).toBeCloseTo(share, 12)
  })

  // Our own line past the published range.
  it.each([[2.5, 0.875], [20, 0.255], [25, 0.1], [40, 0.1], [90, 0.1]])('at %s deg is our line %s', (deg, share) => {
    expect(upliftFactor(rad(deg))).toBeCloseTo(share, 12)
  })

  it('never rises with the angle', () => {
    for (let deg = 0; deg < 90; deg += 0.25) {
      expect(upliftFactor(rad(deg + 0.25))).toBeLessThanOrEqual(upliftFactor(rad(deg)))
    }
  })

  it('is certain for a flat pull and less so with the angle', () => {
    expect(upliftSd(0)).toBe(0)
    expect(upliftSd(rad(2.5))).toBeCloseTo(0.05 / 0.875, 12)
    expect(upliftSd(rad(5))).toBeCloseTo(0.1 / 0.75, 12)
    expect(upliftSd(rad(15))).toBeCloseTo(0.1 / 0.41, 12)
  })

  it.each([-0.01, 2, Number.NaN, Number.POSITIVE_INFINITY])('refuses an angle of %s', (angle) => {
    expect(() => upliftFactor(angle)).toThrow(RangeError)
    expect(() => upliftSd(angle)).toThrow(/shank angle/)
  })
})
