import { describe, expect, it } from 'vitest'
import { calibrate } from './calibration'

describe('calibration over twenty simulated campaigns', () => {
  const result = calibrate(20)

  it('covers the true median 87 to 93 times in a hundred', () => {
    expect(result.coverage).toBeGreaterThan(0.87)
    expect(result.coverage).toBeLessThan(0.93)
  })

  it('is off by at most three quarters of what the plain mean is', () => {
    expect(result.estimateError / result.plainError).toBeLessThan(0.75)
  })
})
