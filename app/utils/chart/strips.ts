import { suitableScale } from './scale'
import { wrapped } from './text'
import type { ChartScale } from './scale'
import type { StripRow } from './types'

/** One row of a strip chart as placed: heights in px, widths left to per cent. */
export interface PlacedRow { top: number, height: number, label: readonly string[], note: readonly string[], lineY: number, textY: number, noteY: number }

/** Where the words and the plot of a strip chart stand, by drawing. */
export interface StripFrame { narrow: boolean, head: number, indent: number }

interface Words { label: string, note?: string }

const lineHeight = 18

/** Letters that fit beside the plot at its least width (800 px wide, 280 px narrow), less where a pattern stands before them. */
const room = ({ narrow, indent }: StripFrame) => narrow
  ? { label: indent > 0 ? 24 : 30, note: indent > 0 ? 38 : 45 }
  : { label: indent > 0 ? 32 : 37, note: indent > 0 ? 40 : 46 }

/**
 * Rows with their places. Wide: words on the left, the interval level with the first line. Narrow: words above, the interval beneath.
 *
 * @param rows what is drawn
 * @param words label and note of a row
 */
export function placedRows<Row>(rows: readonly Row[], words: (row: Row) => Words, frame: StripFrame): { row: Row, at: PlacedRow, index: number }[] {
  const most = room(frame)
  let top = frame.head
  return rows.map((row, index) => {
    const { label, note } = words(row)
    const lines = wrapped(label, most.label)
    const notes = note ? wrapped(note, most.note) : []
    const below = lineHeight * (lines.length + notes.length)
    const height = frame.narrow ? below + 50 : Math.max(below + 10, 48)
    const at = { top, height, label: lines, note: notes, lineY: frame.narrow ? top + below + 18 : top + 18, textY: top + 20, noteY: top + 20 + lineHeight * lines.length }
    top += height
    return { row, at, index }
  })
}

/** Where the last row ends. */
export function bottomOf(placed: readonly { at: PlacedRow }[], head: number): number {
  const last = placed.at(-1)?.at
  return last ? last.top + last.height : head
}

/** The axis that all rows share: what has evidence lies inside, a thin row's long interval may run out of it. */
export function stripAxis(rows: readonly StripRow[], load: number | null): ChartScale {
  const firm = rows.filter(row => !row.dashed)
  const seen = firm.length > 0 ? firm : rows
  const intervals = seen.flatMap(row => [row.low90, row.high90])
  return suitableScale([...intervals, ...rows.map(row => row.median), ...rows.flatMap(row => row.pulls.map(pull => pull.value)), ...(load === null ? [] : [load])])
}

export interface KeyItem { mark: 'interval' | 'thin' | 'pull' | 'limit' | 'dashed', text: string, x: number }

/** Sets the parts of a key side by side: about 6 px a letter. */
export function keyInLine(items: readonly Omit<KeyItem, 'x'>[]): KeyItem[] {
  let x = 0
  return items.map((item) => {
    const placed = { ...item, x }
    x += 33 + item.text.length * 6 + 22
    return placed
  })
}

/** The key to those marks that a strip chart has. */
export function stripKey(rows: readonly StripRow[]): KeyItem[] {
  const pulls = rows.flatMap(row => row.pulls)
  return keyInLine([
    ...(rows.some(row => !row.dashed) ? [{ mark: 'interval', text: 'middle, 50 % and 90 % interval' } as const] : []),
    ...(rows.some(row => row.dashed) ? [{ mark: 'dashed', text: '90 % interval, thin evidence' } as const] : []),
    ...(pulls.some(pull => !pull.atLimit) ? [{ mark: 'pull', text: 'a pull each' } as const] : []),
    ...(pulls.some(pull => pull.atLimit) ? [{ mark: 'limit', text: 'never moved: that or more' } as const] : []),
  ])
}

/** An open tick: whether its arrow and its count (where several coincide) have room before the next one. */
export interface HeldPlace { x: number, arrow: boolean, count: number | null }

/**
 * Places of the pulls that never moved, those that coincide as one.
 *
 * @param places in per cent of the plot's width
 * @param leastWidth the least width in px that the plot is drawn at
 */
export function heldPlaces(places: readonly number[], leastWidth: number): HeldPlace[] {
  const counts = new Map<number, number>()
  for (const x of [...places].sort((a, b) => a - b)) counts.set(x, (counts.get(x) ?? 0) + 1)
  const distinct = [...counts]
  return distinct.map(([x, count], index) => {
    const next = distinct[index + 1]?.[0]
    const room = next === undefined ? Number.POSITIVE_INFINITY : (next - x) / 100 * leastWidth
    return { x, arrow: room >= 12, count: count > 1 && room >= 24 ? count : null }
  })
}
