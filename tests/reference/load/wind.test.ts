import { describe, expect, it } from 'vitest'
import { gustFactor, meanAndGust } from '#shared/load/gust'
import { dragN, velocityPressurePa } from '#shared/load/pressure'
import { exposures } from '#shared/types/words'
import { KN_MS, LBF_N, FT_M, MPH_MS } from '#shared/units/constants'
import published from './published.json'

describe('wind against published figures', () => {
  // WMO/TD-No. 1555 (Harper, Kepert, Ginger 2010) table 1.1.
  it.each(exposures)('gust factor %s', (exposure) => {
    expect(gustFactor(exposure)).toBe(published.gustFactors.rows[exposure])
  })

  // The same table: 25 kn mean, offshore wind at the coast.
  it('gusts to 38.0 kn in a mean wind of 25 kn off the land', () => {
    const { gustMs } = meanAndGust({ speedMs: 25 * KN_MS, kind: 'mean' })
    expect(gustMs / KN_MS).toBeCloseTo(published.gustFactors.worked[0]!.expected, 1)
  })

  // 1/2 rho V^2, rho 1.225 kg/m3: printed digits.
  it.each(published.velocityPressure.rowsKnPa)('velocity pressure at %d kn is %d Pa', (knots, pascals) => {
    expect(velocityPressurePa(knots! * KN_MS)).toBeCloseTo(pascals!, 1)
  })

  // ASCE 7: 0.00256 V^2 psf with V in mph; three digits.
  it('agrees with the pressure of ASCE 7 to its three digits', () => {
    for (const mph of [10, 35, 70, 120]) {
      const psf = velocityPressurePa(mph * MPH_MS) * FT_M ** 2 / LBF_N
      expect(psf / (0.00256 * mph ** 2)).toBeCloseTo(1, 2)
    }
  })

  // OCIMF Mooring Equipment Guidelines, 2nd ed., appendix D: longitudinal wind force on a loaded tanker, 1 %.
  it('agrees with the tanker of OCIMF to 1 %', () => {
    const kilonewtons = dragN(0.73 * 818, 60 * KN_MS, 1.223) / 1000
    expect(Math.abs(kilonewtons / published.windWorked[0]!.expected - 1)).toBeLessThan(0.01)
  })
})
