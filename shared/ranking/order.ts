import type { RankedRow } from '#shared/types/ranking'
import type { RankingOrder } from '#shared/types/words'
import { designIndex, lnDifference } from '#shared/holding/predict'
import { normalCdf } from '#shared/stats/normal'
import type { MixSeabed } from '#shared/ranking/context'
import { windRank } from '#shared/ranking/holdingWind'
import type { Candidate } from '#shared/ranking/row'

/** Between these chances of the upper row's median being the higher one, the order of two rows is a coin-toss. */
export const coinToss = { low: 0.35, high: 0.65 } as const

/** Caps closer than this count as one, m/s of gust: half a knot, as they are printed in whole knots. */
const sameCapMs = 0.257

function worstWind({ row }: Candidate): number {
  return row.worst === null ? -Infinity : windRank(row.worst.holdingWind)
}

function falling(a: number, b: number): number {
  return a === b ? 0 : b - a
}

/**
 * Sorts rows: by worst holding wind, then least chance, then weighted chance; or by weighted chance first. Equal in all,
 * by slug, so that the order of the input does not matter.
 */
export function orderRows(candidates: readonly Candidate[], order: RankingOrder): Candidate[] {
  const keys: ((candidate: Candidate) => number)[] = [worstWind, candidate => candidate.chanceWorst ?? -1, ({ row }) => row.weightedChance]
  if (order === 'weighted') keys.reverse()
  return [...candidates].sort((a, b) => {
    for (const key of keys) {
      const difference = falling(key(a), key(b))
      if (difference !== 0) return difference
    }
    return a.row.design < b.row.design ? -1 : 1
  })
}

/**
 * Chance that the first design's true median on a seabed is the higher one, both at the same mass, from the joint covariance.
 *
 * @returns 0 to 1; null where either has no estimate there
 */
export function chanceHigher(entry: MixSeabed, first: string, second: string): number | null {
  if (entry.fit === null) return null
  const a = designIndex(entry.fit, first)
  const b = designIndex(entry.fit, second)
  if (a < 0 || b < 0) return null
  const { mean, variance } = lnDifference(entry.fit, a, b)
  if (variance > 0) return normalCdf(mean / Math.sqrt(variance))
  return mean === 0 ? 0.5 : Number(mean > 0)
}

/** True where the two rows' worst holding winds are the same cap: the most any pull showed, or 64 kn. */
function tiedAtCap(upper: RankedRow, lower: RankedRow): boolean {
  const a = upper.worst?.holdingWind
  const b = lower.worst?.holdingWind
  if (a === undefined || b === undefined) return false
  if ('reason' in a || 'reason' in b) return 'reason' in a && 'reason' in b && a.reason === 'beyond64kn' && b.reason === 'beyond64kn'
  return a.atLeast && b.atLeast && Math.abs(a.gustMs - b.gustMs) < sameCapMs
}

/**
 * Whether the order of two neighbouring rows means nothing: a coin-toss between their medians on the lower row's worst
 * seabed, or the same cap.
 */
export function areTied(mix: readonly MixSeabed[], upper: RankedRow, lower: RankedRow): boolean {
  if (tiedAtCap(upper, lower)) return true
  const entry = mix.find(({ seabed }) => seabed === lower.worst?.seabed)
  const chance = entry === undefined ? null : chanceHigher(entry, upper.design, lower.design)
  return chance !== null && chance > coinToss.low && chance < coinToss.high
}
