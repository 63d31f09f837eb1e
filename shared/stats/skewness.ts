import { solveWithDays } from '#shared/stats/newton'
import { inverseWithin } from '#shared/stats/skylineInverse'
import type { Skyline } from '#shared/stats/skyline'
import type { Laplace } from '#shared/stats/laplace'

/** Posterior variance of each observation's eta, day effect included, the workspace standing at the mode. */
export function etaVariances(laplace: Laplace): Float64Array {
  const { model, structure, cross, dayCurvature } = laplace
  const inverse = inverseWithin(structure.matrix)
  const own = new Float64Array(laplace.x.length)
  return Float64Array.from(model.lo, (_, i) => {
    const day = model.day[i]!
    const cols: number[] = day < 0 ? [] : Array.from(structure.dayCols.subarray(structure.dayColStart[day]!, structure.dayColStart[day + 1]!))
    if (day >= 0) cols.forEach((col, s) => (own[col] = -cross[structure.dayColStart[day]! + s]! / dayCurvature[day]!))
    for (let t = model.rowStart[i]!; t < model.rowStart[i + 1]!; t++) {
      if (day < 0) cols.push(model.cols[t]!)
      own[model.cols[t]!]! += model.coefs[t]!
    }
    const variance = (day < 0 ? 0 : 1 / dayCurvature[day]!) + quadratic(inverse, cols, own)
    for (const col of cols) own[col] = 0
    return variance
  })
}

function quadratic(inverse: Skyline, cols: readonly number[], weights: Float64Array): number {
  let sum = 0
  for (const a of cols) {
    for (const b of cols) {
      const entry = a >= b ? inverse.values[inverse.base[a]! + b]! : inverse.values[inverse.base[b]! + a]!
      sum += weights[a]! * weights[b]! * entry
    }
  }
  return sum
}

/**
 * Posterior mean of the effects to third order: the mode moved by half the likelihood's skewness,
 * x + H^-1 sum_i z_i l'''_i var(eta_i) / 2. Pulls that end at the rig's limit make the posterior lean upwards; the mode alone
 * would leave that out.
 * Source: the third-order term of Laplace's method (L. Tierney, J. Kadane, 1986).
 */
export function correctedMean(laplace: Laplace): Float64Array {
  const { model, d3 } = laplace
  const variances = etaVariances(laplace)
  const gx = new Float64Array(laplace.x.length)
  const gw = new Float64Array(laplace.w.length)
  for (let i = 0; i < d3.length; i++) {
    const pull = 0.5 * d3[i]! * variances[i]!
    for (let t = model.rowStart[i]!; t < model.rowStart[i + 1]!; t++) gx[model.cols[t]!]! += model.coefs[t]! * pull
    if (model.day[i]! >= 0) gw[model.day[i]!]! += pull
  }
  solveWithDays(laplace, gx, gw)
  return laplace.x.map((value, k) => value + gx[k]!)
}
