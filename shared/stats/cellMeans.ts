import { emptyTerms, intervalTerms } from '#shared/stats/intervalTerms'

/** Interval-censored observations of one cell: each lies between lo and hi, infinities allowed. */
export type CellIntervals = readonly { lo: number, hi: number }[]

/** Sums over one cell at a mean and a sigma: derivatives of its log likelihood by mean and by ln sigma. */
interface CellSums { log: number, byMean: number, byMeanTwice: number, byScale: number, byScaleTwice: number, byBoth: number }

const terms = emptyTerms()

/** Sums a cell's terms. */
export function cellSums(cell: CellIntervals, mean: number, sigma: number): CellSums {
  const sums: CellSums = { log: 0, byMean: 0, byMeanTwice: 0, byScale: 0, byScaleTwice: 0, byBoth: 0 }
  for (const { lo, hi } of cell) {
    intervalTerms((lo - mean) / sigma, (hi - mean) / sigma, terms)
    sums.log += terms.log
    sums.byMean += terms.d1 / sigma
    sums.byMeanTwice += terms.d2 / sigma ** 2
    sums.byScale += terms.dLogScale
    sums.byScaleTwice += terms.d2LogScale
    sums.byBoth += (terms.d1ByLogScale - terms.d1) / sigma
  }
  return sums
}

/** Whether a cell has a finite mean: not where every observation is open above, or every one open below. */
export function openSide(cell: CellIntervals): 'above' | 'below' | null {
  if (cell.every(({ hi }) => hi === Infinity)) return 'above'
  return cell.every(({ lo }) => lo === -Infinity) ? 'below' : null
}

/**
 * Maximum likelihood mean of one cell at a given sigma, by bisection on the slope (the log likelihood is concave).
 *
 * @param cell observations with a finite mean (`openSide` null)
 */
export function cellMean(cell: CellIntervals, sigma: number): number {
  const ends = cell.flatMap(({ lo, hi }) => [lo, hi]).filter(Number.isFinite)
  let low = Math.min(...ends) - 10 * sigma
  let high = Math.max(...ends) + 10 * sigma
  for (let i = 0; i < 80 && high - low > 1e-13 * (1 + Math.abs(low)); i++) {
    const middle = 0.5 * (low + high)
    if (cellSums(cell, middle, sigma).byMean > 0) low = middle
    else high = middle
  }
  return 0.5 * (low + high)
}
