import { describe, expect, it } from 'vitest'
import { beaufortForce, beaufortSpeedMs } from '#shared/units/beaufort'
import { formatFeetInches, formatInches, formatNumber, formatPlain, formatQuantity, unitLabel } from '#shared/units/format'
import { inRange } from '#shared/units/range'

describe('formatQuantity', () => {
  it.each([
    [11.2, 'length', 'metric', '11.2 m'], [10.668, 'length', 'imperial', '35 ft'], [6500, 'mass', 'asAtSea', '6,500 kg'], [15, 'speed', 'metric', '15 m/s'],
    [15.4333333, 'speed', 'asAtSea', '30 kn'], [5337.87, 'force', 'metric', '5.34 kN'], [5337.87, 'force', 'imperial', '1,200 lbf'],
    [0.01, 'diameter', 'metric', '10 mm'], [0.139626, 'angle', 'asAtSea', '8°'], [0.3, 'share', 'metric', '30 %'], [4.45934592, 'area', 'imperial', '48 ft²'],
    [-0.00001, 'length', 'metric', '0 m'],
  ] as const)('prints %d %s in %s as %s', (value, kind, system, text) => {
    expect(formatQuantity(value, kind, system)).toBe(text)
  })

  it('shows a force in kgf or lbf when asked, and fixed decimals when asked', () => {
    expect(formatQuantity(5337.87, 'force', 'asAtSea', { forceUnit: 'kgf' })).toBe('544 kgf')
    expect(formatQuantity(5337.87, 'force', 'asAtSea', { forceUnit: 'lbf' })).toBe('1,200 lbf')
    expect(formatNumber(5300, 'force', 'metric', { decimals: 2 })).toBe('5.30')
    expect(unitLabel('speed', 'asAtSea')).toBe('kn')
    expect(formatPlain(1234.5, 1)).toBe('1,234.5')
  })

  it('refuses what is no number, and decimals out of range', () => {
    expect(() => formatQuantity(Number.NaN, 'length', 'metric')).toThrow(RangeError)
    expect(() => formatPlain(Number.POSITIVE_INFINITY)).toThrow(RangeError)
    expect(() => formatPlain(1, 7)).toThrow('decimals')
    expect(() => formatFeetInches(-1)).toThrow('lengthM')
    expect(() => formatInches(Number.NaN)).toThrow('diameterM')
  })
})

describe('feet and inches', () => {
  it('carries twelve inches into the next foot', () => {
    expect(formatFeetInches(10.7188)).toBe('35\' 2"')
    expect(formatFeetInches(0.3047)).toBe('1\'')
    expect(formatFeetInches(0)).toBe('0\'')
  })

  it('prints sixteenths in lowest terms, and decimals for anything else', () => {
    expect(formatInches(0.0079375)).toBe('5/16"')
    expect(formatInches(0.0127)).toBe('1/2"')
    expect(formatInches(0.03175)).toBe('1 1/4"')
    expect(formatInches(0.0254)).toBe('1"')
    expect(formatInches(0.01)).toBe('0.394"')
  })
})

describe('beaufort and ranges', () => {
  it('refuses what is no force', () => {
    for (const force of [-1, 13, 2.5, Number.NaN]) expect(() => beaufortSpeedMs(force)).toThrow(RangeError)
    expect(() => beaufortForce(-1)).toThrow('speedMs')
    expect(beaufortForce(100)).toBe(12)
  })

  it('names quantity, interval and value', () => {
    expect(inRange('depthM', 4, 0, 10)).toBe(4)
    expect(() => inRange('depthM', Number.NaN, 0, 10)).toThrow('depthM must be between 0 and 10, got NaN')
  })
})
