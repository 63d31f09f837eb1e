import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { linearScale, logarithmicScale, suitableScale, tickText } from '~/utils/chart/scale'

const loads = fc.array(fc.double({ min: 1e-3, max: 1e6, noNaN: true }), { minLength: 1, maxLength: 30 })

describe('the axis of a chart', () => {
  it('is logarithmic where values span more than threefold, else linear from 0', () => {
    expect(suitableScale([1, 9]).kind).toBe('log')
    expect(suitableScale([4, 5, 6])).toMatchObject({ kind: 'linear', low: 0 })
  })

  it('places a value by its logarithm: the middle of 1 to 100 is 10', () => {
    const scale = logarithmicScale(1, 100)
    expect(scale.at(10)).toBeCloseTo(50, 6)
    expect(scale.at(Math.sqrt(10)) - scale.at(1)).toBeCloseTo(scale.at(10) - scale.at(Math.sqrt(10)), 1)
  })

  it('places a value by its distance from 0 on a linear axis', () => {
    expect(linearScale(0, 10).at(2.5)).toBe(25)
  })

  it('holds every value it was made for, in order, at ticks that lie inside', () => {
    fc.assert(fc.property(loads, (values) => {
      const scale = suitableScale(values)
      const sorted = [...values].sort((a, b) => a - b)
      const places = sorted.map(scale.at)
      expect(places.every((place, index) => place >= (places[index - 1] ?? 0) && place <= 100)).toBe(true)
      expect(values.some(scale.outside)).toBe(false)
      expect(scale.ticks.length).toBeGreaterThanOrEqual(2)
      expect(scale.ticks.every(tick => tick >= scale.low && tick <= scale.high)).toBe(true)
    }))
  })

  it('puts what lies outside at its end and says so; nothing has no logarithm', () => {
    const scale = logarithmicScale(1, 10)
    expect([scale.at(0), scale.at(0.1), scale.at(1e6)]).toEqual([0, 0, 100])
    expect([scale.outside(0.1), scale.outside(2), scale.outside(1e6)]).toEqual([true, false, true])
  })

  it('stands with nothing to draw, or with one value, or with a value that is not finite', () => {
    expect(suitableScale([])).toMatchObject({ low: 0, high: 1 })
    expect(suitableScale([0, 0])).toMatchObject({ low: 0, high: 1 })
    expect(suitableScale([5, Number.POSITIVE_INFINITY, Number.NaN]).at(5)).toBeLessThanOrEqual(100)
    expect(suitableScale([5]).ticks.length).toBeGreaterThan(1)
  })

  it('writes ticks without the tail that binary fractions leave', () => {
    expect([0.1 + 0.2, 2000, 5].map(tickText)).toEqual(['0.3', '2000', '5'])
  })
})
