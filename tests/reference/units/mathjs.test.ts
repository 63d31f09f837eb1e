import { describe, expect, it } from 'vitest'
import { create, createUnitDependencies, unitDependencies } from 'mathjs'
import { parseQuantity } from '#shared/units/parse'
import type { QuantityKind } from '#shared/units/systems'
import * as constants from '#shared/units/constants'
import { beaufortForce, beaufortSpeedMs } from '#shared/units/beaufort'
import published from './published.json'

const math = create({ ...createUnitDependencies!, ...unitDependencies! })
math.createUnit('knot', '0.51444444444444444444 m/s')

/** What is typed, the same in the words of mathjs, and the SI unit of the kind. */
const same: [QuantityKind, string, string, string][] = [
  ['length', 'm', 'm', 'm'], ['length', 'cm', 'cm', 'm'], ['length', 'mm', 'mm', 'm'], ['length', 'ft', 'ft', 'm'], ['length', 'in', 'in', 'm'],
  ['length', '\'', 'foot', 'm'], ['length', '"', 'inch', 'm'],
  ['mass', 'kg', 'kg', 'kg'], ['mass', 'g', 'g', 'kg'], ['mass', 't', 'tonne', 'kg'], ['mass', 'lb', 'lbm', 'kg'],
  ['speed', 'm/s', 'm/s', 'm/s'], ['speed', 'km/h', 'km/h', 'm/s'], ['speed', 'mph', 'mi/h', 'm/s'], ['speed', 'kn', 'knot', 'm/s'],
  ['force', 'N', 'N', 'N'], ['force', 'kN', 'kN', 'N'], ['force', 'daN', 'daN', 'N'], ['force', 'lbf', 'lbf', 'N'], ['force', 'kgf', 'kilogramforce', 'N'],
  ['area', 'm²', 'm2', 'm2'], ['area', 'm2', 'm^2', 'm2'], ['area', 'sq ft', 'sqft', 'm2'], ['area', 'ft²', 'ft^2', 'm2'],
  ['diameter', 'mm', 'mm', 'm'], ['diameter', '"', 'in', 'm'],
  ['angle', '°', 'deg', 'rad'], ['angle', 'rad', 'rad', 'rad'],
]

function read(text: string, kind: QuantityKind): number {
  const result = parseQuantity(text, kind)
  if ('error' in result) throw new Error(result.error)
  return result.value
}

// mathjs 15, unit definitions of its own.
describe('the parser against mathjs', () => {
  it.each(same)('%s in %s is %s', (kind, typed, theirs, si) => {
    for (const number of [0, 0.37, 1, 11.2, 63, 4500, 12345.678]) {
      const expected = math.unit(number, theirs).toNumber(si)
      expect(Math.abs(read(`${number} ${typed}`, kind) - expected)).toBeLessThanOrEqual(1e-12 * expected)
      expect(Math.abs(read(`${String(number).replace('.', ',')}${typed}`, kind) - expected)).toBeLessThanOrEqual(1e-12 * expected)
    }
  })

  it('adds up feet and inches', () => {
    for (const [feet, inches, typed] of [[35, 2, '35\' 2"'], [35, 2.5, '35\' 2 1/2"'], [0, 11.75, '0ft 11 3/4in'], [6, 0.5, '6 feet ½ inch']] as const) {
      const expected = math.unit(feet, 'ft').toNumber('m') + math.unit(inches, 'in').toNumber('m')
      expect(read(typed, 'length')).toBeCloseTo(expected, 12)
    }
  })

  it('holds the same constants', () => {
    expect(constants.FT_M).toBe(math.unit('1 ft').toNumber('m'))
    expect(constants.LB_KG).toBe(math.unit('1 lbm').toNumber('kg'))
    expect(constants.LBF_N).toBeCloseTo(math.unit('1 lbf').toNumber('N'), 12)
    expect(constants.MPH_MS).toBeCloseTo(math.unit('1 mi/h').toNumber('m/s'), 12)
  })
})

// WMO code 1100: the upper end of each band, 10-minute mean at 10 m; force 12 is 64 kn or more.
describe('the Beaufort scale against WMO code 1100', () => {
  it.each(published.beaufort.knots)('force %d runs from %d to %s kn', (force, lowKn, highKn) => {
    const upperKn = highKn ?? lowKn!
    expect(beaufortSpeedMs(force!) / constants.KN_MS).toBeCloseTo(upperKn, 12)
    expect(read(`F${force}`, 'speed') / constants.KN_MS).toBeCloseTo(upperKn, 12)
    const next = force === 0 ? 0 : lowKn! * constants.KN_MS
    expect(beaufortForce(next)).toBe(force)
    if (force! > 0) expect(beaufortForce(upperKn * constants.KN_MS)).toBe(force)
  })
})
