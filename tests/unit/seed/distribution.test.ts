import { describe, expect, it } from 'vitest'
import type { World, WorldPull } from '../../../seed/world'
import type { PulledSeabed } from '../../../seed/world/truth/holding'
import { makeWorld } from '../../../seed/world'
import { simulatePull } from '../../../seed/world/simulate'
import { anchorDaySd, firstPullWeak, pulledSeabeds, pullSd, rigErrorLn } from '../../../seed/world/truth/holding'
import { trueLnMedian, trueModificationRatio, trueNeverSetShare, trueTemper } from '../../../seed/world/truth'
import { normalCdf } from './normal'

// Thirty campaigns from the same true values, so that sampling error is small beside what is looked for.
const worlds: World[] = Array.from({ length: 30 }, (_, i) => makeWorld(`campaign-${i}`))
const pulls = worlds.flatMap(w => w.pulls)
const entered = (p: WorldPull) => p.fresh && (p.setting === 'set' || p.setting === 'setAfterDragging')
const mean = (xs: readonly number[]) => xs.reduce((sum, x) => sum + x, 0) / xs.length

function trueLn(p: WorldPull): number {
  const seabed = p.seabed as PulledSeabed
  const ratio = p.modification === null ? 1 : trueModificationRatio(p.modification, seabed)
  return trueLnMedian(p.design, seabed, p.massKg) + Math.log(ratio) + rigErrorLn
}

describe('the simulation follows the written-down truth', () => {
  it.each([800, 1250, 1500])('has as many pulls holding %i N as the truth says, where no first pull is weak', (stepN) => {
    for (const seabed of ['soft-mud', 'firm-mud', 'sandy-mud', 'cobble-over-sand'] as const) {
      const here = pulls.filter(p => p.seabed === seabed && entered(p))
      const sd = Math.hypot(pullSd[seabed], anchorDaySd)
      const expected = mean(here.map(p => normalCdf((trueLn(p) - Math.log(stepN)) / sd)))
      expect(Math.abs(mean(here.map(p => p.heldN >= stepN ? 1 : 0)) - expected), seabed).toBeLessThan(0.02)
    }
  })

  it('spreads soft-mud pulls by 0.30 within an anchor\'s day and 0.36 in all', () => {
    const here = pulls.filter(p => p.seabed === 'soft-mud' && entered(p) && p.modification === null && p.heldN > 0 && p.movedN !== null)
    const worldOf = new Map(worlds.flatMap(w => w.pulls.map(p => [p, w.seed] as const)))
    const residuals = here.map(p => ({ day: `${worldOf.get(p)}/${p.trial}/${p.design}`, r: Math.log(Math.sqrt(p.heldN * (p.movedN ?? NaN))) - trueLn(p) }))
    const days = new Map<string, number[]>()
    for (const { day, r } of residuals) days.set(day, [...days.get(day) ?? [], r])
    const groups = [...days.values()].filter(rs => rs.length > 1)
    const within = groups.flatMap(rs => rs.map(r => (r - mean(rs)) ** 2)).reduce((a, b) => a + b, 0) / groups.reduce((n, rs) => n + rs.length - 1, 0)
    expect(Math.abs(mean(residuals.map(x => x.r)))).toBeLessThan(0.02)
    expect(Math.sqrt(within)).toBeGreaterThan(0.28)
    expect(Math.sqrt(within)).toBeLessThan(0.33)
    expect(Math.sqrt(mean(residuals.map(x => x.r ** 2)))).toBeGreaterThan(0.34)
    expect(Math.sqrt(mean(residuals.map(x => x.r ** 2)))).toBeLessThan(0.39)
  })

  it.each(pulledSeabeds)('has never-set shares as written down on %s', (seabed) => {
    const here = pulls.filter(p => p.seabed === seabed && p.fresh && p.setting !== 'fouled')
    const shares = here.map(p => trueNeverSetShare(p.design, seabed))
    const sd = Math.sqrt(shares.reduce((sum, s) => sum + s * (1 - s), 0)) / here.length
    expect(Math.abs(mean(here.map(p => p.setting === 'neverSet' ? 1 : 0)) - mean(shares))).toBeLessThan(4 * sd)
  })

  it('drags steadily on cobble and never breaks out there', () => {
    const here = pulls.filter(p => p.seabed === 'cobble-over-sand' && entered(p) && p.movedN !== null)
    expect(here.length).toBeGreaterThan(500)
    expect(here.every(p => p.end === 'dragged')).toBe(true)
  })

  it('resets after a breakout and stays buried in a veer pull as often as the family does', () => {
    const familyOf = new Map(worlds[0]?.designs.map(d => [d.slug, d.family]))
    const temper = (p: WorldPull) => trueTemper(familyOf.get(p.design) ?? 'other', p.seabed as PulledSeabed)
    const tried = pulls.filter(p => p.after === 'reset' || p.after === 'didNotReset')
    const veered = pulls.filter(p => p.veerOutcome !== null)
    expect(Math.abs(mean(tried.map(p => (p.after === 'reset' ? 1 : 0) - temper(p).resetShare)))).toBeLessThan(0.04)
    expect(Math.abs(mean(veered.map(p => (p.veerOutcome === 'stayedBuried' ? 1 : 0) - temper(p).veerStaysShare)))).toBeLessThan(0.04)
  })

  it('has a first pull break out at half of the next now and then: 8 % of them on gravel, none on firm mud', () => {
    const n = 8000
    const share = (place: string, stepN: number) => {
      const trial = worlds[0]?.trials.find(t => t.place === place)
      const design = worlds[0]?.designs.find(d => d.slug === 'ulvesk')
      if (!trial || !design) throw new Error('the demo world must have this place and design')
      const plan = { design: design.slug, massKg: 20, modification: null, pair: null, firstOfDay: true, veer: false, mayContinue: false, eastM: 0, northM: 0 }
      const firsts = Array.from({ length: n }, (_, i) => simulatePull(trial, plan, design, 1, true, `first-${i}`)).filter(entered)
      const seabed = trial.seabed as PulledSeabed
      const below = (shift: number) => normalCdf((Math.log(stepN) - trueLnMedian('ulvesk', seabed, 20) - rigErrorLn - shift) / Math.hypot(pullSd[seabed], anchorDaySd))
      return { seen: mean(firsts.map(p => p.heldN < stepN ? 1 : 0)), strong: below(0), weak: below(Math.log(firstPullWeak.share)) }
    }
    const gravel = share('Shingle Neb', 1000)
    const mixed = 0.92 * gravel.strong + 0.08 * gravel.weak
    expect(mixed - gravel.strong).toBeGreaterThan(0.025)
    expect(Math.abs(gravel.seen - mixed)).toBeLessThan(0.012)
    const mud = share('Tarrack Bight', 3000)
    expect(Math.abs(mud.seen - mud.strong)).toBeLessThan(0.018)
  })
})
