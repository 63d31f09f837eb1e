import { describe, expect, it } from 'vitest'
import { completeBoat } from '#shared/load/boat'
import type { BoatInput } from '#shared/load/boat'

describe('completeBoat', () => {
  it('names every value it guessed', () => {
    expect(completeBoat({ type: 'sailMonohull', lengthM: 10 }).guessed.sort()).toEqual([
      'beamM', 'bowHeightM', 'displacementKg', 'freeboardM', 'propellerAreaM2', 'sideAreaM2', 'sideDragCoefficient', 'waterline', 'windage',
    ])
  })

  it('guesses nothing when everything is given, and changes nothing', () => {
    const boat = {
      type: 'motor' as const, lengthM: 12, beamM: 4, displacementKg: 9000, freeboardM: 1.6, bowHeightM: 1.8,
      windage: [{ part: 'all', areaM2: 20, dragCoefficient: 0.9 }], sideAreaM2: 30, sideDragCoefficient: 1.1,
      waterline: { lengthM: 11, beamM: 3.7, draughtM: 1 }, propellerAreaM2: 0.2,
    }
    expect(completeBoat(boat)).toEqual({ ...boat, guessed: [] })
  })

  // The ratios are this program's own, stated on its method page.
  it.each([
    ['sailMonohull', 3.2, 2.72, 1.6, 5500, 1.1],
    ['sailMultihull', 5.5, 1.65, 1, 5500, 1.1],
    ['motor', 3.3, 2.97, 0.8, 6500, 1.3],
  ] as const)('fills in a %s of 10 m', (type, beamM, waterlineBeamM, draughtM, displacementKg, freeboardM) => {
    const boat = completeBoat({ type, lengthM: 10 })
    expect(boat.beamM).toBeCloseTo(beamM, 12)
    expect(boat.waterline.lengthM).toBeCloseTo(8.8, 12)
    expect(boat.waterline.beamM).toBeCloseTo(waterlineBeamM, 12)
    expect(boat.waterline.draughtM).toBeCloseTo(draughtM, 12)
    expect(boat.displacementKg).toBeCloseTo(displacementKg, 9)
    expect(boat.freeboardM).toBeCloseTo(freeboardM, 12)
    expect(boat.bowHeightM).toBeCloseTo(1.1, 12)
    expect(boat.propellerAreaM2).toBe(0.05)
  })

  it('gives a motor boat neither mast nor sails, and 0.2 m2 of stays', () => {
    const { windage, sideAreaM2 } = completeBoat({ type: 'motor', lengthM: 10, beamM: 3.5 })
    expect(windage.map(({ part }) => part)).toEqual(['hull', 'cabin and cockpit structure', 'stays and shrouds', 'sprayhood, bimini, dinghy, gear'])
    expect(windage[0]?.areaM2).toBeCloseTo(3.5 * 1.3, 12)
    expect(windage[1]?.areaM2).toBeCloseTo(0.12 * 10 * 3.5, 12)
    expect(windage[2]?.areaM2).toBe(0.2)
    expect(windage[3]?.areaM2).toBeCloseTo(2, 12)
    expect(sideAreaM2).toBeCloseTo(14, 12)
  })

  it('lets the freeboard replace the hull height, three quarters of the beam for a multihull', () => {
    const hull = (input: BoatInput) => completeBoat(input).windage[0]!.areaM2
    expect(hull({ type: 'sailMonohull', lengthM: 10, beamM: 3, freeboardM: 1.5 })).toBeCloseTo(4.5, 12)
    expect(hull({ type: 'sailMultihull', lengthM: 10, beamM: 6, freeboardM: 1.5 })).toBeCloseTo(6.75, 12)
  })

  it.each([
    [{ lengthM: 0 }, 'boat.lengthM'], [{ lengthM: Number.NaN }, 'boat.lengthM'], [{ lengthM: Number.POSITIVE_INFINITY }, 'boat.lengthM'],
    [{ beamM: -1 }, 'boat.beamM'], [{ displacementKg: 0 }, 'boat.displacementKg'], [{ freeboardM: 99 }, 'boat.freeboardM'],
    [{ windage: [] }, 'boat.windage'], [{ windage: [{ part: 'x', areaM2: -1, dragCoefficient: 1 }] }, 'boat.windage.0.areaM2'],
    [{ windage: [{ part: 'x', areaM2: 1, dragCoefficient: 9 }] }, 'boat.windage.0.dragCoefficient'],
    [{ waterline: { lengthM: 9, beamM: 3, draughtM: 0 } }, 'boat.waterline.draughtM'],
    [{ type: 'raft' as never }, 'boat.type'],
  ] satisfies [Partial<BoatInput>, string][])('refuses %j and names %s', (change, field) => {
    const attempt = () => completeBoat({ type: 'sailMonohull', lengthM: 10, ...change })
    expect(attempt).toThrow(RangeError)
    expect(attempt).toThrow(field)
  })
})
