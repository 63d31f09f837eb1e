import { describe, expect, it } from 'vitest'
import fc from 'fast-check'
import { completeBoat } from '#shared/load/boat'
import { currentLoadN } from '#shared/load/current'
import { heightFactor, meanAndGust } from '#shared/load/gust'
import { sheerDragAreaM2 } from '#shared/load/sheer'
import { frontDragAreaM2, surveyLoad, windLoadFactors, windLoads } from '#shared/load/survey'
import { tableLoad } from '#shared/load/table'
import { boatTypes, exposures, windKinds } from '#shared/types/words'
import { KN_MS } from '#shared/units/constants'

const checkBoat = completeBoat({ type: 'sailMonohull', lengthM: 11.2, beamM: 3.6 })

const anyBoat = fc.record({ type: fc.constantFrom(...boatTypes), lengthM: fc.double({ min: 3, max: 30, noNaN: true }) })
const anyWind = fc.record({
  kind: fc.constantFrom(...windKinds),
  exposure: fc.constantFrom(...exposures),
  at10m: fc.boolean(),
  sheerDeg: fc.double({ min: 0, max: 90, noNaN: true }),
})
const speed = fc.double({ min: 0, max: 60, noNaN: true })

// The check boat of the method page: a sail monohull of 11.2 x 3.6 m at 30 kn, the method's own stated bands.
describe('the check boat', () => {
  const loads = windLoads(checkBoat, { speedMs: 30 * KN_MS, kind: 'gust' })

  it('has a drag area of 10 to 13 m2 from ahead', () => {
    const dragAreaM2 = frontDragAreaM2(checkBoat.windage)
    expect(dragAreaM2).toBeGreaterThan(10)
    expect(dragAreaM2).toBeLessThan(13)
  })

  it('asks 1.5 to 1.9 kN steady and about 2.1 kN with sheer', () => {
    expect(loads.steadyN).toBeGreaterThan(1500)
    expect(loads.steadyN).toBeLessThan(1900)
    expect(loads.sheerN / 1000).toBeCloseTo(2.1, 1)
  })

  it('meets 5.3 kN in the table by length and 7.1 kN by beam', () => {
    const { table } = tableLoad(checkBoat, 30 * KN_MS)
    expect(table!.loadN / 1000).toBeCloseTo(7.1, 1)
    expect(table).toMatchObject({ decidedBy: 'beam', rowFt: 50 })
    const byLength = tableLoad({ type: 'sailMonohull', lengthM: 11.2, beamM: 3 }, 30 * KN_MS).table!
    expect(byLength.loadN / 1000).toBeCloseTo(5.3, 1)
    expect(table!.neighbourN).toBeCloseTo(byLength.loadN, 9)
  })
})

describe('windLoads', () => {
  it('adds up its parts to the steady load', () => {
    fc.assert(fc.property(anyBoat, anyWind, speed, (input, wind, speedMs) => {
      const { parts, steadyN } = windLoads(completeBoat(input), { ...wind, speedMs })
      expect(parts.reduce((sum, { loadN }) => sum + loadN, 0)).toBeCloseTo(steadyN, 6)
    }))
  })

  it('never lowers a load for more wind, and never lets sheer lower it', () => {
    fc.assert(fc.property(anyBoat, anyWind, speed, speed, (input, wind, one, other) => {
      const boat = completeBoat(input)
      const less = windLoads(boat, { ...wind, speedMs: Math.min(one, other) })
      const more = windLoads(boat, { ...wind, speedMs: Math.max(one, other) })
      expect(more.steadyN).toBeGreaterThanOrEqual(less.steadyN)
      expect(more.gustN).toBeGreaterThanOrEqual(less.gustN)
      expect(more.sheerN).toBeGreaterThanOrEqual(less.sheerN)
      expect(more.gustN).toBeGreaterThanOrEqual(more.steadyN)
      expect(more.sheerN).toBeGreaterThanOrEqual(more.gustN)
      const table = (speedMs: number) => tableLoad(boat, speedMs).table?.loadN ?? 0
      expect(table(Math.max(one, other))).toBeGreaterThanOrEqual(table(Math.min(one, other)))
    }))
  })

  it('is its factors times the square of the speed', () => {
    fc.assert(fc.property(anyBoat, anyWind, speed, (input, wind, speedMs) => {
      const boat = completeBoat(input)
      const factors = windLoadFactors(boat, wind)
      const loads = windLoads(boat, { ...wind, speedMs })
      expect(loads.steadyN).toBeCloseTo(factors.steady * speedMs ** 2, 6)
      expect(loads.gustN).toBeCloseTo(factors.gust * speedMs ** 2, 6)
      expect(loads.sheerN).toBeCloseTo(factors.sheer * speedMs ** 2, 6)
    }))
  })

  it('replaces all default parts by the windage given', () => {
    const boat = completeBoat({ type: 'sailMonohull', lengthM: 11.2, beamM: 3.6, windage: [{ part: 'all', areaM2: 10, dragCoefficient: 1 }] })
    const { steadyN, parts } = windLoads(boat, { speedMs: 10, kind: 'gust' })
    expect(steadyN).toBeCloseTo(0.5 * 1.225 * 100 * 10, 9)
    expect(parts).toHaveLength(1)
  })

  it('applies the gust factor to a mean only, and the height only to a 10-m forecast', () => {
    const at = (wind: object) => windLoads(checkBoat, { speedMs: 10, kind: 'mean', ...wind })
    expect(at({}).gustN / at({}).steadyN).toBeCloseTo(1.52 ** 2, 12)
    expect(at({ exposure: 'atSea' }).gustN / at({}).steadyN).toBeCloseTo(1.23 ** 2, 12)
    expect(at({ kind: 'gust' }).gustN).toBe(at({ kind: 'gust' }).steadyN)
    expect(at({ at10m: true }).steadyN / at({}).steadyN).toBeCloseTo(0.2 ** (2 / 7), 12)
  })

  it('sheers 15 degrees for a multihull and 30 for the others when nothing is said', () => {
    const multihull = completeBoat({ type: 'sailMultihull', lengthM: 11 })
    const sheer = (boat: typeof multihull, sheerDeg?: number) => windLoads(boat, { speedMs: 10, kind: 'gust', sheerDeg }).sheerN
    expect(sheer(multihull)).toBe(sheer(multihull, 15))
    expect(sheer(checkBoat)).toBe(sheer(checkBoat, 30))
  })

  it.each([
    [{ speedMs: -1 }, 'wind.speedMs'], [{ speedMs: Number.NaN }, 'wind.speedMs'], [{ sheerDeg: 91 }, 'wind.sheerDeg'],
    [{ kind: 'breeze' as never }, 'wind.kind'], [{ exposure: 'bay' as never }, 'wind.exposure'],
  ])('refuses %j and names %s', (change, field) => {
    const attempt = () => windLoads(checkBoat, { speedMs: 10, kind: 'mean', ...change })
    expect(attempt).toThrow(RangeError)
    expect(attempt).toThrow(field)
  })
})

