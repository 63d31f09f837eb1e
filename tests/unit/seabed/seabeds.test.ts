import { describe, expect, it } from 'vitest'
import { patternKinds } from '#shared/seabed/facts'
import { holdingAtMass, isNumbered, seabedFacts, sizeExponent, soilKind } from '#shared/seabed/seabeds'
import { numberedSeabeds, seabeds, soilKinds, unnumberedSeabeds } from '#shared/types/words'

describe('seabeds', () => {
  it.each(seabeds)('describes %s', (seabed) => {
    const facts = seabedFacts(seabed)
    expect(facts.name).not.toBe('')
    expect(facts.description).toMatch(/^[A-Z].{60,}\.$/)
    expect(soilKinds).toContain(facts.soil)
    expect(facts.patterns.length).toBeGreaterThan(0)
    expect(facts.patterns.every(pattern => patternKinds.includes(pattern))).toBe(true)
    expect(facts.numbered).toBe(isNumbered(seabed))
  })

  it('has no two alike in name, notation or pattern', () => {
    expect(new Set(seabeds.map(seabed => seabedFacts(seabed).patterns.join())).size).toBe(seabeds.length)
    expect(new Set(seabeds.map(seabed => seabedFacts(seabed).name)).size).toBe(seabeds.length)
    expect(new Set(seabeds.map(seabed => seabedFacts(seabed).notation)).size).toBe(seabeds.length)
  })

  it('sorts them by soil kind', () => {
    const kinds = Object.fromEntries(soilKinds.map(kind => [kind, seabeds.filter(seabed => soilKind(seabed) === kind)]))
    expect(kinds.soft).toEqual(['soft-mud', 'silt', 'firm-mud', 'weed-over-mud'])
    expect(kinds.mixed).toEqual(['sandy-mud'])
    expect(kinds.none).toEqual(unnumberedSeabeds)
    expect(kinds.hard).toHaveLength(numberedSeabeds.length - 5)
  })

  it('gives 0.92, 0.86 and 0.80, and refuses a seabed without a number', () => {
    expect([sizeExponent('silt'), sizeExponent('sandy-mud'), sizeExponent('gravel')]).toEqual([0.92, 0.86, 0.8])
    expect(() => sizeExponent('rock' as never)).toThrow(RangeError)
    expect(() => seabedFacts('toString' as never)).toThrow('seabed must be one of')
  })

  it('refuses masses and exponents out of range', () => {
    expect(() => holdingAtMass(1, 0, 1, 1)).toThrow('referenceMassKg')
    expect(() => holdingAtMass(1, 1, Number.NaN, 1)).toThrow('massKg')
    expect(() => holdingAtMass(1, 1, 1, 3)).toThrow('exponent')
    expect(holdingAtMass(5000, 15, 15, 0.8)).toBe(5000)
  })
})
