import type { HoldingSds } from '#shared/types/holding'
import type { LnPrediction } from '#shared/holding/predict'
import { upliftFactor, upliftSd } from '#shared/rode/uplift'

/** Sd of ln F: how far the survey load itself may be off (ours). */
export const loadSd = 0.25

/** What the rode passes on at one load: ln F, ln r at its shank angle, and tau_r squared. */
export interface DemandPoint { lnLoad: number, lnUplift: number, upliftVariance: number }

/** A load the rode cannot bound: nothing holds against it. */
export const unboundedDemand: DemandPoint = { lnLoad: Infinity, lnUplift: 0, upliftVariance: 0 }

/**
 * What an anchor has to resist.
 *
 * @param loadN horizontal load, N, 0 or more
 * @param angleRad shank angle at that load, rad, 0 to pi/2
 * @throws RangeError for a negative load or an angle outside its range
 */
export function demandPoint(loadN: number, angleRad: number): DemandPoint {
  if (!(loadN >= 0)) throw new RangeError(`load must be 0 N or more, got ${loadN}`)
  return { lnLoad: Math.log(loadN), lnUplift: Math.log(upliftFactor(angleRad)), upliftVariance: upliftSd(angleRad) ** 2 }
}

/**
 * Variance of one anchoring about the true median, besides the estimate's own and the uplift factor's:
 * between pulls, between days, between anchor-days, and the load's (0.25, ours).
 *
 * @param sigma residual sd of ln holding
 */
export function anchoringVariance(sigma: number, sds: Pick<HoldingSds, 'trial' | 'anchorDay'>): number {
  return sigma ** 2 + sds.trial ** 2 + sds.anchorDay ** 2 + loadSd ** 2
}

/**
 * Standard score of holding: (m + ln r - ln F) / sqrt(v + sigma^2 + s_u^2 + s_w^2 + tau_F^2 + tau_r^2); the chance once
 * set is its normal probability. Infinite without a load, minus infinity for a load the rode cannot bound.
 *
 * @param prediction posterior of the true median's logarithm at the anchor's mass
 * @param demand what the rode passes on
 * @param variance from anchoringVariance
 */
export function holdingScore(prediction: LnPrediction, demand: DemandPoint, variance: number): number {
  if (demand.lnLoad === Infinity) return -Infinity
  if (demand.lnLoad === -Infinity) return Infinity
  const sd = Math.sqrt(prediction.variance + variance + demand.upliftVariance)
  return (prediction.mean + demand.lnUplift - demand.lnLoad) / sd
}
