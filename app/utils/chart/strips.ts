import { suitableScale } from './scale'
import { wrapped } from './text'
import type { ChartScale } from './scale'
import type { StripRow } from './types'

/** One row of a strip chart as placed: heights in px, widths left to per cent. */
export interface PlacedRow { top: number, height: number, label: readonly string[], note: readonly string[], lineY: number, textY: number, noteY: number }

interface Words { label: string, note?: string }

const lineHeight = 18

/** Rows of the wide drawing: words on the left, the interval level with the first line. */
export function wideRows(rows: readonly Words[], head: number, mostLabel = 27, mostNote = 34): PlacedRow[] {
  let top = head
  return rows.map(({ label, note }) => {
    const lines = wrapped(label, mostLabel)
    const noteLines = note ? wrapped(note, mostNote) : []
    const height = Math.max(28 + lineHeight * (lines.length + noteLines.length - 1), 46)
    const placed = { top, height, label: lines, note: noteLines, lineY: top + 18, textY: top + 20, noteY: top + 20 + lineHeight * lines.length }
    top += height
    return placed
  })
}

/** Rows of the narrow drawing: words above, the interval beneath them. */
export function narrowRows(rows: readonly Words[], head: number, mostLabel = 24, mostNote = 42): PlacedRow[] {
  let top = head
  return rows.map(({ label, note }) => {
    const lines = wrapped(label, mostLabel)
    const noteLines = note ? wrapped(note, mostNote) : []
    const words = lineHeight * (lines.length + noteLines.length)
    const placed = { top, height: words + 46, label: lines, note: noteLines, lineY: top + words + 18, textY: top + 20, noteY: top + 20 + lineHeight * lines.length }
    top += placed.height
    return placed
  })
}

export const bottomOf = (rows: readonly PlacedRow[], head: number): number => {
  const last = rows.at(-1)
  return last ? last.top + last.height : head
}

/** The axis that all rows share: what has evidence lies inside, a thin row's long interval may run out of it. */
export function stripAxis(rows: readonly StripRow[], load: number | null): ChartScale {
  const firm = rows.filter(row => !row.dashed)
  const seen = firm.length > 0 ? firm : rows
  const intervals = seen.flatMap(row => [row.low90, row.high90])
  return suitableScale([...intervals, ...rows.map(row => row.median), ...rows.flatMap(row => row.pulls.map(pull => pull.value)), ...(load === null ? [] : [load])])
}
