import { findMode } from '#shared/stats/newton'
import { setSds } from '#shared/stats/laplace'
import type { Laplace } from '#shared/stats/laplace'
import type { LogSds } from '#shared/stats/mixedModel'
import { halfLogDeterminant } from '#shared/stats/sparseCholesky'

/** ln of the half-normal prior density of exp(logSd), by ln sd, up to a constant; 0 where the prior is flat (no Jacobian either). */
function logPrior(logSd: number, scale: number): number {
  return scale === Infinity ? 0 : logSd - 0.5 * (Math.exp(logSd) / scale) ** 2
}

/**
 * Laplace approximation of ln p(data | sds), up to a constant, plus the log prior of the sds on their log scale. Moves the
 * workspace to the mode at these sds.
 */
export function logEvidence(laplace: Laplace, logSds: LogSds): number {
  setSds(laplace, logSds)
  const { model, precision } = laplace
  let sum = findMode(laplace)
  const integrated = model.maximised.indexOf(1) < 0 ? precision.length : model.maximised.indexOf(1)
  for (let k = 0; k < integrated; k++) if (precision[k]! > 0) sum += 0.5 * Math.log(precision[k]!)
  sum -= halfLogDeterminant(laplace.structure.matrix, integrated)
  if (model.days > 0) {
    sum += 0.5 * model.days * Math.log(laplace.dayPrecision)
    for (const curvature of laplace.dayCurvature) sum -= 0.5 * Math.log(curvature)
  }
  for (let g = 0; g < model.groups; g++) sum += logPrior(logSds[g]!, model.sdScale[g]!)
  return sum + logPrior(logSds[model.groups]!, model.sigmaScale)
}
