import { inverseWithin } from '#shared/stats/sparseInverse'
import type { Laplace } from '#shared/stats/laplace'

/** Posterior variances at the sds last set: of each effect, each day effect, and each observation's eta. */
export interface Variances { effects: Float64Array, days: Float64Array, etas: Float64Array }

function quadratic(inverse: Float64Array, cols: ArrayLike<number>, from: number, to: number, weights: Float64Array): number {
  const size = weights.length
  let sum = 0
  for (let s = from; s < to; s++) {
    const row = cols[s]! * size
    const weight = weights[cols[s]!]!
    let inner = 0
    for (let t = from; t < s; t++) inner += inverse[row + cols[t]!]! * weights[cols[t]!]!
    sum += weight * (2 * inner + inverse[row + cols[s]!]! * weight)
  }
  return sum
}

/** eta of an observation without a day: its effects' own covariance. */
function plainVariance(laplace: Laplace, inverse: Float64Array, i: number, weights: Float64Array): number {
  const { rowStart, cols, coefs } = laplace.model
  for (let t = rowStart[i]!; t < rowStart[i + 1]!; t++) weights[cols[t]!] = coefs[t]!
  const variance = quadratic(inverse, cols, rowStart[i]!, rowStart[i + 1]!, weights)
  for (let t = rowStart[i]!; t < rowStart[i + 1]!; t++) weights[cols[t]!] = 0
  return variance
}

/** A day's effect, and the etas of its observations: the day's share of every effect met that day is taken off first. */
function dayVariances(laplace: Laplace, inverse: Float64Array, d: number, weights: Float64Array, out: Variances): void {
  const { model, structure, cross, dayCurvature } = laplace
  const { dayClass, example, dayColStart, dayCols } = structure
  const from = dayColStart[d]!
  const to = dayColStart[d + 1]!
  const alone = 1 / dayCurvature[d]!
  for (let s = from; s < to; s++) weights[dayCols[s]!] = -cross[s]! * alone
  out.days[d] = alone + quadratic(inverse, dayCols, from, to, weights)
  for (let c = dayClass[d]!; c < dayClass[d + 1]!; c++) {
    const i = example[c]!
    for (let t = model.rowStart[i]!; t < model.rowStart[i + 1]!; t++) weights[model.cols[t]!]! += model.coefs[t]!
    out.etas[i] = alone + quadratic(inverse, dayCols, from, to, weights)
    for (let t = model.rowStart[i]!; t < model.rowStart[i + 1]!; t++) weights[model.cols[t]!]! -= model.coefs[t]!
  }
  for (let s = from; s < to; s++) weights[dayCols[s]!] = 0
}

/** Posterior variances, the workspace standing at the mode. */
export function posteriorVariances(laplace: Laplace): Variances {
  const { model, structure } = laplace
  const inverse = inverseWithin(structure.matrix)
  const out = {
    effects: laplace.x.map((_, k) => inverse[k * laplace.x.length + k]!),
    days: new Float64Array(model.days),
    etas: new Float64Array(model.lo.length),
  }
  const weights = new Float64Array(laplace.x.length)
  for (let d = 0; d < model.days; d++) dayVariances(laplace, inverse, d, weights, out)
  model.day.forEach((day, i) => {
    out.etas[i] = day < 0 ? plainVariance(laplace, inverse, i, weights) : out.etas[structure.example[structure.classOf[i]!]!]!
  })
  return out
}
