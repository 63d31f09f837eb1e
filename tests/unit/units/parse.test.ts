import { describe, expect, it } from 'vitest'
import fc from 'fast-check'
import { formatFeetInches, formatInches, formatQuantity } from '#shared/units/format'
import { parseQuantity } from '#shared/units/parse'
import type { ParseOptions } from '#shared/units/parse'
import { displayUnit, forceUnits, quantityKinds, unitSystems } from '#shared/units/systems'
import type { QuantityKind } from '#shared/units/systems'

function read(text: string, kind: QuantityKind, options?: ParseOptions): number {
  const result = parseQuantity(text, kind, options)
  if ('error' in result) throw new Error(result.error)
  return result.value
}

function error(text: string, kind: QuantityKind, options?: ParseOptions): string {
  const result = parseQuantity(text, kind, options)
  if (!('error' in result)) throw new Error(`read ${text} as ${result.understood}`)
  return result.error
}

describe('parseQuantity reads', () => {
  // Foot, inch and pound by the 1959 agreement; the nautical mile of 1852 m.
  it.each([
    ['35ft', 'length', 10.668], ['35\' 2"', 'length', 10.7188], ['35\' 2 1/2"', 'length', 10.7315], ['35’ 2½”', 'length', 10.7315],
    ['35\'2', 'length', 10.7188], ['35\'-2"', 'length', 10.7188], ['35 ft 2 in.', 'length', 10.7188], ['35\'', 'length', 10.668], ['35\'\'', 'length', 0.889], ['35½ ft', 'length', 10.8204],
    ['11,2 m', 'length', 11.2], ['11.2', 'length', 11.2], ['  11. ', 'length', 11], ['11. m', 'length', 11], ['.5 m', 'length', 0.5], [',5 m', 'length', 0.5],
    ['1,200 kg', 'mass', 1200], ['4.5 t', 'mass', 4500], ['4,5t', 'mass', 4500], ['9900 lbs', 'mass', 4490.564463],
    ['30 kn', 'speed', 15.4333333333], ['30 KTS', 'speed', 15.4333333333], ['15 m/s', 'speed', 15], ['15 m s⁻¹', 'speed', 15], ['55 km / h', 'speed', 15.2777777778],
    ['35 mph', 'speed', 15.6464], ['F8', 'speed', 20.5777777778], ['force 8', 'speed', 20.5777777778], ['8 Bft', 'speed', 20.5777777778],
    ['5/16"', 'diameter', 0.0079375], ['5/16', 'diameter', 0.0079375], ['5⁄16 in', 'diameter', 0.0079375], ['1-1/4"', 'diameter', 0.03175], ['10 mm', 'diameter', 0.01], ['10', 'diameter', 0.01],
    ['5.3 kN', 'force', 5300], ['540 kgf', 'force', 5295.591], ['540 kg', 'force', 5295.591], ['1200 lbf', 'force', 5337.86593831],
    ['4.5 m²', 'area', 4.5], ['48 sq. ft', 'area', 4.45934592], ['30°', 'angle', Math.PI / 6], ['30 degrees', 'angle', Math.PI / 6],
    ['30 %', 'share', 0.3], ['30', 'share', 0.3], ['0,3', 'share', 0.3], ['1', 'share', 1],
  ] satisfies [string, QuantityKind, number][])('%s as a %s', (text, kind, expected) => {
    expect(read(text, kind)).toBeCloseTo(expected, 8)
  })

  // What each mark between digits means is this program's own decision, said in the docstring of decimalValue.
  it.each([
    ['1,200', 1200], ['12,345', 12345], ['0,125', 0.125], ['1,2', 1.2], ['1,25', 1.25], ['1,2345', 1.2345], ['1234,567', 1234.567], ['1.200', 1.2],
    ['1,200,000', 1.2e6], ['1.200.000', 1.2e6], ['1,200.5', 1200.5], ['1.200,5', 1200.5], ['1 200', 1200], ['1 200,5', 1200.5], ['1 200,500', 1200.5], ['1\u00a0200', 1200],
  ])('%s kg as %d', (text, expected) => {
    expect(read(`${text} kg`, 'mass')).toBe(expected)
  })

  it.each(['1,20,000', '1.2.3', '1,2,3', '1.200,5.1', '1,,2', '12 34', '1/0', '5/16/2', '1e3', '--5', '', ' ', 'm', 'NaN', 'Infinity', '１２'.repeat(31)])('nothing in %j', (text) => {
    expect(parseQuantity(text, 'mass')).toHaveProperty('error')
  })

  it('a bare number in the unit of the system', () => {
    expect(read('35', 'length', { system: 'imperial' })).toBeCloseTo(10.668, 12)
    expect(read('20', 'speed', { system: 'asAtSea' })).toBeCloseTo(10.2888888889, 9)
    expect(read('20', 'speed')).toBe(20)
    expect(read('100', 'force', { system: 'imperial' })).toBeCloseTo(444.822161526, 8)
  })
})

