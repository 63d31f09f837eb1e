import { describe, expect, it } from 'vitest'
import { erf, erfcx } from '#shared/stats/erfcx'
import { logNormalCdf, normalCdf, normalQuantile } from '#shared/stats/normal'

const relative = (value: number, expected: number): number => Math.abs(value - expected) / Math.abs(expected)

describe('the normal distribution', () => {
  it.each([
    [-40, -804.6084420137538], [-10, -53.23128515051247], [-1, -1.8410216450092636], [0, -0.6931471805599453],
    [1, -0.17275377902344988], [8, -6.220960574271787e-16],
  ])('gives ln Phi(%d) as R 4.2.2 pnorm(log.p = TRUE) does', (x, expected) => {
    expect(relative(logNormalCdf(x), expected)).toBeLessThan(1e-13)
  })

  it.each([
    [1e-12, -7.034483825301132], [0.05, -1.6448536269514726], [0.3, -0.5244005127080407], [0.9, 1.2815515655446008],
    [0.999999, 4.753424308817089],
  ])('gives the quantile of %d as R 4.2.2 qnorm does', (p, expected) => {
    expect(relative(normalQuantile(p), expected)).toBeLessThan(1e-12)
  })

  it.each([
    [-2, 108.94090438997796], [0.1, 0.8964569799691267], [0.5, 0.6156903441929259], [2, 0.25539567631050564],
    [3.9, 0.14031418160068915],
  ])('gives erfcx(%d) as R 4.2.2 does from pnorm', (x, expected) => {
    expect(relative(erfcx(x), expected)).toBeLessThan(1e-13)
  })

  it('falls to 1/(x sqrt(pi)) far out and never underflows', () => {
    expect(relative(erfcx(1e8), 1 / (1e8 * Math.sqrt(Math.PI)))).toBeLessThan(1e-14)
    expect(erfcx(Infinity)).toBe(0)
  })

  it('is odd in erf, and rises to 1 in Phi', () => {
    expect(erf(-0.3)).toBe(-erf(0.3))
    expect(erf(7)).toBe(1)
    expect(normalCdf(0)).toBeCloseTo(0.5, 15)
    expect(normalCdf(40)).toBe(1)
  })

  it('refuses what is no number or no probability', () => {
    expect(() => erfcx(NaN)).toThrow(/x must be a number, got NaN/)
    expect(() => normalQuantile(0)).toThrow(/p must lie strictly between 0 and 1, got 0/)
    expect(() => normalQuantile(1.2)).toThrow(RangeError)
  })
})
