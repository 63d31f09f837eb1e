import { cholesky, invert } from '#shared/stats/smallMatrix'
import type { Gradient, SmoothFunction } from '#shared/stats/maximise'

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

const step = 0.1

/** Negative Hessian at the mode, by central differences of the gradient. */
function curvature(f: SmoothFunction, gradient: Gradient, mode: Float64Array): Float64Array[] {
  const slopes = (axis: number, by: number): Float64Array => {
    const at = mode.slice()
    at[axis]! += by
    f(at)
    return gradient(at)
  }
  const rows = Array.from(mode, (_, axis) => {
    const up = slopes(axis, step)
    return slopes(axis, -step).map((down, k) => (down - up[k]!) / (2 * step))
  })
  return rows.map((row, i) => row.map((value, j) => (i === j ? Math.max(value, 0.25) : 0.5 * (value + rows[j]![i]!))))
}

/** Covariance from the curvature, off-diagonals shrunk until it is positive definite. */
function covariance(hessian: Float64Array[]): Float64Array[] {
  for (let shrink = 1; ; shrink *= 0.7) {
    const damped = hessian.map((row, i) => row.map((value, j) => (i === j ? value : value * shrink)))
    const inverse = invert(damped)
    if (inverse !== null) return inverse
  }
}

/** Spread on one side: what a normal density would need to fall as the true one does, two and a half sd along the axis. */
function spread(f: SmoothFunction, mode: Float64Array, peak: number, direction: Float64Array, sd: number): number {
  const reach = 2.5
  const drop = peak - f(mode.map((value, k) => value + reach * direction[k]!))
  const factor = Math.sqrt(0.5 * reach ** 2 / Math.max(drop, 1e-3))
  return sd * Math.min(Math.max(factor, 0.5), 3)
}

/**
 * Fits the stand-in to a log density around its mode.
 *
 * @param gradient called only at the point where f was called last
 * @param peak f at the mode
 */
export function splitNormal(f: SmoothFunction, gradient: Gradient, mode: Float64Array, peak: number): SplitNormal {
  const cov = covariance(curvature(f, gradient, mode))
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
