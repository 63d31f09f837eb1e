import { describe, expect, it } from 'vitest'
import { calibrate } from './calibration'

/**
 * Six campaigns, so that it fits into every run: the bounds are wider than over twenty (calibration.long.test.ts), since about 770
 * cells that share rigs and designs are worth some hundred independent ones (two standard errors: 5 points).
 */
describe('calibration over six simulated campaigns', () => {
  const result = calibrate(6)

  it('covers the true median about nine times in ten', () => {
    expect(result.coverage).toBeGreaterThan(0.83)
    expect(result.coverage).toBeLessThan(0.96)
  })

  it('stands nearer to the truth than the plain mean', () => {
    expect(result.estimateError / result.plainError).toBeLessThan(0.75)
  })
})
