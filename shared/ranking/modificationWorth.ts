import type { ModificationEstimate, StoredFit } from '#shared/types/holding'
import type { ModificationWorth, SeabedWorth, Span } from '#shared/types/modification'
import type { RankingRequest } from '#shared/types/ranking'
import { designIndex, massFactor, predictAt, referenceMassKg, type LnPrediction } from '#shared/holding/predict'
import { modificationRatio } from '#shared/holding/ratios'
import { z90 } from '#shared/stats/normal'
import { anchoringVariance } from '#shared/ranking/chance'
import type { PlanDemand } from '#shared/ranking/context'
import { findHoldingWind } from '#shared/ranking/holdingWind'
import { planGround } from '#shared/ranking/plan'
import { greatestWindMs, planDemand } from '#shared/ranking/planDemand'
import { withPlanFields } from '#shared/ranking/planFields'

/** A function of the ratio, at its median and at both ends of its interval. */
function spanOf({ median, low90, high90 }: Span, at: (ratio: number) => number): Span {
  return { median: at(median), low90: at(low90), high90: at(high90) }
}

/** The gust at which nine of ten hold, m/s, as if pulls knew no limit: 0 where it is not reached in calm, 64 kn where it is passed. */
function reachedGust(demand: PlanDemand, prediction: LnPrediction, variance: number): number {
  const wind = findHoldingWind(demand, prediction, variance, null)
  if ('gustMs' in wind) return wind.gustMs
  return wind.reason === 'beyond64kn' ? greatestWindMs : 0
}

/** How far a ratio moves the wind at which nine of ten hold. */
function windChange(demand: PlanDemand, { mean, variance }: LnPrediction, spread: number, ratio: Span): NonNullable<SeabedWorth['changeMs']> {
  const reached = (factor: number) => reachedGust(demand, { mean: mean + Math.log(factor), variance }, spread)
  const before = reached(1)
  const gust = spanOf(ratio, factor => reached(factor) - before)
  const capped = Math.max(before, reached(ratio.high90)) >= greatestWindMs
  return { gust, mean: spanOf(gust, change => change / demand.gustFactor), capped }
}

/** The modification on one seabed; null where the fit knows nothing of the design there. */
function worthOn(estimate: ModificationEstimate, fit: StoredFit, massKg: number, demand: PlanDemand | null): SeabedWorth | null {
  const part = fit.seabeds.find(({ seabed }) => seabed === estimate.seabed)
  const index = part === undefined ? -1 : designIndex(part, estimate.design)
  const known = part?.designs[index]
  if (part === undefined || known === undefined) return null
  const prediction = predictAt(part, index, massKg)
  const half = z90 * Math.sqrt(prediction.variance)
  const left = demand?.upliftFactor ?? 1
  const medianN = Math.exp(prediction.mean) * left
  const { ratio, design, seabed, verdict } = modificationRatio(estimate)
  const spread = anchoringVariance(fit.sigma, fit.sds)
  const mostN = known.mostShown15KgN
  return {
    design,
    seabed,
    unmodifiedN: { median: medianN, low90: medianN * Math.exp(-half), high90: medianN * Math.exp(half) },
    changeN: spanOf(ratio, factor => medianN * (factor - 1)),
    unmodifiedWind: demand && findHoldingWind(demand, prediction, spread, mostN === null ? null : mostN * massFactor(part, massKg)),
    changeMs: demand && windChange(demand, prediction, spread, ratio),
    sameAsKg: spanOf(ratio, factor => massKg * factor ** (1 / (part.exponent + part.betaMean))),
    verdict,
  }
}

/**
 * What a modification is worth for a plan, on every seabed it was tried on: in newtons of holding as this rode pulls, in wind
 * at which nine of ten hold, and as the mass of an unmodified anchor that would hold as much. Each change is the ratio's
 * alone, taken at the unmodified anchor's best estimate: the ends of its interval are the ratio's ends. The change of wind is
 * worked out past what any pull showed, where the unmodified anchor's own holding wind is capped there (ours).
 *
 * @param estimates of one modification
 * @param plan boat, rode, wind and mass; its seabeds play no part
 * @throws FieldError for whatever a plan refuses, its field after `plan.`
 */
export function modificationWorth(estimates: readonly ModificationEstimate[], plan: RankingRequest, fit: StoredFit): ModificationWorth {
  const ground = withPlanFields(() => planGround(plan))
  const demand = withPlanFields(() => planDemand(plan, ground))
  const massKg = ground.massKg ?? referenceMassKg
  return {
    massKg,
    loadN: demand?.surveyN ?? null,
    upliftFactor: demand?.upliftFactor ?? null,
    seabeds: estimates.map(estimate => worthOn(estimate, fit, massKg, demand)).filter(worth => worth !== null),
  }
}
