/** The error function and the scaled complementary error function exp(x^2) erfc(x). */

const invSqrtPi = 0.5641895835477563

const nearNum = [3.1611237438705655, 113.86415415105016, 377.485237685302, 3209.3775891384694, 0.18577770618460315]
const nearDen = [23.601290952344122, 244.02463793444417, 1282.6165260773723, 2844.236833439171]
const midNum = [
  0.5641884969886701, 8.883149794388377, 66.11919063714163, 298.6351381974001, 881.952221241769,
  1712.0476126340707, 2051.0783778260716, 1230.3393547979972, 2.1531153547440383e-8,
]
const midDen = [
  15.744926110709835, 117.6939508913125, 537.1811018620099, 1621.3895745666903, 3290.7992357334597,
  4362.619090143247, 3439.3676741437216, 1230.3393548037495,
]
const farNum = [
  0.30532663496123236, 0.36034489994980445, 0.12578172611122926, 0.016083785148742275, 0.0006587491615298378,
  0.016315387137302097,
]
const farDen = [2.568520192289822, 1.8729528499234673, 0.5279051029514285, 0.06051834131244132, 0.0023352049762686918]

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
