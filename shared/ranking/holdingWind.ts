import type { HoldingWind } from '#shared/types/ranking'
import type { LnPrediction } from '#shared/holding/predict'
import { normalQuantile } from '#shared/stats/normal'
import { holdingScore, type DemandPoint } from '#shared/ranking/chance'
import type { PlanDemand } from '#shared/ranking/context'
import { greatestSpeed } from '#shared/ranking/speedSearch'

/** The chance that a holding wind stands for: nine of ten separate anchorings, each properly set on its own day. */
export const holdingWindChance = 0.9

const score90 = normalQuantile(holdingWindChance)

/** ln of what the anchor must be able to hold flat, minus ln of what it can: 0 or more where it can. */
function reserve(lnHoldingN: number, point: DemandPoint): number {
  return point.lnLoad === -Infinity ? Infinity : lnHoldingN + point.lnUplift - point.lnLoad
}

/** The gust up to which the most any pull showed would have held, m/s; Infinity where that is past the wind reached anyway. */
function shownWind({ surveyByGust }: PlanDemand, lnMostN: number, reachedMs: number): number {
  if (reachedMs < Infinity && reserve(lnMostN, surveyByGust.at(reachedMs)) >= 0) return Infinity
  return greatestSpeed(surveyByGust, point => reserve(lnMostN, point)) ?? 0
}

/**
 * The wind at which the chance once set falls to 0.9, said as mean and gust. Capped at the wind where F/r equals the most
 * any pull of this design on this seabed showed, scaled to the anchor's mass; `atLeast` where the cap decides. A gust
 * past the table's last speed (64 kn) or a chance under 0.9 in calm is said in words, without a number.
 *
 * @param demand the plan's demand by wind
 * @param prediction posterior of ln holding at the anchor's mass
 * @param variance from anchoringVariance
 * @param mostShownN greatest held/r of any pull, scaled to the anchor's mass, N; null without pulls
 */
export function findHoldingWind(
  demand: PlanDemand, prediction: LnPrediction, variance: number, mostShownN: number | null,
): HoldingWind {
  const reached = greatestSpeed(demand.surveyByGust, point => holdingScore(prediction, point, variance) - score90)
  if (reached === null) return { reason: 'doesNotReach' }
  const shown = mostShownN === null ? Infinity : shownWind(demand, Math.log(mostShownN), reached)
  const gustMs = Math.min(reached, shown)
  if (gustMs === Infinity) return { reason: 'beyond64kn' }
  return { meanMs: gustMs / demand.gustFactor, gustMs, atLeast: shown < reached }
}

/**
 * The wind, as entered, at which the table load with any current meets the median holding that the rode's angle at that
 * load leaves: a second opinion, never a chance.
 *
 * @param medianN true median holding for a flat pull at the anchor's mass, N
 * @returns m/s; null outside the table, where it is not met even in calm, and past the table's last speed (64 kn)
 */
export function findTableWind(demand: PlanDemand, medianN: number): number | null {
  if (demand.tableByWind === null) return null
  const lnMedian = Math.log(medianN)
  const speedMs = greatestSpeed(demand.tableByWind, point => reserve(lnMedian, point))
  return speedMs === Infinity ? null : speedMs
}

/** Whether the median holding left at the table load's angle is at least the table load; null outside the table. */
export function meetsTable(demand: PlanDemand, lnMedian: number): boolean | null {
  return demand.table === null ? null : reserve(lnMedian, demand.table) >= 0
}

/** Holding winds in order: not reached in calm lowest, past 64 kn highest, the rest by their gust in m/s. */
export function windRank(wind: HoldingWind): number {
  if ('gustMs' in wind) return wind.gustMs
  return wind.reason === 'doesNotReach' ? -1 : Infinity
}
