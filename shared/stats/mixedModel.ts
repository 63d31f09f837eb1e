/**
 * An interval-censored Gaussian mixed model: each observation y_i lies between lo_i and hi_i, and
 *
 *   y_i = sum_k coef_ik x_k + w_day(i) + e_i,   e_i ~ N(0, sigma^2)
 *
 * Every effect x_k has a normal prior with mean 0: either of a known sd (Infinity: none), or of the sd of its group, which is
 * estimated. Each observation may also carry one effect of its own day; those are many, and are eliminated first.
 */
export interface MixedModel {
  /** ends of the observations, offsets taken off; -Infinity and Infinity allowed */
  lo: Float64Array
  hi: Float64Array
  /** effects of observation i: cols (rising) and coefs from rowStart[i] to rowStart[i + 1] */
  rowStart: Int32Array
  cols: Int32Array
  coefs: Float64Array
  /** group of each effect, or -1 where its prior sd is known */
  group: Int32Array
  /** known prior sd of each effect of group -1; Infinity means flat */
  priorSd: Float64Array
  /** day of each observation, -1 for none */
  day: Int32Array
  days: number
  /** group of the day effects, -1 when there are none */
  dayGroup: number
  groups: number
  /** scales of the half-normal priors on the groups' sds and on sigma; Infinity means flat */
  sdScale: Float64Array
  sigmaScale: number
  /** 1 for effects that are maximised over, not integrated out: the fixed effects of a maximum likelihood fit; else 0 */
  maximised: Uint8Array
}

/** Standard deviations at which a model is evaluated: logs of the groups' sds, then ln sigma. */
export type LogSds = Float64Array

function checkColumns(model: MixedModel): void {
  for (let i = 0; i < model.lo.length; i++) {
    let least = 0
    for (let t = model.rowStart[i]!; t < model.rowStart[i + 1]!; t++) {
      const col = model.cols[t]!
      if (!(col >= least && col < model.group.length)) {
        throw new RangeError(`effects of observation ${i} must rise and be between ${least} and ${model.group.length - 1}, got ${col}`)
      }
      least = col + 1
    }
  }
}

/** Throws a RangeError naming the first thing wrong with a model. */
export function checkModel(model: MixedModel): void {
  const n = model.lo.length
  if (n === 0) throw new RangeError('observations must be at least 1, got 0')
  if (model.hi.length !== n || model.day.length !== n || model.rowStart.length !== n + 1) {
    throw new RangeError(`hi, day and rowStart must match ${n} observations, got ${model.hi.length}, ${model.day.length}, ${model.rowStart.length}`)
  }
  for (let i = 0; i < n; i++) {
    if (!(model.lo[i]! < model.hi[i]!)) {
      throw new RangeError(`observation ${i} must have lo < hi, got ${model.lo[i]} and ${model.hi[i]}`)
    }
  }
  checkColumns(model)
  if (model.priorSd.length !== model.group.length || model.maximised.length !== model.group.length) {
    throw new RangeError(`priorSd and maximised must match ${model.group.length} effects, got ${model.priorSd.length}, ${model.maximised.length}`)
  }
  if (model.sdScale.length !== model.groups) {
    throw new RangeError(`sdScale must have ${model.groups} entries, got ${model.sdScale.length}`)
  }
}
