import { cellMean, cellSums, openSide } from '#shared/stats/cellMeans'
import type { CellIntervals } from '#shared/stats/cellMeans'

/** Maximum likelihood with one free mean a cell and one sigma for all. */
export interface FreeMeans {
  /** null where nothing identifies it */
  sigma: number | null
  /** a cell's mean and standard error; null where it has no finite mean; the error null where sigma is */
  cells: ({ mean: number, sd: number | null } | null)[]
}

/** Sigma is looked for between these. */
const least = 1e-4
const greatest = 50

/** Slope of the profile likelihood by ln sigma, each cell at its best mean: its sign changes once (J. Burridge, 1981). */
function slope(cells: readonly CellIntervals[], sigma: number): number {
  return cells.reduce((sum, cell) => sum + cellSums(cell, cellMean(cell, sigma), sigma).byScale, 0)
}

function bestSigma(cells: readonly CellIntervals[]): number | 'none' | 'unbounded' {
  let low = Math.log(least)
  let high = Math.log(greatest)
  if (cells.length === 0 || slope(cells, least) <= 0) return 'none'
  if (slope(cells, greatest) >= 0) return 'unbounded'
  for (let i = 0; i < 50; i++) {
    const middle = 0.5 * (low + high)
    if (slope(cells, Math.exp(middle)) > 0) low = middle
    else high = middle
  }
  return Math.exp(0.5 * (low + high))
}

/** Middle of what a cell's intervals have in common. */
function agreement(cell: CellIntervals): { mean: number, sd: null } | null {
  if (cell.length === 0 || openSide(cell) !== null) return null
  return { mean: 0.5 * (Math.max(...cell.map(one => one.lo)) + Math.min(...cell.map(one => one.hi))), sd: null }
}

/**
 * Fits one mean a cell and one sigma to interval-censored normal observations by maximum likelihood: what R's
 * `survreg(Surv(lo, hi, type = "interval2") ~ 0 + cell, dist = "gaussian")` does. Standard errors from the observed information
 * of means and ln sigma together.
 *
 * A cell whose observations are all open above (or all below) has no finite mean and says nothing of sigma. Sigma is null where
 * the observations agree within their intervals (it would go to 0; the means then go to the middle of what each cell's intervals
 * have in common), or where nothing bounds it above (and then there are no means either).
 */
export function fitFreeMeans(cells: readonly CellIntervals[]): FreeMeans {
  const finite = cells.filter(cell => cell.length > 0 && openSide(cell) === null)
  const sigma = bestSigma(finite)
  if (sigma === 'unbounded') return { sigma: null, cells: cells.map(() => null) }
  if (sigma === 'none') return { sigma: null, cells: cells.map(agreement) }
  const fits = cells.map((cell) => {
    if (cell.length === 0 || openSide(cell) !== null) return null
    const mean = cellMean(cell, sigma)
    return { mean, sums: cellSums(cell, mean, sigma) }
  })
  let information = 0
  for (const fit of fits) {
    if (fit) information += -fit.sums.byScaleTwice + fit.sums.byBoth ** 2 / fit.sums.byMeanTwice
  }
  return {
    sigma,
    cells: fits.map((fit) => {
      if (fit === null) return null
      const { byMeanTwice, byBoth } = fit.sums
      return { mean: fit.mean, sd: Math.sqrt(-1 / byMeanTwice + (byBoth / byMeanTwice) ** 2 / information) }
    }),
  }
}
