import { solveForward } from '#shared/stats/skyline'
import type { Laplace } from '#shared/stats/laplace'

/**
 * A sum of effects whose posterior is wanted. `unseen` names effects that no observation carries: each is known by a number of
 * the caller's, and has the sd of its group, or (group -1) a known one.
 */
export interface Contrast {
  cols: readonly number[]
  unseen: readonly UnseenEffect[]
}

export interface UnseenEffect { id: number, group: number, knownSd: number }

/** Posterior mean and covariance (row-major) of a list of contrasts. */
export interface Moments { mean: Float64Array, covariance: Float64Array }

function forward(laplace: Laplace, contrast: Contrast): Float64Array {
  const y = new Float64Array(laplace.x.length)
  for (const col of contrast.cols) y[col]! += 1
  solveForward(laplace.structure.matrix, y)
  return y
}

/** Variance that two contrasts share through effects nobody observed. */
function sharedUnseen(a: Contrast, b: Contrast, variance: (effect: UnseenEffect) => number): number {
  let sum = 0
  for (const one of a.unseen) {
    if (b.unseen.some(other => other.id === one.id)) sum += variance(one)
  }
  return sum
}

/**
 * Moments of contrasts at the sds last set, the workspace standing at the mode.
 *
 * @param centre the effects' posterior mean (the mode, or the mode corrected for skewness)
 * @param groupSds the groups' sds, for unseen effects
 */
export function contrastMoments(laplace: Laplace, contrasts: readonly Contrast[], centre: Float64Array, groupSds: Float64Array): Moments {
  const size = contrasts.length
  const halves = contrasts.map(contrast => forward(laplace, contrast))
  const variance = ({ group, knownSd }: UnseenEffect): number => (group < 0 ? knownSd : groupSds[group]!) ** 2
  const mean = Float64Array.from(contrasts, contrast => contrast.cols.reduce((sum, col) => sum + centre[col]!, 0))
  const covariance = new Float64Array(size * size)
  for (let i = 0; i < size; i++) {
    for (let j = 0; j <= i; j++) {
      let sum = sharedUnseen(contrasts[i]!, contrasts[j]!, variance)
      const a = halves[i]!
      const b = halves[j]!
      for (let k = 0; k < a.length; k++) sum += a[k]! * b[k]!
      covariance[i * size + j] = sum
      covariance[j * size + i] = sum
    }
  }
  return { mean, covariance }
}
