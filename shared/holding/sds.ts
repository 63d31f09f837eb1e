import { sdNames } from '#shared/holding/effects'
import { sdPriorScale } from '#shared/holding/holdingModel'
import type { HoldingModel } from '#shared/holding/holdingModel'
import type { MixedFit, MixedFitOptions } from '#shared/stats/fitMixedModel'
import type { HoldingSds } from '#shared/types/holding'

/** Mean of the half-normal prior on an sd: what is left to say where no pull carries such an effect. */
export const priorMeanSd = sdPriorScale * Math.sqrt(2 / Math.PI)

/** The sds by name. A kind of effect that no pull carries keeps its prior mean. */
export function namedSds(model: HoldingModel, fit: MixedFit): HoldingSds {
  const entries = sdNames.map((name) => {
    const group = model.groups.indexOf(name)
    return [name, group < 0 ? priorMeanSd : fit.groupSds[group]!] as const
  })
  return Object.fromEntries(entries) as Record<(typeof sdNames)[number], number>
}

/** How a fit may be bent from outside: sds taken as given, or the number of integration points. For tests and benchmarks. */
export interface FitOptions {
  sds?: HoldingSds & { sigma: number }
  /** points of the integration over the sds; 0 stays at their mode */
  points?: number
}

/** The same for the solver. */
export function solverOptions(model: HoldingModel, options: FitOptions): MixedFitOptions {
  const { sds, points } = options
  return {
    ...(sds === undefined ? {} : { sds: [...model.groups.map(name => sds[name]), sds.sigma] }),
    ...(points === undefined ? {} : { points }),
  }
}
