import { describe, expect, it } from 'vitest'
import { fitHolding } from '#shared/holding/fitHolding'
import { modificationVerdict } from '#shared/holding/modifications'
import type { PullRecord } from '#shared/types/holding'
import { pull } from '../../factories/pull'

/** Back-to-back pairs over several days, the modified anchor holding `ratio` times as much. */
function pairs(ratio: number, named: boolean): PullRecord[] {
  return Array.from({ length: 24 }, (_, i) => {
    const heldN = 1000 * (1 + 0.1 * (i % 4)) * (i % 2 === 0 ? 1 : ratio)
    return pull({
      trial: `t${i >> 2}`, heldN, movedN: heldN * 1.02, ...(i % 2 === 0 ? {} : { modification: 'blunted-edge' }),
      ...(named ? { pair: `p${(i >> 1) % 2}` } : {}),
    })
  })
}

describe('a modification', () => {
  it.each([[2, 'better'], [0.5, 'worse']] as const)('that makes it hold %d times as much is %s', (ratio, verdict) => {
    const [one] = fitHolding(pairs(ratio, true)).modifications
    expect(one).toMatchObject({ design: 'd1', modification: 'blunted-edge', seabed: 'loose-sand', pulls: 12, pairs: 12, verdict })
    expect(Math.sign(one!.lnRatio)).toBe(Math.sign(Math.log(ratio)))
  })

  it('carries no verdict without back-to-back pairs', () => {
    expect(fitHolding(pairs(2, false)).modifications[0]).toMatchObject({ pairs: 0, verdict: null })
  })

  it('is not counted among the unmodified pulls', () => {
    expect(fitHolding(pairs(2, true)).seabeds[0]!.designs[0]).toMatchObject({ pulls: 12, days: 6 })
  })

  it.each([
    [0.02, 0.05, 'noDifference'], [0.3, 0.1, 'better'], [-0.3, 0.1, 'worse'], [0.1, 0.1, 'cannotTell'], [0.09, 0.02, 'noDifference'],
  ] as const)('with ln ratio %d and sd %d is judged %s', (lnRatio, lnSd, verdict) => {
    expect(modificationVerdict(lnRatio, lnSd)).toBe(verdict)
  })
})
