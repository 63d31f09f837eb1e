import { describe, expect, it } from 'vitest'
import { betaBinomialShares } from '#shared/stats/betaBinomial'
import { logGamma } from '#shared/stats/gamma'
import { betaCdf, betaQuantile } from '#shared/stats/incompleteBeta'

describe('the beta distribution', () => {
  it.each([
    [0.01, 4.599479878042022], [0.3, 1.0957979948180756], [1.5, -0.12078223763524518], [10, 12.801827480081469],
    [1234.5, 7550.550901077894],
  ])('has ln Gamma(%d) of R 4.2.2 lgamma', (x, expected) => {
    expect(Math.abs(logGamma(x) / expected - 1)).toBeLessThan(1e-12)
  })

  it.each([
    [0.1, 0.3, 4, 0.7702924515085486], [0.5, 2, 3, 0.6875], [0.9, 5, 0.5, 0.3166429150200122], [0.999, 30, 0.2, 0.46389281018655004],
  ])('has the distribution function of R 4.2.2 pbeta at %d for (%d, %d)', (x, a, b, expected) => {
    expect(betaCdf(x, a, b)).toBeCloseTo(expected, 12)
  })

  it.each([
    [0.05, 0.3, 4, 0.000008772617902751665], [0.95, 2, 3, 0.7513953742698184], [0.5, 50, 2, 0.9673091500837798],
  ])('has the quantile of R 4.2.2 qbeta at %d for (%d, %d)', (p, a, b, expected) => {
    expect(Math.abs(betaQuantile(p, a, b) / expected - 1)).toBeLessThan(1e-8)
  })

  it('refuses what lies outside', () => {
    expect(() => betaCdf(1.1, 1, 1)).toThrow(/x must be between 0 and 1, got 1.1/)
    expect(() => betaQuantile(-0.1, 1, 1)).toThrow(RangeError)
    expect(() => logGamma(0)).toThrow(/x must be above 0, got 0/)
  })
})

describe('shares', () => {
  it('are drawn together where designs are alike, and less where there are more pulls', () => {
    const [few, many, whole] = betaBinomialShares([{ successes: 0, trials: 2 }, { successes: 0, trials: 30 }, { successes: 20, trials: 30 }])
    expect(few!.mean).toBeGreaterThan(many!.mean)
    expect(few!.high90 - few!.low90).toBeGreaterThan(many!.high90 - many!.low90)
    expect(whole!.mean).toBeGreaterThan(0.5)
    expect(whole!.mean).toBeLessThan(2 / 3)
  })

  it('are null where nothing was tried, and half with one in two', () => {
    expect(betaBinomialShares([{ successes: 0, trials: 0 }])).toEqual([null])
    const [one] = betaBinomialShares([{ successes: 1, trials: 2 }])
    expect(one!.mean).toBeCloseTo(0.5, 12)
    expect(one!.low90 + one!.high90).toBeCloseTo(1, 10)
  })

  it('refuse counts that cannot be', () => {
    expect(() => betaBinomialShares([{ successes: 3, trials: 2 }])).toThrow(/successes must be whole and between 0 and trials, got 3 of 2/)
  })
})
