import { describe, expect, it } from 'vitest'
import { breakingLoad } from '#shared/rode/breakingLoad'
import { solveRode } from '#shared/rode/catenary'

const input = { heightM: 20, horizontalLoadN: 1, chain: { lengthM: 30, weightNPerM: 12 }, rope: { lengthM: 30, weightNPerM: 5 } }

describe('breakingLoad', () => {
  it('finds the load that breaks the chain where it meets the rope', () => {
    const { mostN, part } = breakingLoad(input, [{ part: 'chain', breakingN: 5000 }, { part: 'rope', breakingN: 9000 }])
    expect(part).toBe('chain')
    expect(solveRode({ ...input, horizontalLoadN: mostN }).tensionJoinN).toBeCloseTo(5000, 3)
  })

  it('finds the load that breaks the rope at the bow', () => {
    const { mostN, part } = breakingLoad(input, [{ part: 'chain', breakingN: 5000 }, { part: 'rope', breakingN: 4990 }])
    expect(part).toBe('rope')
    expect(solveRode({ ...input, horizontalLoadN: mostN }).tensionBowN).toBeCloseTo(4990, 3)
  })

  it('passes over what is unknown', () => {
    expect(breakingLoad(input, [{ part: 'chain', breakingN: null }, { part: 'rope', breakingN: 4990 }]).part).toBe('rope')
    expect(breakingLoad(input, [{ part: 'chain', breakingN: null }])).toEqual({ mostN: 1e9, part: '' })
  })

  it('is nothing for a rode that its own weight breaks', () => {
    expect(breakingLoad(input, [{ part: 'rope', breakingN: 50 }]).mostN).toBeLessThan(1e-3)
  })
})
