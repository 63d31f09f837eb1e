import { contrastList, contrastMoments } from '#shared/stats/contrasts'
import type { Contrast, ContrastList, Moments } from '#shared/stats/contrasts'
import { logEvidence } from '#shared/stats/evidence'
import { evidenceGradient } from '#shared/stats/evidenceGradient'
import { splitNormal } from '#shared/stats/hyperposterior'
import { designPoints } from '#shared/stats/integration'
import { makeLaplace } from '#shared/stats/laplace'
import type { Laplace } from '#shared/stats/laplace'
import { maximise, numericGradient } from '#shared/stats/maximise'
import type { Gradient, SmoothFunction } from '#shared/stats/maximise'
import type { LogSds, MixedModel } from '#shared/stats/mixedModel'
import { addMoments, emptyMoments, meanMoments } from '#shared/stats/mixture'
import { meanShift } from '#shared/stats/skewness'
import { posteriorVariances } from '#shared/stats/variances'

export interface MixedFit {
  /** posterior means of the groups' sds and of sigma (their modes where nothing is integrated) */
  groupSds: Float64Array
  sigma: number
  /** moments of each list of contrasts, in the order asked for */
  moments: Moments[]
}

export interface MixedFitOptions {
  /** take these sds as given: groups in order, then sigma */
  sds?: readonly number[]
  /** points of the integration over the sds; 0 stays at the mode of the sds */
  points?: number
}

/** Standard deviations are looked for between these. */
const leastSd = 1e-4
const greatestSd = 10

/**
 * Points of the integration unless the caller says: enough for means of the sds to about a tenth of their posterior sd, and more
 * where they cost little and the sds are least known.
 */
function usualPoints(observations: number): number {
  return Math.min(256, Math.max(64, Math.round(65_536 / observations)))
}

/** Points that weigh less than this (the mode weighs about 1) are left out. */
const negligible = 0.01

/** Evidence and its gradient; by differences where some effects are maximised, not integrated. */
function evidenceOf(laplace: Laplace): { f: SmoothFunction, gradient: Gradient } {
  const f: SmoothFunction = at => logEvidence(laplace, at)
  const whole = !laplace.model.maximised.includes(1)
  return { f, gradient: whole ? at => evidenceGradient(laplace, at) : numericGradient(f) }
}

function searchMode(laplace: Laplace): { at: LogSds, value: number } {
  const size = laplace.model.groups + 1
  const start = new Float64Array(size).fill(Math.log(0.2))
  start[size - 1] = Math.log(0.4)
  const box = { lower: new Float64Array(size).fill(Math.log(leastSd)), upper: new Float64Array(size).fill(Math.log(greatestSd)) }
  const { f, gradient } = evidenceOf(laplace)
  return maximise(f, gradient, start, box)
}

/** Moments at one setting of the sds, the workspace standing at the mode of the effects there. */
function momentsHere(laplace: Laplace, at: LogSds, lists: readonly ContrastList[]): MixedFit {
  const sds = at.map(Math.exp)
  const shift = meanShift(laplace, posteriorVariances(laplace).etas)
  const centre = laplace.x.map((value, k) => value + shift.x[k]!)
  return {
    groupSds: sds.slice(0, -1),
    sigma: sds[sds.length - 1]!,
    moments: lists.map(list => contrastMoments(laplace, list, centre, sds)),
  }
}

/**
 * Weighted fit over points spread around the mode of the sds. Each weight is the evidence over the density that the points were
 * spread by; both are taken against their values at the mode, so nothing overflows.
 */
function integrate(laplace: Laplace, mode: LogSds, peak: number, count: number, lists: readonly ContrastList[]): MixedFit {
  const { f, gradient } = evidenceOf(laplace)
  const shape = splitNormal(f, gradient, mode, peak)
  const sds = new Float64Array(mode.length)
  const sums = lists.map(list => emptyMoments(list.contrasts.length))
  let total = 0
  logEvidence(laplace, mode)
  const { x, w } = laplace
  for (const { at, logDensity } of designPoints(shape, count)) {
    Object.assign(laplace, { x, w })
    const weight = Math.exp(logEvidence(laplace, at) - peak - logDensity)
    if (weight < negligible) continue
    const fit = momentsHere(laplace, at, lists)
    fit.moments.forEach((moments, k) => addMoments(sums[k]!, moments, weight))
    at.forEach((log, k) => (sds[k]! += weight * Math.exp(log)))
    total += weight
  }
  const means = sds.map(sum => sum / total)
  return { groupSds: means.slice(0, -1), sigma: means[means.length - 1]!, moments: sums.map(meanMoments) }
}

/**
 * Fits an interval-censored mixed model: sds by their posterior (Laplace evidence, half-normal priors), effects by their mode
 * corrected for skewness, both averaged over the sds so that not knowing the sds widens every interval.
 *
 * @param wanted lists of contrasts whose joint moments are wanted
 * @throws RangeError for a malformed model; Error where a direction is neither seen nor held by a prior
 */
export function fitMixedModel(model: MixedModel, wanted: readonly (readonly Contrast[])[], options: MixedFitOptions = {}): MixedFit {
  const lists = wanted.map(contrastList)
  const laplace = makeLaplace(model)
  const count = options.points ?? usualPoints(model.lo.length)
  let at: LogSds = Float64Array.from(options.sds ?? [], Math.log)
  if (options.sds === undefined) {
    const mode = searchMode(laplace)
    if (count > 0) return integrate(laplace, mode.at, mode.value, count, lists)
    at = mode.at
  }
  logEvidence(laplace, at)
  return momentsHere(laplace, at, lists)
}
