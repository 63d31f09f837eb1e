import { erfcx } from '#shared/stats/erfcx'

/** The standard normal distribution, in log space where tails would underflow. */

const logSqrt2Pi = 0.9189385332046728
const sqrtHalfPi = 1.2533141373155003

/** ln of the standard normal density at x. */
export function logNormalDensity(x: number): number {
  return -0.5 * x * x - logSqrt2Pi
}

/** Mills ratio (1 - Phi(x)) / phi(x): x from about -38 up. */
export function millsRatio(x: number): number {
  return sqrtHalfPi * erfcx(x * Math.SQRT1_2)
}

/**
 * ln Phi(x), stable in the far lower tail.
 *
 * @throws RangeError for NaN
 */
export function logNormalCdf(x: number): number {
  if (x === -Infinity) return -Infinity
  if (x <= 0) return logNormalDensity(x) + Math.log(millsRatio(-x))
  return Math.log1p(-Math.exp(logNormalDensity(x)) * millsRatio(x))
}

/** Phi(x): the standard normal distribution function. @throws RangeError for NaN */
export function normalCdf(x: number): number {
  return x <= 0 ? Math.exp(logNormalCdf(x)) : 1 - Math.exp(logNormalCdf(-x))
}

const centreNum = [
  3.3871328727963666080, 133.14166789178437745, 1971.5909503065514427, 13731.693765509461125, 45921.953931549871457,
  67265.770927008700853, 33430.575583588128105, 2509.0809287301226727,
]
const centreDen = [
  1, 42.313330701600911252, 687.18700749205790830, 5394.1960214247511077, 21213.794301586595867, 39307.895800092710610,
  28729.085735721942674, 5226.4952788528545610,
]
const middleNum = [
  1.42343711074968357734, 4.63033784615654529590, 5.76949722146069140550, 3.64784832476320460504, 1.27045825245236838258,
  0.241780725177450611770, 0.0227238449892691845833, 7.74545014278341407640e-4,
]
const middleDen = [
  1, 2.05319162663775882187, 1.67638483018380384940, 0.689767334985100004550, 0.148103976427480074590,
  0.0151986665636164571966, 5.47593808499534494600e-4, 1.05075007164441684324e-9,
]
const tailNum = [
  6.65790464350110377720, 5.46378491116411436990, 1.78482653991729133580, 0.296560571828504891230,
  0.0265321895265761230930, 0.00124266094738807843860, 2.71155556874348757815e-5, 2.01033439929228813265e-7,
]
const tailDen = [
  1, 0.599832206555887937690, 0.136929880922735805310, 0.0148753612908506148525, 7.86869131145613259100e-4,
  1.84631831751005468180e-5, 1.42151175831644588870e-7, 2.04426310338993978564e-15,
]

function horner(coefficients: readonly number[], t: number): number {
  let sum = 0
  for (let i = coefficients.length - 1; i >= 0; i--) sum = sum * t + coefficients[i]!
  return sum
}

/**
 * Standard normal quantile: the x with Phi(x) = p; about 1e-16 relative.
 * Source: M. J. Wichura, Algorithm AS 241, Applied Statistics 37 (1988).
 *
 * @param p probability, strictly between 0 and 1
 * @throws RangeError outside that interval
 */
export function normalQuantile(p: number): number {
  if (!(p > 0 && p < 1)) throw new RangeError(`p must lie strictly between 0 and 1, got ${p}`)
  const q = p - 0.5
  if (Math.abs(q) <= 0.425) {
    const r = 0.180625 - q * q
    return q * horner(centreNum, r) / horner(centreDen, r)
  }
  const r = Math.sqrt(-Math.log(q < 0 ? p : 1 - p))
  const size = r <= 5
    ? horner(middleNum, r - 1.6) / horner(middleDen, r - 1.6)
    : horner(tailNum, r - 5) / horner(tailDen, r - 5)
  return q < 0 ? -size : size
}

/** Half-width of a 90 % interval of a normal variable, in standard deviations. */
export const z90 = 1.6448536269514722
