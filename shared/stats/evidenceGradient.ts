import type { Laplace } from '#shared/stats/laplace'
import type { LogSds } from '#shared/stats/mixedModel'
import { meanShift } from '#shared/stats/skewness'
import type { Shift } from '#shared/stats/skewness'
import { posteriorVariances } from '#shared/stats/variances'
import type { Variances } from '#shared/stats/variances'

function priorSlope(logSd: number, scale: number): number {
  return scale === Infinity ? 0 : 1 - (Math.exp(logSd) / scale) ** 2
}

/** Groups' slopes: each effect's square and variance against its prior's, and how the mode moves. */
function addGroups(laplace: Laplace, variances: Variances, shift: Shift, out: Float64Array): void {
  const { model, x, w, precision, dayPrecision } = laplace
  model.group.forEach((group, k) => {
    if (group >= 0) out[group]! += precision[k]! * (x[k]! * (x[k]! + 2 * shift.x[k]!) + variances.effects[k]!) - 1
  })
  for (let d = 0; d < w.length; d++) {
    out[model.dayGroup]! += dayPrecision * (w[d]! * (w[d]! + 2 * shift.w[d]!) + variances.days[d]!) - 1
  }
}

/** The slope by ln sigma. */
function scaleSlope(laplace: Laplace, variances: Variances, shift: Shift): number {
  const { model, byScale, d1ByScale, curvatureByScale } = laplace
  let sum = 0
  for (let i = 0; i < byScale.length; i++) {
    let moved = model.day[i]! < 0 ? 0 : shift.w[model.day[i]!]!
    for (let t = model.rowStart[i]!; t < model.rowStart[i + 1]!; t++) moved += model.coefs[t]! * shift.x[model.cols[t]!]!
    sum += byScale[i]! - 0.5 * variances.etas[i]! * curvatureByScale[i]! + moved * d1ByScale[i]!
  }
  return sum
}

/**
 * Gradient of `logEvidence` by the log sds, where every effect is integrated. The workspace must stand at the mode for these sds,
 * as `logEvidence` leaves it.
 */
export function evidenceGradient(laplace: Laplace, logSds: LogSds): Float64Array {
  const { model } = laplace
  const variances = posteriorVariances(laplace)
  const shift = meanShift(laplace, variances.etas)
  const out = new Float64Array(logSds.length)
  addGroups(laplace, variances, shift, out)
  out[model.groups] = scaleSlope(laplace, variances, shift)
  return out.map((slope, k) => slope + priorSlope(logSds[k]!, k < model.groups ? model.sdScale[k]! : model.sigmaScale))
}
