import { logBeta } from '#shared/stats/gamma'

const tiny = 1e-300

/** Continued fraction of the incomplete beta function by Lentz's method (DLMF 8.17.22). */
function fraction(a: number, b: number, x: number): number {
  let c = 1
  let d = 1 / away(1 - (a + b) * x / (a + 1))
  let value = d
  for (let m = 1; m < 10_000; m++) {
    const even = m * (b - m) * x / ((a + 2 * m - 1) * (a + 2 * m))
    d = 1 / away(1 + even * d)
    c = away(1 + even / c)
    value *= d * c
    const odd = -(a + m) * (a + b + m) * x / ((a + 2 * m) * (a + 2 * m + 1))
    d = 1 / away(1 + odd * d)
    c = away(1 + odd / c)
    value *= d * c
    if (Math.abs(d * c - 1) < 1e-15) break
  }
  return value
}

function away(x: number): number {
  return Math.abs(x) < tiny ? tiny : x
}

/**
 * Distribution function of a Beta(a, b) variable at x: the regularised incomplete beta function.
 *
 * @throws RangeError for a or b not above 0, or x outside 0 to 1
 */
export function betaCdf(x: number, a: number, b: number): number {
  if (!(x >= 0 && x <= 1)) throw new RangeError(`x must be between 0 and 1, got ${x}`)
  if (x === 0 || x === 1) return x
  const front = Math.exp(a * Math.log(x) + b * Math.log1p(-x) - logBeta(a, b))
  return x < (a + 1) / (a + b + 2) ? front * fraction(a, b, x) / a : 1 - front * fraction(b, a, 1 - x) / b
}

/**
 * Quantile of a Beta(a, b) variable, by bisection.
 *
 * @throws RangeError for a or b not above 0, or p outside 0 to 1
 */
export function betaQuantile(p: number, a: number, b: number): number {
  if (!(p >= 0 && p <= 1)) throw new RangeError(`p must be between 0 and 1, got ${p}`)
  let low = 0
  let high = 1
  for (let i = 0; i < 60; i++) {
    const middle = 0.5 * (low + high)
    if (betaCdf(middle, a, b) < p) low = middle
    else high = middle
  }
  return 0.5 * (low + high)
}
