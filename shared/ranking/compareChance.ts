import type { HoldingSds } from '#shared/types/holding'
import type { ComparisonVerdict } from '#shared/types/comparison'
import type { LnPrediction } from '#shared/holding/predict'
import { coinToss } from '#shared/ranking/order'
import { hasEvidence } from '#shared/ranking/evidence'
import { normalCdf, z90 } from '#shared/stats/normal'

/** From this chance on "very likely" is said (ours): nine in ten, as for a holding wind. */
export const veryLikelyFrom = 0.9

/**
 * Chance that a normal difference is above 0; one half where it is known to be 0.
 *
 * @returns 0 to 1; of the difference turned round it is one minus this
 */
export function chanceAbove({ mean, variance }: LnPrediction): number {
  if (variance > 0) return normalCdf(mean / Math.sqrt(variance))
  return mean === 0 ? 0.5 : Number(mean > 0)
}

/**
 * The same when each anchor is pulled once, side by side on one day: the day is shared, the anchor's own day and the
 * spread between pulls come in once for each.
 *
 * @param sigma residual sd of ln holding
 */
export function chanceInOneTry({ mean, variance }: LnPrediction, sigma: number, { anchorDay }: Pick<HoldingSds, 'anchorDay'>): number {
  return chanceAbove({ mean, variance: variance + 2 * (sigma ** 2 + anchorDay ** 2) })
}

/** Ratio of the two medians with its 90 % interval. */
export function ratioOf({ mean, variance }: LnPrediction): { median: number, low90: number, high90: number } {
  const half = z90 * Math.sqrt(variance)
  return { median: Math.exp(mean), low90: Math.exp(mean - half), high90: Math.exp(mean + half) }
}

interface Evidence { pulls: number, days: number }

/**
 * What may be said of two anchors: nothing where either has too few pulls to be ranked; a coin-toss between 0.35 and 0.65,
 * as in the ranking; very likely from 0.9 (or down to 0.1, for the other); more likely between.
 *
 * @param chance that the first's median is the higher one, 0 to 1
 */
export function comparisonVerdict(chance: number, first: Evidence, second: Evidence): ComparisonVerdict {
  if (!hasEvidence(first) || !hasEvidence(second)) return 'notTested'
  if (chance > coinToss.low && chance < coinToss.high) return 'cannotTell'
  return Math.max(chance, 1 - chance) >= veryLikelyFrom ? 'veryLikely' : 'moreLikely'
}
