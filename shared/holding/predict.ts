import type { SeabedFit } from '#shared/types/holding'

/** Mean and variance of a natural logarithm of newtons. */
export interface LnPrediction { mean: number, variance: number }

/** The mass at which estimates are kept, kg: ours, a usual size. */
export const referenceMassKg = 15

/** ln(mass / 15 kg), the size term of the model; a RangeError unless the mass is positive and finite. */
function lnMassRatio(massKg: number): number {
  if (!(massKg > 0 && massKg < Infinity)) {
    throw new RangeError(`anchor mass must be more than 0 kg, got ${massKg}`)
  }
  return Math.log(massKg / referenceMassKg)
}

/** Place of a design in a seabed's estimates, -1 where the fit has none for it. */
export function designIndex(fit: SeabedFit, design: string): number {
  return fit.designs.findIndex(estimate => estimate.design === design)
}

/**
 * One number of a seabed's joint covariance: designs by their place, beta_s last.
 *
 * @throws RangeError where the matrix does not hold it
 */
export function element(fit: SeabedFit, row: number, column: number): number {
  const value = fit.covariance[row * (fit.designs.length + 1) + column]
  if (value === undefined) {
    throw new RangeError(`covariance of ${fit.seabed} must hold ${(fit.designs.length + 1) ** 2} numbers, got ${fit.covariance.length}`)
  }
  return value
}

/**
 * The same as predictLnHolding, by the design's place in the fit.
 *
 * @throws RangeError for a place the fit does not have
 */
export function predictAt(fit: SeabedFit, index: number, massKg: number): LnPrediction {
  const estimate = fit.designs[index]
  if (estimate === undefined) {
    throw new RangeError(`design must be one of the ${fit.designs.length} estimated on ${fit.seabed}, got place ${index}`)
  }
  const x = lnMassRatio(massKg)
  const beta = fit.designs.length
  const variance = element(fit, index, index) + 2 * x * element(fit, index, beta) + x * x * element(fit, beta, beta)
  return { mean: estimate.lnMean15Kg + (fit.exponent + fit.betaMean) * x, variance: Math.max(0, variance) }
}

/**
 * Posterior of a design's true median holding on a seabed at a mass, flat pull, perfect rig:
 * ln H(mass) = ln H(15 kg) + (b_s + beta_s) ln(mass / 15 kg), the covariance with beta_s included.
 *
 * @param fit the estimates of one seabed
 * @param design the design's slug
 * @param massKg anchor mass, kg, more than 0
 * @returns mean and variance of ln(holding in N)
 * @throws RangeError for a design the fit does not know or a mass that is not positive
 *
 * Source: H = H_R (W/W_R)^b, UFC 4-159-03 eq. 26; exponents of its tables 5-3 and 5-4 from memory; beta_s is ours.
 */
export function predictLnHolding(fit: SeabedFit, design: string, massKg: number): LnPrediction {
  const index = designIndex(fit, design)
  if (index < 0) throw new RangeError(`design must be one of those estimated on ${fit.seabed}, got ${design}`)
  return predictAt(fit, index, massKg)
}

/**
 * Factor from a load at 15 kg to the same anchor's at another mass: (mass / 15 kg)^(b_s + beta_s), beta_s at its mean.
 *
 * @param massKg anchor mass, kg, more than 0
 * @throws RangeError for a mass that is not positive
 */
export function massFactor(fit: SeabedFit, massKg: number): number {
  return Math.exp((fit.exponent + fit.betaMean) * lnMassRatio(massKg))
}

/**
 * Posterior of the difference of two designs' ln median holding on one seabed at one mass, from their joint covariance.
 * Both share the seabed's exponent, so the mass drops out.
 *
 * @param first place of the first design in the fit
 * @param second place of the second
 * @returns mean and variance of ln(first) - ln(second)
 */
export function lnDifference(fit: SeabedFit, first: number, second: number): LnPrediction {
  const a = fit.designs[first]
  const b = fit.designs[second]
  if (a === undefined || b === undefined) {
    throw new RangeError(`designs must be among the ${fit.designs.length} estimated on ${fit.seabed}, got places ${first} and ${second}`)
  }
  const variance = element(fit, first, first) + element(fit, second, second) - 2 * element(fit, first, second)
  return { mean: a.lnMean15Kg - b.lnMean15Kg, variance: Math.max(0, variance) }
}
