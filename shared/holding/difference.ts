import type { SeabedFit } from '#shared/types/holding'
import { element, predictAt, referenceMassKg, type LnPrediction } from '#shared/holding/predict'

/** One anchor of a comparison: a design by its place in the fit, at a mass in kg. */
export interface AnchorAt { index: number, massKg: number }

/**
 * Posterior covariance of two anchors' ln median holding on one seabed, each at its own mass:
 * C_ab + x_b C_a,beta + x_a C_b,beta + x_a x_b C_beta,beta, x = ln(mass / 15 kg).
 *
 * @throws RangeError for a place the fit does not have or a mass that is not positive
 */
function lnCovariance(fit: SeabedFit, a: AnchorAt, b: AnchorAt): number {
  const beta = fit.designs.length
  const [xa, xb] = [Math.log(a.massKg / referenceMassKg), Math.log(b.massKg / referenceMassKg)]
  return element(fit, a.index, b.index) + xb * element(fit, a.index, beta) + xa * element(fit, b.index, beta) + xa * xb * element(fit, beta, beta)
}

/**
 * Posterior of the difference of two anchors' ln median holding on one seabed, from the fit's joint covariance: what both
 * share (the seabed's mean, its exponent, the family) cancels as far as it is shared. At one mass it is lnDifference.
 *
 * @param fit the estimates of one seabed
 * @param first an anchor, mass more than 0 kg
 * @param second the other; the same design at another mass is allowed
 * @returns mean and variance of ln(first) - ln(second)
 * @throws RangeError for a place the fit does not have or a mass that is not positive
 */
export function lnDifferenceAt(fit: SeabedFit, first: AnchorAt, second: AnchorAt): LnPrediction {
  const a = predictAt(fit, first.index, first.massKg)
  const b = predictAt(fit, second.index, second.massKg)
  const variance = a.variance + b.variance - 2 * lnCovariance(fit, first, second)
  return { mean: a.mean - b.mean, variance: Math.max(0, variance) }
}