describe('parseQuantity says', () => {
  it.each([
    ['35\' 2"', 'length', '35 ft 2 in = 10.719 m'], ['1,200 kg', 'mass', '1,200 kg'], ['4.5 t', 'mass', '4.5 t = 4,500 kg'],
    ['F8', 'speed', 'Beaufort 8, up to 40 kn = 20.6 m/s'], ['F12', 'speed', 'Beaufort 12, 64 kn or more = 32.9 m/s'],
    ['5/16"', 'diameter', '5/16 in = 7.94 mm'], ['8', 'angle', '8°'], ['0.3', 'share', '0.3 = 30 %'], ['540 kg', 'force', '540 kgf = 5.296 kN'],
  ] satisfies [string, QuantityKind, string][])('what it understood by %s as a %s', (text, kind, understood) => {
    expect(parseQuantity(text, kind)).toMatchObject({ understood })
  })

  it('the Beaufort force and the inch size beside the value', () => {
    expect(parseQuantity('F8', 'speed')).toMatchObject({ beaufort: 8 })
    for (const text of ['1/2"', '2/4 in', '0.5"', '½', '0,5 in']) expect(parseQuantity(text, 'diameter')).toMatchObject({ sizeIn: '1/2' })
    expect(parseQuantity('1 1/4"', 'diameter')).toMatchObject({ sizeIn: '1 1/4' })
    expect(parseQuantity('10 mm', 'diameter')).not.toHaveProperty('sizeIn')
    expect(parseQuantity('0.33"', 'diameter')).not.toHaveProperty('sizeIn')
  })

  it('what is accepted, with the range where there is one', () => {
    expect(error('3 cwt', 'mass')).toBe('“cwt” is not a unit read here. Type a mass such as 4500 kg, 4.5 t or 9900 lb.')
    expect(error('long', 'length', { min: 3, max: 40 })).toContain('between 3 m and 40 m')
    expect(error('99 m', 'length', { min: 3, max: 40 })).toBe('99 m is outside what is allowed. Type a length such as 11.2 m, 35 ft or 35\' 2", between 3 m and 40 m.')
    expect(error('99 ft', 'length', { max: 12.192, system: 'imperial' })).toContain('between 0 ft and 40 ft')
    expect(error('-1', 'length')).toContain('at least 0 m')
    expect(error('130 %', 'share')).toContain('between 0 % and 100 %')
    expect(error('F13', 'speed')).toContain('Beaufort ends at force 12')
    expect(error('5\' 14"', 'length')).toContain('under 12')
    expect(error('9'.repeat(50), 'mass')).toContain('too large')
  })

  it('a negative value where the range allows one', () => {
    expect(read('−1,5 m', 'length', { min: -2, max: 2 })).toBe(-1.5)
  })
})

describe('properties', () => {
  const piece = fc.constantFrom('1', '2', '35', '.', ',', ' ', '/', '\'', '"', 'ft', 'in', 'm', 'kg', 't', 'F', 'kn', '%', '°', '-', '½', 'e', '0', '\u00a0', '﷽')
  const anyText = fc.oneof(fc.string(), fc.string({ unit: 'binary' }), fc.array(piece, { maxLength: 12 }).map(pieces => pieces.join('')))

  it('never throws, and never answers with a number that is not finite', () => {
    fc.assert(fc.property(anyText, fc.constantFrom(...quantityKinds), fc.constantFrom(...unitSystems), (text, kind, system) => {
      const result = parseQuantity(text, kind, { system })
      if ('error' in result) expect(result.error).toMatch(/Type a.* such as /)
      else {
        expect(Number.isFinite(result.value) && result.value >= 0).toBe(true)
        expect(result.understood).not.toBe('')
      }
    }), { numRuns: 20_000 })
  })

  it('reads back what it prints, to the last digit printed', () => {
    const value = fc.double({ min: 0, max: 1e6, noNaN: true })
    fc.assert(fc.property(value, fc.constantFrom(...quantityKinds), fc.constantFrom(...unitSystems), fc.constantFrom(undefined, ...forceUnits), (raw, kind, system, forceUnit) => {
      const si = kind === 'share' ? raw / 1e6 : raw
      const unit = displayUnit(kind, system, forceUnit)
      const back = read(formatQuantity(si, kind, system, { forceUnit }), kind, { system })
      expect(Math.abs(back - si)).toBeLessThanOrEqual(unit.factor * (0.5 * 10 ** -unit.decimals) * (1 + 1e-6) + 1e-9 * si)
    }), { numRuns: 5000 })
  })

  it('reads back feet and inches to half an inch, and sixteenths exactly', () => {
    fc.assert(fc.property(fc.double({ min: 0, max: 1000, noNaN: true }), (lengthM) => {
      expect(Math.abs(read(formatFeetInches(lengthM), 'length') - lengthM)).toBeLessThanOrEqual(0.0127 + 1e-9)
    }))
    fc.assert(fc.property(fc.integer({ min: 1, max: 600 }), (sixteenths) => {
      expect(read(formatInches(sixteenths / 16 * 0.0254), 'diameter')).toBeCloseTo(sixteenths / 16 * 0.0254, 12)
    }))
  })
})
