import type { Moments } from '#shared/stats/contrasts'

/** Running sums for the moments of a weighted mixture of normals. Means are kept against the first one, so no digits are lost. */
export interface MomentSums { weight: number, origin: Float64Array | null, mean: Float64Array, second: Float64Array }

/** Sums of nothing yet, for lists of the given length. */
export function emptyMoments(size: number): MomentSums {
  return { weight: 0, origin: null, mean: new Float64Array(size), second: new Float64Array(size * size) }
}

/** Adds one component. */
export function addMoments(sums: MomentSums, moments: Moments, weight: number): void {
  const size = sums.mean.length
  sums.origin ??= moments.mean.slice()
  const away = moments.mean.map((value, k) => value - sums.origin![k]!)
  sums.weight += weight
  for (let i = 0; i < size; i++) {
    sums.mean[i]! += weight * away[i]!
    const row = i * size
    for (let j = 0; j < size; j++) sums.second[row + j]! += weight * (moments.covariance[row + j]! + away[i]! * away[j]!)
  }
}

/** Mean and covariance of the mixture. @throws RangeError when nothing was added */
export function meanMoments(sums: MomentSums): Moments {
  const { weight, origin } = sums
  if (origin === null || !(weight > 0)) throw new RangeError(`weight of a mixture must be above 0, got ${weight}`)
  const size = sums.mean.length
  const away = sums.mean.map(sum => sum / weight)
  return {
    mean: away.map((value, k) => value + origin[k]!),
    covariance: sums.second.map((sum, k) => sum / weight - away[Math.floor(k / size)]! * away[k % size]!),
  }
}
