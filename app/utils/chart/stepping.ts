/** Where a reader stands in a chart: a row, and one of its marks; mark -1 is the row as a whole. */
export interface ChartPlace { row: number, mark: number }

/**
 * The place that a key leads to: up and down by rows, left and right by the marks of a row, Home and End to the first and last row,
 * Escape out of the chart. Undefined where the key means nothing here.
 *
 * @param marks how many marks each row has besides itself
 * @param keep up and down stay on the same mark, as in a table
 */
export function placeAfter(key: string, place: ChartPlace | null, marks: readonly number[], keep = false): ChartPlace | null | undefined {
  const last = marks.length - 1
  if (last < 0) return undefined
  const row = place?.row ?? -1
  const toRow = (wanted: number): ChartPlace => ({ row: Math.min(Math.max(wanted, 0), last), mark: keep && place ? place.mark : -1 })
  const toMark = (step: number): ChartPlace => {
    if (!place) return toRow(0)
    return { row, mark: Math.min(Math.max(place.mark + step, -1), (marks[row] ?? 0) - 1) }
  }
  switch (key) {
    case 'ArrowDown': return toRow(row + 1)
    case 'ArrowUp': return toRow(place ? row - 1 : last)
    case 'ArrowRight': return toMark(1)
    case 'ArrowLeft': return toMark(-1)
    case 'Home': return toRow(0)
    case 'End': return toRow(last)
    case 'Escape': return null
    default: return undefined
  }
}
