import { makeSparse } from '#shared/stats/sparseCholesky'
import type { SparseMatrix } from '#shared/stats/sparseCholesky'
import { classesOf } from '#shared/stats/classes'
import type { Classes } from '#shared/stats/classes'
import type { MixedModel } from '#shared/stats/mixedModel'

/** Index lists made once per model, so that each Newton step only adds numbers up. */
export interface Structure extends Classes {
  /** observations of each day: order[dayStart[d]] to order[dayStart[d + 1]] */
  dayStart: Int32Array
  order: Int32Array
  /** effects met on each day, rising: dayCols[dayColStart[d]] to ... */
  dayColStart: Int32Array
  dayCols: Int32Array
  /** for each entry of model.cols the place of its effect in dayCols, -1 without a day */
  slot: Int32Array
  matrix: SparseMatrix
}

function groupByDay(model: MixedModel): Pick<Structure, 'dayStart' | 'order'> {
  const dayStart = new Int32Array(model.days + 1)
  for (const day of model.day) if (day >= 0) dayStart[day + 1]!++
  for (let d = 0; d < model.days; d++) dayStart[d + 1]! += dayStart[d]!
  const next = dayStart.slice()
  const order = new Int32Array(dayStart[model.days]!)
  model.day.forEach((day, i) => {
    if (day >= 0) order[next[day]!++] = i
  })
  return { dayStart, order }
}

function colsOf(model: MixedModel, observations: Iterable<number>): number[] {
  const seen = new Set<number>()
  for (const i of observations) {
    for (let t = model.rowStart[i]!; t < model.rowStart[i + 1]!; t++) seen.add(model.cols[t]!)
  }
  return [...seen].sort((a, b) => a - b)
}

/** Effects that occur together: those of each day, and of each observation without one. */
export function meetingsOf(model: MixedModel): number[][] {
  const byDay = Array.from({ length: model.days }, (): number[] => [])
  const alone: number[][] = []
  model.day.forEach((day, i) => {
    if (day >= 0) byDay[day]!.push(i)
    else alone.push(colsOf(model, [i]))
  })
  return [...byDay.map(observations => colsOf(model, observations)), ...alone]
}

/**
 * Builds the index lists and the empty matrix of a model whose effects stand in their order of elimination.
 *
 * @param columns places that elimination fills
 */
export function structureOf(model: MixedModel, columns: readonly Int32Array[]): Structure {
  const { dayStart, order } = groupByDay(model)
  const alike = classesOf(model, dayStart, order)
  const slot = new Int32Array(model.cols.length).fill(-1)
  const dayColStart = new Int32Array(model.days + 1)
  const dayCols: number[] = []
  for (let d = 0; d < model.days; d++) {
    const members = order.subarray(dayStart[d]!, dayStart[d + 1]!)
    const cols = colsOf(model, members)
    for (const i of members) {
      for (let t = model.rowStart[i]!; t < model.rowStart[i + 1]!; t++) slot[t] = dayCols.length + cols.indexOf(model.cols[t]!)
    }
    dayCols.push(...cols)
    dayColStart[d + 1] = dayCols.length
  }
  return { dayStart, order, ...alike, dayColStart, dayCols: Int32Array.from(dayCols), slot, matrix: makeSparse(columns) }
}
