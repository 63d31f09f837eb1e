import { describe, expect, it } from 'vitest'
import { movesBetween, type Holding } from '#shared/holding/moves'

const holding = (design: string, medianN: number, lnSd = 0.2, pulls = 3): Holding => ({ design, name: design, seabed: 'loose-sand', lnMean: Math.log(medianN), lnSd, pulls })

describe('how estimates moved', () => {
  it('compares what both give, furthest first, and counts what came in', () => {
    const moves = movesBetween([holding('a', 1000), holding('b', 2000), holding('gone', 500)], [holding('a', 1500, 0.1), holding('b', 1900, 0.1, 9), holding('new', 800)])
    expect(moves).toMatchObject({ compared: 2, added: 1, movedMuch: 1, outside: 1 })
    expect(moves.largest.map(({ design }) => design)).toEqual(['a', 'b'])
    expect(moves.largest[0]?.ratio).toBeCloseTo(1.5, 12)
    expect(moves.widthRatio).toBeCloseTo(0.5, 12)
    expect(moves.largest[1]).toMatchObject({ before: { pulls: 3 }, after: { pulls: 9 } })
  })

  it('holds the new median against the earlier 90 % interval: 1.645 standard deviations (normal tables)', () => {
    const to = (sds: number) => movesBetween([holding('a', 1000)], [{ ...holding('a', 1000), lnMean: Math.log(1000) + sds * 0.2 }]).outside
    expect([to(1.64), to(1.65), to(-1.64), to(-1.65)]).toEqual([0, 1, 0, 1])
  })

  it('counts a halving and a doubling alike', () => {
    const { largest, movedMuch } = movesBetween([holding('a', 1000), holding('b', 1000), holding('c', 1000)], [holding('a', 500), holding('b', 2000), holding('c', 1149)])
    expect(movedMuch).toBe(2)
    expect(largest.map(({ design }) => design)).toEqual(['a', 'b', 'c'])
  })

  it('has nothing to compare with before the first', () => {
    expect(movesBetween([], [holding('a', 1)])).toEqual({ compared: 0, added: 1, movedMuch: 0, outside: 0, widthRatio: null, largest: [] })
  })
})
