import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { rankDesigns } from '#shared/ranking/rank'
import type { RankingRequest } from '#shared/types/ranking'
import { numberedSeabeds, swells } from '#shared/types/words'
import { KN_MS } from '#shared/units/constants'
import { makeCovariance, makeDesign, makeEstimate, makeFit, makeSeabedFit } from '../../factories/fit'
import { makePlan } from '../../factories/plan'

const beds = ['loose-sand', 'firm-mud', 'sandy-mud'] as const
const names = ['alder', 'birch', 'cedar', 'elm', 'fir']
const number = (min: number, max: number) => fc.double({ min, max, noNaN: true })

/** Any estimates of five designs on three seabeds: medians at 15 kg of 0.3 to 30 kN, correlated, with and without caps. */
const anyFit = fc.record({
  medians: fc.array(number(Math.log(300), Math.log(30_000)), { minLength: 15, maxLength: 15 }),
  sds: fc.array(number(0.02, 0.6), { minLength: 15, maxLength: 15 }),
  shared: number(0, 0.1),
  betaSd: number(0, 0.1),
  cap: number(0.2, 4),
  sigma: number(0.2, 0.6),
}).map(({ medians, sds, shared, betaSd, cap, sigma }) => makeFit(beds.map((seabed, s) => {
  const estimates = names.map((name, i) => {
    const median = Math.exp(medians[s * 5 + i] ?? 0)
    return makeEstimate(name, median, { lnSd: Math.hypot(sds[s * 5 + i] ?? 0, Math.sqrt(shared)), mostShown15KgN: cap * median })
  })
  return makeSeabedFit(seabed, estimates, { covariance: makeCovariance(sds.slice(s * 5, s * 5 + 5), shared, betaSd) })
}), { sigma }))

/** Any sensible rode and weather: scope 1.05 to 10, chain alone or with rope. */
const anyPlan = fc.record({
  depthM: number(2, 30), scope: number(1.05, 10), chainShare: fc.constantFrom(1, 0.5, 0.1), diameterMm: fc.constantFrom(6, 8, 10, 13),
  swell: fc.constantFrom(...swells), currentMs: fc.constantFrom(0, 0.5, 1.5), speedMs: number(3, 25), kind: fc.constantFrom('mean' as const, 'gust' as const),
}).map(({ depthM, scope, chainShare, diameterMm, speedMs, kind, ...more }): RankingRequest => {
  const lengthM = (depthM + 2) * scope
  const chain = { lengthM: chainShare * lengthM, diameterMm, grade: 'G40' as const }
  const rope = { lengthM: (1 - chainShare) * lengthM, diameterMm: 16, construction: 'nylon3Strand' as const }
  const snubber = { lengthM: 8, diameterMm: 18, construction: 'nylon3Strand' as const }
  return makePlan({
    ...more, depthM, wind: { speedMs, kind }, rode: chainShare < 1 ? { chain, rope, snubber } : { chain, snubber },
    seabeds: [{ seabed: 'loose-sand', share: 0.5 }, { seabed: 'firm-mud', share: 0.3 }, { seabed: 'sandy-mud', share: 0.2 }],
  })
})

const catalogue = names.map(name => makeDesign(name))

