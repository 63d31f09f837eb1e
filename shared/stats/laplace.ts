import { checkModel } from '#shared/stats/mixedModel'
import type { LogSds, MixedModel } from '#shared/stats/mixedModel'
import { eliminationOrder } from '#shared/stats/eliminationOrder'
import { permute } from '#shared/stats/permute'
import { meetingsOf, structureOf } from '#shared/stats/structure'
import type { Structure } from '#shared/stats/structure'

/** Everything a Laplace approximation works in: the model, its index lists, and the state at the last sds tried. */
export interface Laplace {
  /** the model, its effects renumbered in their order of elimination; those that are maximised stand last */
  model: MixedModel
  /** number here of each effect of the model as it was given */
  position: Int32Array
  structure: Structure
  /** effects and day effects: the mode once `findMode` has returned */
  x: Float64Array
  w: Float64Array
  /** per observation: first derivative, curvature (positive) and third derivative of the log likelihood by eta */
  d1: Float64Array
  curvature: Float64Array
  d3: Float64Array
  /** per observation: derivatives by ln sigma of the log likelihood, of d1 and of the curvature */
  byScale: Float64Array
  d1ByScale: Float64Array
  curvatureByScale: Float64Array
  /** prior precision of each effect and of the day effects */
  precision: Float64Array
  dayPrecision: number
  /** per day: curvature of its effect; per entry of dayCols: curvature between day and effect */
  dayCurvature: Float64Array
  cross: Float64Array
  sigma: number
}

/** Makes the workspace of a model. @throws RangeError for a malformed model */
export function makeLaplace(given: MixedModel): Laplace {
  checkModel(given)
  const { position, columns } = eliminationOrder(given.group.length, meetingsOf(given), Array.from(given.maximised, one => one === 1))
  const model = permute(given, position)
  const structure = structureOf(model, columns)
  const n = model.lo.length
  return {
    model,
    position,
    structure,
    x: new Float64Array(model.group.length),
    w: new Float64Array(model.days),
    d1: new Float64Array(n),
    curvature: new Float64Array(n),
    d3: new Float64Array(n),
    byScale: new Float64Array(n),
    d1ByScale: new Float64Array(n),
    curvatureByScale: new Float64Array(n),
    precision: new Float64Array(model.group.length),
    dayPrecision: 0,
    dayCurvature: new Float64Array(model.days),
    cross: new Float64Array(structure.dayCols.length),
    sigma: 1,
  }
}

/** Takes over new standard deviations. */
export function setSds(laplace: Laplace, logSds: LogSds): void {
  const { model, precision } = laplace
  model.group.forEach((group, col) => {
    precision[col] = group < 0 ? 1 / model.priorSd[col]! ** 2 : Math.exp(-2 * logSds[group]!)
  })
  laplace.dayPrecision = model.dayGroup < 0 ? 0 : Math.exp(-2 * logSds[model.dayGroup]!)
  laplace.sigma = Math.exp(logSds[model.groups]!)
}
