import { cholesky, invert } from '#shared/stats/smallMatrix'
import type { SmoothFunction } from '#shared/stats/maximise'

/**
 * A stand-in for the posterior of the log sds: a normal one whose spread may differ below and above the mode along each axis.
 */
export interface SplitNormal {
  mode: Float64Array
  below: Float64Array
  above: Float64Array
  /** lower Cholesky factor of the correlation matrix */
  factor: Float64Array[]
}

const step = 0.15

/** Negative Hessian at the mode by differences. */
function curvature(f: SmoothFunction, mode: Float64Array, peak: number): Float64Array[] {
  const shifted = (moves: readonly [number, number][]): number => {
    const at = mode.slice()
    for (const [axis, by] of moves) at[axis]! += by
    return f(at)
  }
  const up = mode.map((_, k) => shifted([[k, step]]))
  const down = mode.map((_, k) => shifted([[k, -step]]))
  const hessian = Array.from(mode, () => new Float64Array(mode.length))
  for (let i = 0; i < mode.length; i++) {
    hessian[i]![i] = Math.max((2 * peak - up[i]! - down[i]!) / step ** 2, 0.25)
    for (let j = 0; j < i; j++) {
      const both = shifted([[i, step], [j, step]])
      const mixed = (up[i]! + up[j]! - both - peak) / step ** 2
      hessian[i]![j] = mixed
      hessian[j]![i] = mixed
    }
  }
  return hessian
}

/** Covariance from the curvature, off-diagonals shrunk until it is positive definite. */
function covariance(hessian: Float64Array[]): Float64Array[] {
  for (let shrink = 1; ; shrink *= 0.7) {
    const damped = hessian.map((row, i) => row.map((value, j) => (i === j ? value : value * shrink)))
    const inverse = invert(damped)
    if (inverse !== null) return inverse
  }
}

/** Spread on one side: what a normal density would need to fall as the true one does, one and a half sd along the axis. */
function spread(f: SmoothFunction, mode: Float64Array, peak: number, direction: Float64Array, sd: number): number {
  const reach = 1.5
  const drop = peak - f(mode.map((value, k) => value + reach * direction[k]!))
  const factor = Math.sqrt(0.5 * reach ** 2 / Math.max(drop, 1e-3))
  return sd * Math.min(Math.max(factor, 0.5), 3)
}

/** Fits the stand-in to a log density around its mode. */
export function splitNormal(f: SmoothFunction, mode: Float64Array, peak: number): SplitNormal {
  const cov = covariance(curvature(f, mode, peak))
  const sd = Float64Array.from(cov, (row, k) => Math.sqrt(row[k]!))
  const correlation = cov.map((row, i) => row.map((value, j) => value / (sd[i]! * sd[j]!)))
  const factor = cholesky(correlation)
  if (factor === null) throw new Error('the sds have no proper correlation matrix')
  const along = cov.map((row, k) => row.map(value => value / sd[k]!))
  return {
    mode,
    below: sd.map((size, k) => spread(f, mode, peak, along[k]!.map(value => -value), size)),
    above: sd.map((size, k) => spread(f, mode, peak, along[k]!, size)),
    factor,
  }
}