describe('wind', () => {
  it('is said as mean and gust whichever was entered', () => {
    const asGust = meanAndGust({ speedMs: 38, kind: 'gust', exposure: 'offshoreWind' })
    expect(asGust).toEqual({ meanMs: 25, gustMs: 38 })
    expect(meanAndGust({ speedMs: 25, kind: 'mean', exposure: 'offshoreWind' })).toEqual(asGust)
  })

  it('is never taken below 1 m', () => {
    expect(heightFactor(10)).toBe(1)
    expect(heightFactor(0.2)).toBe(heightFactor(1))
  })
})

describe('sheerDragAreaM2', () => {
  it('is the front head-on, and the side abeam', () => {
    expect(sheerDragAreaM2(10, 20, 0)).toBe(10)
    expect(sheerDragAreaM2(10, 20, Math.PI / 2)).toBeCloseTo(20, 12)
    expect(sheerDragAreaM2(10, 0, 1)).toBe(10)
  })
})

describe('surveyLoad', () => {
  const wind = { steadyN: 1000, gustN: 2000, sheerN: 2500, parts: [] }

  it('takes the larger of sheer and surge, and adds the current', () => {
    expect(surveyLoad(wind, 100, 0).totalN).toBe(2600)
    expect(surveyLoad(wind, 100, 900).totalN).toBe(3000)
    expect(surveyLoad(wind, 100, null).totalN).toBeNull()
  })

  it('refuses a negative load', () => {
    expect(() => surveyLoad(wind, -1, 0)).toThrow(RangeError)
    expect(() => surveyLoad(wind, 0, Number.NaN)).toThrow(RangeError)
  })
})

describe('currentLoadN', () => {
  it('is none in slack water and more in more', () => {
    expect(currentLoadN(checkBoat, 0)).toBe(0)
    fc.assert(fc.property(fc.double({ min: 0.05, max: 5, noNaN: true }), fc.double({ min: 0.05, max: 5, noNaN: true }), (one, other) => {
      expect(currentLoadN(checkBoat, Math.max(one, other))).toBeGreaterThanOrEqual(currentLoadN(checkBoat, Math.min(one, other)))
    }))
  })

  // Worked by hand from UFC 4-159-03 eq. 15 to 23: 1 m/s, waterline 10 x 3 m, draught 1.5 m, 7695 kg, 0.05 m2 of propeller.
  // Form 513 x 0.45 = 230.85; Re 8.4034e6, Cf 0.075/4.92446^2 = 0.0030928, S = 25.5 + 5 = 30.5 m2, friction 48.39; propeller 25.65.
  it('adds up form, friction and propeller', () => {
    const boat = { waterline: { lengthM: 10, beamM: 3, draughtM: 1.5 }, displacementKg: 7695, propellerAreaM2: 0.05 }
    expect(currentLoadN(boat, 1)).toBeCloseTo(304.9, 1)
  })

  it.each([0.01, -1, 5.1, Number.NaN, Number.POSITIVE_INFINITY])('refuses %d m/s', (currentMs) => {
    expect(() => currentLoadN(checkBoat, currentMs)).toThrow('currentMs')
  })
})
