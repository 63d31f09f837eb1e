import { line } from 'd3-shape'
import { linearScale } from './scale'
import type { ChartScale } from './scale'
import type { LadderPoint, LadderRow } from './types'

/** Heights in px from the top of the drawing; winds in per cent of the plot's width. */
export interface LadderPlot {
  wind: ChartScale
  load: ChartScale
  yOf: (load: number) => number
  curve: string
  top: number
  bottom: number
}

/** A row as placed: y of its holding, x of its holding wind in per cent (null: none shown), and the y at which its words stand. */
export interface PlacedHolding { y: number, x: number | null, labelY: number, beyond: boolean }

/** The plot of load against wind; holdings past twice the curve's greatest load are drawn at its upper edge. */
export function ladderPlot(curve: readonly LadderPoint[], rows: readonly LadderRow[], top: number, bottom: number, ticks: number): LadderPlot {
  const winds = curve.map(point => point.wind)
  const most = Math.max(...curve.map(point => point.load), 0)
  const holdings = rows.map(row => row.holding).filter(holding => holding <= 2 * most)
  const load = linearScale(0, Math.max(most, ...holdings) || 1, 5)
  const [low, high] = winds.length > 0 ? [Math.min(...winds), Math.max(...winds)] : [0, 1]
  const wind = { ...linearScale(low, high, ticks), low, high, at: (value: number) => Math.round(Math.min(Math.max((value - low) / (high - low || 1), 0), 1) * 1e4) / 100 }
  const yOf = (value: number) => Math.round((bottom - load.at(value) / 100 * (bottom - top)) * 10) / 10
  const drawn = line<LadderPoint>(point => wind.at(point.wind), point => yOf(point.load) - top).digits(2)
  return { wind: { ...wind, ticks: wind.ticks.filter(tick => tick >= low && tick <= high) }, load, yOf, curve: drawn([...curve].sort((a, b) => a.wind - b.wind)) ?? '', top, bottom }
}

/** Moves positions apart until each has its room, as little as may be, keeping their order and the space they have. */
export function spread(wanted: readonly number[], room: number, top: number, bottom: number): number[] {
  const order = wanted.map((y, index) => ({ y, index })).sort((a, b) => a.y - b.y)
  const gap = Math.min(room, order.length > 1 ? (bottom - top) / (order.length - 1) : room)
  let floor = top
  for (const item of order) {
    item.y = Math.max(item.y, floor)
    floor = item.y + gap
  }
  let ceiling = bottom
  for (const item of [...order].reverse()) {
    item.y = Math.min(item.y, ceiling)
    ceiling = item.y - gap
  }
  const places = wanted.map(() => 0)
  for (const { y, index } of order) places[index] = Math.round(y * 10) / 10
  return places
}

/** Where each row's holding meets the curve, and where its words go. */
export function placedHoldings(plot: LadderPlot, rows: readonly LadderRow[], room: number): PlacedHolding[] {
  const heights = rows.map(row => plot.yOf(row.holding))
  const labels = spread(heights, room, plot.top, plot.bottom - 4)
  return rows.map((row, index) => ({
    y: heights[index] ?? 0,
    x: row.wind === null || row.atLeast ? null : plot.wind.at(row.wind),
    labelY: labels[index] ?? 0,
    beyond: row.holding > plot.load.high,
  }))
}

/** A letter for a row: A to Z, then a figure. */
export const rowLetter = (index: number): string => index < 26 ? String.fromCharCode(65 + index) : String(index + 1)
