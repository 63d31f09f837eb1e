import { erf } from '#shared/stats/erfcx'
import { logNormalDensity, millsRatio } from '#shared/stats/normal'

/** ln[Phi(b) - Phi(a)] of a standard normal known to lie between a and b, and its derivatives by the location. */
export interface IntervalTerms {
  /** ln of the probability */
  log: number
  /** first, second and third derivative when the location moves up by one standard deviation (a and b fall alike) */
  d1: number
  d2: number
  d3: number
  /** derivatives by ln of the scale s, at a = (lo - m)/s and b = (hi - m)/s: of log once and twice, and of d1 and d2 */
  dLogScale: number
  d2LogScale: number
  d1ByLogScale: number
  d2ByLogScale: number
}

/** A record to fill. */
export function emptyTerms(): IntervalTerms {
  return { log: 0, d1: 0, d2: 0, d3: 0, dLogScale: 0, d2LogScale: 0, d1ByLogScale: 0, d2ByLogScale: 0 }
}

/** Below this width, in standard deviations, the interval counts as an exact value: the error is its square over 24. */
const exactWidth = 1e-5
/** Past this many standard deviations a one-sided tail is taken from its asymptotic series. */
const farTail = 100

function exact(a: number, b: number, out: IntervalTerms): void {
  const middle = 0.5 * (a + b)
  out.log = logNormalDensity(middle) + Math.log(b - a)
  out.d1 = middle
  out.d2 = -1
  out.d3 = 0
  out.dLogScale = middle * middle - 1
  out.d2LogScale = -2 * middle * middle
  out.d1ByLogScale = -middle
  out.d2ByLogScale = 0
}

/** Fills ln D and the two ratios phi(a)/D, phi(b)/D for a + b >= 0, so that the upper tail is the small one. */
function upper(a: number, b: number): [log: number, p: number, q: number] {
  const shrink = b === Infinity ? 0 : Math.exp(-0.5 * (b - a) * (b + a))
  if (a >= 0) {
    const scaled = millsRatio(a) - (shrink > 0 ? shrink * millsRatio(b) : 0)
    return [logNormalDensity(a) + Math.log(scaled), 1 / scaled, shrink / scaled]
  }
  const d = 0.5 * (erf(b * Math.SQRT1_2) + erf(-a * Math.SQRT1_2))
  return [Math.log(d), Math.exp(logNormalDensity(a)) / d, Math.exp(logNormalDensity(b)) / d]
}

/** One-sided and far out: p = phi(a)/Q(a) is a + 1/a - 2/a^3 + ..., so p - a is taken from the series, not by subtraction. */
function farOneSided(a: number, out: IntervalTerms, sign: number): void {
  const t = 1 / (a * a)
  const excess = (1 - t * (2 - 10 * t)) / a
  const p = a + excess
  out.log = logNormalDensity(a) - Math.log(p)
  out.d1 = sign * p
  out.d2 = -p * excess
  out.d3 = sign * 2 * t / a
  out.dLogScale = a * p
  out.d2LogScale = -a * p * (1 + a * excess)
  out.d1ByLogScale = -sign * a * p * excess
  out.d2ByLogScale = 2 * t
}

function nothingKnown(out: IntervalTerms): void {
  out.log = out.d1 = out.d2 = out.d3 = out.dLogScale = out.d2LogScale = out.d1ByLogScale = out.d2ByLogScale = 0
}

/** Everything from p = phi(a)/D and q = phi(b)/D, by the rules Ep = p(a - d1), Sp = p(a^2 - s) and alike for q. */
function fill(log: number, a: number, b: number, p: number, q: number, out: IntervalTerms): void {
  const [from, to] = [p === 0 ? 0 : a, q === 0 ? 0 : b]
  const d1 = p - q
  const s = p * from - q * to
  const d2 = s - d1 * d1
  const atA = from * from - s
  const atB = to * to - s
  const second = p * from * (atA - 1) - q * to * (atB - 1)
  const d1Scale = p * atA - q * atB
  out.log = log
  out.d1 = d1
  out.d2 = Math.min(d2, 0)
  out.d3 = p * (from * (from - d1) - 1) - q * (to * (to - d1) - 1) - 2 * d1 * d2
  out.dLogScale = s
  out.d2LogScale = second
  out.d1ByLogScale = d1Scale
  out.d2ByLogScale = second - 2 * d1 * d1Scale
}

/**
 * ln of the chance that a standard normal lies in (a, b), with derivatives: neither far tails nor narrow intervals lose digits.
 * @param a lower end in standard deviations, -Infinity allowed
 * @param b upper end, above a, Infinity allowed
 * @param out filled and returned, so that a loop over pulls makes no garbage
 * @throws RangeError unless a < b
 */
export function intervalTerms(a: number, b: number, out: IntervalTerms): IntervalTerms {
  if (!(a < b)) throw new RangeError(`interval ends must rise, got ${a} to ${b}`)
  if (b - a < exactWidth) {
    exact(a, b, out)
    return out
  }
  const flip = a + b < 0
  const from = flip ? -b : a
  const to = flip ? -a : b
  if (from > farTail && (to === Infinity || (to - from) * from > 40)) {
    farOneSided(from, out, flip ? -1 : 1)
    return out
  }
  if (from === -Infinity) {
    nothingKnown(out)
    return out
  }
  const [log, near, far] = upper(from, to)
  fill(log, a, b, flip ? far : near, flip ? near : far, out)
  return out
}
