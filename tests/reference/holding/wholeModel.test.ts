import { describe, expect, it } from 'vitest'
import { fitHolding } from '#shared/holding/fitHolding'
import type { DesignEstimate, ModificationEstimate } from '#shared/types/holding'
import { pullsOf, rms, tableOf } from './fixture'

interface Row { name: string, mean: number, sd: number }

const reference = tableOf('rstan.csv')
const of = (kind: string): Row[] => reference.filter(row => row.kind === kind)
  .map(({ name, mean, sd }) => ({ name: name!, mean: Number(mean), sd: Number(sd) }))

const mean = (values: readonly number[]): number => values.reduce((sum, value) => sum + value, 0) / values.length

/** Source: full Bayes on the same pulls and priors by rstan; holding.stan, rstan.R and rstan.csv beside this file. */
describe('the whole model against full Bayes', () => {
  const fit = fitHolding(pullsOf('wholeModelPulls.csv'))
  const cells = new Map<string, DesignEstimate>(fit.seabeds.flatMap(({ seabed, designs }) => designs.map(one => [`${one.design} ${seabed}`, one])))
  const ratios = new Map<string, ModificationEstimate>(fit.modifications.map(one => [`${one.design} ${one.modification} ${one.seabed}`, one]))
  const sds: Record<string, number> = { ...fit.sds, sigma: fit.sigma }

  it('has the same cells, pulled or not', () => {
    expect([...cells.keys()].sort()).toEqual(of('cell').map(row => row.name).sort())
    expect([...cells.values()].some(cell => cell.pulls === 0)).toBe(true)
  })

  it('has means that differ by at most 0.03, root mean square', () => {
    expect(rms(of('cell').map(row => cells.get(row.name)!.lnMean15Kg - row.mean))).toBeLessThan(0.03)
    expect(rms(of('ratio').map(row => ratios.get(row.name)!.lnRatio - row.mean))).toBeLessThan(0.03)
    expect(rms(of('beta').map(row => fit.seabeds.find(({ seabed }) => seabed === row.name)!.betaMean - row.mean))).toBeLessThan(0.03)
  })

  it('has intervals within a tenth on average, and none far off', () => {
    const shares = [
      ...of('cell').map(row => cells.get(row.name)!.lnSd / row.sd), ...of('ratio').map(row => ratios.get(row.name)!.lnSd / row.sd),
    ]
    expect(mean(shares.map(share => Math.abs(share - 1)))).toBeLessThan(0.1)
    expect(Math.min(...shares)).toBeGreaterThan(0.8)
    expect(Math.max(...shares)).toBeLessThan(1.25)
  })

  it('has sds of the random terms within a tenth on average', () => {
    expect(mean(of('sd').map(row => Math.abs(sds[row.name]! / row.mean - 1)))).toBeLessThan(0.1)
  })
})