describe('a ranking', () => {
  it('never raises a chance that is at least 0.01 when there is more wind', () => {
    fc.assert(fc.property(anyFit, anyPlan, number(0.01, 10), (fit, plan, more) => {
      const before = rankDesigns(plan, catalogue, fit)
      const after = rankDesigns({ ...plan, wind: { ...plan.wind, speedMs: plan.wind.speedMs + more } }, catalogue, fit)
      for (const row of after.rows) {
        const earlier = before.rows.find(({ design }) => design === row.design)
        row.seabeds.forEach(({ chance }, i) => {
          const then = earlier?.seabeds[i]?.chance ?? Number.NaN
          if (then >= 0.01) expect(chance ?? Number.NaN).toBeLessThanOrEqual(then + 1e-6)
        })
      }
    }), { numRuns: 150 })
  })

  it('never lowers a chance when the anchor is heavier', () => {
    fc.assert(fc.property(anyFit, anyPlan, number(3, 60), number(0.1, 40), (fit, plan, massKg, more) => {
      const light = rankDesigns({ ...plan, massKg }, catalogue, fit)
      const heavy = rankDesigns({ ...plan, massKg: massKg + more }, catalogue, fit)
      for (const row of heavy.rows) {
        const lighter = light.rows.find(({ design }) => design === row.design)
        row.seabeds.forEach(({ chance }, i) => expect(chance ?? -1).toBeGreaterThanOrEqual((lighter?.seabeds[i]?.chance ?? 0) - 1e-9))
      }
    }), { numRuns: 100 })
  })

  it('comes back as a chance of 0.9 when its holding wind is asked for, said as a mean or as a gust', () => {
    let seen = 0
    fc.assert(fc.property(anyFit, anyPlan, (fit, plan) => {
      const { rows } = rankDesigns(plan, catalogue, fit)
      const entry = rows.flatMap(({ design, seabeds }) => seabeds.map(seabed => ({ design, seabed }))).find(({ seabed }) => {
        const wind = seabed.holdingWind
        return wind !== null && 'gustMs' in wind && !wind.atLeast
      })
      const wind = entry?.seabed.holdingWind
      if (entry === undefined || !wind || !('gustMs' in wind)) return
      for (const [kind, speedMs] of [['gust', wind.gustMs], ['mean', wind.meanMs]] as const) {
        const again = rankDesigns({ ...plan, wind: { kind, speedMs } }, catalogue, fit)
        const row = again.rows.find(({ design }) => design === entry.design)
        // no row: the wind is the one past which the rode cannot bound the surge
        if (row === undefined) continue
        const chance = row.seabeds.find(({ seabed }) => seabed === entry.seabed.seabed)?.chance ?? Number.NaN
        seen++
        if (plan.swell === 'none') expect(Math.abs(chance - 0.9)).toBeLessThan(0.001)
        else expect(chance).toBeGreaterThan(0.899)
      }
    }), { numRuns: 150 })
    expect(seen).toBeGreaterThan(100)
  })

  it('does not care for the order of designs, seabeds, or estimates', () => {
    fc.assert(fc.property(anyFit, anyPlan, fc.constantFrom('worst' as const, 'weighted' as const), (fit, plan, order) => {
      const one = rankDesigns({ ...plan, order }, catalogue, fit)
      const seabeds = [...plan.seabeds].reverse()
      const other = rankDesigns({ ...plan, order, seabeds }, [...catalogue].reverse(), { ...fit, seabeds: [...fit.seabeds].reverse() })
      expect(other.rows.map(({ design, tiedWithNext, worst }) => [design, tiedWithNext, worst?.seabed]))
        .toEqual(one.rows.map(({ design, tiedWithNext, worst }) => [design, tiedWithNext, worst?.seabed]))
    }), { numRuns: 60 })
  })

  it('keeps its rows in the order it names, and every figure within its bounds', () => {
    fc.assert(fc.property(anyFit, anyPlan, (fit, plan) => {
      const { rows, load } = rankDesigns(plan, catalogue, fit)
      if (load.designN === null) expect(rows).toEqual([])
      const winds = rows.map(({ worst }) => {
        const wind = worst?.holdingWind
        if (wind === undefined) return Number.NaN
        if ('reason' in wind) return wind.reason === 'doesNotReach' ? -1 : Infinity
        expect(wind.gustMs).toBeLessThanOrEqual(64 * KN_MS)
        expect(wind.meanMs).toBeLessThanOrEqual(wind.gustMs)
        return wind.gustMs
      })
      expect(winds).toEqual([...winds].sort((a, b) => b === a ? 0 : b - a))
      for (const row of rows) {
        expect(row.weightedChance).toBeLessThanOrEqual(1)
        for (const { holdingN, chance, upliftFactor } of row.seabeds) {
          expect(chance).toBeGreaterThanOrEqual(0)
          expect(upliftFactor).toBeGreaterThanOrEqual(0.1)
          expect(holdingN?.low90).toBeLessThanOrEqual(holdingN?.median ?? 0)
          expect(holdingN?.high90).toBeGreaterThanOrEqual(holdingN?.median ?? Infinity)
        }
      }
    }), { numRuns: 100 })
  })

  it('answers for every numbered seabed there is', () => {
    const fit = makeFit(numberedSeabeds.map(seabed => makeSeabedFit(seabed, names.map(name => makeEstimate(name, 3000)))))
    const seabeds = numberedSeabeds.map(seabed => ({ seabed, share: 1 / numberedSeabeds.length }))
    const { rows } = rankDesigns(makePlan({ seabeds }), catalogue, fit)
    expect(rows.length).toBe(5)
    expect(rows[0]?.seabeds.length).toBe(numberedSeabeds.length)
  })
})
