/** The error function and the scaled complementary error function exp(x^2) erfc(x). */

const invSqrtPi = 0.5641895835477563

const nearNum = [3.1611237438705656, 113.86415415105016, 377.485237685302021, 3209.37758913846947, 0.185777706184603153]
const nearDen = [23.6012909523441209, 244.024637934444173, 1282.61652607737228, 2844.23683343917062]
const midNum = [
  0.564188496988670089, 8.88314979438837594, 66.1191906371416295, 298.635138197400131, 881.95222124176909,
  1712.04761263407058, 2051.07837782607147, 1230.33935479799725, 2.15311535474403846e-8,
]
const midDen = [
  15.7449261107098347, 117.693950891312499, 537.181101862009858, 1621.38957456669019, 3290.79923573345963,
  4362.61909014324716, 3439.36767414372164, 1230.33935480374942,
]
const farNum = [
  0.305326634961232344, 0.360344899949804439, 0.125781726111229246, 0.0160837851487422766, 6.58749161529837803e-4,
  0.0163153871373020978,
]
const farDen = [2.56852019228982242, 1.87295284992346725, 0.527905102951428412, 0.0605183413124413191, 0.00233520497626869185]

/** Horner-like sum of Cody's scheme: last entry leads, the one before it closes. */
function ratio(t: number, num: readonly number[], den: readonly number[]): number {
  const last = den.length - 1
  let n = num[last + 1]! * t
  let d = t
  for (let i = 0; i < last; i++) {
    n = (n + num[i]!) * t
    d = (d + den[i]!) * t
  }
  return (n + num[last]!) / (d + den[last]!)
}

/**
 * erf(x) for |x| up to 0.46875, where it is best taken directly.
 * Source: W. J. Cody, Rational Chebyshev approximations for the error function, Math. Comp. 23 (1969).
 */
function erfNear(x: number): number {
  return x * ratio(x * x, nearNum, nearDen)
}

/** exp(x^2) erfc(x) for x above 0.46875. */
function erfcxAbove(x: number): number {
  if (x <= 4) return ratio(x, midNum, midDen)
  const t = 1 / (x * x)
  return (invSqrtPi - t * ratio(t, farNum, farDen)) / x
}

/**
 * Scaled complementary error function exp(x^2) erfc(x); no unit. Never underflows for x >= 0; Infinity below about -26.6.
 *
 * @param x any finite number or Infinity
 * @throws RangeError for NaN
 */
export function erfcx(x: number): number {
  if (Number.isNaN(x)) throw new RangeError(`x must be a number, got ${x}`)
  if (x > 0.46875) return x === Infinity ? 0 : erfcxAbove(x)
  if (x >= -0.46875) return Math.exp(x * x) * (1 - erfNear(x))
  return 2 * Math.exp(x * x) - erfcxAbove(-x)
}

/**
 * Error function erf(x), full double precision in relative terms near 0.
 *
 * @throws RangeError for NaN
 */
export function erf(x: number): number {
  if (Number.isNaN(x)) throw new RangeError(`x must be a number, got ${x}`)
  const size = Math.abs(x)
  if (size <= 0.46875) return erfNear(x)
  if (size > 6) return Math.sign(x)
  return Math.sign(x) * (1 - Math.exp(-x * x) * erfcxAbove(size))
}
