import { solveForward } from '#shared/stats/sparseCholesky'
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

/** L^-1 z of one contrast z. */
function half(laplace: Laplace, contrast: Contrast): Float64Array {
  const y = new Float64Array(laplace.x.length)
  for (const col of contrast.cols) y[laplace.position[col]!]! += 1
  solveForward(laplace.structure.matrix, y)
  return y
}

/** The same of each contrast, kept only at the places where any of them holds something. */
function halves(laplace: Laplace, contrasts: readonly Contrast[]): Float64Array[] {
  const full = contrasts.map(contrast => half(laplace, contrast))
  const places: number[] = []
  for (let k = 0; k < laplace.x.length; k++) if (full.some(y => y[k] !== 0)) places.push(k)
  return full.map((y) => {
    const kept = new Float64Array(places.length)
    for (let p = 0; p < kept.length; p++) kept[p] = y[places[p]!]!
    return kept
  })
}

function dot(a: Float64Array, b: Float64Array): number {
  let sum = 0
  for (let k = 0; k < a.length; k++) sum += a[k]! * b[k]!
  return sum
}

/** A list of contrasts, and which pairs of them share an effect that nobody observed. */
export interface ContrastList { contrasts: readonly Contrast[], shared: readonly { i: number, j: number, effect: UnseenEffect }[] }

/** Makes a list ready, once for all settings of the sds. */
export function contrastList(contrasts: readonly Contrast[]): ContrastList {
  const shared = contrasts.flatMap((one, i) => one.unseen.flatMap(effect => contrasts.flatMap((other, j) =>
    (other.unseen.some(({ id }) => id === effect.id) ? [{ i, j, effect }] : []))))
  return { contrasts, shared }
}

/**
 * Moments of contrasts at the sds last set, the workspace standing at the mode.
 *
 * @param centre the effects' posterior mean (the mode, or the mode corrected for skewness)
 * @param groupSds the groups' sds, for unseen effects
 */
export function contrastMoments(laplace: Laplace, list: ContrastList, centre: Float64Array, groupSds: Float64Array): Moments {
  const size = list.contrasts.length
  const parts = halves(laplace, list.contrasts)
  const mean = Float64Array.from(list.contrasts, contrast => contrast.cols.reduce((sum, col) => sum + centre[laplace.position[col]!]!, 0))
  const covariance = new Float64Array(size * size)
  for (let i = 0; i < size; i++) {
    for (let j = 0; j <= i; j++) {
      const both = dot(parts[i]!, parts[j]!)
      covariance[i * size + j] = both
      covariance[j * size + i] = both
    }
  }
  for (const { i, j, effect } of list.shared) {
    covariance[i * size + j]! += (effect.group < 0 ? effect.knownSd : groupSds[effect.group]!) ** 2
  }
  return { mean, covariance }
}
