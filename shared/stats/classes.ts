import type { MixedModel } from '#shared/stats/mixedModel'

/** Observations with the same effects on the same day are alike: their curvatures can be added up before anything else. */
export interface Classes {
  /** class of each observation, and one observation of each class */
  classOf: Int32Array
  example: Int32Array
  /** classes of day d are dayClass[d] to dayClass[d + 1]; those without a day come last */
  dayClass: Int32Array
}

function sameRow(model: MixedModel, i: number, j: number): boolean {
  const length = model.rowStart[i + 1]! - model.rowStart[i]!
  if (model.rowStart[j + 1]! - model.rowStart[j]! !== length) return false
  for (let t = 0; t < length; t++) {
    const a = model.rowStart[i]! + t
    const b = model.rowStart[j]! + t
    if (model.cols[a] !== model.cols[b] || model.coefs[a] !== model.coefs[b]) return false
  }
  return true
}

/**
 * Puts like observations of each day into classes.
 *
 * @param dayStart where each day's observations start in `order`
 */
export function classesOf(model: MixedModel, dayStart: Int32Array, order: Int32Array): Classes {
  const classOf = new Int32Array(model.lo.length)
  const example: number[] = []
  const dayClass = new Int32Array(model.days + 1)
  const assign = (i: number, from: number): void => {
    let found = from
    while (found < example.length && !sameRow(model, example[found]!, i)) found++
    if (found === example.length) example.push(i)
    classOf[i] = found
  }
  for (let d = 0; d < model.days; d++) {
    for (let m = dayStart[d]!; m < dayStart[d + 1]!; m++) assign(order[m]!, dayClass[d]!)
    dayClass[d + 1] = example.length
  }
  model.day.forEach((day, i) => {
    if (day < 0) assign(i, example.length)
  })
  return { classOf, example: Int32Array.from(example), dayClass }
}
