import { describe, expect, it } from 'vitest'
import { holdingModel } from '#shared/holding/holdingModel'
import { sdNames } from '#shared/holding/effects'
import { fitMixedModel } from '#shared/stats/fitMixedModel'
import { canonicalOrder } from '#shared/trial/canonical'
import { pullsOf, tableOf } from './fixture'

/** What lme4 calls the random terms. */
const lme4Names: Record<string, string> = {
  family: 'family:seabed', design: 'design', designSeabed: 'design:seabed', trial: 'trial', anchorDay: 'trial:design',
}

/** Source: R lme4::lmer(REML = FALSE) on the same values; lme4.R and lme4.csv beside this file. */
describe('nearly exact values against lme4', () => {
  const model = holdingModel(canonicalOrder(pullsOf('exactPulls.csv')), { likelihood: true })
  const names = [...model.columnOf.keys()].filter(key => /^\["(seabed|exponent)/.test(key))
  const contrasts = names.map(key => [{ cols: [model.columnOf.get(key)!], unseen: [] }])
  const fit = fitMixedModel(model.mixed, contrasts, { points: 0 })
  const reference = new Map(tableOf('lme4.csv').map(row => [row.name!, Number(row.value)]))

  it.each(names.map((key, i) => [key, i] as const))('gives the fixed mean %s', (key, i) => {
    const [kind, seabed] = JSON.parse(key) as [string, string]
    const centre = kind === 'seabed' ? model.centre : 0
    const expected = reference.get(kind === 'seabed' ? `seabed${seabed}` : `seabed${seabed}:lnm`)!
    expect(Math.abs(fit.moments[i]!.mean[0]! + centre - expected)).toBeLessThan(0.02)
  })

  it.each(sdNames.filter(name => name in lme4Names))('gives the sd of %s', (name) => {
    const expected = reference.get(`sd ${lme4Names[name]}`)!
    expect(expected).toBeGreaterThan(0)
    expect(Math.abs(fit.groupSds[model.groups.indexOf(name)]! / expected - 1)).toBeLessThan(0.05)
  })

  it('gives sigma', () => {
    expect(Math.abs(fit.sigma / reference.get('sd Residual')! - 1)).toBeLessThan(0.05)
  })
})
