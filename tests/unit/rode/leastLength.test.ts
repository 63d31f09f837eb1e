import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { solveRode, type RodeInput } from '#shared/rode/catenary'
import { leastLength } from '#shared/rode/leastLength'
import { DEG_RAD } from '#shared/units/constants'

const within = (min: number, max: number) => fc.double({ min, max, noNaN: true })
const angle = fc.oneof(fc.constant(0), within(0.1, 60).map(deg => deg * DEG_RAD))

describe('leastLength', () => {
  it('gives the angle asked when a rode of chain alone has that length', () => {
    fc.assert(fc.property(within(1, 100), within(10, 100_000), within(0.5, 100), angle, (heightM, horizontalLoadN, weightNPerM, angleRad) => {
      const input = { heightM, horizontalLoadN, chain: { lengthM: 0, weightNPerM } }
      const lengthM = leastLength(input, angleRad) ?? 0
      expect(lengthM).toBeGreaterThan(heightM)
      const shape = solveRode({ ...input, chain: { lengthM, weightNPerM } })
      expect(shape.shankAngleRad).toBeCloseTo(angleRad, 6)
      expect(shape.groundedChainM).toBeCloseTo(0, 6)
    }), { numRuns: 2000, seed: 30_190 })
  })

  it('keeps the chain of a mixed rode and gives the angle asked by its rope', () => {
    let byRope = 0
    fc.assert(fc.property(within(2, 60), within(10, 100_000), within(0, 60), within(1, 100), within(0, 3), angle, (heightM, horizontalLoadN, chainM, chainN, ropeN, angleRad) => {
      const chain = { lengthM: chainM, weightNPerM: chainN }
      const input: RodeInput = { heightM, horizontalLoadN, chain, rope: { lengthM: 1, weightNPerM: ropeN } }
      const lengthM = leastLength(input, angleRad)
      if (lengthM === null) {
        expect(angleRad).toBe(0)
        return
      }
      if (lengthM - chainM < 1e-6 || lengthM > 1e6) return
      byRope += 1
      const shape = solveRode({ ...input, rope: { lengthM: lengthM - chainM, weightNPerM: ropeN } })
      expect(shape.shankAngleRad).toBeCloseTo(angleRad, 6)
    }), { numRuns: 2000, seed: 30_191 })
    expect(byRope).toBeGreaterThan(500)
  })

  it('is the chain itself where the chain is enough', () => {
    const input = { heightM: 5, horizontalLoadN: 100, chain: { lengthM: 60, weightNPerM: 12 }, rope: { lengthM: 20, weightNPerM: 0.1 } }
    expect(leastLength(input, 0)).toBe(60)
  })

  it('is none for a flat pull on a weightless rode', () => {
    const chain = { lengthM: 0, weightNPerM: 0 }
    expect(leastLength({ heightM: 5, horizontalLoadN: 100, chain, rope: { lengthM: 20, weightNPerM: 0 } }, 0)).toBeNull()
    expect(leastLength({ heightM: 5, horizontalLoadN: 100, chain }, 0)).toBeNull()
  })

  it.each([-0.1, 2, Number.NaN])('refuses an angle of %s', (angleRad) => {
    const input = { heightM: 5, horizontalLoadN: 100, chain: { lengthM: 60, weightNPerM: 12 } }
    expect(() => leastLength(input, angleRad)).toThrow(/angleRad must be from 0 to 1.5/)
  })
})
