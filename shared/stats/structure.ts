import { makeSkyline } from '#shared/stats/skyline'
import type { Skyline } from '#shared/stats/skyline'
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
  matrix: Skyline
  /** for each column of the factor, the rows below it that can hold anything */
  columnRows: Int32Array[]
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

/** Rows of each column once elimination has filled the matrix in, from the lists of effects that meet. */
function filledRows(size: number, meetings: readonly (readonly number[])[]): Int32Array[] {
  const rows = Array.from({ length: size }, () => new Set<number>())
  for (const cols of meetings) {
    for (const a of cols) for (const b of cols) if (b > a) rows[a]!.add(b)
  }
  return rows.map((below, col) => {
    const sorted = Int32Array.from(below).sort()
    const next = sorted[0]
    if (next !== undefined) for (const row of sorted) if (row > next) rows[next]!.add(row)
    rows[col] = new Set()
    return sorted
  })
}

/** Lets every effect of a list reach back to the least of them. */
function reach(first: Int32Array, cols: readonly number[]): void {
  const least = cols[0]
  if (least === undefined) return
  for (const col of cols) first[col] = Math.min(first[col]!, least)
}

/** Builds the index lists and the empty matrix of a model. Effects of one block should stand together, shared ones last. */
export function structureOf(model: MixedModel): Structure {
  const { dayStart, order } = groupByDay(model)
  const alike = classesOf(model, dayStart, order)
  const first = Int32Array.from(model.group, (_, col) => col)
  const slot = new Int32Array(model.cols.length).fill(-1)
  const dayColStart = new Int32Array(model.days + 1)
  const dayCols: number[] = []
  const meetings: number[][] = []
  for (let d = 0; d < model.days; d++) {
    const members = order.subarray(dayStart[d]!, dayStart[d + 1]!)
    const cols = colsOf(model, members)
    reach(first, cols)
    meetings.push(cols)
    for (const i of members) {
      for (let t = model.rowStart[i]!; t < model.rowStart[i + 1]!; t++) slot[t] = dayCols.length + cols.indexOf(model.cols[t]!)
    }
    dayCols.push(...cols)
    dayColStart[d + 1] = dayCols.length
  }
  model.day.forEach((day, i) => {
    if (day >= 0) return
    const cols = colsOf(model, [i])
    reach(first, cols)
    meetings.push(cols)
  })
  return {
    dayStart, order, ...alike, dayColStart, dayCols: Int32Array.from(dayCols), slot,
    matrix: makeSkyline(first), columnRows: filledRows(first.length, meetings),
  }
}
