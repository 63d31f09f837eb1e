import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { solveRode, type RodeInput } from '#shared/rode/catenary'
import { tabulateDemand } from '#shared/ranking/demand'
import { tabulateAngle } from '#shared/ranking/rodeTable'
import { greatestSpeed } from '#shared/ranking/speedSearch'

const rodes: [string, Omit<RodeInput, 'horizontalLoadN'>][] = [
  ['chain, long', { heightM: 9.5, chain: { lengthM: 45, weightNPerM: 18.8 } }],
  ['chain, short', { heightM: 9.5, chain: { lengthM: 20, weightNPerM: 18.8 } }],
  ['chain, hardly longer than the height', { heightM: 30, chain: { lengthM: 31.5, weightNPerM: 18.8 } }],
  ['chain and rope', { heightM: 12, chain: { lengthM: 10, weightNPerM: 12 }, rope: { lengthM: 50, weightNPerM: 0.16 } }],
  ['weightless rope', { heightM: 10, chain: { lengthM: 0, weightNPerM: 0 }, rope: { lengthM: 50, weightNPerM: 0 } }],
]

describe('tabulateAngle', () => {
  it.each(rodes)('keeps within 0.02 degrees of the solved rode: %s', (_, rode) => {
    const angleAt = (horizontalLoadN: number) => solveRode({ ...rode, horizontalLoadN }).shankAngleRad
    const table = tabulateAngle(angleAt, 30_000)
    for (let loadN = 5; loadN < 30_000; loadN *= 1.013) {
      const [read, solved] = [table(loadN), angleAt(loadN)].map(angle => Math.min(angle, 25 * Math.PI / 180))
      expect(Math.abs((read ?? 0) - (solved ?? 1))).toBeLessThan(0.02 * Math.PI / 180)
    }
  })

  it('is flat where the rode never lifts, and refuses no range at all', () => {
    expect(tabulateAngle(() => 0, 1000)(500)).toBe(0)
    expect(() => tabulateAngle(() => 0, 1)).toThrow(/more than 1 N, got 1/)
  })
})

describe('greatestSpeed', () => {
  const square = tabulateDemand(speedMs => 5 * speedMs ** 2, () => 0, 33)

  it('finds the wind at which a load is met', () => {
    fc.assert(fc.property(fc.double({ min: 1, max: 5000, noNaN: true }), (loadN) => {
      const found = greatestSpeed(square, ({ lnLoad }) => Math.log(loadN) - lnLoad)
      expect(found).toBeCloseTo(Math.sqrt(loadN / 5), 5)
    }))
  })

  it('says so where it is never met, and where it is met throughout', () => {
    const withCurrent = tabulateDemand(speedMs => 100 + 5 * speedMs ** 2, () => 0, 33)
    expect(greatestSpeed(withCurrent, ({ lnLoad }) => Math.log(90) - lnLoad)).toBeNull()
    expect(greatestSpeed(withCurrent, ({ lnLoad }) => Math.log(9000) - lnLoad)).toBe(Infinity)
  })

  it('stops at the wind past which the rode cannot bound the load', () => {
    const stops = tabulateDemand(speedMs => speedMs > 12.34 ? null : 1, () => 0, 33)
    expect(greatestSpeed(stops, ({ lnLoad }) => 1 - lnLoad)).toBeCloseTo(12.34, 4)
  })
})
