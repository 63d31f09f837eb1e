import { solveWithDays } from '#shared/stats/newton'
import type { Laplace } from '#shared/stats/laplace'

/** What the posterior's lean moves the effects by, from mode to mean. */
export interface Shift { x: Float64Array, w: Float64Array }

/**
 * From the mode of the effects to their posterior mean, to third order: half the likelihood's skewness,
 * H^-1 sum_i z_i l'''_i var(eta_i) / 2. Pulls that end at the rig's limit make the posterior lean upwards; the mode alone would
 * leave that out. The same vector says how the log determinant of H changes with the mode.
 * Source: the third-order term of Laplace's method (L. Tierney, J. Kadane, 1986).
 *
 * @param etas posterior variance of each observation's eta, the workspace standing at the mode
 */
export function meanShift(laplace: Laplace, etas: Float64Array): Shift {
  const { model, d3 } = laplace
  const x = new Float64Array(laplace.x.length)
  const w = new Float64Array(laplace.w.length)
  for (let i = 0; i < d3.length; i++) {
    const pull = 0.5 * d3[i]! * etas[i]!
    for (let t = model.rowStart[i]!; t < model.rowStart[i + 1]!; t++) x[model.cols[t]!]! += model.coefs[t]! * pull
    if (model.day[i]! >= 0) w[model.day[i]!]! += pull
  }
  solveWithDays(laplace, x, w)
  return { x, w }
}
