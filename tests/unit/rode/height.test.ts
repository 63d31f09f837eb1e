import { describe, expect, it } from 'vitest'
import { clearanceM, heightToBow, lengthForScope, scopeOf, swingRadiusM } from '#shared/rode/height'

describe('heights', () => {
  it('adds depth, rise, half the waves and the bow', () => {
    expect(heightToBow(5, 2, 1, 1.2)).toBeCloseTo(8.7, 12)
    expect(heightToBow(0, 0, 0, 0)).toBe(0)
  })

  it('shows what is left under the keel, below zero where she takes the ground', () => {
    expect(clearanceM(5, 2, 1.8)).toBeCloseTo(1.2, 12)
    expect(clearanceM(3, 2, 1.8)).toBeCloseTo(-0.8, 12)
  })

  it('swings wider at low water', () => {
    const swing = { depthM: 8, fallM: 0, bowHeightM: 1, rodeM: 40, lengthOverallM: 11 }
    expect(swingRadiusM({ ...swing, fallM: 4 })).toBeGreaterThan(swingRadiusM(swing))
    expect(swingRadiusM({ ...swing, fallM: 20 })).toBeCloseTo(11 + Math.sqrt(1600 - 1), 12)
  })

  it('refuses what is out of range, by name', () => {
    expect(() => heightToBow(-1, 0, 0, 1)).toThrow(/depthM must be from 0 to 1000, got -1/)
    expect(() => heightToBow(1, Number.NaN, 0, 1)).toThrow(/riseM/)
    expect(() => swingRadiusM({ depthM: 8, fallM: 0, bowHeightM: 1, rodeM: 5, lengthOverallM: 11 })).toThrow(/too short to reach the bottom/)
    expect(() => scopeOf(10, 0)).toThrow(/heightM/)
    expect(() => lengthForScope(0, 5)).toThrow(/scope/)
    expect(() => clearanceM(5, 0, -1)).toThrow(/draughtM/)
  })
})
