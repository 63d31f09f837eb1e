import { describe, expect, it } from 'vitest'
import { makeWorld, pullRecords, truth } from '../../../seed/world'
import { fitHolding } from '../../../shared/holding/fitHolding'

describe('the fit of the demo world against its written-down truth', () => {
  const fit = fitHolding(pullRecords(makeWorld()))
  const cells = fit.seabeds.flatMap(({ seabed, designs }) => designs.map((d) => {
    const row: Readonly<Record<string, number>> = truth.lnMedian15Kg[d.design] ?? {}
    return { ...d, error: d.lnMean15Kg - (row[seabed] ?? NaN) }
  })).filter(d => d.pulls >= 5)

  it('covers the true median with about nine of ten 90 % intervals, where there are five pulls or more', () => {
    expect(cells.length).toBeGreaterThan(80)
    const covered = cells.filter(c => Math.abs(c.error) < 1.645 * c.lnSd).length / cells.length
    expect(covered).toBeGreaterThan(0.82)
  })

  it('is off by less than 0.25 in ln, root mean square, and by less than 0.1 on average', () => {
    const errors = cells.map(c => c.error)
    expect(Math.sqrt(errors.reduce((sum, e) => sum + e * e, 0) / errors.length)).toBeLessThan(0.25)
    expect(Math.abs(errors.reduce((sum, e) => sum + e, 0) / errors.length)).toBeLessThan(0.1)
  })

  it('finds the sds between pulls and between anchor-days, and next to none between trials', () => {
    expect(fit.sigma).toBeGreaterThan(0.3)
    expect(fit.sigma).toBeLessThan(0.4)
    expect(Math.abs(fit.sds.anchorDay - truth.anchorDaySd)).toBeLessThan(0.08)
    expect(fit.sds.trial).toBeLessThan(0.12)
  })

  it('finds that the blunted shank edge holds less, and does not call the paint worse', () => {
    const verdicts = (name: string) => fit.modifications.filter(m => m.modification === name).map(m => m.verdict)
    expect(verdicts('shank-edge-blunted').filter(v => v === 'worse').length).toBeGreaterThanOrEqual(2)
    expect(verdicts('shank-edge-blunted')).not.toContain('better')
    expect(verdicts('flukes-painted')).not.toContain('worse')
  })
}, 60_000)
