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
  3.3871328727963665, 133.14166789178438, 1971.5909503065513, 13731.69376550946, 45921.95393154987,
  67265.7709270087, 33430.57558358813, 2509.0809287301227,
]
const centreDen = [
  1, 42.31333070160091, 687.1870074920579, 5394.196021424751, 21213.794301586597, 39307.89580009271,
  28729.085735721943, 5226.495278852854,
]
const middleNum = [
  1.4234371107496835, 4.630337846156546, 5.769497221460691, 3.6478483247632045, 1.2704582524523684,
  0.2417807251774506, 0.022723844989269184, 0.0007745450142783414,
]
const middleDen = [
  1, 2.053191626637759, 1.6763848301838038, 0.6897673349851, 0.14810397642748008,
  0.015198666563616457, 0.0005475938084995345, 1.0507500716444169e-9,
]
const tailNum = [
  6.657904643501103, 5.463784911164114, 1.7848265399172913, 0.29656057182850487,
  0.026532189526576124, 0.0012426609473880784, 0.000027115555687434876, 2.0103343992922881e-7,
]
const tailDen = [
  1, 0.599832206555888, 0.1369298809227358, 0.014875361290850615, 0.0007868691311456133,
  0.000018463183175100548, 1.421511758316446e-7, 2.0442631033899397e-15,
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
