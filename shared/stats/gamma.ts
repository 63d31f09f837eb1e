/** The logarithm of the gamma function, and of the beta function. */

const lanczos = [
  0.9999999999998099, 676.5203681218851, -1259.1392167224028, 771.3234287776531, -176.6150291621406, 12.507343278686905,
  -0.13857109526572012, 0.000009984369578019572, 1.5056327351493116e-7,
]

/**
 * ln Gamma(x) for x above 0, about 1e-14 relative.
 * Source: C. Lanczos, SIAM J. Numer. Anal. B 1 (1964), with the coefficients for g = 7, n = 9.
 *
 * @throws RangeError for x not above 0
 */
export function logGamma(x: number): number {
  if (!(x > 0)) throw new RangeError(`x must be above 0, got ${x}`)
  if (x < 0.5) return Math.log(Math.PI / Math.sin(Math.PI * x)) - logGamma(1 - x)
  const z = x - 1
  const t = z + 7.5
  const sum = lanczos.reduce((total, c, k) => (k === 0 ? c : total + c / (z + k)), 0)
  return 0.9189385332046728 + (z + 0.5) * Math.log(t) - t + Math.log(sum)
}

/** ln B(a, b). @throws RangeError for a or b not above 0 */
export function logBeta(a: number, b: number): number {
  return logGamma(a) + logGamma(b) - logGamma(a + b)
}
