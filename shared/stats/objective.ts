import { emptyTerms, intervalTerms } from '#shared/stats/intervalTerms'
import type { Laplace } from '#shared/stats/laplace'

const terms = emptyTerms()

/**
 * Log likelihood plus log prior (up to a constant) at effects x and day effects w. Leaves the derivatives of each
 * observation's term, by its eta, in the workspace.
 */
export function objective(laplace: Laplace, x: Float64Array, w: Float64Array): number {
  const { model, precision, dayPrecision, sigma } = laplace
  const { lo, hi, rowStart, cols, coefs, day } = model
  let sum = 0
  for (let i = 0; i < lo.length; i++) {
    let eta = day[i]! < 0 ? 0 : w[day[i]!]!
    for (let t = rowStart[i]!; t < rowStart[i + 1]!; t++) eta += coefs[t]! * x[cols[t]!]!
    intervalTerms((lo[i]! - eta) / sigma, (hi[i]! - eta) / sigma, terms)
    sum += terms.log
    laplace.d1[i] = terms.d1 / sigma
    laplace.curvature[i] = -terms.d2 / (sigma * sigma)
    laplace.d3[i] = terms.d3 / (sigma * sigma * sigma)
    laplace.byScale[i] = terms.dLogScale
    laplace.d1ByScale[i] = (terms.d1ByLogScale - terms.d1) / sigma
    laplace.curvatureByScale[i] = -(terms.d2ByLogScale - 2 * terms.d2) / (sigma * sigma)
  }
  let square = 0
  for (let k = 0; k < x.length; k++) square += precision[k]! * x[k]! * x[k]!
  for (let d = 0; d < w.length; d++) square += dayPrecision * w[d]! * w[d]!
  return sum - 0.5 * square
}
