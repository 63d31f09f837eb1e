import { describe, expect, it } from 'vitest'
import { parseInch, sizeOf } from '#shared/rode/size'
import { chainPart, ropePart, solverInput, steelInWater } from '#shared/rode/weights'
import { G } from '#shared/units/constants'

describe('sizes', () => {
  it.each([['5/16', 0.3125], ['1/2"', 0.5], ['3/8 in', 0.375], ['1 1/8', 1.125], ['1-1/4', 1.25], ['2', 2], ['0.5', 0.5], ['.75', 0.75]])('reads %s as %s in', (text, inch) => {
    expect(parseInch(text, 'chain.sizeIn')).toBe(inch)
  })

  it.each(['', 'ten', '5/0', '5/16/2', '-1/2', '99', '0', '1/99', '1 /', 'NaN', '1e3', '__proto__', '8mm'])('refuses "%s"', (text) => {
    expect(() => parseInch(text, 'chain.sizeIn')).toThrow(/chain.sizeIn must be/)
  })

  it('keeps metric and inch apart', () => {
    expect(sizeOf({ diameterMm: 12.7 }, 'chain')).toEqual({ mm: 12.7, inch: null })
    expect(sizeOf({ sizeIn: '1/2' }, 'chain')).toEqual({ mm: 12.7, inch: 0.5 })
    expect(sizeOf({}, 'chain')).toBeNull()
    expect(() => sizeOf({ diameterMm: 8, sizeIn: '5/16' }, 'chain')).toThrow(/not both/)
  })
})

describe('weights', () => {
  it('weighs 8 mm chain at 11.9 N/m in the sea', () => {
    expect(steelInWater).toBeCloseTo(0.869, 3)
    expect(chainPart({ lengthM: 40, diameterMm: 8 }).weightNPerM).toBeCloseTo(1.4 * steelInWater * G, 12)
    expect(chainPart({ lengthM: 40, diameterMm: 8 }).weightNPerM).toBeCloseTo(11.9, 1)
  })

  it('weighs other sizes by 0.0219 d^2, inches too', () => {
    expect(chainPart({ lengthM: 1, diameterMm: 12 }).weightNPerM).toBeCloseTo(0.0219 * 144 * steelInWater * G, 12)
    expect(chainPart({ lengthM: 1, sizeIn: '3/8' }).weightNPerM).toBeCloseTo(0.0219 * 9.525 ** 2 * steelInWater * G, 9)
  })

  it('takes a weight before a size', () => {
    expect(chainPart({ lengthM: 1, diameterMm: 8, submergedWeightNPerM: 5 }).weightNPerM).toBe(5)
    expect(ropePart({ lengthM: 1, submergedWeightNPerM: 0 }).weightNPerM).toBe(0)
    expect(ropePart({ lengthM: 1, diameterMm: 14 }).weightNPerM).toBeCloseTo(0.0006 * 196 * 0.101 * G, 12)
  })

  it('wants a diameter or a weight, except of chain of no length', () => {
    expect(() => chainPart({ lengthM: 1 })).toThrow(/diameter or a submerged weight/)
    expect(() => ropePart({ lengthM: 1 })).toThrow(/diameter or a submerged weight/)
    expect(chainPart({ lengthM: 0 })).toEqual({ lengthM: 0, weightNPerM: 0 })
  })

  it('leaves out rope of no length', () => {
    expect(solverInput({ chain: { lengthM: 9, diameterMm: 8 }, rope: { lengthM: 0 } }, 3, 100).rope).toBeUndefined()
  })
})
