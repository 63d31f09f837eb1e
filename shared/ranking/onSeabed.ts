import type { SeabedFit } from '#shared/types/holding'
import type { CatalogueDesign } from '#shared/types/ranking'
import type { SeabedRow } from '#shared/types/reading'
import { predictAt } from '#shared/holding/predict'
import { z90 } from '#shared/stats/normal'
import { hasEvidence } from '#shared/ranking/evidence'
import { chanceHigher, coinToss } from '#shared/ranking/order'
import { scaledFrom } from '#shared/ranking/seabedRow'

export interface SeabedOrder { ranked: SeabedRow[], thin: SeabedRow[], neverPulled: number }

function rowOf(fit: SeabedFit, index: number, massKg: number, name: string): SeabedRow | null {
  const estimate = fit.designs[index]
  if (estimate === undefined) return null
  const { mean, variance } = predictAt(fit, index, massKg)
  const half = z90 * Math.sqrt(variance)
  const { design, family, pulls, days, atLimit, setShare, resetShare, veerShare } = estimate
  return {
    rank: null, design, name, family, pulls, days, atLimit, setShare, resetShare, veerShare,
    holdingN: { median: Math.exp(mean), low90: Math.exp(mean - half), high90: Math.exp(mean + half) },
    scaledFromKg: scaledFrom(estimate.massRangeKg, massKg),
    tiedWithNext: false,
    ticks: [],
  }
}

const byMedian = (a: SeabedRow, b: SeabedRow): number => b.holdingN.median - a.holdingN.median || (a.design < b.design ? -1 : 1)

/**
 * The designs on one seabed in order of their true median holding, flat pull, all at one mass: no plan, no load. Neighbours
 * whose order is a coin-toss (0.35 < Pr(higher) < 0.65 from the joint covariance) are marked; the mass drops out of that.
 * Designs with fewer than 5 pulls or on fewer than 2 days stand apart, most pulls first; those never pulled are counted.
 *
 * @param massKg anchor mass, kg, more than 0
 * @throws RangeError for a mass that is not positive
 */
export function orderOnSeabed(fit: SeabedFit, catalogue: readonly CatalogueDesign[], massKg: number): SeabedOrder {
  const names = new Map(catalogue.map(({ slug, name }) => [slug, name]))
  const rows = fit.designs.map(({ design }, index) => rowOf(fit, index, massKg, names.get(design) ?? design)).filter(row => row !== null)
  const pulled = rows.filter(({ pulls }) => pulls > 0)
  const ranked = pulled.filter(hasEvidence).sort(byMedian)
  const entry = { seabed: fit.seabed, share: 1, fit }
  const marked = ranked.map((row, index) => {
    const next = ranked[index + 1]
    const chance = next ? chanceHigher(entry, row.design, next.design) : null
    return { ...row, rank: index + 1, tiedWithNext: chance !== null && chance > coinToss.low && chance < coinToss.high }
  })
  const thin = pulled.filter(row => !hasEvidence(row)).sort((a, b) => b.pulls - a.pulls || byMedian(a, b))
  return { ranked: marked, thin, neverPulled: rows.length - pulled.length }
}
