import { describe, expect, it } from 'vitest'
import { answerFit } from '#shared/holding/whatWouldTheySay'
import { pullsOf, tableOf } from './fixture'

/** Source: R survival::survreg, dist = "lognormal", interval2; survreg.R and survreg.csv beside this file. */
describe('free means against survreg', () => {
  const answer = answerFit({ pulls: pullsOf('freeMeansPulls.csv'), pooled: false })
  const reference = tableOf('survreg.csv')
  const of = (cell: string) => answer.estimates.find(one => `${one.design} ${one.seabed}` === cell)

  it('finds the same cells to have a finite mean', () => {
    const finite = answer.estimates.filter(one => one.lnMean15Kg !== null).map(one => `${one.design} ${one.seabed}`)
    expect(finite.sort()).toEqual(reference.map(row => row.cell).filter(cell => cell !== 'sigma').sort())
  })

  it.each(reference.filter(row => row.cell !== 'sigma'))('gives the mean and standard error of $cell', (row) => {
    expect(Math.abs(of(row.cell!)!.lnMean15Kg! - Number(row.mean))).toBeLessThan(1e-4)
    expect(Math.abs(of(row.cell!)!.lnSd! - Number(row.se))).toBeLessThan(1e-4)
  })

  it('gives sigma', () => {
    expect(Math.abs(answer.sigma! - Number(reference.find(row => row.cell === 'sigma')!.mean))).toBeLessThan(1e-4)
  })
})
