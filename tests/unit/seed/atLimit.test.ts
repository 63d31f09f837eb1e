import { describe, expect, it } from 'vitest'
import { fitHolding } from '../../../shared/holding/fitHolding'
import { makeWorld, pullRecords } from '../../../seed/world'

describe('pulls counted as at the limit', () => {
  it('are those that the rig\'s limit ended, not those that were stopped early', () => {
    const world = makeWorld()
    const fit = fitHolding(pullRecords(world), { points: 0 })
    const counted = world.pulls.filter(pull => pull.end === 'atTheLimit' && pull.modification === null && pull.fresh)
    expect(counted.length).toBeGreaterThan(50)
    expect(world.pulls.filter(pull => pull.end === 'stoppedEarly').length).toBeGreaterThan(20)
    const total = fit.seabeds.flatMap(({ designs }) => designs).reduce((sum, { atLimit }) => sum + atLimit, 0)
    expect(total).toBe(counted.length)
  })
})
