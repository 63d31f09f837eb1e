import type { DesignEstimate } from '#shared/types/holding'
import type { RankedSeabed } from '#shared/types/ranking'
import { designIndex, massFactor, predictAt, type LnPrediction } from '#shared/holding/predict'
import { normalCdf, z90 } from '#shared/stats/normal'
import { holdingScore } from '#shared/ranking/chance'
import { isNumberedMix, type MixSeabed, type NumberedMix, type RankContext } from '#shared/ranking/context'
import { findHoldingWind, findTableWind, meetsTable } from '#shared/ranking/holdingWind'

/**
 * The mass that holding at another is scaled from: the nearest one pulled, where the anchor's lies outside 0.5 to 2 times
 * those pulled; null within, and without pulls.
 */
export function scaledFrom(massRangeKg: DesignEstimate['massRangeKg'], massKg: number): number | null {
  if (massRangeKg === null) return null
  const [least, most] = massRangeKg
  if (massKg < 0.5 * least) return least
  return massKg > 2 * most ? most : null
}

/**
 * Score of holding at the plan's wind, see holdingScore; no better than at any lesser wind. Past the published angles the
 * uplift factor is so unsure that the score of an anchor unlikely to hold could rise with the wind: what drags in less
 * does not hold in more (ours).
 */
export function planScore({ demand, variance }: RankContext, prediction: LnPrediction): number {
  let score = holdingScore(prediction, demand.survey, variance)
  if (score >= 0) return score
  for (const point of demand.lifted) score = Math.min(score, holdingScore(prediction, point, variance))
  return score
}

function withoutNumber({ seabed, share }: MixSeabed, upliftFactor: number): RankedSeabed {
  return {
    seabed,
    share,
    holdingN: null,
    upliftFactor,
    chance: null,
    setShare: null,
    holdingWind: null,
    tableWindMs: null,
    veer: null,
    pulls: 0,
    days: 0,
    atLimit: 0,
    scaledFromKg: null,
  }
}

/** A design on one seabed of the mix at a mass: holding, chance once set, holding wind, and what stands behind them. */
export function rankSeabed(context: RankContext, entry: MixSeabed, design: string, massKg: number): RankedSeabed {
  const { demand, variance } = context
  const index = entry.fit === null ? -1 : designIndex(entry.fit, design)
  const estimate = entry.fit?.designs[index]
  if (!isNumberedMix(entry) || estimate === undefined) return withoutNumber(entry, demand.upliftFactor)
  const prediction = predictAt(entry.fit, index, massKg)
  const { mean } = prediction
  const half = z90 * Math.sqrt(prediction.variance)
  const most = estimate.mostShown15KgN
  const mostShownN = most === null ? null : most * massFactor(entry.fit, massKg)
  return {
    seabed: entry.seabed,
    share: entry.share,
    holdingN: { median: Math.exp(mean), low90: Math.exp(mean - half), high90: Math.exp(mean + half) },
    upliftFactor: demand.upliftFactor,
    chance: normalCdf(planScore(context, prediction)),
    setShare: estimate.setShare,
    holdingWind: findHoldingWind(demand, prediction, variance, mostShownN),
    tableWindMs: findTableWind(demand, Math.exp(mean)),
    veer: estimate.veerShare,
    pulls: estimate.pulls,
    days: estimate.days,
    atLimit: estimate.atLimit,
    scaledFromKg: scaledFrom(estimate.massRangeKg, massKg),
  }
}

/** How a size of a design does on its worst seabed: the least chance once set, and whether the table load is met on all. */
export interface SizeResult { massKg: number, chanceWorst: number | null, meetsTable: boolean | null }

/**
 * One real size on every numbered seabed of the mix. chanceWorst is null where any of them has no estimate of the design,
 * or none carries a number.
 */
export function judgeSize(context: RankContext, numbered: readonly NumberedMix[], design: string, massKg: number): SizeResult {
  let lowest = Infinity
  let meets: boolean | null = context.demand.table === null ? null : true
  for (const { fit } of numbered) {
    const index = designIndex(fit, design)
    if (index < 0) return { massKg, chanceWorst: null, meetsTable: null }
    const prediction = predictAt(fit, index, massKg)
    lowest = Math.min(lowest, planScore(context, prediction))
    if (meets && !meetsTable(context.demand, prediction.mean)) meets = false
  }
  if (numbered.length === 0) return { massKg, chanceWorst: null, meetsTable: null }
  return { massKg, chanceWorst: normalCdf(lowest), meetsTable: meets }
}
