import { describe, expect, it } from 'vitest'
import { betaBinomialShares } from '#shared/stats/betaBinomial'
import { tableOf } from './fixture'

/** Source: R, the same prior on a 400 x 400 grid with exact mixture quantiles; shares.R and shares.csv beside this file. */
describe('beta-binomial shares against R', () => {
  const rows = tableOf('shares.csv').map(row => Object.fromEntries(Object.entries(row).map(([name, text]) => [name, Number(text)])))
  const shares = betaBinomialShares(rows.map(row => ({ successes: row.successes!, trials: row.trials! })))

  it.each(rows.map((row, i) => [row.successes, row.trials, i] as const))('gives %d of %d', (_, trials, i) => {
    expect(shares[i]!.mean).toBeCloseTo(rows[i]!.mean!, 2)
    expect(Math.abs(shares[i]!.mean - rows[i]!.mean!)).toBeLessThan(0.005)
    expect(Math.abs(shares[i]!.low90 - rows[i]!.low90!)).toBeLessThan(0.02)
    expect(Math.abs(shares[i]!.high90 - rows[i]!.high90!)).toBeLessThan(0.02)
    expect(shares[i]!.n).toBe(trials)
  })
})
