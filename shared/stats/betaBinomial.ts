import { logBeta } from '#shared/stats/gamma'
import { betaQuantile } from '#shared/stats/incompleteBeta'

/** Successes out of trials. */
export interface Count { successes: number, trials: number }

/** A share: posterior mean and 90 % interval, and the trials behind it. */
export interface EstimatedShare { mean: number, low90: number, high90: number, n: number }

interface PriorPoint { a: number, b: number, weight: number }

const gridSize = 24

/** Likelihood of all counts under one Beta(a, b) prior, in log; what does not depend on a and b is left out. */
function logLikelihood(counts: readonly Count[], a: number, b: number): number {
  const prior = logBeta(a, b)
  return counts.reduce((sum, { successes, trials }) => sum + logBeta(a + successes, b + trials - successes) - prior, 0)
}

/**
 * Weights of Beta(m pi, m (1 - pi)) priors shared by all counts, on a grid: pi uniform on (0, 1), m/(1 + m) uniform too, so that
 * anything from no likeness to full likeness between designs is thought possible (ours).
 */
export function sharedPrior(counts: readonly Count[], size = gridSize): PriorPoint[] {
  const points: (PriorPoint & { log: number })[] = []
  for (let i = 0; i < size; i++) {
    for (let j = 0; j < size; j++) {
      const share = (i + 0.5) / size
      const likeness = (j + 0.5) / size
      const m = likeness / (1 - likeness)
      const a = m * share
      const b = m * (1 - share)
      points.push({ a, b, weight: 0, log: logLikelihood(counts, a, b) })
    }
  }
  const most = Math.max(...points.map(point => point.log))
  const total = points.reduce((sum, point) => sum + Math.exp(point.log - most), 0)
  return points.map(({ a, b, log }) => ({ a, b, weight: Math.exp(log - most) / total }))
}

/** Posterior of one count, mixed over the shared prior; its mean and variance make the beta density that gives the interval. */
function share(count: Count, prior: readonly PriorPoint[]): EstimatedShare {
  let mean = 0
  let square = 0
  for (const { a, b, weight } of prior) {
    const from = a + count.successes
    const total = a + b + count.trials
    mean += weight * from / total
    square += weight * from * (from + 1) / (total * (total + 1))
  }
  const concentration = mean * (1 - mean) / (square - mean * mean) - 1
  const a = mean * concentration
  const b = (1 - mean) * concentration
  return { mean, low90: betaQuantile(0.05, a, b), high90: betaQuantile(0.95, a, b), n: count.trials }
}

/**
 * Beta-binomial shares of several designs under a prior they share, the prior integrated over. Mean exact over the grid; the
 * interval from the beta density of the same mean and variance.
 *
 * @param counts successes and trials of each design, whole numbers, 0 <= successes <= trials
 * @returns one share each, null where trials is 0
 * @throws RangeError for counts out of range
 */
export function betaBinomialShares(counts: readonly Count[]): (EstimatedShare | null)[] {
  for (const { successes, trials } of counts) {
    if (!(Number.isInteger(successes) && Number.isInteger(trials) && successes >= 0 && successes <= trials)) {
      throw new RangeError(`successes must be whole and between 0 and trials, got ${successes} of ${trials}`)
    }
  }
  const tried = counts.filter(count => count.trials > 0)
  if (tried.length === 0) return counts.map(() => null)
  const prior = sharedPrior(tried)
  return counts.map(count => (count.trials === 0 ? null : share(count, prior)))
}
