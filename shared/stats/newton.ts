import { assemble } from '#shared/stats/assemble'
import { objective } from '#shared/stats/objective'
import { factorise, solve } from '#shared/stats/sparseCholesky'
import type { Laplace } from '#shared/stats/laplace'

const mostSteps = 100

/** A Newton decrement below this leaves the mode exact to about a ten-millionth of a posterior sd. */
const enough = 1e-13

/** Gradient of the objective in effects and day effects. */
function gradient(laplace: Laplace, gx: Float64Array, gw: Float64Array): void {
  const { model, x, w, d1, precision, dayPrecision } = laplace
  for (let k = 0; k < gx.length; k++) gx[k] = -precision[k]! * x[k]!
  for (let d = 0; d < gw.length; d++) gw[d] = -dayPrecision * w[d]!
  for (let i = 0; i < d1.length; i++) {
    for (let t = model.rowStart[i]!; t < model.rowStart[i + 1]!; t++) gx[model.cols[t]!]! += model.coefs[t]! * d1[i]!
    if (model.day[i]! >= 0) gw[model.day[i]!]! += d1[i]!
  }
}

/** Solves H (sx, sw) = (gx, gw) in place by way of the eliminated matrix; the factor must stand in the structure. */
export function solveWithDays(laplace: Laplace, gx: Float64Array, gw: Float64Array): void {
  const { structure, cross, dayCurvature } = laplace
  const { dayColStart, dayCols, matrix } = structure
  for (let d = 0; d < gw.length; d++) {
    const share = gw[d]! / dayCurvature[d]!
    for (let s = dayColStart[d]!; s < dayColStart[d + 1]!; s++) gx[dayCols[s]!]! -= cross[s]! * share
  }
  solve(matrix, gx)
  for (let d = 0; d < gw.length; d++) {
    let sum = gw[d]!
    for (let s = dayColStart[d]!; s < dayColStart[d + 1]!; s++) sum -= cross[s]! * gx[dayCols[s]!]!
    gw[d] = sum / dayCurvature[d]!
  }
}

function moved(from: Float64Array, step: Float64Array, length: number): Float64Array {
  const to = new Float64Array(from.length)
  for (let k = 0; k < to.length; k++) to[k] = from[k]! + length * step[k]!
  return to
}

/**
 * Climbs to the mode of the effects at the sds last set, by Newton steps with halving, from where the workspace stands. On
 * return the structure's matrix holds the Cholesky factor at the mode.
 *
 * @returns the objective at the mode
 * @throws Error when the mode cannot be found (a flat direction without a prior)
 */
export function findMode(laplace: Laplace): number {
  const gx = new Float64Array(laplace.x.length)
  const gw = new Float64Array(laplace.w.length)
  let value = objective(laplace, laplace.x, laplace.w)
  for (let step = 0; step < mostSteps; step++) {
    gradient(laplace, gx, gw)
    const before = [gx.slice(), gw.slice()] as const
    assemble(laplace)
    if (!factorise(laplace.structure.matrix)) throw new Error('the effects are not identified: their curvature is not positive')
    solveWithDays(laplace, gx, gw)
    const decrement = dot(before[0], gx) + dot(before[1], gw)
    if (decrement < enough) return value
    value = lineSearch(laplace, gx, gw, value, decrement)
  }
  throw new Error(`no mode of the effects within ${mostSteps} Newton steps`)
}

function dot(a: Float64Array, b: Float64Array): number {
  let sum = 0
  for (let k = 0; k < a.length; k++) sum += a[k]! * b[k]!
  return sum
}

/** Halves the step until the objective rises enough; below rounding any step is taken. */
function lineSearch(laplace: Laplace, sx: Float64Array, sw: Float64Array, value: number, decrement: number): number {
  for (let length = 1; ; length /= 2) {
    const x = moved(laplace.x, sx, length)
    const w = moved(laplace.w, sw, length)
    const next = objective(laplace, x, w)
    const rounding = 1e-12 * (1 + Math.abs(value))
    if (next >= value + 1e-4 * length * decrement - rounding || length < 1e-6) {
      laplace.x = x
      laplace.w = w
      return next
    }
  }
}
